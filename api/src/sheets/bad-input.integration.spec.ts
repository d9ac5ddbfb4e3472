import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openStage, recordClearances, type Hands, type SheetStage } from '../testing/sheet-stage.js';

let stage: SheetStage;
let hands: Hands;
beforeAll(async () => {
  stage = await openStage();
  hands = await stage.newSheet();
  await recordClearances(hands, stage.small);
});
afterAll(() => stage.close());

type Case = readonly [field: string, path: string, body: unknown];

const mm = { value: 0.045, unit: 'mm' };
const tool = randomUUID();
const noSnag = '00000000-0000-4000-8000-000000000000';

/** For every route that takes a body: what is wrong, and which field must be named. */
const entryCases: Case[] = [
  ['content', '1.2', {}],
  ['content', '1.2', { content: 'all done' }],
  ['content.kind', '1.2', { content: {} }],
  ['content.kind', '1.2', { content: { kind: 'all-done' } }],
  ['content.kind', '1.2', { content: { kind: 'check', outcome: 'pass' } }],
  ['content.outcome', '1.1', { content: { kind: 'check', outcome: 'maybe' } }],
  ['content.note', '1.1', { content: { kind: 'check', outcome: 'pass', note: ' ' } }],
  ['content.extra', '1.1', { content: { kind: 'check', outcome: 'pass', extra: 1 } }],
  ['extra', '1.1', { content: { kind: 'check', outcome: 'pass' }, extra: 1 }],
  ['replaces', '1.1', { content: { kind: 'check', outcome: 'pass' }, replaces: 'the first' }],
  ['content.toolId', '1.2', { content: { kind: 'measurement', at: 'Main 1', value: mm } }],
  ['content.value', '1.2', { content: { kind: 'measurement', at: 'Main 1', toolId: tool } }],
  [
    'content.value.unit',
    '1.2',
    { content: { kind: 'measurement', at: 'Main 1', toolId: tool, value: { value: 1 } } },
  ],
  [
    'content.value.value',
    '1.2',
    { content: { kind: 'measurement', at: 'Main 1', toolId: tool, value: { value: '1', unit: 'mm' } } },
  ],
  [
    'content.value.extra',
    '1.2',
    { content: { kind: 'measurement', at: 'Main 1', toolId: tool, value: { ...mm, extra: 1 } } },
  ],
  ['content.pass', '1.3', { content: { kind: 'tightening', pass: 0, fastener: '1', toolId: tool } }],
  [
    'content.adapter.angle',
    '1.3',
    {
      content: {
        kind: 'tightening',
        pass: 1,
        fastener: '1',
        toolId: tool,
        adapter: { length: mm, angle: 'x' },
      },
    },
  ],
  ['content.fitted', '2.1', { content: { kind: 'wiring', fitted: [1, 3, 4, 2] } }],
  ['content.sightings', '2.2', { content: { kind: 'valve-timing', sightings: 'shut' } }],
  [
    'content.sightings[0][0]',
    '2.2',
    { content: { kind: 'valve-timing', sightings: [[{ cylinder: 1, colour: 'blue' }]] } },
  ],
  ['content.fileId', '2.4', { content: { kind: 'photo', shows: 'Timing marks', fileId: 'me.jpg' } }],
];

const readingCases: Case[] = [
  ['content', '1.2', {}],
  ['content.kind', '1.2', { content: { kind: 'looked-at' } }],
  ['content.kind', '1.2', { content: { kind: 'inspected', outcome: 'pass', seen: [] } }],
  ['content.readings', '1.2', { content: { kind: 'measured-again', toolId: tool } }],
  [
    'content.readings[0].value',
    '1.2',
    { content: { kind: 'measured-again', toolId: tool, readings: [{ at: 'Main 1' }] } },
  ],
  ['content.toolId', '1.2', { content: { kind: 'measured-again', toolId: tool, readings: [] } }],
  ['content.setting', '1.3', { content: { kind: 'setting-and-pull-witnessed', toolId: tool } }],
  ['content.seen', '2.3', { content: { kind: 'inspected', outcome: 'pass' } }],
];

const rows = async (): Promise<unknown> => {
  const statement = `SELECT (SELECT count(*) FROM entries) e, (SELECT count(*) FROM second_readings) r,
    (SELECT count(*) FROM snags) n, (SELECT count(*) FROM ledger_lines) l, (SELECT sum(version) FROM sheets) v`;
  return (await stage.app.db.sql(stage.workshop.shop, statement))[0];
};

describe('bad input', () => {
  it.each(entryCases)('to entries names %s on step %s and saves nothing', async (field, code, body) => {
    await refused(field, `steps/${code}/entries`, body as object);
  });

  it.each(readingCases)(
    'to second readings names %s on step %s and saves nothing',
    async (field, code, body) => {
      await refused(field, `steps/${code}/second-readings`, body as object, 'imogen');
    },
  );

  it.each<readonly [string, string, object]>([
    ['outcome', 'steps/1.2/countersignatures', {}],
    ['pullsWitnessed', 'steps/1.2/countersignatures', { outcome: 'agree', pullsWitnessed: 'all' }],
    ['words', 'steps/1.2/snags', {}],
    ['words', 'steps/1.2/snags', { words: '\n' }],
    ['words', 'steps/1.2/snags', { words: 'x'.repeat(1001) }],
    ['how', `snags/${noSnag}/settlements`, { how: 'forgotten', reason: 'x' }],
    ['reason', `snags/${noSnag}/settlements`, { how: 'redone' }],
    ['reason', 'send-back', {}],
    ['meaning', 'signatures', { meaning: 'liked', password: 'x' }],
    ['password', 'signatures', { meaning: 'built' }],
    ['password', 'signatures', { meaning: 'released', password: 'wrong' }],
  ])('names %s of %s', async (field, path, body) => {
    await refused(field, path, body, 'nell');
  });

  it.each([
    ['carId', { carId: randomUUID() }],
    ['specEditionId', { specEditionId: randomUUID() }],
    ['builderId', { builderId: randomUUID() }],
    ['countersignerId', { countersignerId: 'imogen' }],
    ['extra', { extra: 1 }],
  ])('names %s of a new sheet', async (field, wrong) => {
    const { ids, small, workshop } = stage;
    const right = {
      ...{ carId: workshop.cars.ravis, specEditionId: small.edition },
      ...{ builderId: ids.tomasz, countersignerId: ids.imogen },
    };
    const before = await rows();
    const answer = await stage.clients.nell.post('/sheets', { ...right, ...wrong });
    expect([answer.status, answer.body.errors[0].field]).toEqual([400, field]);
    expect(await rows()).toEqual(before);
  });

  it('refuses one person in both places, and another shop’s car', async () => {
    const { ids, small, workshop } = stage;
    const sheet = { carId: workshop.cars.ravis, specEditionId: small.edition, builderId: ids.bea };
    const same = await stage.clients.nell.post('/sheets', { ...sheet, countersignerId: ids.bea });
    expect(same.body.errors[0].field).toBe('countersignerId');
    const foreign = { ...sheet, carId: workshop.cars.otherShops, countersignerId: ids.imogen };
    expect((await stage.clients.nell.post('/sheets', foreign)).body.errors[0].field).toBe('carId');
  });

  it.each(['state=lost', 'car=LM-C01', 'limit=0', 'cursor=x'])('refuses the list ?%s', async (query) => {
    const answer = await stage.clients.nell.get(`/sheets?${query}`);
    expect([answer.status, answer.body.errors[0].field]).toEqual([400, query.split('=')[0]]);
  });
});

async function refused(
  field: string,
  path: string,
  body: object,
  name: 'tomasz' | 'imogen' | 'nell' = 'tomasz',
): Promise<void> {
  const before = await rows();
  const answer = await hands[name].post(path, body).set('Idempotency-Key', randomUUID());
  expect({
    status: answer.status,
    fields: answer.body.errors?.map((error: { field: string }) => error.field),
  }).toEqual({
    status: 400,
    fields: expect.arrayContaining([field]),
  });
  for (const { message } of answer.body.errors) expect(message).toMatch(/^[A-Z“].*[.!?]$/s);
  expect(await rows()).toEqual(before);
}
