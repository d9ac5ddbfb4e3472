import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { CurePoint, CureRequest } from '../contracts/curing.js';
import type { Quantity, Unit } from '../contracts/quantity.js';
import { cure } from './cure.js';

const of = (value: number, unit: Unit): Quantity => ({ value, unit });
const line = (celsius: number, toLoad: number, full: number, rest: Partial<CurePoint> = {}): CurePoint => ({
  ...{ temperature: of(celsius, '°C'), toLoad: of(toLoad, 'h'), full: of(full, 'h') },
  ...rest,
});
const at = (time: string, day = '2026-12-01'): string => `${day}T${time}:00Z`;

/** A made-up data sheet; every time below is worked out by hand from it. */
const sheet = [line(10, 12, 48), line(20, 6, 24), line(40, 2, 8)];
const request: CureRequest = { sheet, temperature: of(20, '°C'), applied: at('08:00'), now: at('12:00') };

describe('cure', () => {
  it('waits until it may be loaded', () => {
    const waiting = cure(request);
    expect(waiting).toMatchObject({
      ...{ verdict: 'fail', loadAt: '2026-12-01T14:00:00.000Z', fullAt: '2026-12-02T08:00:00.000Z' },
    });
    expect(waiting.progress).toBeCloseTo(4 / 6, 12);
    expect(waiting.reason).toContain('2 h still to wait');
    expect(cure({ ...request, now: at('13:59') }).reason).toContain('1 min still');
    expect(cure({ ...request, now: at('14:00') })).toMatchObject({ verdict: 'pass', progress: 1 });
  });

  it.each([
    [of(15, '°C'), '2026-12-01T17:00:00.000Z'],
    [of(59, '°F'), '2026-12-01T17:00:00.000Z'],
    [of(30, '°C'), '2026-12-01T12:00:00.000Z'],
    [of(10, '°C'), '2026-12-01T20:00:00.000Z'],
    [of(104, '°F'), '2026-12-01T10:00:00.000Z'],
  ])('is linear between the temperatures: %j', (temperature, loadAt) => {
    expect(cure({ ...request, temperature }).loadAt).toBe(loadAt);
  });

  it('takes the lines in any order, and of two at one temperature the slower', () => {
    const shuffled = [line(40, 2, 8), line(10, 12, 48), line(20, 5, 20), line(20, 6, 24)];
    expect(cure({ ...request, sheet: shuffled }).loadAt).toBe('2026-12-01T14:00:00.000Z');
  });

  it.each([of(9.9, '°C'), of(40.1, '°C'), of(-20, '°C')])('guesses nothing outside: %j', (temperature) => {
    const answer = cure({ ...request, temperature });
    expect(answer.verdict).toBe('not-judged');
    expect(answer.loadAt).toBeUndefined();
    expect(answer.reason.replaceAll('\u2009', ' ')).toContain('from 10 °C to 40 °C');
  });

  it('runs from when the joint was closed', () => {
    expect(cure({ ...request, closed: at('08:10') }).loadAt).toBe('2026-12-01T14:10:00.000Z');
  });

  it('fails a joint that was closed late, whatever the time since', () => {
    const late = { ...request, closed: at('08:21'), openTime: of(20, 'min'), now: at('23:00') };
    expect(cure(late)).toMatchObject({ verdict: 'fail' });
    expect(cure(late).reason).toContain('21 min after');
    expect(cure({ ...late, closed: at('08:20') }).verdict).toBe('pass');
  });

  it('goes by the gap, and by the next larger one', () => {
    const byGap = [
      ...[line(20, 3, 24, { gap: of(0.05, 'mm') }), line(20, 8, 72, { gap: of(0.15, 'mm') })],
      line(10, 6, 48, { gap: of(0.05, 'mm') }),
    ];
    const load = (gap?: Quantity) => cure({ ...request, sheet: byGap, gap }).loadAt;
    expect(load(of(0.05, 'mm'))).toBe('2026-12-01T11:00:00.000Z');
    expect(load(of(0.02, 'mm'))).toBe('2026-12-01T11:00:00.000Z');
    expect(load(of(2, 'thou'))).toBe('2026-12-01T16:00:00.000Z');
    expect(load(of(0.15, 'mm'))).toBe('2026-12-01T16:00:00.000Z');
    for (const gap of [of(0.151, 'mm'), undefined]) {
      expect(cure({ ...request, sheet: byGap, gap }).verdict).toBe('not-judged');
    }
    // At 15 °C only the small gap has figures.
    const cold = { ...request, sheet: byGap, temperature: of(15, '°C') };
    expect(cure({ ...cold, gap: of(0.05, 'mm') }).loadAt).toBe('2026-12-01T12:30:00.000Z');
    expect(cure({ ...cold, gap: of(0.1, 'mm') }).verdict).toBe('not-judged');
  });

  it('goes by substrate, activator and humidity', () => {
    const lines = [
      ...[line(20, 6, 24, { substrate: 'steel' }), line(20, 24, 72, { substrate: 'zinc' })],
      line(20, 1, 6, { substrate: 'zinc', activator: true }),
    ];
    const load = (joint: Partial<CureRequest>) => cure({ ...request, sheet: lines, ...joint }).loadAt;
    expect(load({ substrate: 'Steel' })).toBe('2026-12-01T14:00:00.000Z');
    expect(load({ substrate: 'zinc', activator: true })).toBe('2026-12-01T09:00:00.000Z');
    expect(load({ substrate: 'zinc' })).toBe('2026-12-02T08:00:00.000Z');
    expect(cure({ ...request, sheet: lines, substrate: 'cork' }).reason).toContain('steel, zinc');
    expect(load({})).toBeUndefined();
    expect(load({ substrate: 'steel', activator: true })).toBeUndefined();
    const moist = [line(20, 24, 96, { humidity: 30 }), line(20, 8, 24, { humidity: 50 })];
    const dryAir = (humidity?: number) => cure({ ...request, sheet: moist, humidity });
    expect(dryAir(50).loadAt).toBe('2026-12-01T16:00:00.000Z');
    expect(dryAir(90).loadAt).toBe('2026-12-01T16:00:00.000Z');
    expect(dryAir(49).loadAt).toBe('2026-12-02T08:00:00.000Z');
    expect(dryAir(29).verdict).toBe('not-judged');
    expect(dryAir().verdict).toBe('not-judged');
  });

  it('says what the sheet says nothing of', () => {
    const told = { gap: of(0.1, 'mm'), substrate: 'steel', humidity: 50 };
    expect(cure({ ...request, ...told, retorqueAllowed: true }).cautions).toHaveLength(3);
    expect(cure({ ...request, ...told }).loadAt).toBe('2026-12-01T14:00:00.000Z');
  });

  it('says when it may be handled', () => {
    const handled = sheet.map((point) => ({ ...point, toHandle: of(30, 'min') }));
    expect(cure({ ...request, sheet: handled }).handleAt).toBe('2026-12-01T08:30:00.000Z');
    expect(cure(request).handleAt).toBeUndefined();
  });
});

describe('the lot', () => {
  it.each([
    ['2026-12-01', 'pass'],
    ['2026-11-30', 'fail'],
    ['2026-12-02', 'pass'],
    ['2026-12-01T07:59:00Z', 'fail'],
  ])('to %s: %s', (lotExpires, verdict) => {
    expect(cure({ ...request, lotExpires, now: at('20:00') }).verdict).toBe(verdict);
  });

  it('is compared with when it was applied, and its day ends in UTC', () => {
    const late = { ...request, applied: '2026-12-02T00:30+01:00', now: at('12:00', '2026-12-02') };
    expect(cure({ ...late, lotExpires: '2026-12-01' }).verdict).toBe('pass');
    const next = { ...late, applied: '2026-12-02T01:00+01:00' };
    expect(cure({ ...next, lotExpires: '2026-12-01' }).verdict).toBe('fail');
  });

  it('fails where the sheet has no figures too', () => {
    const answer = cure({ ...request, temperature: of(0, '°C'), lotExpires: '2026-11-30' });
    expect(answer.verdict).toBe('fail');
    expect(answer.reason).toContain('past its date');
  });
});

describe('temperatures on the way', () => {
  const later = { ...request, now: at('20:00') };

  it('add up the shares of the time', () => {
    // 3 h of 12 at 10 °C, then 20 °C; between the two readings 10 °C counts. 9/12 of 6 h from 11:00: 15:30.
    const log = [
      { at: at('08:00'), temperature: of(10, '°C') },
      { at: at('11:00'), temperature: of(20, '°C') },
    ];
    expect(cure({ ...later, log }).loadAt).toBe('2026-12-01T15:30:00.000Z');
    // Warm first, cold at 10:00: the cold counts for the two hours before. 10/12 of 12 h from 10:00: 20:00.
    const cooling = [{ at: at('10:00'), temperature: of(10, '°C') }];
    expect(cure({ ...later, log: cooling }).loadAt).toBe('2026-12-01T20:00:00.000Z');
  });

  it('that the sheet has no figures for end it, before loading but not after', () => {
    const frost = (time: string) => cure({ ...later, log: [{ at: at(time), temperature: of(2, '°C') }] });
    expect(frost('13:00').verdict).toBe('not-judged');
    const after = [
      { at: at('14:00'), temperature: of(20, '°C') },
      { at: at('15:00'), temperature: of(2, '°C') },
    ];
    expect(cure({ ...later, log: after }).verdict).toBe('pass');
    expect(cure({ ...later, log: after }).fullAt).toBeUndefined();
  });

  it('never make it earlier than the coldest of them alone would, nor later than the warmest', () => {
    const celsius = fc.double({ min: 10, max: 40, noNaN: true });
    fc.assert(
      fc.property(fc.array(celsius, { minLength: 1, maxLength: 6 }), (temperatures) => {
        const log = temperatures.map((value, i) => ({
          at: at(`${String(9 + i).padStart(2, '0')}:00`),
          temperature: of(value, '°C'),
        }));
        const all = [20, ...temperatures];
        const alone = (value: number) => Date.parse(cure({ ...later, temperature: of(value, '°C') }).loadAt!);
        const load = Date.parse(cure({ ...later, log }).loadAt!);
        expect(load).toBeGreaterThanOrEqual(alone(Math.max(...all)) - 1);
        expect(load).toBeLessThanOrEqual(alone(Math.min(...all)) + 1);
      }),
    );
  });
});

it('takes times without an offset as one clock’s', () => {
  const local = { ...request, applied: '2026-12-01T08:00', now: '2026-12-01T12:00' };
  expect(cure(local).loadAt).toBe('2026-12-01T14:00:00.000');
  expect(cure(local).reason).toContain('14:00 on 1 Dec 2026');
  expect(cure(request).reason).toContain('14:00 UTC on 1 Dec 2026');
});

it('says not to tighten again, unless the data sheet allows it', () => {
  expect(cure(request).cautions?.[0]).toContain('Do not tighten again');
  expect(cure({ ...request, retorqueAllowed: true }).cautions).toEqual([]);
});

it.each<[string, unknown]>([
  ['request', []],
  ['sheet', { ...request, sheet: [] }],
  ['sheet', { ...request, sheet: Array.from({ length: 5000 }, () => sheet[0]) }],
  ['sheet[0].temperature.value', { ...request, sheet: [line(-300, 1, 2)] }],
  ['sheet[0].toLoad.value', { ...request, sheet: [line(20, 0, 2)] }],
  ['sheet[0].toLoad', { ...request, sheet: [line(20, 3, 2)] }],
  ['sheet[0].toHandle', { ...request, sheet: [line(20, 1, 2, { toHandle: of(2, 'h') })] }],
  ['sheet[0].full.value', { ...request, sheet: [line(20, 1, 1e12)] }],
  ['sheet[0].activator', { ...request, sheet: [{ ...line(20, 1, 2), activator: 'yes' }] }],
  ['sheet[0].substrate', { ...request, sheet: [line(20, 1, 2, { substrate: 'x'.repeat(1e6) })] }],
  ['temperature.unit', { ...request, temperature: of(20, 'mm') }],
  ['gap.value', { ...request, gap: of(-1, 'mm') }],
  ['humidity', { ...request, humidity: 101 }],
  ['applied', { ...request, applied: 'yesterday' }],
  ['applied', { ...request, applied: '2026-02-30T08:00Z' }],
  ['applied', { ...request, applied: '9'.repeat(1e6) }],
  ['now', { ...request, now: at('07:59') }],
  ['now', { ...request, now: '2026-12-01T12:00' }],
  ['closed', { ...request, closed: at('07:59') }],
  ['closed', { ...request, closed: at('12:01') }],
  ['openTime.value', { ...request, openTime: of(0, 'min') }],
  ['lotExpires', { ...request, lotExpires: '2026-13-01' }],
  ['lotExpires', { ...request, lotExpires: 'soon' }],
  ['log', { ...request, log: {} }],
  ['log[0].at', { ...request, log: [{ at: at('13:00'), temperature: of(20, '°C') }] }],
  [
    'log[1].at',
    { ...request, log: [at('09:00'), at('08:30')].map((time) => ({ at: time, temperature: of(20, '°C') })) },
  ],
  ['retorqueAllowed', { ...request, retorqueAllowed: 'no' }],
])('is refused on %s', (field, given) => {
  expect(() => cure(given as CureRequest)).toThrow(expect.objectContaining({ name: 'InputError', field }));
});
