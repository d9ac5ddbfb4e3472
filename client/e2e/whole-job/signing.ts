import { readFileSync } from 'node:fs';
import { expect, type Page } from '@playwright/test';
import type { Sheet } from '@second-spanner/shared/contracts/sheets';
import { demoPassword } from '../sign-in.js';
import { button, pageOf, type Job } from './job.js';
import { pdfText } from './pdf-text.js';

async function sign(page: Page, act: string): Promise<void> {
  await page.getByLabel('Your password, once more').fill(demoPassword);
  await button(page, act).click();
}

/** The three signatures, each with its password; a wrong one signs nothing. */
export async function signOff(job: Job): Promise<void> {
  const { builder, second, foreman } = job;
  for (const page of [builder, second, foreman]) await page.goto(pageOf(job, 'sign-off'));
  await builder.getByLabel('Your password, once more').fill('not-my-password');
  await button(builder, 'Sign as the builder').click();
  await expect(builder.getByLabel('Your password, once more')).toHaveAttribute('aria-invalid', 'true');
  await expect(builder.getByText('waits for Tomasz Brandt')).toBeVisible();

  await sign(builder, 'Sign as the builder');
  await sign(second, 'Sign as the second person');
  await sign(foreman, 'Release the sheet');
  await expect(foreman.getByText('Verification code')).toBeVisible();
  for (const page of [builder, second]) {
    await expect(page.getByText(/waits for/)).toHaveCount(0);
    await expect(page.getByLabel('Your password, once more')).toHaveCount(0);
  }
}

/** The printed build sheet tells the car, who built and checked it, the code to verify it, and its pages. */
export async function readTheBuildSheet(job: Job): Promise<Sheet> {
  const { foreman, work } = job;
  const sheet = await work.builder.get<Sheet>(`/sheets/${work.sheetId}`);
  expect(sheet).toMatchObject({ state: 'released', stepsDone: sheet.stepsTotal, openSnags: 0 });
  const downloading = foreman.waitForEvent('download');
  await button(foreman, 'Download the PDF').click();
  const download = await downloading;
  expect(download.suggestedFilename()).toBe(`build-sheet-${sheet.code}.pdf`);
  const pages = await pdfText(readFileSync(await download.path()));
  const all = pages.join(' ');
  for (const words of [
    'Aldwyn Tern 1.8',
    'AT18-20614',
    sheet.code,
    'Tomasz Brandt',
    'Imogen Vale',
    'Nell Okafor',
    'Leads of 3 and 4 changed over',
    '27.3 lbf·ft on T-08',
    'At the drive gear 0.23 mm 9 thou 0.25',
  ]) {
    expect(all).toContain(words);
  }
  for (const [index, page] of pages.entries()) {
    expect(page).toContain(sheet.verificationCode);
    expect(page).toContain(`Page ${index + 1} of ${pages.length}`);
  }
  return sheet;
}

/** A released sheet takes nothing more: the api refuses it, and no page offers it. */
export async function expectFrozen(job: Job): Promise<void> {
  const { builder, work } = job;
  const step = `/sheets/${work.sheetId}/steps/14.1`;
  const refused = await work.builder.send(`${step}/entries`, {
    content: { kind: 'check', outcome: 'fail', note: 'written after the release' },
  });
  expect(refused.status()).toBe(422);
  expect(refused.headers()['content-type']).toContain('application/problem+json');
  expect((await work.builder.send(`${step}/snags`, { words: 'after the release' })).status()).toBe(422);
  await builder.goto(pageOf(job, 'steps/14.1'));
  await expect(builder.getByText('This sheet is released and frozen.')).toBeVisible();
  for (const act of ['Keep it', 'Correct it', 'Raise a snag', 'Not critical here']) {
    await expect(button(builder, act)).toHaveCount(0);
  }
  await expect(builder.getByText('written after the release')).toHaveCount(0);
}
