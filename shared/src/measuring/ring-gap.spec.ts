import { describe, expect, it } from 'vitest';
import type { RingGapRequest } from '../contracts/measuring.js';
import type { Quantity, Unit } from '../contracts/quantity.js';
import { ringGap } from './ring-gap.js';

const of = (value: number, unit: Unit = 'mm'): Quantity => ({ value, unit });

describe('ringGap', () => {
  it('wants so much for each inch of bore', () => {
    // T7-004, RG1: a trade magazine of January 2019, 4.030 in × 0.0045 and × 0.0050.
    const { wanted, verdict } = ringGap({
      ...{ bore: of(4.03, 'in'), gap: of(19, 'thou') },
      perBore: { low: 0.0045, high: 0.005 },
    });
    expect(wanted.low?.value).toBeCloseTo(18.135, 9);
    expect(wanted.high?.value).toBeCloseTo(20.15, 9);
    expect(verdict).toBe('pass');
  });

  const hot: RingGapRequest = { bore: of(86), gap: of(0.344), ringHotterBy: of(200, 'K') };

  it('closes by π·D·α·ΔT', () => {
    // T7-009, CTE1: 0.616 mm for 86 mm and 200 K; 0.308 mm for 100 K.
    expect(ringGap(hot).closesBy?.value).toBeCloseTo(0.6160034875158865, 12);
    expect(ringGap({ ...hot, ringHotterBy: of(360, '°F') }).closesBy?.value).toBeCloseTo(0.616003487515, 9);
    expect(ringGap(hot).verdict).toBe('fail');
    expect(ringGap({ ...hot, ringHotterBy: of(100, 'K') }).verdict).toBe('pass');
    expect(ringGap({ ...hot, ringHotterBy: of(100, 'K'), uncertainty: of(0.05) }).verdict).toBe('doubtful');
  });

  it('says that the ring was taken to be grey iron', () => {
    expect(ringGap(hot).assumed.join(' ')).toContain('grey iron');
    const steel = ringGap({ ...hot, coefficient: 12 });
    expect(steel.assumed.join(' ')).not.toContain('grey iron');
    expect(steel.closesBy?.value).toBeCloseTo((0.6160034875158865 * 12) / 11.4, 12);
  });

  it('is not judged by nothing', () => {
    expect(ringGap({ bore: of(86), gap: of(0.3) })).toMatchObject({ verdict: 'not-judged', closesBy: null });
  });

  it('fails a gap that is good cold and closes hot', () => {
    const answer = ringGap({ ...hot, limits: { low: of(0.3), high: of(0.4) } });
    expect(answer.verdict).toBe('fail');
    expect(answer.reason).toContain('ends meet');
  });

  it.each<[string, unknown]>([
    ['bore.value', { ...hot, bore: of(0) }],
    ['gap.unit', { ...hot, gap: of(1, 'bar') }],
    ['gap.value', { ...hot, gap: of(-1) }],
    ['perBore', { ...hot, limits: { low: of(1) }, perBore: { low: 0.004 } }],
    ['perBore.low', { ...hot, perBore: { low: 4.5 } }],
    ['perBore.high', { ...hot, perBore: { low: 0.005, high: 0.004 } }],
    ['ringHotterBy.value', { ...hot, ringHotterBy: of(-1, 'K') }],
    ['coefficient', { ...hot, coefficient: NaN }],
  ])('is refused on %s', (field, request) => {
    expect(() => ringGap(request as RingGapRequest)).toThrow(
      expect.objectContaining({ name: 'InputError', field }),
    );
  });
});
