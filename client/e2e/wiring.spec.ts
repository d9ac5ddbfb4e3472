import { expect, test, type Page } from '@playwright/test';
import { expectNoAxeViolations } from './axe.js';
import { signIn } from './sign-in.js';

const page = '/workings/wiring';

// The side-outlet four of the design: posts 315° and 225° cross over to outlets B and A inside the cap.
const engine =
  'cylinders=4&order=1-3-4-2&turns=anticlockwise&from=cap&at=45&first=315' +
  '&trace=45:C,135:D,225:A,315:B&advance=10&valves=16_56_51_21';
const misread = `${page}?${engine}&fitted=A:1,B:3,C:2,D:4`;

const rows = (on: Page): Promise<string[]> =>
  on.getByRole('region', { name: 'a row a post' }).getByRole('row').allInnerTexts();

const fitted = (on: Page, outlet: string) =>
  on.getByRole('group', { name: 'Leads as fitted' }).getByLabel(`Outlet ${outlet}`);

test('an engine that is typed in has its map, and the address opens it again', async ({ page: tab }) => {
  await signIn(tab, 'tomasz', page);
  await tab.getByLabel('Firing order').fill('1-3-4-2');
  await tab.getByLabel('Rotor turns').selectOption('anticlockwise');
  await tab.getByLabel('One post at').fill('45');
  await tab.getByLabel('Post for the first cylinder').selectOption('315');
  // Geometry: anticlockwise from 315° come 225°, 135° and 45°.
  await expect
    .poll(() => rows(tab))
    .toEqual([
      expect.stringContaining('Post'),
      expect.stringMatching(/315°\s+1\s/),
      expect.stringMatching(/225°\s+3\s/),
      expect.stringMatching(/135°\s+4\s/),
      expect.stringMatching(/45°\s+2\s/),
    ]);

  await expect(tab).toHaveURL(/order=1-3-4-2&turns=anticlockwise.*first=315/);
  const before = await rows(tab);
  await tab.goto(tab.url());
  await expect.poll(() => rows(tab)).toEqual(before);
});

test('an engine of the spec book fills the fields and leaves the leads empty', async ({ page: tab }) => {
  await signIn(tab, 'nell', page);
  const choice = tab.getByLabel('Engine', { exact: true });
  const name = await choice.locator('option', { hasText: 'AT18' }).first().innerText();
  await choice.selectOption(name);

  await expect(tab.locator('ss-title-block')).toContainText(/AT18, edition \d/);
  for (const outlet of ['A', 'B', 'C', 'D']) await expect(fitted(tab, outlet)).toHaveValue('');
});

test('leads in firing order round the outside are told from the trace, and one swap cures them', async ({
  page: tab,
}) => {
  await signIn(tab, 'tomasz', `${page}?${engine}`);
  for (const [outlet, cylinder] of Object.entries({ A: '1', B: '3', C: '2' })) {
    await fitted(tab, outlet).selectOption(cylinder);
  }
  await expect(tab.getByText('3 of 4 leads entered.').first()).toBeVisible();
  await fitted(tab, 'D').selectOption('4');

  await expect(tab.getByRole('heading', { name: 'Outlets read as posts' })).toBeVisible();
  await expect(tab.getByText('One swap puts it right')).toBeVisible();
  await expect(tab.getByText('It also fits')).toBeVisible();
  await expect(tab.getByText(/flash back through the carburettor/)).toBeVisible();

  await fitted(tab, 'A').selectOption('3');
  await expect(tab.getByText('Cylinder 3 is at two outlets: look again.')).toBeVisible();
  await fitted(tab, 'B').selectOption('1');
  await expect(tab.getByRole('heading', { name: 'Wired right' })).toBeVisible();
});

test('an order that names a cylinder twice is said at its field, and what was typed stays', async ({
  page: tab,
}) => {
  await signIn(tab, 'tomasz', `${page}?${engine}`);
  await tab.getByText('Change it').click();
  const order = tab.getByLabel('Firing order');
  await order.fill('1-3-4-4');
  await expect(order).toHaveAttribute('aria-invalid', 'true');
  await expect(order).toHaveAccessibleDescription(/Each cylinder fires once/);
  await expect(order).toHaveValue('1-3-4-4');
});

test('a car owner works out engines that are typed in, without the spec book', async ({ page: tab }) => {
  await signIn(tab, 'ravi', misread);
  await expect(tab.getByRole('heading', { name: 'Outlets read as posts' })).toBeVisible();
  await expect(tab.getByLabel('Engine', { exact: true })).toHaveCount(0);
});

test('is printed on one A4 page @desk', async ({ page: tab }) => {
  await signIn(tab, 'tomasz', misread);
  await expect(tab.getByRole('heading', { name: 'Outlets read as posts' })).toBeVisible();
  const pdf = (await tab.pdf({ format: 'A4', preferCSSPageSize: true })).toString('latin1');
  expect(pdf.match(/\/Type\s*\/Page\b/g)).toHaveLength(1);
});

test('is as wide as the window, from the smallest phone on', async ({ page: tab }) => {
  await signIn(tab, 'tomasz', misread);
  await expect(tab.getByRole('heading', { name: 'Outlets read as posts' })).toBeVisible();
  for (const width of [320, 360, 768, 960, 1280, 1440]) {
    await tab.setViewportSize({ width, height: 800 });
    expect(await tab.evaluate(() => document.documentElement.scrollWidth), `at ${width}`).toBe(width);
  }
});

test('nothing stands in the way of reading it otherwise than by eye', async ({ page: tab }) => {
  await signIn(tab, 'nell', page);
  await expect(tab.getByLabel('Firing order')).toBeVisible();
  await expectNoAxeViolations(tab);
  await tab.goto(misread);
  await expect(tab.getByRole('heading', { name: 'Outlets read as posts' })).toBeVisible();
  await expectNoAxeViolations(tab);
});
