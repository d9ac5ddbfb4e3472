import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { HeatToAssembleRequest } from '../contracts/fits.js';
import { InputError } from '../contracts/input-error.js';
import { heatToAssemble } from './heat-to-assemble.js';
import { thermalGrowth } from './thermal-growth.js';

const mm = (value: number) => ({ value, unit: 'mm' }) as const;
const um = (value: number) => ({ value, unit: 'µm' }) as const;
const celsius = (value: number) => ({ value, unit: '°C' }) as const;

const bearing: HeatToAssembleRequest = {
  diameter: mm(30),
  // T5-055: a 30 mm steel bore heated by 85 K grows 29.835 µm.
  interference: um(15),
  clearance: um(14.835),
  hub: 'steel',
  shaft: 'steel',
  room: celsius(20),
  by: 'heating-hub',
};

describe('heating the hub', () => {
  it('is 85 K for 29.835 µm on 30 mm of steel', () => {
    const answer = heatToAssemble({ ...bearing, hottestAllowed: celsius(120) });
    expect(answer.hubRise.unit).toBe('K');
    expect(answer.hubRise.value).toBeCloseTo(85, 9);
    expect(answer.hubTemperature.value).toBeCloseTo(105, 9);
    expect(answer.shaftDrop.value).toBe(0);
    expect(answer.clearanceThen.unit).toBe('µm');
    expect(answer.clearanceThen.value).toBeCloseTo(14.835, 9);
    expect(answer.verdict).toBe('pass');
  });

  it('gives a difference its own degrees: 80 to 90 K are 144 to 162 °F of difference, not 176 to 194', () => {
    // 68 °F is 20 °C; 85 K × 1.8 = 153 °F (NIST SP 811, app. B.9: t/°F differences are 1.8 times those in K).
    const answer = heatToAssemble({ ...bearing, room: { value: 68, unit: '°F' } });
    expect(answer.hubRise).toEqual({ value: expect.closeTo(85, 9) as number, unit: 'K' });
    expect(answer.hubTemperature.value).toBeCloseTo(68 + 153, 9);
    expect(answer.reason).toMatch(/221\s°F, 153 °F above the room/);
  });

  it.each([
    [celsius(105), 'pass'],
    [celsius(104.9), 'fail'],
    [{ value: 221, unit: '°F' }, 'pass'],
    [undefined, 'not-judged'],
  ] as const)('allowed to %j: %s', (hottestAllowed, verdict) => {
    expect(heatToAssemble({ ...bearing, hottestAllowed }).verdict).toBe(verdict);
  });

  it('warns of sealed bearings over 80 °C, which the bearing makers print', () => {
    expect(heatToAssemble(bearing).cautions.join(' ')).toMatch(/sealed.* 80\s°C/);
  });
});

describe('cooling the shaft', () => {
  it('shrinks the shaft alone', () => {
    const answer = heatToAssemble({ ...bearing, by: 'cooling-shaft', coldestAllowed: celsius(-78.5) });
    expect(answer.shaftDrop.value).toBeCloseTo(85, 9);
    expect(answer.shaftTemperature.value).toBeCloseTo(-65, 9);
    expect(answer.verdict).toBe('pass');
    expect(answer.cautions.join(' ')).toMatch(/drive out the air/);
  });

  it('is refused where no cold is enough', () => {
    expect(() => heatToAssemble({ ...bearing, by: 'cooling-shaft', interference: um(200) })).toThrow(
      expect.objectContaining({ field: 'by' }),
    );
  });
});

describe('both', () => {
  const both: HeatToAssembleRequest = { ...bearing, by: 'both', coldest: celsius(-20) };

  it('leaves to the hub what the cold shaft does not give', () => {
    // Same material: 85 K between them in all, 40 K of which the shaft gives.
    const answer = heatToAssemble(both);
    expect(answer.shaftDrop.value).toBeCloseTo(40, 9);
    expect(answer.hubRise.value).toBeCloseTo(45, 9);
  });

  it('does not heat a hub that the cold shaft enters already', () => {
    const answer = heatToAssemble({ ...both, coldest: celsius(-100) });
    expect(answer.hubRise.value).toBe(0);
    // 120 K of steel on 30 mm shrink 42.12 µm (11.7 · 30 · 120), 15 of which were interference.
    expect(answer.clearanceThen.value).toBeCloseTo(27.12, 9);
  });
});

it('grows as the coefficients say: an aluminium housing leaves its iron liner', () => {
  // T5-056: 90 mm, 23.6 against 11.4, 80 K: 87.84 µm.
  expect((thermalGrowth(0.09, 23.6, 80) - thermalGrowth(0.09, 11.4, 80)) * 1e6).toBeCloseTo(87.84, 9);
});

it('always leaves the clearance that was wanted, or more', () => {
  const length = fc.double({ min: 1, max: 100, noNaN: true });
  fc.assert(
    fc.property(
      length,
      length,
      length,
      fc.constantFrom('heating-hub', 'both'),
      fc.constantFrom('steel', 'aluminium', 'brass', 'grey-iron'),
      (diameter, interference, clearance, by, hub) => {
        const answer = heatToAssemble({
          ...bearing,
          diameter: mm(diameter + 60),
          interference: um(interference),
          clearance: um(clearance),
          by,
          hub,
          coldest: celsius(-20),
        } as HeatToAssembleRequest);
        expect(answer.clearanceThen.value).toBeGreaterThanOrEqual(clearance - 1e-6);
      },
    ),
  );
});

describe('input that cannot be used', () => {
  it.each([
    ['request', undefined],
    ['diameter.value', { ...bearing, diameter: mm(0) }],
    ['interference.value', { ...bearing, interference: um(-5) }],
    ['clearance.unit', { ...bearing, clearance: celsius(5) }],
    ['hub', { ...bearing, hub: 'cheese' }],
    ['hub', { ...bearing, hub: 12 }],
    ['shaft.coefficient', { ...bearing, shaft: { coefficient: 0 } }],
    ['room', { ...bearing, room: 20 }],
    ['room.value', { ...bearing, room: celsius(-300) }],
    ['by', { ...bearing, by: 'press' }],
    ['by', { ...bearing, interference: mm(10) }],
    ['coldest', { ...bearing, by: 'both' }],
    ['coldest', { ...bearing, by: 'both', coldest: celsius(30) }],
    ['hottestAllowed.unit', { ...bearing, hottestAllowed: { value: 100, unit: 'bar' } }],
  ])('%s', (field, request) => {
    expect(() => heatToAssemble(request as HeatToAssembleRequest)).toThrow(InputError);
    expect(() => heatToAssemble(request as HeatToAssembleRequest)).toThrow(
      expect.objectContaining({ field }),
    );
  });
});
