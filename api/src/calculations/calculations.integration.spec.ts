import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { browser } from '../testing/documented.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import { signedInClient, type TestClient } from '../testing/test-client.js';
import { openWorkshop } from '../testing/workshop.js';
import { calculations } from './calculations.js';

let app: TestApp;
let ravi: TestClient;

beforeAll(async () => {
  app = await startTestApp();
  await openWorkshop(app.services);
  ravi = await signedInClient(app.address, 'ravi@lowmill.example');
});
afterAll(() => app.close());

const torque = (value: number): object => ({ value, unit: 'N·m' });
const length = (value: number): object => ({ value, unit: 'mm' });
const four = { firingOrder: [1, 3, 4, 2], rotation: 'anticlockwise' };
const valveTiming = { ivo: 10, ivc: 50, evo: 50, evc: 10 };

/** A plain input of each calculation, and what must be in its answer. */
const plain: readonly [string, object, object][] = [
  // NIST SP 811 (2008), appendix B.8: 1 lbf·ft = 1.355 818 N·m, rounded there.
  [
    'convert',
    { quantity: { value: 1, unit: 'lbf·ft' }, to: 'N·m' },
    { quantity: { value: expect.closeTo(1.355818, 5), unit: 'N·m' } },
  ],
  // Common practice, no source: 1-3-4-2 on an anticlockwise rotor puts 3 on the post before post 1.
  ['cap-map', four, { verdict: 'pass', distributorInterval: 90, crankInterval: 180 }],
  // Common practice, no source: wired 1-4-3-2 the leads of 3 and 4 change places.
  [
    'cap-diagnosis',
    { cap: four, fitted: { 1: 1, 4: 4, 3: 3, 2: 2 } },
    { verdict: 'fail', cause: 'two-leads-swapped' },
  ],
  // Arithmetic: an inlet valve open from 10° before TDC to 50° after BDC is open 10 + 180 + 50 degrees.
  [
    'valve-clock',
    { firingOrder: [1, 3, 4, 2], valveTiming, crank: 0 },
    { duration: { inlet: 240, exhaust: 240 }, overlap: 20 },
  ],
  // Common practice, no source: both valves rock at the end of the exhaust stroke.
  [
    'which-tdc',
    {
      ...{ firingOrder: [1, 3, 4, 2], valveTiming, cylinder: 1 },
      sightings: [[{ cylinder: 1, rocking: true }]],
    },
    { answer: 'exhaust-tdc' },
  ],
  // From memory of ASME PCC-1's star pattern for four bolts.
  [
    'tightening-plan',
    { fasteners: { pattern: 'circle', count: 4 }, final: torque(40), passes: [{ fraction: 1 }] },
    { basis: 'general-practice', sequence: ['1', '3', '2', '4'] },
  ],
  // The lever rule, common practice without a source: twice the length in line takes half the setting.
  [
    'wrench-setting',
    { torque: torque(40), wrenchLength: length(200), adapterLength: length(200), adapterAngle: 0 },
    { setting: { value: expect.closeTo(20, 9), unit: 'N·m' } },
  ],
  // Limits belong to the good side: arithmetic.
  ['limit-decision', { value: length(0.05), low: length(0.02), high: length(0.05) }, { verdict: 'pass' }],
  // En = (x₁ − x₂) ÷ √(U₁² + U₂²), ISO 13528: 27.0 and 28.1 lbf·ft, each ± 4 %, worked out outside.
  [
    'two-readings',
    {
      first: { value: { value: 27, unit: 'lbf·ft' }, uncertainty: { value: 1.08, unit: 'lbf·ft' } },
      second: { value: { value: 28.1, unit: 'lbf·ft' }, uncertainty: { value: 1.124, unit: 'lbf·ft' } },
    },
    { verdict: 'pass', en: expect.closeTo(-0.7056828550594477, 9) },
  ],
  // ISO 286-2:2010, tables 6 and 25: 40 H7 is 0 to +25 µm, 40 p6 is +26 to +42 µm.
  [
    'fit',
    { hole: { size: length(40), class: 'H7' }, shaft: { size: length(40), class: 'p6' } },
    {
      kind: 'interference',
      least: { value: expect.closeTo(-0.042, 9), unit: 'mm' },
      most: { value: expect.closeTo(-0.001, 9), unit: 'mm' },
    },
  ],
  // ISO 898-1:2013, table 4: the nominal stress area of M10 is 58.0 mm².
  ['thread', { thread: 'M10x1.5' }, { stressArea: { value: expect.closeTo(58, 1), unit: 'mm2' } }],
  // Arithmetic: π ÷ 4 × 8² × 9 cm³.
  [
    'swept-volume',
    { bore: length(80), stroke: length(90), cylinders: 4 },
    { total: { value: expect.closeTo(1809.5573684677208, 6), unit: expect.any(String) } },
  ],
  // Arithmetic: 60.02 − 59.975.
  [
    'formula',
    {
      formula: 'bore_min - journal_max',
      readings: { bore_min: length(60.02), journal_max: length(59.975) },
      unit: 'mm',
    },
    { value: { value: expect.closeTo(0.045, 9), unit: 'mm' }, uses: ['bore_min', 'journal_max'] },
  ],
];

/** One bad input of each, and the field that must be named. */
const bad: readonly [string, object, string][] = [
  ['convert', { quantity: { value: 1, unit: 'furlong' }, to: 'm' }, 'quantity.unit'],
  ['cap-map', { ...four, firingOrder: [1, 3, 3, 2] }, 'firingOrder[2]'],
  ['cap-diagnosis', { cap: four, fitted: {} }, 'fitted'],
  ['valve-clock', { firingOrder: [1, 3, 4, 2], valveTiming, crank: 'top' }, 'crank'],
  ['which-tdc', { firingOrder: [1, 3, 4, 2], valveTiming, cylinder: 9, sightings: [[]] }, 'cylinder'],
  [
    'tightening-plan',
    { fasteners: { pattern: 'circle', count: 4 }, final: torque(40), passes: [] },
    'passes',
  ],
  [
    'wrench-setting',
    { torque: torque(40), wrenchLength: length(200), adapterLength: length(50), adapterAngle: null },
    'adapterAngle',
  ],
  ['limit-decision', { value: length(1), high: torque(2) }, 'high.unit'],
  ['two-readings', { first: { value: length(1), uncertainty: length(0.1) } }, 'second'],
];

describe('the workings', () => {
  it.each(plain)('answer %s', async (name, request, answer) => {
    const { status, body } = await ravi.post(`/calculations/${name}`, request);
    expect(body).toMatchObject(answer);
    expect(status).toBe(200);
  });

  it.each(bad)('refuse a bad %s by its field', async (name, request, field) => {
    const { status, body, type } = await ravi.post(`/calculations/${name}`, request);
    expect(status).toBe(400);
    expect(type).toBe('application/problem+json');
    expect(body.errors).toEqual([{ field, message: expect.stringMatching(/[.!?]$/) }]);
  });

  it.each(plain)('refuse a field that %s does not know', async (name, request) => {
    const { status, body } = await ravi.post(`/calculations/${name}`, { ...request, colour: 'red' });
    expect(status).toBe(400);
    expect(body.errors[0].field).toBe('colour');
  });

  it.each(calculations.map((each) => [each.name, each] as const))(
    'answer the example of %s as the calculation itself does',
    async (name, { example, calculate }) => {
      const { status, body } = await ravi.post(`/calculations/${name}`, example);
      expect({ status, body }).toEqual({
        status: 200,
        body: JSON.parse(JSON.stringify(await calculate(example))),
      });
    },
  );

  it.each(calculations.map((each) => [each.name, each] as const))(
    'refuse a field that %s does not know, however deep',
    async (name, { example }) => {
      const { request, path } = withUnknown(example);
      const { status, body } = await ravi.post(`/calculations/${name}`, request);
      expect(status).toBe(400);
      expect(body.errors).toEqual([{ field: path, message: expect.stringContaining('not known here') }]);
    },
  );

  it.each([
    ['a megabyte of digits', `{"quantity":{"value":${'9'.repeat(1_000_000)},"unit":"m"},"to":"mm"}`, 413],
    ['a number of 90,000 digits', `{"quantity":{"value":${'9'.repeat(90_000)},"unit":"m"},"to":"mm"}`, 400],
    ['ten thousand brackets', `{"quantity":${'['.repeat(10_000)}${']'.repeat(10_000)},"to":"mm"}`, 400],
    ['ten thousand braces', `${'{"quantity":'.repeat(7_000)}1${'}'.repeat(7_000)}`, 400],
    ['brackets that never close', '['.repeat(90_000), 400],
    ['a text that cannot be kept, deep down', `${'['.repeat(40_000)}"\\u0000"${']'.repeat(40_000)}`, 400],
    ['ninety thousand items', `{"firingOrder":[${'1,'.repeat(45_000)}1],"rotation":"clockwise"}`, 400],
  ])('refuse %s', async (_what, sent, status) => {
    for (const name of ['convert', 'cap-map']) {
      const answer = await ravi.post(`/calculations/${name}`).type('json').send(sent);
      expect(answer.status).toBe(status);
      expect(answer.type).toBe('application/problem+json');
    }
  });

  it('are there for signed-in people alone', async () => {
    const answer = await browser(app.address)
      .post('/api/calculations/convert')
      .set({ Cookie: 'XSRF-TOKEN=x', 'X-XSRF-TOKEN': 'x' })
      .send({});
    expect(answer.status).toBe(401);
  });

  it.each(['/calculations/nothing', '/calculations'])('do not answer %s', async (path) => {
    expect((await ravi.post(path, {})).status).toBe(404);
  });
});

/** A request with one unknown field in the innermost of its first objects, or at the top where there is none. */
function withUnknown(request: object): { request: object; path: string } {
  const inner = Object.entries(request).find(
    ([, value]) => typeof value === 'object' && !Array.isArray(value),
  );
  if (!inner) return { request: { ...request, colour: 'red' }, path: 'colour' };
  const [name, value] = inner as [string, object];
  const found = withUnknown(value);
  return { request: { ...request, [name]: found.request }, path: `${name}.${found.path}` };
}
