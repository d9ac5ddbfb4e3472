import { expect, type Page } from '@playwright/test';
import { button, keep, pageOf, soon, type Job } from './job.js';
import { check } from './work-through.js';

/** The wiring map by itself, before the cap goes on. */
export async function readTheMap({ builder }: Job): Promise<void> {
  await builder.goto('/workings/wiring');
  await builder.getByLabel('Engine', { exact: true }).selectOption('AT18,2');
  // By geometry: anticlockwise from 315° come 225°, 135° and 45°; the cap's trace crosses outlets A and B.
  await expect(builder.getByRole('region', { name: 'a row a post' }).getByRole('row')).toContainText([
    'Post',
    /315°\s*B\s*1/,
    /225°\s*A\s*3/,
    /135°\s*D\s*4/,
    /45°\s*C\s*2/,
  ]);
}

const position = (page: Page, number: number) =>
  page.getByRole('group', { name: `Crank position ${number}` });

/** Which TDC it is, told from what the valves were seen to do. */
export async function findCompressionTdc(job: Job): Promise<void> {
  const { builder, work } = job;
  const code = '11.1';
  await builder.goto(pageOf(job, `steps/${code}`));
  await position(builder, 1).getByLabel('Piston').selectOption('top');
  await position(builder, 1).getByLabel('Inlet valve').selectOption('shut');
  await position(builder, 1).getByLabel('Exhaust valve').selectOption('shut');
  await expect(builder.locator('ss-told')).toContainText('Next:');
  await button(builder, 'Crank turned on: add a position').click();
  await position(builder, 2).getByLabel('Exhaust valve').selectOption('opening');
  await builder.getByLabel('Which position is asked about?').selectOption('Position 1');
  // Common practice, no source: No. 1 at the top, both valves shut and the exhaust opening next, was compression.
  await expect(builder.locator('ss-told')).toContainText(/No\. 1: .*compression/i);
  expect(await keep(builder, button(builder, 'Keep what was seen'), 'entries')).toBe(201);
  await expect(builder.getByText('It is recorded and waits for Imogen Vale.')).toBeVisible();
  await check(work, code);
}

async function enterLeads(page: Page, cylinders: Readonly<Record<string, string>>): Promise<void> {
  for (const [outlet, cylinder] of Object.entries(cylinders)) {
    await page.getByLabel(`Outlet ${outlet}`).selectOption(cylinder);
  }
}

/** Leads of 3 and 4 in each other's outlets: told, cured by one swap, corrected, and read again by the second. */
export async function wireTheCap(job: Job): Promise<void> {
  const { builder, second } = job;
  const code = '11.13';
  await builder.goto(pageOf(job, `steps/${code}`));
  await expect(builder.getByLabel('Outlet A')).toHaveValue('');
  await expect(builder.locator('ss-diagnosis')).toHaveCount(0);
  await enterLeads(builder, { A: '4', B: '1', C: '2', D: '3' });
  expect(await keep(builder, button(builder, 'Keep the leads as fitted'), 'entries')).toBe(201);

  // Common practice, no source: 1-3-4-2 on an anticlockwise rotor, wired 1-4-3-2, is cured by one swap of 3 and 4.
  const diagnosis = builder.locator('ss-diagnosis');
  await expect(diagnosis).toContainText('Two leads swapped');
  await expect(diagnosis).toContainText('One swap puts it right');
  await expect(diagnosis).toContainText(
    /Lead 4 to outlet D, lead 3 to outlet A|Lead 3 to outlet A, lead 4 to outlet D/,
  );
  await second.goto(pageOf(job, `steps/${code}/second`));
  await expect(second.getByText('It can’t be checked yet')).toBeVisible();

  await button(builder, 'Leads moved, read it again').click();
  await builder.getByLabel('Why is it replaced?').fill('Leads of 3 and 4 changed over');
  await enterLeads(builder, { A: '3', B: '1', C: '2', D: '4' });
  expect(await keep(builder, button(builder, 'Keep the leads as fitted'), 'entries')).toBe(201);
  await expect(diagnosis).toContainText('Wired right');

  await expect(second.getByLabel('Outlet A')).toHaveValue('', soon);
  await enterLeads(second, { A: '3', B: '1', C: '2', D: '4' });
  expect(await keep(second, button(second, 'Keep the leads as I read them'), 'second-readings')).toBe(201);
  await expect(second.getByText('the two readings agree')).toBeVisible();
  expect(await keep(second, button(second, `Countersign step ${code}`), 'countersignatures')).toBe(201);
  await expect(builder.getByText('It is recorded and waits for Imogen Vale.')).toHaveCount(0, soon);
}
