import { describe, expect, it } from 'vitest';
import type { BeltLineRequest, DrivenPulley } from '../contracts/belt-drive.js';
import { InputError } from '../contracts/input-error.js';
import { beltAlignment } from './belt-alignment.js';
import { beltLine } from './belt-line.js';

const mm = (value: number) => ({ value, unit: 'mm' }) as const;
type Rims = readonly [number, number, number, number];
const gaps = ([driverNear, driverFar, drivenNear, drivenFar]: Rims) => ({
  driverNear: mm(driverNear),
  driverFar: mm(driverFar),
  drivenNear: mm(drivenNear),
  drivenFar: mm(drivenFar),
});
const driver = { name: 'crank pulley', diameter: mm(138) };
const dynamo = (rims: Rims, more: Partial<DrivenPulley> = {}): DrivenPulley => ({
  name: 'dynamo pulley',
  diameter: mm(92),
  span: mm(300),
  gaps: gaps(rims),
  ...more,
});
const line = (...driven: DrivenPulley[]): BeltLineRequest => ({ driver, driven });

describe('the line of a belt', () => {
  it('is that of the two pulleys', () => {
    const pulley = dynamo([0.1, -0.1, 1.2, 1.6]);
    const { offset, angle, verdict, reason } = beltAlignment({
      span: pulley.span,
      gaps: pulley.gaps,
      driverDiameter: driver.diameter,
      drivenDiameter: pulley.diameter,
    });
    expect(beltLine(line(pulley)).pulleys[0]).toMatchObject({ offset, angle, verdict, reason, runOut: null });
  });

  it('of three pulleys is as its worst', () => {
    const pump = { ...dynamo([0, 0, 0.2, 0.2]), name: 'pump pulley' };
    const answer = beltLine(line(pump, dynamo([0, 0, 4, 4])));
    expect(answer.pulleys.map(({ verdict }) => verdict)).toEqual(['pass', 'fail']);
    expect(answer.verdict).toBe('fail');
    expect(answer.reason).toMatch(/^dynamo pulley:/);
  });

  it('is of the grooves where both distances are given', () => {
    const request = {
      driver: { ...driver, faceToGroove: mm(9) },
      driven: [dynamo([0, 0, -3, -3], { faceToGroove: mm(12) })],
    };
    expect(beltLine(request).pulleys[0]?.offset.value).toBeCloseTo(0, 9);
    expect(beltLine(request).reason).toContain('The grooves are');
    expect(beltLine(line(dynamo([0, 0, 1, 1]))).reason).toContain('The rims are');
    expect(beltLine(request).assumed.join(' ')).not.toMatch(/rims are taken/);
  });
});

describe('a second set, a quarter turn on', () => {
  // A driven pulley of 92 mm leaning 0.5° has 0.872 687 mm per 100 mm (T6-021), 0.802 872 mm over its rims.
  const lean = 0.8028718366898329;

  it('shows no run-out where the lean stays', () => {
    const [pulley] = beltLine(line(dynamo([0, 0, lean, 0], { quarterTurn: gaps([0, 0, lean, 0]) }))).pulleys;
    expect(pulley?.runOut).toBeCloseTo(0, 9);
    expect(pulley?.tilt).toBeCloseTo(0.5, 9);
  });

  it('shows run-out where it turns with the pulley, and doubts', () => {
    const [pulley] = beltLine(line(dynamo([0, 0, lean, 0], { quarterTurn: gaps([0, 0, 0, lean]) }))).pulleys;
    expect(pulley?.runOut).toBeCloseTo(0.5, 9);
    expect(pulley?.tilt).toBeCloseTo(0, 9);
    expect(pulley?.offset.value).toBeCloseTo(lean / 2, 9);
    expect(pulley?.verdict).toBe('doubtful');
    expect(pulley?.reason).toMatch(/runs out by 0\.50°/);
  });
});

describe('the cure', () => {
  const cureOf = (rims: Rims, more: Partial<DrivenPulley> = {}) =>
    beltLine(line(dynamo(rims, more))).pulleys[0];

  it.each([
    // Moves are the offsets; shims of 0.5 mm the nearest whole number.
    [[0, 0, 3.1, 3.1], 3.1, 6, /3\.1\smm forward.* put 6 shims of 0\.5\smm behind it, which leaves 0\.1\smm/],
    [[0, 0, -3, -3], -3, 6, /3\smm back.* take 6 shims of 0\.5\smm out from behind it\./],
    [[0, 0, 1, 1], 1, 2, /may stay as it is/],
  ] as const)('of gaps %j', (rims, move, shims, words) => {
    const pulley = cureOf(rims, { shim: mm(0.5) });
    expect(pulley?.cure.move.value).toBeCloseTo(move, 9);
    expect(pulley?.cure.shims).toBe(shims);
    expect(pulley?.cure.words).toMatch(words);
  });

  it.each([
    // 0.0087 of the span is 6.09 and 1.479 mm: on the limit, which is good.
    [700, 6.09],
    [170, 1.479],
  ])('of a pulley on the limit at %d mm of span is none, room or not', (span, back) => {
    const pulley = cureOf([0, 0, back, back], { span: mm(span), shim: mm(0.5), roomInFront: mm(0.5) });
    expect(pulley?.verdict).toBe('pass');
    expect(pulley?.cure.words).toBe('The dynamo pulley may stay as it is.');
  });

  it('turns a pulley that leans the other way', () => {
    // Its near rim 1.2 mm back of its far one: 0.75°, so that the far rim must come back 1.2 mm.
    expect(cureOf([0, 0, 0.6, -0.6])?.cure.words).toMatch(/far rim has come 1\.2\smm back/);
    expect(cureOf([0, 0, -0.6, 0.6])?.cure.words).toMatch(/far rim has come 1\.2\smm forward/);
  });

  it.each([
    [[0, 0, 3, 3], { roomInFront: mm(3) }, true],
    [[0, 0, 3, 3], { roomInFront: mm(2.9) }, false],
    [[0, 0, -3, -3], { roomBehind: mm(2.9), roomInFront: mm(9) }, false],
    [[0, 0, -3, -3], { roomInFront: mm(9) }, null],
  ] as const)('of gaps %j with %j clears: %s', (rims, room, clears) => {
    const pulley = cureOf(rims, room);
    expect(pulley?.clears).toBe(clears);
    expect(/would foul/.test(pulley?.cure.words ?? '')).toBe(clears === false);
  });
});

it('a pulley over its limit by less than is printed is said to be just over', () => {
  // 0.0087 of 300 mm is 2.61 mm.
  const { verdict, reason } = beltLine(line(dynamo([0, 0, 2.612, 2.612])));
  expect(verdict).toBe('fail');
  expect(reason).toMatch(/2\.61\smm out of one plane \(just over the 2\.61\smm allowed over this span\)/);
});

describe('input that cannot be used', () => {
  const good = line(dynamo([0, 0, 1, 1]));
  it.each([
    ['request', null],
    ['driver.name', { ...good, driver: { ...driver, name: '' } }],
    ['driver.diameter.value', { ...good, driver: { ...driver, diameter: mm(0) } }],
    ['driven', { ...good, driven: [] }],
    ['driven', { ...good, driven: Array.from({ length: 5000 }, () => dynamo([0, 0, 1, 1])) }],
    ['driven[0].span.value', line(dynamo([0, 0, 1, 1], { span: mm(-1) }))],
    ['driven[0].gaps.drivenFar.value', line(dynamo([0, 0, 1, NaN]))],
    ['driven[0].quarterTurn.driverNear', line(dynamo([0, 0, 1, 1], { quarterTurn: {} as never }))],
    ['driven[0].shim.value', line(dynamo([0, 0, 1, 1], { shim: mm(0) }))],
    ['driver.faceToGroove', line(dynamo([0, 0, 1, 1], { faceToGroove: mm(9) }))],
    ['driven[0].faceToGroove', { ...good, driver: { ...driver, faceToGroove: mm(9) } }],
    ['limit.angle', { ...good, limit: { angle: 'little' } }],
  ])('%s', (field, request) => {
    expect(() => beltLine(request as BeltLineRequest)).toThrow(InputError);
    expect(() => beltLine(request as BeltLineRequest)).toThrow(expect.objectContaining({ field }));
  });
});
