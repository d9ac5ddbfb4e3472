import { randomUUID } from 'node:crypto';
import type { EntryContent } from '@second-spanner/shared/contracts/steps';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { scenes } from '../testing/sheet-scenes.js';
import { openStage, recordClearances, type Hands, type SheetStage } from '../testing/sheet-stage.js';

let stage: SheetStage;
beforeAll(async () => {
  stage = await openStage();
});
afterAll(() => stage.close());

/** Countersigns what 1.3 rests on. */
async function checkClearances(hands: Hands): Promise<void> {
  await recordClearances(hands, stage.small);
  await hands.imogen.readAgain('1.2', scenes.clearanceAgain(stage.small.tools, 0.045, 0.044)).expect(201);
  await hands.imogen.countersign('1.2').expect(201);
}

describe('a failed reading that the foreman accepts', () => {
  it('is shown to the foreman, who then gives no second reading of it, and is read again blind', async () => {
    const hands = await stage.newSheet();
    const { tomasz, imogen, nell } = hands;
    const { tools } = stage.small;
    await tomasz.record('1.1', scenes.check()).expect(201);
    await tomasz.record('1.2', scenes.clearance(tools, 'Main 1', 0.09)).expect(201);
    await tomasz.record('1.2', scenes.clearance(tools, 'Main 2', 0.044)).expect(201);
    const hidden = await imogen.step('1.2');
    expect(JSON.stringify(hidden.body)).not.toContain('0.09');
    const [snag] = (await nell.step('1.2')).body.snags;
    expect(snag.words).toContain('0.09');
    await nell.settle(snag.id, { how: 'accepted-as-it-is', reason: 'Within the wear limit.' }).expect(200);
    const own = await nell.readAgain('1.2', scenes.clearanceAgain(tools, 0.09, 0.044));
    expect(own.status).toBe(422);
    const again = await imogen.readAgain('1.2', scenes.clearanceAgain(tools, 0.09, 0.044)).expect(201);
    expect(again.body.secondReadings[0].agreement.verdict).toBe('pass');
    await imogen.countersign('1.2').expect(201);
  });
});

describe('a second check', () => {
  it('is not given by who recorded', async () => {
    const hands = await stage.newSheet();
    await recordClearances(hands, stage.small);
    const own = await hands.tomasz.readAgain('1.2', scenes.clearanceAgain(stage.small.tools, 0.045, 0.044));
    expect([own.status, own.body.detail]).toEqual([
      422,
      'You recorded on this step: the second reading is another person’s.',
    ]);
    await hands.tomasz.countersign('1.2').expect(422);
  });

  it('waits until everything is recorded, and for one’s own reading', async () => {
    const hands = await stage.newSheet();
    await hands.tomasz.record('1.1', scenes.check()).expect(201);
    await hands.imogen.readAgain('1.2', scenes.clearanceAgain(stage.small.tools, 0.045, 0.044)).expect(422);
    await hands.tomasz.record('1.2', scenes.clearance(stage.small.tools, 'Main 1', 0.045)).expect(201);
    await hands.tomasz.record('1.2', scenes.clearance(stage.small.tools, 'Main 2', 0.044)).expect(201);
    const early = await hands.imogen.countersign('1.2');
    expect([early.status, early.body.detail]).toEqual([422, 'Give your own reading first.']);
  });

  it('clears the hold when it agrees, and only then', async () => {
    const hands = await stage.newSheet();
    const { tomasz, imogen } = hands;
    const { tools } = stage.small;
    await checkClearances(hands);
    const held = await tomasz.record('2.1', { kind: 'wiring', fitted: scenes.leads });
    expect(held.status).toBe(422);
    expect(held.body.detail).toContain('Hold point 1.3');
    for (const nut of ['1', '2']) await tomasz.record('1.3', scenes.pull(tools, 1, nut, 30)).expect(201);
    await imogen.readAgain('1.3', scenes.settingSeen(tools, 55)).expect(201);
    for (const nut of ['1', '2']) await tomasz.record('1.3', scenes.pull(tools, 2, nut, 55)).expect(201);
    await tomasz.record('2.1', { kind: 'wiring', fitted: scenes.leads }).expect(422);
    const unwatched = await imogen.countersign('1.3', ['1']);
    expect([unwatched.status, unwatched.body.detail]).toEqual([422, 'Not witnessed yet: nut 2.']);
    const unknown = await imogen.countersign('1.3', ['1', '2', '9']);
    expect([unknown.status, unknown.body.errors[0].field]).toEqual([400, 'pullsWitnessed']);
    await imogen.countersign('1.3', ['2', '1']).expect(201);
    await tomasz.record('2.1', { kind: 'wiring', fitted: scenes.leads }).expect(201);
  });

  it('of a wrench must agree with what was pulled afterwards', async () => {
    const hands = await stage.newSheet();
    const { tomasz, imogen } = hands;
    const { tools } = stage.small;
    await checkClearances(hands);
    for (const nut of ['1', '2']) await tomasz.record('1.3', scenes.pull(tools, 1, nut, 30)).expect(201);
    await imogen.readAgain('1.3', scenes.settingSeen(tools, 55)).expect(201);
    const other: EntryContent = {
      ...{ kind: 'tightening', pass: 2, fastener: '1', toolId: tools['T-10'] },
      reading: { value: 55, unit: 'N·m' },
    };
    await tomasz.record('1.3', other).expect(201);
    await tomasz.record('1.3', scenes.pull(tools, 2, '2', 55)).expect(201);
    const refused = await imogen.countersign('1.3', ['1', '2']);
    expect([refused.status, refused.body.detail]).toEqual([
      422,
      'You read T-07, but the pulls were recorded with another wrench.',
    ]);
  });

  it('is void after a correction: a new round begins', async () => {
    const hands = await stage.newSheet();
    const { tomasz, imogen } = hands;
    const { tools } = stage.small;
    await checkClearances(hands);
    const before = (await tomasz.step('1.2')).body;
    expect(before).toMatchObject({ status: 'done', round: 1 });
    const [first] = before.entries;
    const correction = { replaces: first.id, reason: 'Read at the wrong angle.' };
    const after = await tomasz.record('1.2', scenes.clearance(tools, 'Main 1', 0.05), correction).expect(201);
    expect(after.body).toMatchObject({ status: 'to-countersign', round: 2 });
    expect((await imogen.step('1.2')).body).toMatchObject({ covered: true, entries: [] });
    await imogen.countersign('1.2').expect(422);
    await imogen.readAgain('1.2', scenes.clearanceAgain(tools, 0.05, 0.044)).expect(201);
    expect((await imogen.countersign('1.2').expect(201)).body.status).toBe('done');
  });

  it('is made once, however many countersign at once', async () => {
    const hands = await stage.newSheet();
    await recordClearances(hands, stage.small);
    const reading = scenes.clearanceAgain(stage.small.tools, 0.045, 0.044);
    const readers = [hands.imogen, hands.nell, hands.bea];
    for (const reader of readers) await reader.readAgain('1.2', reading).expect(201);
    const fifty = Array.from({ length: 50 }, (_each, index) => readers[index % 3] ?? hands.imogen);
    const answers = await Promise.all(fifty.map((reader) => reader.countersign('1.2')));
    const statuses = answers.map(({ status }) => status);
    expect(statuses.filter((status) => status === 201)).toHaveLength(1);
    expect(statuses.filter((status) => status === 409)).toHaveLength(49);
    expect((await hands.tomasz.step('1.2')).body.countersignatures).toHaveLength(1);
  });
});

describe('a disagreement', () => {
  /** Recorded by Tomasz, read otherwise by Imogen. En beyond 1: 0.015 mm apart, U 0.003 mm each. */
  async function disagree(): Promise<{ hands: Hands; snag: { id: string; maySettle: boolean } }> {
    const hands = await stage.newSheet();
    await recordClearances(hands, stage.small);
    const reading = scenes.clearanceAgain(stage.small.tools, 0.06, 0.044);
    const answer = await hands.imogen.readAgain('1.2', reading).expect(201);
    expect(answer.body.secondReadings[0].agreement.verdict).toBe('fail');
    return { hands, snag: answer.body.snags[0] };
  }

  it('is a snag by itself, which stops the step and cannot be countersigned away', async () => {
    const { hands, snag } = await disagree();
    expect(snag).toMatchObject({ cause: 'disagreement', settled: null, maySettle: false });
    expect((await hands.tomasz.step('1.2')).body.status).toBe('snag');
    await hands.imogen.countersign('1.2').expect(422);
    const [entry] = (await hands.tomasz.step('1.2')).body.entries;
    const correction = { replaces: entry.id, reason: 'To be rid of it.' };
    const fixed = await hands.tomasz.record(
      '1.2',
      scenes.clearance(stage.small.tools, 'Main 1', 0.06),
      correction,
    );
    expect(fixed.status).toBe(422);
  });

  it('is settled by neither of the two', async () => {
    const { hands, snag } = await disagree();
    const request = { how: 'redone', reason: 'I was right.' } as const;
    const refused = await hands.tomasz.settle(snag.id, request);
    expect([refused.status, refused.body.detail]).toEqual([
      422,
      'Neither of the two who disagree settles it.',
    ]);
    // A countersigner settles nothing at all.
    await hands.imogen.settle(snag.id, request).expect(403);
    await hands.bea.settle(snag.id, { how: 'accepted-as-it-is', reason: 'Good enough.' }).expect(403);
  });

  it('is not settled by the second person either where their role may settle', async () => {
    const hands = await stage.newSheet();
    await recordClearances(hands, stage.small);
    const read = await hands.bea
      .readAgain('1.2', scenes.clearanceAgain(stage.small.tools, 0.06, 0.044))
      .expect(201);
    const { id } = read.body.snags[0];
    await hands.bea.settle(id, { how: 'redone', reason: 'I was right.' }).expect(422);
  });

  it('settled as redone by a third voids what was recorded', async () => {
    const { hands, snag } = await disagree();
    const { tools } = stage.small;
    await hands.bea.settle(snag.id, { how: 'redone', reason: 'Both read again.' }).expect(200);
    const step = (await hands.tomasz.step('1.2')).body;
    expect(step).toMatchObject({ round: 2, done: 0, status: 'open' });
    expect(step.entries.every((entry: { current: boolean }) => !entry.current)).toBe(true);
    for (const at of ['Main 1', 'Main 2']) {
      await hands.tomasz.record('1.2', scenes.clearance(tools, at, 0.05)).expect(201);
    }
    await hands.imogen.readAgain('1.2', scenes.clearanceAgain(tools, 0.05, 0.05)).expect(201);
    expect((await hands.imogen.countersign('1.2').expect(201)).body.status).toBe('done');
    const late = await hands.bea.settle(snag.id, { how: 'redone', reason: 'Again.' });
    expect([late.status, late.body.detail]).toEqual([409, 'This snag was settled by Bea Holm already.']);
  });

  it('accepted as it is by the foreman lets the second person countersign', async () => {
    const { hands, snag } = await disagree();
    const reason = 'Both are inside the limits.';
    await hands.nell.settle(snag.id, { how: 'accepted-as-it-is', reason }).expect(200);
    expect((await hands.imogen.countersign('1.2').expect(201)).body.status).toBe('done');
  });

  it('said in words, where the readings agree, stops the step too', async () => {
    const hands = await stage.newSheet();
    await recordClearances(hands, stage.small);
    await hands.imogen.readAgain('1.2', scenes.clearanceAgain(stage.small.tools, 0.045, 0.044)).expect(201);
    const bare = hands.imogen.post('steps/1.2/countersignatures', { outcome: 'dispute' });
    await bare.set('Idempotency-Key', randomUUID()).expect(400);
    const disputed = await hands.imogen.dispute('1.2', 'The cap is on the wrong way round.').expect(201);
    expect(disputed.body).toMatchObject({ status: 'snag', can: { countersign: false } });
    const [snag] = disputed.body.snags;
    expect(snag).toMatchObject({ cause: 'disagreement', words: 'The cap is on the wrong way round.' });
    await hands.imogen.dispute('1.2', 'Still.').expect(409);
    await hands.nell
      .settle(snag.id, { how: 'accepted-as-it-is', reason: 'It is right; see page 3.' })
      .expect(200);
    expect((await hands.imogen.countersign('1.2').expect(201)).body.status).toBe('done');
  });
});
