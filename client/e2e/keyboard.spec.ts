import { expect, test, type Locator, type Page } from '@playwright/test';
import type { StepDetail } from '@second-spanner/shared/contracts/sheets';
import { enter, newSheet } from './places.js';
import { demoPassword, demoPerson } from './sign-in.js';

/** Moves on with the Tab key alone until the wanted thing has the focus; the focus is never out of sight. */
async function tabTo(page: Page, wanted: Locator, atMost = 80): Promise<void> {
  await expect(wanted).toBeVisible();
  for (let pressed = 0; pressed < atMost; pressed += 1) {
    await page.keyboard.press('Tab');
    const focused = page.locator(':focus');
    await expect(focused).toBeInViewport();
    if (await wanted.evaluate((element) => element === document.activeElement)) return;
  }
  throw new Error(`The focus did not come to ${wanted.toString()} in ${atMost} steps.`);
}

test('from the sign-in to a recorded step by the keys alone @desk', async ({ page, browser }) => {
  const past = await (await browser.newContext()).newPage();
  const hand = await enter(past, 'tomasz');
  const sheet = await newSheet(hand);

  await page.goto('/');
  await tabTo(page, page.getByLabel('E-mail'));
  await page.keyboard.type(demoPerson('tomasz').email);
  await tabTo(page, page.getByLabel('Password'));
  await page.keyboard.type(demoPassword);
  await page.keyboard.press('Enter');

  await expect(page.getByRole('heading', { name: 'What waits for Tomasz' })).toBeVisible();
  await tabTo(page, page.locator(`main a[href="${sheet}/steps/1.1"]`));
  await page.keyboard.press('Enter');

  await expect(page.getByRole('heading', { name: 'Engine on its stand', level: 1 })).toBeVisible();
  await tabTo(page, page.getByLabel('Right'), 150);
  await page.keyboard.press('Space');
  await tabTo(page, page.getByRole('button', { name: 'Keep it' }));
  await page.keyboard.press('Enter');
  await expect(page.getByText('Kept at').first()).toBeVisible();
  expect(await hand.get<StepDetail>(`${sheet}/steps/1.1`)).toMatchObject({ status: 'done' });
});

test('the first key on a page leads past the navigation @desk', async ({ page }) => {
  await enter(page, 'tomasz');
  await page.goto('/cars');
  await expect(page.getByText('Calder Vee 3.4')).toBeVisible();
  const skip = page.getByRole('link', { name: 'Skip to the page' });
  await tabTo(page, skip, 1);
  await page.keyboard.press('Enter');
  await tabTo(page, page.getByLabel('Find a car, engine or owner'), 3);
});

test('the menu of the phone opens, holds the focus and closes by the keys alone @phone', async ({ page }) => {
  await enter(page, 'tomasz');
  await page.goto('/');
  const opener = page.getByRole('button', { name: 'Menu', exact: true });
  await tabTo(page, opener);
  await page.keyboard.press('Enter');
  const menu = page.getByRole('dialog', { name: 'Menu' });
  await tabTo(page, menu.getByRole('link', { name: 'Sheets' }));
  await page.keyboard.press('Escape');
  await expect(menu).toBeHidden();
  await expect(opener).toBeFocused();
});
