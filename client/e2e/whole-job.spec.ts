import { expect, test, type BrowserContextOptions } from '@playwright/test';
import { signIn } from './sign-in.js';
import { measureTwiceBlind } from './whole-job/blind.js';
import { openJob } from './whole-job/job.js';
import { expectFrozen, readTheBuildSheet, signOff } from './whole-job/signing.js';
import { tightenTheWaterPump } from './whole-job/tightening.js';
import { findCompressionTdc, readTheMap, wireTheCap } from './whole-job/timing-and-wiring.js';
import { workUpTo } from './whole-job/work-through.js';

const desk: BrowserContextOptions = {
  viewport: { width: 1440, height: 900 },
  deviceScaleFactor: 1,
  hasTouch: false,
  isMobile: false,
};

// The builder and the second person have phones at the engine, the foreman has the desk. What is not played in the
// pages is worked past them, by the same people.
test('three people finish an engine, from the wiring map to the released build sheet @phone', async ({
  browser,
}) => {
  test.setTimeout(300_000);
  const open = async (who: string, options?: BrowserContextOptions) => {
    const page = await (await browser.newContext(options)).newPage();
    await signIn(page, who);
    return page;
  };
  const job = await openJob(
    { builder: await open('tomasz'), second: await open('imogen'), foreman: await open('nell', desk) },
    'LM-0147',
  );
  const upTo = (code: string | null) =>
    test.step(`the steps before ${code ?? 'the sign-off'}`, () => workUpTo(job.work, code));

  await test.step('the wiring map by itself', () => readTheMap(job));
  await upTo('10.6');
  await test.step('a tightening in lbf·ft with limits in N·m', () => tightenTheWaterPump(job));
  await upTo('11.1');
  await test.step('compression TDC by sightings', () => findCompressionTdc(job));
  await upTo('11.3');
  await test.step('a reading measured again, blind', () => measureTwiceBlind(job));
  await upTo('11.13');
  await test.step('leads swapped, told and cured', () => wireTheCap(job));
  await upTo(null);
  await test.step('sign-off and release', () => signOff(job));
  const sheet = await test.step('the build sheet', () => readTheBuildSheet(job));
  await test.step('a write refused', () => expectFrozen(job));
  await test.step('the code on the paper', async () => {
    const stranger = await (await browser.newContext()).newPage();
    await stranger.goto(`/v/${sheet.verificationCode ?? ''}`);
    await expect(stranger.getByText('Aldwyn Tern 1.8')).toBeVisible();
    await expect(stranger.locator('.verdict')).toContainText('Pass');
    await expect(stranger.getByRole('row')).toHaveCount(4);
  });
});
