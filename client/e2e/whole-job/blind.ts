import { expect } from '@playwright/test';
import type { StepDetail } from '@second-spanner/shared/contracts/sheets';
import { toolNamed } from './demo-work.js';
import { Heard } from './heard.js';
import { button, keep, pageOf, soon, type Job } from './job.js';

const code = '11.3';
const waits = 'It is recorded and waits for Imogen Vale.';
/** 0.23 mm, however it is written; not as part of another number. */
const firstFigure = /(?<![\d.])0?[.,]230*(?!\d)/;

/** An end float measured by two people with two tools, the second blind; both are compared once both are in. */
export async function measureTwiceBlind(job: Job): Promise<void> {
  const { builder, second, work } = job;
  const heard = new Heard(second);
  await second.goto(pageOf(job, `steps/${code}/second`));
  await expect(second.getByText('It can’t be checked yet')).toBeVisible();

  await builder.goto(pageOf(job, `steps/${code}`));
  await builder.getByLabel('Tool').selectOption(toolNamed(work.tools, 'T-05').id);
  await builder.getByLabel('Reading, At the drive gear', { exact: true }).fill('0.23');
  await expect(builder.locator('ss-judged')).toContainText('Pass');
  expect(await keep(builder, button(builder, /^Keep it/), 'entries')).toBe(201);
  await expect(second.getByText('First reading covered')).toBeVisible(soon);

  await expectNotATrace(job, heard);

  await second.getByLabel('Your own tool, not the builder’s').selectOption(toolNamed(work.tools, 'T-06').id);
  await second.getByLabel('Your reading, unit').selectOption('thou');
  await second.getByLabel('Your reading', { exact: true }).fill('9');
  expect(await keep(second, button(second, 'Keep my reading'), 'second-readings')).toBe(201);

  await expect(second.getByText('the two readings agree')).toBeVisible();
  // ISO 13528, En score, as in the NIST Dataplot reference manual: |x1 − x2| ÷ √(U1² + U2²), which is
  // |0.23 − 9 × 0.0254| ÷ √(0.004² + (0.15 × 0.0254)²) = 0.25.
  await expect(second.getByRole('row', { name: /En 0\.25 0\.230? mm 9(\.0)? thou/ })).toBeVisible();
  expect(await heard.sofar()).toMatch(firstFigure);

  expect(await keep(second, button(second, `Countersign step ${code}`), 'countersignatures')).toBe(201);
  await expect(builder.getByText(waits)).toHaveCount(0, soon);
}

/** Before the second reading is in, the first figure is on no page of the second person's and in nothing sent to it. */
async function expectNotATrace(job: Job, heard: Heard): Promise<void> {
  const { second, work } = job;
  const shown: string[] = [await second.content()];
  await second.goto(pageOf(job, 'history'));
  await expect(second.getByText('covered until your own reading is in').first()).toBeVisible();
  shown.push(await second.content());
  await second.goBack();
  await expect(second.getByText('First reading covered')).toBeVisible();
  for (const content of shown) expect(content).not.toMatch(firstFigure);
  const sent = await heard.sofar();
  expect(sent).toContain('"covered":true');
  expect(sent).not.toMatch(firstFigure);
  const asked = await work.second.get<StepDetail>(`/sheets/${work.sheetId}/steps/${code}`);
  expect(asked).toMatchObject({ covered: true, entries: [] });
}
