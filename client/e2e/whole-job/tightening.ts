import { expect } from '@playwright/test';
import { toolNamed } from './demo-work.js';
import { button, keep, pageOf, soon, type Job } from './job.js';
import { record } from './work-through.js';

const code = '10.6';
const waits = 'It is recorded and waits for Imogen Vale.';

/** The water pump's nuts: limits printed in N·m, pulled in lbf·ft; the wrench read blind, each pull watched. */
export async function tightenTheWaterPump(job: Job): Promise<void> {
  const { builder, second, work } = job;
  const wrench = toolNamed(work.tools, 'T-08').id;
  await record(work, code, (content) => content.kind === 'tightening' && content.pass === 1);
  await second.goto(pageOf(job, `steps/${code}/second`));
  await expect(second.getByText('First reading covered')).toBeVisible();
  await second.getByLabel('The wrench in the builder’s hand').selectOption(wrench);
  await second.getByLabel('It is set to, unit').selectOption('lbf·ft');
  // 37 N·m is 27.29 lbf·ft: 1 lbf·ft = 1.355 818 N·m, NIST Special Publication 811 (2008), appendix B.8.
  await second.getByLabel('It is set to', { exact: true }).fill('27.3');
  await button(second, 'Keep my reading').click();
  await expect(second.getByText('the two readings agree')).toBeVisible();
  await expect(button(second, 'Countersign')).toHaveCount(0);

  await builder.goto(pageOf(job, `steps/${code}`));
  await builder.getByLabel('Wrench', { exact: true }).selectOption(wrench);
  const field = builder.getByLabel(/^Reading, stud nut \d$/);
  await builder.getByLabel(/^Reading, stud nut \d, unit$/).selectOption('lbf·ft');
  // 20 lbf·ft are 27.1 N·m, far under the 35 N·m of the spec: said before it is kept.
  await field.fill('20');
  await expect(builder.locator('ss-judged')).toContainText('under the limit');
  for (let pulled = 1; pulled <= 4; pulled += 1) {
    const label = await builder.locator('label', { hasText: 'Reading, stud nut' }).innerText();
    // Common practice, no source: 27 lbf·ft on a water pump's studs. 36.6 N·m, inside the 35 to 39 of the spec.
    await field.fill('27');
    await expect(builder.locator('ss-judged')).toContainText('Pass');
    await keep(builder, button(builder, /^Keep it/), 'entries');
    const fastener = label.replace('Reading, s', 'S');
    const pull = second.getByRole('checkbox', { name: new RegExp(`^${fastener}: 27(\\.0)? lbf·ft`) });
    await expect(pull).toBeEnabled(soon);
    await pull.check();
  }
  await expect(builder.getByText(waits)).toBeVisible();
  expect(await keep(second, button(second, `Countersign step ${code}`), 'countersignatures')).toBe(201);
  await expect(builder.getByText(waits)).toHaveCount(0, soon);
}
