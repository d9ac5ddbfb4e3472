import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { EntryContent } from '@second-spanner/shared/contracts/steps';
import { SheetHand } from '../testing/sheet-hand.js';
import { scenes } from '../testing/sheet-scenes.js';
import { openStage, recordClearances, type Hands, type SheetStage } from '../testing/sheet-stage.js';

let stage: SheetStage;
let hands: Hands;
beforeAll(async () => {
  stage = await openStage();
  hands = await stage.newSheet();
});
afterAll(() => stage.close());

const countEntries = async (): Promise<number> => {
  const statement = 'SELECT count(*)::int AS count FROM entries';
  const [row] = await stage.app.db.sql<{ count: number }>(stage.workshop.shop, statement);
  return row?.count ?? -1;
};

describe('an entry', () => {
  it('counts once: a replay answers 200 and the same, another body under its key 409', async () => {
    const sheet = await stage.newSheet();
    const key = randomUUID();
    const first = await sheet.tomasz.record('1.1', scenes.check(), undefined, key).expect(201);
    const before = await countEntries();
    const again = await sheet.tomasz.record('1.1', scenes.check(), undefined, key).expect(200);
    expect(again.body).toEqual(first.body);
    const other = await sheet.tomasz.record('1.1', scenes.check('fail'), undefined, key);
    expect([other.status, other.body.detail]).toEqual([409, 'This key was used for another request.']);
    await sheet.bea.record('1.1', scenes.check(), undefined, key).expect(409);
    await hands.tomasz.record('1.1', scenes.check(), undefined, key).expect(409);
    expect(await countEntries()).toBe(before);
  });

  it('counts once, raced twenty times', async () => {
    const sheet = await stage.newSheet();
    const key = randomUUID();
    const before = await countEntries();
    const racers = Array.from({ length: 20 }, () =>
      sheet.tomasz.record('1.1', scenes.check(), undefined, key),
    );
    const statuses = (await Promise.all(racers)).map(({ status }) => status).sort();
    expect(statuses).toEqual([...Array.from({ length: 19 }, () => 200), 201]);
    expect(await countEntries()).toBe(before + 1);
  });

  it('counts on one sheet alone when its key is raced on two', async () => {
    for (let race = 0; race < 5; race++) {
      const sheets = [await stage.newSheet(), await stage.newSheet()];
      const key = randomUUID();
      const answers = await Promise.all(
        sheets.map(({ tomasz }) => tomasz.record('1.1', scenes.check(), undefined, key)),
      );
      expect(answers.map(({ status }) => status).sort()).toEqual([201, 409]);
    }
  });

  it('needs a key', async () => {
    const bare = await hands.tomasz.post('steps/1.1/entries', { content: scenes.check() });
    expect([bare.status, bare.body.errors[0].field]).toEqual([400, 'Idempotency-Key']);
  });

  it('does not take a place that is taken; a correction does, with a reason', async () => {
    const sheet = await stage.newSheet();
    const { tools } = stage.small;
    await recordClearances(sheet, stage.small);
    const taken = await sheet.bea.record('1.2', scenes.clearance(tools, 'Main 1', 0.05));
    expect([taken.status, taken.body.detail]).toEqual([
      409,
      'This is recorded already. Correct it with a reason.',
    ]);
    const [first, second] = (await sheet.tomasz.step('1.2')).body.entries;
    const content = scenes.clearance(tools, 'Main 1', 0.05);
    const path = 'steps/1.2/entries';
    const send = (body: object) => sheet.tomasz.post(path, body).set('Idempotency-Key', randomUUID());
    expect((await send({ content, replaces: first.id })).body.errors[0].field).toBe('reason');
    expect((await send({ content, reason: 'Why?' })).body.errors[0].field).toBe('reason');
    const elsewhere = await send({ content, replaces: second.id, reason: 'Mixed up.' });
    expect([elsewhere.status, elsewhere.body.errors[0].field]).toEqual([400, 'replaces']);
    expect((await send({ content, replaces: randomUUID(), reason: 'Lost.' })).status).toBe(400);
    const corrected = await send({ content, replaces: first.id, reason: 'Read again.' });
    expect(corrected.status).toBe(201);
    const old = corrected.body.entries.find(({ id }: { id: string }) => id === first.id);
    const now = corrected.body.entries.find(({ replaces }: { replaces: string }) => replaces === first.id);
    expect(old).toMatchObject({ current: false, replacedBy: now.id });
    expect(now).toMatchObject({ current: true, replaceReason: 'Read again.' });
    expect((await send({ content, replaces: first.id, reason: 'Again.' })).status).toBe(409);
  });

  it('that fails raises a snag by itself; the correction that passes settles it', async () => {
    const sheet = await stage.newSheet();
    const failed = await sheet.tomasz.record('1.1', scenes.check('fail')).expect(201);
    expect(failed.body).toMatchObject({ status: 'snag', openSnags: 1, done: 0 });
    const [entry] = failed.body.entries;
    const stillWrong = { replaces: entry.id, reason: 'Wiped.' };
    const twice = await sheet.tomasz.record('1.1', scenes.check('fail'), stillWrong).expect(201);
    const right = { replaces: twice.body.entries.at(-1).id, reason: 'Wiped again.' };
    const mended = await sheet.tomasz.record('1.1', scenes.check(), right).expect(201);
    expect(mended.body).toMatchObject({ status: 'done', openSnags: 0, round: 1 });
    for (const snag of mended.body.snags) {
      expect(snag.settled).toMatchObject({ how: 'redone', reason: 'Wiped again.' });
    }
    expect((await sheet.tomasz.sheet()).body).toMatchObject({ openSnags: 0, stepsDone: 1 });
  });

  it('that the foreman accepts as it is counts as good', async () => {
    const sheet = await stage.newSheet();
    const failed = await sheet.tomasz.record('1.1', scenes.check('fail')).expect(201);
    const [snag] = failed.body.snags;
    await sheet.bea.settle(snag.id, { how: 'accepted-as-it-is', reason: 'Fine.' }).expect(403);
    await sheet.nell.settle(snag.id, { how: 'accepted-as-it-is', reason: 'It is an old mark.' }).expect(200);
    expect((await sheet.tomasz.step('1.1')).body).toMatchObject({ status: 'done', done: 1 });
  });

  it('read with a tool past its calibration is doubtful, and the place is not done', async () => {
    const sheet = await stage.newSheet();
    await sheet.tomasz.record('1.1', scenes.check()).expect(201);
    const content: EntryContent = {
      ...{ kind: 'measurement', at: 'Main 1', toolId: stage.small.tools['T-24'] },
      value: { value: 0.045, unit: 'mm' },
    };
    const answer = await sheet.tomasz.record('1.2', content).expect(201);
    expect(answer.body).toMatchObject({ done: 0, openSnags: 0, status: 'in-hand' });
    expect(answer.body.entries[0].verdict).toBe('doubtful');
  });
});

describe('the order of work', () => {
  it('opens a step when what it rests on is done, and says what it waits for', async () => {
    const early = await hands.tomasz.record('1.2', scenes.clearance(stage.small.tools, 'Main 1', 0.045));
    expect([early.status, early.body.detail]).toEqual([
      422,
      'It rests on 1.1, Shells dry, which is not done.',
    ]);
    const [wait] = (await hands.tomasz.step('1.2')).body.waitsFor;
    expect(wait).toMatchObject({ what: 'step', code: '1.1' });
  });

  it('opens a pass when the one before is complete; within a pass nuts may be jumped', async () => {
    const sheet = await stage.newSheet();
    const { tools } = stage.small;
    await recordClearances(sheet, stage.small);
    await sheet.imogen.readAgain('1.2', scenes.clearanceAgain(tools, 0.045, 0.044)).expect(201);
    await sheet.imogen.countersign('1.2').expect(201);
    await sheet.tomasz.record('1.3', scenes.pull(tools, 1, '2', 30)).expect(201);
    const shut = await sheet.tomasz.record('1.3', scenes.pull(tools, 2, '2', 55));
    expect([shut.status, shut.body.detail]).toEqual([
      422,
      'Pass 2 opens when pass 1 is complete: nut 1 is missing.',
    ]);
    await sheet.tomasz.record('1.3', scenes.pull(tools, 1, '1', 30)).expect(201);
    const unwatched = await sheet.tomasz.record('1.3', scenes.pull(tools, 2, '2', 55));
    expect(unwatched.status).toBe(422);
    expect(unwatched.body.detail).toContain('Imogen Vale watching');
    expect((await sheet.tomasz.step('1.3')).body.waitsFor[0].what).toBe('second-check');
    await sheet.imogen.readAgain('1.3', scenes.settingSeen(tools, 55)).expect(201);
    await sheet.tomasz.record('1.3', scenes.pull(tools, 2, '2', 55)).expect(201);
  });

  it('takes nothing on a planned sheet', async () => {
    const planned = new SheetHand(stage.clients.tomasz, await stage.small.layOut({ planned: true }));
    const refused = await planned.record('1.1', scenes.check());
    expect([refused.status, refused.body.detail]).toEqual([
      422,
      'The sheet is planned: put the engine on the stand first.',
    ]);
  });

  it('unmarks a critical step only before anything is on it, and never a hold point', async () => {
    const sheet = await stage.newSheet();
    const unmark = (code: string, body: object) =>
      sheet.nell.client.put(`/sheets/${sheet.id}/steps/${code}/unmarking`, body);
    expect((await unmark('2.3', {})).body.errors[0].field).toBe('reason');
    expect((await unmark('1.3', { reason: 'In a hurry.' })).body.detail).toContain('hold point');
    const done = await unmark('2.3', { reason: 'The strap is seen again at 12.7.' });
    expect(done.body).toMatchObject({ critical: false, secondCheck: null });
    expect(done.body.uncriticalReason).toBe('The strap is seen again at 12.7.');
    await recordClearances(sheet, stage.small);
    expect((await unmark('1.2', { reason: 'Too late.' })).status).toBe(422);
  });
});
