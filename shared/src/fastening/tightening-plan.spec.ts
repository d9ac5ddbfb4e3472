import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { FastenerLayout, TighteningPass, TighteningPlanRequest } from '../contracts/calculations.js';
import { InputError } from '../contracts/input-error.js';
import type { Quantity, Unit } from '../contracts/quantity.js';
import { tighteningPlan } from './tightening-plan.js';

const torque = (value: number, unit: Unit = 'N·m'): Quantity => ({ value, unit });
const head: FastenerLayout = { pattern: 'grid', rows: 2, columns: 5 };
const pump: FastenerLayout = { pattern: 'circle', count: 4 };
// common practice, no source: 27 lbf·ft on a water pump's studs.
const studs = torque(27, 'lbf·ft');

function plan(more: Partial<TighteningPlanRequest> = {}) {
  return tighteningPlan({ fasteners: pump, final: studs, passes: [{ fraction: 1 }], ...more });
}

describe('the passes of a plan', () => {
  it.each([
    // T4-144, CRISS: three passes of a third, two thirds and all.
    [
      [1 / 3, 2 / 3, 1],
      [9, 18, 27],
    ],
    // T4-145, PASS: a gasket maker's guidance, 30, 60 and 100 %.
    [
      [0.3, 0.6, 1],
      [8.1, 16.2, 27],
    ],
  ])('by fractions %o of 27 lbf·ft', (fractions, expected) => {
    const { steps, sequence } = plan({ passes: fractions.map((fraction) => ({ fraction })) });
    expected.forEach((value, i) => {
      const pass = steps.filter((step) => step.pass === i + 1);
      expect(pass.map((step) => step.fastener)).toEqual(sequence);
      expect(pass.map((step) => step.order)).toEqual([1, 2, 3, 4]);
      for (const { target } of pass) {
        expect(target?.unit).toBe('lbf·ft');
        expect(target?.value).toBeCloseTo(value, 9);
      }
    });
  });

  it('by torques, then angles, need no final torque', () => {
    // T4-142, CHG: cylinder head data, 20 and 40 N·m, then 60° and 80°, 140° in all.
    const passes = [{ torque: torque(20) }, { torque: torque(40) }, { angle: 60 }, { angle: 80 }];
    const { steps, verdict } = tighteningPlan({ fasteners: head, passes });
    expect(verdict).toBe('pass');
    expect(steps.filter((step) => step.fastener === '3')).toEqual([
      { pass: 1, order: 1, fastener: '3', target: torque(20) },
      { pass: 2, order: 1, fastener: '3', target: torque(40) },
      { pass: 3, order: 1, fastener: '3', angle: 60 },
      { pass: 4, order: 1, fastener: '3', angle: 80 },
    ]);
  });

  it('carry the tolerance on full torque and on check passes only', () => {
    const passes: TighteningPass[] = [
      { fraction: 0.5 },
      { torque: torque(50) },
      { fraction: 1 },
      { torque: torque(55) },
      { check: true },
      { angle: 5 },
    ];
    const tolerance = { low: torque(2), high: torque(3) };
    const { steps } = plan({ final: torque(55), tolerance, passes });
    const band = { target: torque(55), low: torque(53), high: torque(58) };
    expect(
      steps.filter(({ order }) => order === 1).map(({ target, low, high }) => ({ target, low, high })),
    ).toEqual([{ target: torque(27.5) }, { target: torque(50) }, band, band, band, {}]);
  });

  it('are in the unit asked for, in any of its spellings, limits too', () => {
    const { steps } = plan({
      tolerance: { low: torque(2, 'lbf·ft'), high: torque(24, 'lbf·in') },
      unit: 'Nm',
    });
    // NIST SP 811 App. B: 1 lbf·ft is 1.355 817 948 331 400 4 N·m; 24 lbf·in are 2 lbf·ft by definition.
    const newtonMetres = 1.3558179483314004;
    const [{ target, low, high } = {}] = steps;
    expect([target?.unit, low?.unit, high?.unit]).toEqual(['N·m', 'N·m', 'N·m']);
    expect(target?.value).toBeCloseTo(27 * newtonMetres, 9);
    expect(low?.value).toBeCloseTo(25 * newtonMetres, 9);
    expect(high?.value).toBeCloseTo(29 * newtonMetres, 9);
  });

  it('keep the unit of each torque where none is asked for', () => {
    const passes = [{ torque: torque(12, 'lbf·ft') }, { fraction: 1 }];
    const units = plan({ final: torque(30), passes }).steps.map(({ target }) => target?.unit);
    expect(new Set(units.slice(0, 4))).toEqual(new Set(['lbf·ft']));
    expect(new Set(units.slice(4))).toEqual(new Set(['N·m']));
  });

  it('go by each fastener where the group mixes sizes', () => {
    const finals = { 1: torque(40), 2: torque(20), 3: torque(40), 4: torque(20) };
    const tolerance = { low: torque(1), high: torque(1) };
    const passes = [{ torque: torque(20) }, { fraction: 1 }];
    const { steps, reason } = tighteningPlan({ fasteners: pump, finals, tolerance, passes });
    const find = (pass: number, fastener: string) =>
      steps.find((step) => step.pass === pass && step.fastener === fastener);
    expect(find(1, '1')).toEqual({ pass: 1, order: 1, fastener: '1', target: torque(20) });
    expect(find(1, '2')).toMatchObject({ target: torque(20), low: torque(19), high: torque(21) });
    expect(find(2, '3')).toMatchObject({ target: torque(40), low: torque(39), high: torque(41) });
    expect(reason).toContain('20\u2009N·m up to 40\u2009N·m');
  });
});

describe('whose sequence it is', () => {
  it('is general practice where none is given, and says so', () => {
    const { basis, verdict, reason, sequence, loosening } = plan();
    expect([basis, verdict]).toEqual(['general-practice', 'pass']);
    expect(reason).toContain('General practice');
    expect(reason).toContain("not the maker's");
    // The star pattern of ASME PCC-1 (from memory), and backwards.
    expect(sequence).toEqual(['1', '3', '2', '4']);
    expect(loosening).toEqual(['4', '2', '3', '1']);
  });

  it("is the maker's where one is given, and wins", () => {
    const sequence = ['8', '3', '7', '2', '4', '9', '10', '1', '6', '5'];
    const given = plan({ fasteners: head, sequence });
    expect([given.basis, given.verdict]).toEqual(['maker', 'pass']);
    expect(given.sequence).toEqual(sequence);
    expect(given.loosening).toEqual([...sequence].reverse());
    expect(given.steps.map((step) => step.fastener)).toEqual(sequence);
    expect(given.reason).toContain("maker's");
  });

  it('is doubtful where it begins at an edge, and names the fastener', () => {
    const sequence = ['1', '2', '3', '4', '5', '6', '7', '8', '9', '10'];
    const { verdict, reason, basis } = plan({ fasteners: head, sequence });
    expect([verdict, basis]).toEqual(['doubtful', 'maker']);
    expect(reason).toContain('begins at an edge, with fastener 1');
  });

  it('is not doubted for where it begins on a circle', () => {
    expect(plan({ sequence: ['4', '2', '1', '3'] }).verdict).toBe('pass');
  });
});

describe('plans that contradict themselves are doubtful', () => {
  it.each([
    [
      'a pass lower than the one before',
      [{ fraction: 0.6 }, { fraction: 0.3 }, { fraction: 1 }],
      'Pass 2 is lower',
    ],
    ['a check before a lower pass', [{ check: true }, { torque: torque(10, 'lbf·ft') }], 'Pass 2 is lower'],
    ['no pass to the final torque', [{ fraction: 0.3 }, { fraction: 0.6 }], 'No pass brings'],
  ] as const)('%s', (_, passes, words) => {
    const { verdict, reason } = plan({ passes });
    expect(verdict).toBe('doubtful');
    expect(reason).toContain(words);
  });

  it('but not where an angle brings them there', () => {
    expect(plan({ passes: [{ fraction: 0.5 }, { angle: 90 }] }).verdict).toBe('pass');
  });
});

describe('input that cannot be used', () => {
  const good = { fasteners: pump, final: studs, passes: [{ fraction: 1 }] };
  const at = (fastener: string, x: unknown, y: unknown) => ({ fastener, x, y });
  const twoSizes = { 1: studs, 2: studs, 3: studs };
  const tolerance = { low: torque(2), high: torque(2) };

  it.each([
    ['request', null],
    ['fasteners', { ...good, fasteners: [] }],
    ['fasteners', { ...good, fasteners: { ...pump, positions: [at('1', 0, 0)] } }],
    ['fasteners.pattern', { ...good, fasteners: { pattern: 'spiral' } }],
    ['fasteners.rows', { ...good, fasteners: { pattern: 'grid', rows: 0, columns: 5 } }],
    ['fasteners.rows', { ...good, fasteners: { pattern: 'grid', rows: 100, columns: 100 } }],
    ['fasteners.columns', { ...good, fasteners: { pattern: 'grid', rows: 2, columns: 2.5 } }],
    ['fasteners.count', { ...good, fasteners: { pattern: 'circle' } }],
    ['fasteners.count', { ...good, fasteners: { pattern: 'line', count: 1e9 } }],
    ['fasteners.count', { ...good, fasteners: { pattern: 'line', count: NaN } }],
    ['fasteners.positions', { ...good, fasteners: { positions: [] } }],
    ['fasteners.positions[1]', { ...good, fasteners: { positions: [at('a', 0, 0), at('b', 0, 0)] } }],
    [
      'fasteners.positions[1].fastener',
      { ...good, fasteners: { positions: [at('a', 0, 0), at('a', 1, 0)] } },
    ],
    ['fasteners.positions[0].x', { ...good, fasteners: { positions: [at('a', NaN, 0)] } }],
    ['fasteners.positions[0].y', { ...good, fasteners: { positions: [at('a', 0, '0')] } }],
    ['sequence', { ...good, sequence: [] }],
    ['sequence', { ...good, sequence: ['1', '2', '3'] }],
    ['sequence[3]', { ...good, sequence: ['1', '2', '3', '5'] }],
    ['sequence[3]', { ...good, sequence: ['1', '2', '3', '3'] }],
    ['sequence[0]', { ...good, sequence: [1, 2, 3, 4] }],
    ['final', { fasteners: pump, passes: [{ fraction: 1 }] }],
    ['final', { fasteners: pump, passes: [{ check: true }] }],
    ['final', { fasteners: pump, tolerance, passes: [{ torque: studs }] }],
    ['final.value', { ...good, final: torque(0) }],
    ['final.value', { ...good, final: torque(-27) }],
    ['final.unit', { ...good, final: torque(27, 'mm') }],
    ['finals', { ...good, finals: { ...twoSizes, 4: studs } }],
    ['finals.4', { ...good, final: undefined, finals: twoSizes }],
    ['finals.5', { ...good, final: undefined, finals: { ...twoSizes, 5: studs } }],
    ['finals.2.value', { ...good, final: undefined, finals: { ...twoSizes, 2: torque(-1), 4: studs } }],
    ['tolerance', { ...good, tolerance: 2 }],
    ['tolerance.low', { ...good, tolerance: { ...tolerance, low: torque(27, 'lbf·ft') } }],
    ['tolerance.low.value', { ...good, tolerance: { ...tolerance, low: torque(-2) } }],
    ['tolerance.high', { ...good, tolerance: { low: torque(2) } }],
    ['passes', { ...good, passes: [] }],
    ['passes', { ...good, passes: Array.from({ length: 21 }, () => ({ fraction: 1 })) }],
    ['passes[1]', { ...good, passes: [{ fraction: 0.5 }, {}] }],
    ['passes[1]', { ...good, passes: [{ fraction: 0.5 }, { fraction: 1, angle: 90 }] }],
    ['passes[2].fraction', { ...good, passes: [{ fraction: 0.3 }, { fraction: 0.6 }, { fraction: 1.2 }] }],
    ['passes[0].fraction', { ...good, passes: [{ fraction: 0 }] }],
    ['passes[0].fraction', { ...good, passes: [{ fraction: NaN }] }],
    ['passes[0].torque', { ...good, passes: [{ torque: torque(28, 'lbf·ft') }] }],
    ['passes[0].torque.unit', { ...good, passes: [{ torque: torque(20, 'psi') }] }],
    ['passes[0].angle', { ...good, passes: [{ angle: 90 }] }],
    ['passes[1].angle', { ...good, passes: [{ fraction: 1 }, { angle: 0 }] }],
    ['passes[1].angle', { ...good, passes: [{ fraction: 1 }, { angle: 3600 }] }],
    ['passes[0].check', { ...good, passes: [{ check: false }] }],
    ['unit', { ...good, unit: 'bar' }],
    ['unit', { ...good, unit: 'heave' }],
  ])('%s', (field, request) => {
    expect(() => tighteningPlan(request as TighteningPlanRequest)).toThrow(InputError);
    expect(() => tighteningPlan(request as TighteningPlanRequest)).toThrow(
      expect.objectContaining({ field }),
    );
  });

  it('takes twenty passes', () => {
    const passes = Array.from({ length: 20 }, (_, i) => ({ fraction: (i + 1) / 20 }));
    expect(plan({ passes }).steps).toHaveLength(80);
  });
});

describe('properties', () => {
  const anyLayout: fc.Arbitrary<FastenerLayout> = fc.oneof(
    fc.record({
      pattern: fc.constant('grid' as const),
      rows: fc.integer({ min: 1, max: 8 }),
      columns: fc.integer({ min: 1, max: 12 }),
    }),
    fc.record({
      pattern: fc.constantFrom('circle' as const, 'line' as const),
      count: fc.integer({ min: 1, max: 60 }),
    }),
    fc
      .uniqueArray(fc.tuple(fc.integer({ min: 0, max: 30 }), fc.integer({ min: 0, max: 30 })), {
        minLength: 1,
        maxLength: 30,
        selector: String,
      })
      .map((places) => ({ positions: places.map(([x, y], i) => ({ fastener: `stud ${i}`, x, y })) })),
  );

  function namesOf(layout: FastenerLayout): string[] {
    if ('positions' in layout) return layout.positions.map(({ fastener }) => fastener);
    const count = layout.pattern === 'grid' ? layout.rows * layout.columns : layout.count;
    return Array.from({ length: count }, (_, i) => `${i + 1}`);
  }

  it('every plan takes each fastener once in each pass, and loosens them backwards', () => {
    const passes = [{ fraction: 0.5 }, { fraction: 1 }, { check: true }] as const;
    fc.assert(
      fc.property(anyLayout, fc.boolean(), (fasteners, isGiven) => {
        const names = namesOf(fasteners);
        const given = isGiven ? { sequence: [...names].reverse() } : {};
        const { sequence, loosening, steps, basis } = tighteningPlan({
          fasteners,
          final: studs,
          passes,
          ...given,
        });
        expect([...sequence].sort()).toEqual([...names].sort());
        expect(loosening).toEqual([...sequence].reverse());
        expect(basis).toBe(isGiven ? 'maker' : 'general-practice');
        expect(steps.map((step) => `${step.pass} ${step.order} ${step.fastener}`)).toEqual(
          [1, 2, 3].flatMap((pass) => sequence.map((fastener, i) => `${pass} ${i + 1} ${fastener}`)),
        );
      }),
    );
  });

  it('general practice never begins at an edge where there is a middle to begin at', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 8 }), fc.integer({ min: 3, max: 12 }), (rows, columns) => {
        const fasteners = { pattern: 'grid', rows, columns } as const;
        const { sequence } = tighteningPlan({ fasteners, final: studs, passes: [{ fraction: 1 }] });
        const again = tighteningPlan({ fasteners, final: studs, passes: [{ fraction: 1 }], sequence });
        expect(again.verdict).toBe('pass');
      }),
    );
  });
});
