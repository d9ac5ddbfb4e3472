import { expect, test } from '@playwright/test';
import type { StepDetail } from '@second-spanner/shared/contracts/sheets';
import { expectNoAxeViolations } from './axe.js';
import { enter, newSheet } from './places.js';

test('an empty list says so, and how to go on', async ({ page }) => {
  await enter(page, 'nell');
  await page.goto('/sheets?state=signed-off');
  await expect(page.getByRole('heading', { name: 'No such sheets' })).toBeVisible();
  await expectNoAxeViolations(page);
  await page.getByRole('link', { name: 'Show every sheet' }).click();
  await expect(page.getByRole('link', { name: 'LM-0139' })).toBeVisible();
});

test('without a network a page says so, and reads on when there is one again', async ({ page, context }) => {
  await enter(page, 'nell');
  await page.goto('/cars');
  await expect(page.getByText('Calder Vee 3.4')).toBeVisible();
  await page.goto('/sheets');
  await expect(page.getByText('LM-0139').first()).toBeVisible();
  await context.setOffline(true);
  await expect(page.getByText('No network. What is shown may be out of date.')).toBeVisible();
  await page.getByRole('combobox', { name: 'State' }).selectOption('released');
  await expect(page.getByRole('heading', { name: 'No network' })).toBeVisible();
  await expectNoAxeViolations(page);
  await context.setOffline(false);
  await page.getByRole('button', { name: 'Try again' }).click();
  await expect(page.getByText('LM-0139').first()).toBeVisible();
  await expect(page.getByText('LM-0147')).toHaveCount(0);
});

test('what is recorded without a network waits on the device and is sent when there is one', async ({
  page,
  context,
}) => {
  const hand = await enter(page, 'tomasz');
  const sheet = await newSheet(hand);
  await page.goto(`${sheet}/steps/1.1`);
  await page.getByLabel('Right').check();
  await context.setOffline(true);
  await page.getByRole('button', { name: 'Keep it' }).click();
  await expect(page.getByText('Waits for the network')).toBeVisible();
  await expect(page.getByText('1 entry in the waiting tray.')).toBeVisible();
  await expectNoAxeViolations(page);

  await context.setOffline(false);
  await expect(page.getByText('Nothing in the waiting tray.')).toBeVisible();
  const step = await hand.get<StepDetail>(`${sheet}/steps/1.1`);
  expect(step).toMatchObject({ status: 'done', entries: [{ content: { kind: 'check', outcome: 'pass' } }] });
});
