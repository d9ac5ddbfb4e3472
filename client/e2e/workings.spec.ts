import { expect, test, type Locator, type Page } from '@playwright/test';
import { tradeText } from '@second-spanner/shared/contracts/trade-words';
import { workings } from '@second-spanner/shared/workings/registry';
import { expectNoAxeViolations } from './axe.js';
import { carPage, enter } from './places.js';

const placeOf = ({ group, key }: { group: string; key: string }): string => `/workings/${group}/${key}`;
/** The wiring map has a page of its own, and its own tests. */
const generic = workings.filter(({ key }) => key !== 'wiring-map');

/** On the phone one of each group is looked over: it is the same page, and the desk looks over all at every width. */
const firstOfGroup = new Set(
  generic
    .filter(({ group }, i) => generic.findIndex((one) => one.group === group) === i)
    .map(({ key }) => key),
);

/** At the foot of the page, once it grows no more, the way to the answer rests below the fields and hides none. */
async function toTheFoot(page: Page): Promise<void> {
  const moved = (): Promise<number> =>
    page.evaluate(() => {
      const before = scrollY;
      scrollTo(0, document.body.scrollHeight);
      return Math.abs(scrollY - before);
    });
  await expect.poll(moved).toBe(0);
}

async function sheetsOfPaper(page: Page): Promise<number> {
  const pdf = (await page.pdf({ format: 'A4', preferCSSPageSize: true })).toString('latin1');
  return pdf.match(/\/Type\s*\/Page\b/g)?.length ?? 0;
}

const errors = (page: Page): Locator => page.locator('.error:not(:empty)');
const answer = (page: Page): Locator => page.locator('ss-judged, ss-answer-parts');

async function tryExample(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Try the example' }).click();
  await expect(page.getByRole('button', { name: 'Print this page' })).toBeVisible();
}

async function expectAsWideAs(page: Page, widths: readonly number[]): Promise<void> {
  const size = page.viewportSize() ?? { width: 0, height: 800 };
  for (const width of widths) {
    await page.setViewportSize({ width, height: size.height });
    await expect
      .poll(() => page.evaluate(() => document.documentElement.scrollWidth), { message: `at ${width}` })
      .toBe(width);
  }
  await page.setViewportSize(size);
}

test.describe('every working', () => {
  let page: Page;
  test.beforeAll(async ({ browser }) => {
    page = await browser.newPage();
    await enter(page, 'tomasz');
  });
  test.afterAll(() => page.close());

  test('is named on the page of workings, with what it answers', async () => {
    await page.goto('/workings');
    for (const { title } of generic) {
      const name = tradeText(title, 'british');
      await expect(page.getByRole('link', { name, exact: true })).toBeVisible();
    }
    await expectAsWideAs(page, [320]);
    await expectNoAxeViolations(page);
  });

  for (const working of generic) {
    const where = firstOfGroup.has(working.key) ? '' : ' @desk';
    test(`${working.key}: its example is answered, readable by everybody, at every width, on one page of paper${where}`, async () => {
      await page.goto(placeOf(working));
      await tryExample(page);
      await expect(errors(page)).toHaveCount(0);
      await expect(answer(page).first()).toBeVisible();
      await expectAsWideAs(page, [320, 360, 960, 1440]);
      await toTheFoot(page);
      await expectNoAxeViolations(page);
      expect(await sheetsOfPaper(page)).toBe(1);
    });
  }

  test('says what it waits for while nothing is typed, readable by everybody', async () => {
    await page.goto('/workings/convert/convert');
    await expect(page.getByText('Still to be filled in: figure with its unit.')).toBeVisible();
    await expectNoAxeViolations(page);
  });
});

const convert = '/workings/convert/convert';
const figure = (page: Page): Locator => page.getByLabel('Figure with its unit');

test('what was typed survives a reload, and going away and back', async ({ page }) => {
  await enter(page, 'tomasz');
  await page.goto(convert);
  await figure(page).fill('27 lbf·ft');
  // NIST SP 811 (2008), appendix B.8: 1 lbf·ft is 1.355 818 N·m.
  await expect(answer(page).first()).toContainText('36.6071');
  await expect(page).toHaveURL(/figure=27/);
  await page.reload();
  await expect(figure(page)).toHaveValue('27 lbf·ft');
  await page.goto('/cars');
  await page.goBack();
  await expect(figure(page)).toHaveValue('27 lbf·ft');
  await expect(answer(page).first()).toContainText('36.6071');
});

test('a unit that cannot be read is said at its field, and what was typed stays', async ({ page }) => {
  await enter(page, 'tomasz');
  await page.goto(convert);
  await figure(page).fill('27 furlongs');
  await expect(figure(page)).toHaveAttribute('aria-invalid', 'true');
  await expect(figure(page)).toHaveAccessibleDescription(/There is no unit “furlongs”/);
  await expect(figure(page)).toHaveValue('27 furlongs');
});

test('old addresses of the wiring map lead to it, with their case', async ({ page }) => {
  await enter(page, 'tomasz');
  await page.goto('/workings/wiring?order=1-3-4-2&turns=clockwise');
  await expect(page).toHaveURL(/\/workings\/wiring\/wiring-map\?order=1-3-4-2&turns=clockwise/);
  await expect(page.getByRole('heading', { name: 'Map worked out' })).toBeVisible();
});

test('an address without a working is said to be none', async ({ page }) => {
  await enter(page, 'tomasz');
  for (const address of ['/workings/wiring/convert', '/workings/nothing', '/workings/convert/nothing']) {
    await page.goto(address);
    await expect(page.getByText('There is no page under this address')).toBeVisible();
  }
});

test('a working is opened, filled in and copied by the keys alone @desk', async ({ page, context }) => {
  await context.grantPermissions(['clipboard-read', 'clipboard-write']);
  await enter(page, 'tomasz');
  await page.goto('/workings');
  await page.getByRole('link', { name: 'Convert a figure' }).focus();
  await page.keyboard.press('Enter');
  await expect(page.getByRole('heading', { name: 'Convert a figure', level: 1 })).toBeFocused();
  const tabTo = async (wanted: Locator): Promise<void> => {
    for (let pressed = 0; pressed < 40; pressed += 1) {
      await page.keyboard.press('Tab');
      if (await wanted.evaluate((element) => element === document.activeElement)) return;
    }
    throw new Error(`The focus did not come to ${wanted.toString()}.`);
  };
  await tabTo(figure(page));
  await page.keyboard.type('1 in');
  await tabTo(page.getByRole('button', { name: 'Copy as text' }));
  await page.keyboard.press('Enter');
  await expect(page.getByText('Copied. The address above')).toBeVisible();
  // Exact by definition: an inch is 25.4 mm.
  expect(await page.evaluate(() => navigator.clipboard.readText())).toContain('25.4');
});

test('a working is kept in a car file, and opens again from there', async ({ page }, { project }) => {
  const hand = await enter(page, 'tomasz');
  await page.goto(`${convert}?figure=27%20lbf%C2%B7ft`);
  await page.getByRole('button', { name: 'Keep in a car file' }).click();
  const dialog = page.getByRole('dialog', { name: 'Keep in a car file' });
  await dialog.getByRole('button', { name: 'Keep it' }).click();
  await expect(dialog.getByLabel('Car')).toHaveAccessibleDescription(/Choose the car/);
  const car = dialog.getByLabel('Car');
  await car.selectOption(await car.locator('option', { hasText: 'LM-C01' }).getAttribute('value'));
  const name = `Head nuts in new units, ${project.name}`;
  await dialog.getByLabel('Name').fill(name);
  await expectNoAxeViolations(page);
  await dialog.getByRole('button', { name: 'Keep it' }).click();
  await expect(page.getByText(`Kept as “${name}”`)).toBeVisible();

  await page.goto(await carPage(hand, 'LM-C01'));
  await page.getByRole('link', { name }).click();
  await expect(page).toHaveURL(/\/workings\/convert\/convert\?figure=27/);
  await expect(figure(page)).toHaveValue('27 lbf·ft');
});

test('a working is had as a PDF', async ({ page }) => {
  await enter(page, 'tomasz');
  await page.goto(`${convert}?figure=27%20lbf%C2%B7ft`);
  const download = page.waitForEvent('download');
  await page.getByRole('button', { name: 'Print as PDF' }).click();
  expect((await download).suggestedFilename()).toBe('convert.pdf');
});

test('a car owner calculates, and keeps nothing', async ({ page }) => {
  await enter(page, 'ravi');
  await page.goto(`${convert}?figure=1%20in`);
  await expect(answer(page).first()).toContainText('25.4');
  await expect(page.getByRole('button', { name: 'Keep in a car file' })).toHaveCount(0);
});
