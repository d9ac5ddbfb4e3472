import { expect, test, type Page } from '@playwright/test';
import type { Sheet, StepDetail } from '@second-spanner/shared/contracts/sheets';
import { carPage, enter, newSheet } from './places.js';
import { demoPerson } from './sign-in.js';
import type { Hand } from './whole-job/hand.js';

// A worker's own requests pass the page's routes by.
test.use({ serviceWorkers: 'block' });

/** A new sheet's main journals, which rest on nothing: 53.96 to 53.98 mm, to be read with a micrometer. */
async function atTheJournals(page: Page): Promise<{ hand: Hand; sheet: string }> {
  const hand = await enter(page, 'tomasz');
  const sheet = await newSheet(hand);
  await page.goto(`${sheet}/steps/1.14`);
  return { hand, sheet };
}

const reading = (page: Page) => page.getByLabel(/^Reading, Main 1, across$/);

async function chooseTool(page: Page, code: string): Promise<void> {
  const tool = page.getByLabel('Tool', { exact: true });
  await tool.selectOption(await tool.locator('option', { hasText: code }).getAttribute('value'));
}

const entriesOf = async (hand: Hand, sheet: string): Promise<number> =>
  (await hand.get<StepDetail>(`${sheet}/steps/1.14`)).entries.length;

test('a wrong password is said, and the e-mail stays as it was typed', async ({ page }) => {
  await page.goto('/sheets');
  await page.getByLabel('E-mail').fill(demoPerson('tomasz').email);
  await page.getByLabel('Password').fill('not the password');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('alert').filter({ hasText: /password/i })).toBeVisible();
  await expect(page.getByLabel('E-mail')).toHaveValue(demoPerson('tomasz').email);
  await expect(page.getByLabel('Password')).toHaveValue('not the password');
  await expect(page).toHaveURL(/\/sign-in\?to=%2Fsheets/);
});

test('an empty sign-in names both fields', async ({ page }) => {
  await page.goto('/sign-in');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByLabel('E-mail')).toHaveAccessibleDescription(/Write your e-mail address/);
  await expect(page.getByLabel('Password')).toHaveAccessibleDescription(/Write your password/);
});

test('a reading outside the tool’s range is said at the field, and stays', async ({ page }) => {
  const { hand, sheet } = await atTheJournals(page);
  await chooseTool(page, 'T-01');
  await reading(page).fill('5397');
  await expect(page.locator('ss-judged')).toContainText(
    /5397\smm is outside the range of T-01, 0\smm to 100\smm/,
  );
  await expect(reading(page)).toHaveValue('5397');
  // In daily work the point was forgotten: put right in place, and nothing was kept meanwhile.
  expect(await entriesOf(hand, sheet)).toBe(0);
  await reading(page).fill('53.97');
  await expect(page.locator('ss-judged')).toContainText('Pass');
});

test('what is no figure is said at the field, and stays over a reload', async ({ page }) => {
  await atTheJournals(page);
  await reading(page).fill('fifty');
  await reading(page).blur();
  await expect(reading(page)).toHaveAttribute('aria-invalid', 'true');
  await expect(reading(page)).toHaveAccessibleDescription(/\S/);
  await expect(page.getByRole('button', { name: /^Keep it/ })).toBeDisabled();
  await page.reload();
  await expect(reading(page)).toHaveValue('fifty');
});

test('a reading without its tool is not kept: the tool’s field says so', async ({ page }) => {
  const { hand, sheet } = await atTheJournals(page);
  await reading(page).fill('53.97');
  await page.getByRole('button', { name: /^Keep it/ }).click();
  await expect(page.getByLabel('Tool', { exact: true })).toHaveAccessibleDescription(
    'Choose a tool from the register.',
  );
  await expect(reading(page)).toHaveValue('53.97');
  expect(await entriesOf(hand, sheet)).toBe(0);
});

test('a save that the api refuses says why, and keeps what was typed', async ({ page }) => {
  const { hand, sheet } = await atTheJournals(page);
  await chooseTool(page, 'T-01');
  await page.route('**/api/sheets/*/steps/*/entries', (route) =>
    route.fulfill({
      status: 422,
      contentType: 'application/problem+json',
      json: {
        type: 'about:blank',
        title: 'Against the rules',
        status: 422,
        detail: 'The sheet was signed meanwhile.',
      },
    }),
  );
  await reading(page).fill('53.97');
  await page.getByRole('button', { name: /^Keep it/ }).click();
  await expect(page.getByText('Not kept. The sheet was signed meanwhile.').first()).toBeVisible();
  await expect(reading(page)).toHaveValue('53.97');
  expect(await entriesOf(hand, sheet)).toBe(0);
});

test('a sentence that is left out is asked for', async ({ page }) => {
  const hand = await enter(page, 'tomasz');
  const sheet = await newSheet(hand);
  await page.goto(`${sheet}/steps/1.1`);
  await page.getByRole('button', { name: 'Raise a snag' }).click();
  await page.getByRole('button', { name: 'Raise the snag' }).click();
  await expect(page.getByLabel('What is wrong?')).toHaveAccessibleDescription('Say it in a sentence.');
  await page.getByLabel('What is wrong?').fill('The stand has a cracked weld.');
  await page.reload();
  await expect(page.getByLabel('What is wrong?')).toHaveValue('The stand has a cracked weld.');
  expect(await hand.get<Sheet>(sheet)).toMatchObject({ openSnags: 0 });
});

test('a sheet is started with every field chosen, from the car’s own spec', async ({ page }) => {
  const hand = await enter(page, 'nell');
  await page.goto(await carPage(hand, 'LM-C01'));
  const before = (await hand.get<{ sheets: unknown[] }>(await carPage(hand, 'LM-C01'))).sheets.length;
  const edition = page.getByRole('combobox', { name: 'Spec, approved edition' });
  await expect(edition).toContainText('AT18');
  await page.getByRole('button', { name: 'Start the sheet' }).click();
  await expect(page.getByText('Choose who builds the engine.')).toBeVisible();

  await edition.click();
  await page.getByRole('option', { name: /CV34/ }).click();
  await page.getByRole('combobox', { name: 'Builder' }).click();
  await page.getByRole('option', { name: /Tomasz Brandt/ }).click();
  await page.getByRole('combobox', { name: 'Second person' }).click();
  await page.getByRole('option', { name: /Imogen Vale/ }).click();
  await page.getByRole('button', { name: 'Start the sheet' }).click();
  await expect(page.getByText(/the car has the engine AT18/)).toBeVisible();
  await expect(page.getByRole('combobox', { name: 'Builder' })).toContainText('Tomasz Brandt');
  expect((await hand.get<{ sheets: unknown[] }>(await carPage(hand, 'LM-C01'))).sheets).toHaveLength(before);
});
