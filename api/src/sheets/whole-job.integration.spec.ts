import type { Verification } from '@second-spanner/shared/contracts/sheets';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { scenes } from '../testing/sheet-scenes.js';
import { openStage, workAll, type Hands, type SheetStage } from '../testing/sheet-stage.js';

let stage: SheetStage;
let sheet: Hands;
beforeAll(async () => {
  stage = await openStage();
  sheet = await stage.newSheet();
});
afterAll(() => stage.close());

describe('the whole job, by three people', () => {
  it('is worked until nothing is missing, then signed, countersigned and released', async () => {
    const { tomasz, imogen, nell } = sheet;
    const early = await tomasz.sign('built');
    expect([early.status, early.body.detail]).toEqual([
      422,
      'Not done yet: 1.1, 1.2, 1.3, 2.1, 2.2 and 2 more.',
    ]);
    await workAll(sheet, stage);
    const worked = (await tomasz.sheet()).body;
    expect(worked).toMatchObject({
      stepsDone: 7,
      stepsTotal: 7,
      openSnags: 0,
      canSign: 'built',
      nextStep: null,
    });

    await tomasz.sign('built', 'not the password').expect(400);
    expect((await imogen.sheet()).body.canSign).toBeNull();
    await tomasz.sign('built').expect(200);
    const again = await tomasz.sign('countersigned');
    expect([again.status, again.body.detail]).toEqual([
      422,
      'You signed this sheet as built: somebody else countersigns it.',
    ]);
    expect((await imogen.sheet()).body).toMatchObject({ state: 'countersigning', canSign: 'countersigned' });
    await imogen.sign('countersigned').expect(200);
    await imogen.sign('released').expect(403);
    const released = await nell.sign('released');
    expect(released.status).toBe(200);
    expect(released.body).toMatchObject({ state: 'released', canSign: null });
    expect(released.body.signatures.map((each: { meaning: string }) => each.meaning)).toEqual([
      'built',
      'countersigned',
      'released',
    ]);
    expect(released.body.verificationCode).toMatch(/^[0-9A-HJKMNP-TV-Z]{4}-[0-9A-HJKMNP-TV-Z]{4}$/);
  });

  it('is verified by the code on its paper, without signing in', async () => {
    const { verificationCode } = (await sheet.nell.sheet()).body;
    const typed = verificationCode.toLowerCase().replace('-', ' ');
    const answer = await fetch(`${stage.app.address}/api/verifications/${encodeURIComponent(typed)}`);
    const body = (await answer.json()) as Verification;
    expect(body).toMatchObject({ verdict: 'pass', verificationCode, carName: 'Aldwyn Tern LM-C01' });
    expect(body.signatures.map(({ name }) => name)).toEqual(['Tomasz Brandt', 'Imogen Vale', 'Nell Okafor']);
    expect((await fetch(`${stage.app.address}/api/verifications/0000-0000`)).status).toBe(404);
  });

  it('takes nothing more, by the api', async () => {
    const { tomasz, nell, imogen } = sheet;
    const refused = 'The sheet is released: nothing on it changes any more.';
    const writes = [
      await tomasz.record('1.1', scenes.check()),
      await imogen.readAgain('1.2', scenes.clearanceAgain(stage.small.tools, 0.045, 0.045)),
      await imogen.countersign('1.2'),
      await tomasz.post('steps/1.1/snags', { words: 'Late.' }),
      await tomasz.post('steps/1.2/calls', {}),
    ];
    for (const { status, body } of writes) expect([status, body.detail]).toEqual([422, refused]);
    await nell.post('send-back', { reason: 'Late.' }).expect(422);
    await tomasz.post('start', {}).expect(422);
  });

  it.each([
    [
      'an entry',
      `INSERT INTO entries SELECT gen_random_uuid(), shop_id, sheet_id, step_id, round, content,
       si_value, verdict, reason, NULL, NULL, recorded_at, recorded_by, gen_random_uuid(), body_hash FROM entries LIMIT 1`,
    ],
    ['a change of the sheet', `UPDATE sheets SET open_snags = 1`],
    ['a change of a step', `UPDATE steps SET round = round + 1`],
    [
      'a ledger line',
      `INSERT INTO ledger_lines SELECT sheet_id, max(seq) + 1, shop_id, repeat('0', 64),
       repeat('0', 64), '{}', now() FROM ledger_lines GROUP BY sheet_id, shop_id`,
    ],
    ['taking an entry away', 'DELETE FROM entries'],
    ['a change of a signature', `UPDATE signatures SET binding = repeat('0', 64)`],
  ])('takes nothing more, by direct SQL: %s', async (_what, statement) => {
    await expect(stage.app.db.sql(stage.workshop.shop, statement)).rejects.toMatchObject({ code: 'SP001' });
  });

  it('has a history that tells it, newest first and in pages', async () => {
    const first = (await sheet.nell.client.get(`/sheets/${sheet.id}/history?limit=3`)).body;
    expect(first.items.map((line: { sentence: string }) => line.sentence)).toEqual([
      'Released the sheet.',
      'Signed as the second person.',
      'Signed as built.',
    ]);
    const next = (await sheet.nell.client.get(`/sheets/${sheet.id}/history?limit=3&cursor=${first.next}`))
      .body;
    expect(next.items[0].seq).toBe(first.items[2].seq - 1);
  });
});
