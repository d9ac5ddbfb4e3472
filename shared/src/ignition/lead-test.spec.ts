import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { LeadTestRequest } from '../contracts/ignition-checks.js';
import { leadTest } from './lead-test.js';

const ohms = (value: number) => ({ value, unit: 'Ω' }) as const;
const kilohms = (value: number) => ({ value, unit: 'kΩ' }) as const;
const mm = (value: number) => ({ value, unit: 'mm' }) as const;
const foot = { value: 1, unit: 'ft' } as const;

const resistive = {
  kind: 'resistive',
  length: mm(600),
  nominal: { low: kilohms(7), high: kilohms(10), per: foot },
} as const;
const copper = { kind: 'wire-core', length: mm(600) } as const;

describe('a resistive lead', () => {
  it('may read the maker’s resistance for its length', () => {
    // T2-067, LEAD-M: 7 to 10 kΩ a foot, 600 mm.
    const { limits, verdict } = leadTest({ ...resistive, reading: kilohms(15) });
    expect(limits?.low.value).toBeCloseTo(13.779527559055119, 9);
    expect(limits?.high.value).toBeCloseTo(19.68503937007874, 9);
    expect(limits?.low.unit).toBe('kΩ');
    expect(verdict).toBe('pass');
    // T2-068, LEAD-M: 670.56 mm is the longest that stays under 22 kΩ.
    const longest = leadTest({ ...resistive, length: mm(670.56), reading: kilohms(15) });
    expect(longest.limits?.high.value).toBeCloseTo(22, 9);
  });

  it('keeps within the maker’s limit for a whole lead', () => {
    const long = { ...resistive, length: mm(900), whole: { high: kilohms(22) } };
    expect(leadTest({ ...long, reading: kilohms(23) }).verdict).toBe('fail');
    expect(leadTest({ ...long, reading: kilohms(21.9) }).verdict).toBe('pass');
  });

  it.each([
    [kilohms(13), 'fail'],
    [kilohms(13.5), 'doubtful'],
    [kilohms(14.5), 'pass'],
    [kilohms(25), 'fail'],
    [ohms(0.4), 'fail'],
    ['open', 'fail'],
    ['short', 'fail'],
  ] as const)('reading %o with ±0.5 kΩ: %s', (reading, verdict) => {
    expect(leadTest({ ...resistive, reading, uncertainty: kilohms(0.5) }).verdict).toBe(verdict);
  });

  it('is not judged without the maker’s figure, unless it is open or has no resistance', () => {
    const unknown = { kind: 'resistive', length: mm(600) } as const;
    expect(leadTest({ ...unknown, reading: kilohms(9) })).toMatchObject({
      verdict: 'not-judged',
      limits: null,
    });
    expect(leadTest({ ...unknown, reading: ohms(1) }).verdict).toBe('fail');
    expect(leadTest({ ...unknown, reading: 'open' }).verdict).toBe('fail');
  });

  it('has its end fittings added', () => {
    const { limits } = leadTest({ ...resistive, endFittings: kilohms(5), reading: kilohms(20) });
    expect(limits?.low.value).toBeCloseTo(18.779527559055119, 9);
  });
});

describe('a wire-core lead', () => {
  it.each([
    [ohms(0.3), 'pass'],
    ['short', 'pass'],
    [kilohms(12), 'fail'],
    ['open', 'fail'],
  ] as const)('reading %o: %s', (reading, verdict) => {
    expect(leadTest({ ...copper, reading }).verdict).toBe(verdict);
  });

  it('is judged by the maker’s limit for a whole lead, where there is one', () => {
    const limited = { ...copper, whole: { high: ohms(5) } };
    expect(leadTest({ ...limited, reading: ohms(4) }).verdict).toBe('pass');
    expect(leadTest({ ...limited, reading: ohms(6) }).verdict).toBe('fail');
  });

  it('has the resistance of its suppressors, and none is then wrong', () => {
    const suppressed = { ...copper, endFittings: kilohms(5) };
    expect(leadTest({ ...suppressed, reading: kilohms(4.6) }).verdict).toBe('pass');
    expect(leadTest({ ...suppressed, reading: 'short' }).verdict).toBe('fail');
    expect(leadTest({ ...suppressed, reading: ohms(1) }).verdict).toBe('fail');
  });
});

it('says that a disturbed connection is tested again, and what an ohmmeter does not tell', () => {
  const answer = leadTest({ ...resistive, reading: 'open', disturbed: true });
  expect(answer.verdict).toBe('not-judged');
  expect(answer.reason).toContain('test the lead again');
  expect(answer.cautions.join(' ')).toContain('says nothing of the insulation');
});

it('judges a lead cut to any length by its share', () => {
  fc.assert(
    fc.property(
      fc.integer({ min: 50, max: 2000 }),
      fc.double({ min: 0, max: 30, noNaN: true }),
      (length, reading) => {
        const { verdict } = leadTest({ ...resistive, length: mm(length), reading: kilohms(reading) });
        const perFoot = (reading / length) * 304.8;
        const clear = Math.min(perFoot - 7, 10 - perFoot);
        fc.pre(Math.abs(clear) > 1e-6);
        expect(verdict).toBe(clear > 0 ? 'pass' : 'fail');
      },
    ),
  );
});

it.each([
  ['reading', { ...resistive }],
  ['reading', { ...resistive, reading: 'dead' }],
  ['reading.value', { ...resistive, reading: ohms(-1) }],
  ['reading.unit', { ...resistive, reading: mm(1) }],
  ['kind', { ...resistive, kind: 'copper', reading: 'open' }],
  ['length.value', { ...resistive, length: mm(0), reading: 'open' }],
  ['nominal', { ...resistive, nominal: 7, reading: 'open' }],
  ['nominal.per.value', { ...resistive, nominal: { ...resistive.nominal, per: mm(0) }, reading: 'open' }],
  ['nominal.low', { ...resistive, nominal: { ...resistive.nominal, low: kilohms(11) }, reading: 'open' }],
  ['whole.low', { ...resistive, whole: { low: kilohms(9), high: kilohms(1) }, reading: 'open' }],
  ['whole.high', { ...resistive, whole: { high: kilohms(1) }, reading: 'open' }],
  ['endFittings.unit', { ...resistive, endFittings: mm(1), reading: 'open' }],
  ['uncertainty.value', { ...resistive, uncertainty: ohms(NaN), reading: 'open' }],
  ['disturbed', { ...resistive, disturbed: 'no', reading: 'open' }],
])('refuses by %s', (field, request) => {
  expect(() => leadTest(request as LeadTestRequest)).toThrow(expect.objectContaining({ field }));
});
