import { describe, expect, it } from 'vitest';
import type { Tool } from '../contracts/registers.js';
import type { EntryContent, MeasurementStep, ValveTimingStep, WiringStep } from '../contracts/steps.js';
import { judgeEntry } from './judge-entry.js';

const base = { stage: 1, instruction: '', restsOn: [], hold: false, critical: true } as const;
const gauge: Tool = {
  id: 'gauge',
  code: 'T-04',
  name: 'Dial gauge',
  kind: 'dial-gauge',
  low: { value: 0, unit: 'mm' },
  high: { value: 10, unit: 'mm' },
  resolution: { value: 0.01, unit: 'mm' },
  uncertainty: { value: 0.012, unit: 'mm' },
  calibrationDue: '2027-03-14',
};
const context = { tools: [gauge], on: '2026-12-01' };

const endFloat: MeasurementStep = {
  ...base,
  code: '3.9',
  title: 'Crankshaft end float',
  kind: 'measurement',
  method: 'dial-gauge',
  limits: { low: { value: 0.1, unit: 'mm' }, high: { value: 0.25, unit: 'mm' } },
  unit: 'mm',
  at: ['Centre main'],
};
const read = (value: number, unit: 'mm' | 'in' = 'mm'): EntryContent => ({
  kind: 'measurement',
  at: 'Centre main',
  value: { value, unit },
  toolId: 'gauge',
});

describe('a measurement', () => {
  it('passes inside the guarded limits, is doubtful within the uncertainty of one, fails beyond it', () => {
    // Guard band of ISO 14253-1 (from memory): pass needs value ± U inside the limits.
    expect(judgeEntry(endFloat, read(0.17), context).verdict).toBe('pass');
    expect(judgeEntry(endFloat, read(0.245), context).verdict).toBe('doubtful');
    expect(judgeEntry(endFloat, read(0.3), context).verdict).toBe('fail');
  });

  it('takes a reading in inches against limits in millimetres', () => {
    // 1 in = 25.4 mm exactly (NIST SP 811, App. B): 0.007 in is 0.1778 mm.
    expect(judgeEntry(endFloat, read(0.007, 'in'), context).verdict).toBe('pass');
  });

  it('prints no digits that only floating point made', () => {
    // 1 thou = 0.001 in exactly: ±0.15 thou is ±0.00015 in.
    const inThou: Tool = {
      ...gauge,
      uncertainty: { value: 0.15, unit: 'thou' },
      resolution: { value: 0.1, unit: 'thou' },
    };
    const { reason } = judgeEntry(endFloat, read(0.007, 'in'), { ...context, tools: [inThou] });
    expect(reason).not.toMatch(/\d\.\d{7,}/);
  });

  it('fails a reading past the range of the tool and doubts one made past its calibration', () => {
    const past = judgeEntry(endFloat, read(17), context);
    expect(past.verdict).toBe('fail');
    expect(past.reason).toContain('outside the range of T-04');
    const late = judgeEntry(endFloat, read(0.17), { ...context, on: '2027-03-15' });
    expect(late.verdict).toBe('doubtful');
    expect(late.reason).toContain('2027-03-14');
  });

  it('refuses a place, a tool and a kind that the step does not have', () => {
    const elsewhere: EntryContent = {
      kind: 'measurement',
      at: 'Rear',
      value: { value: 1, unit: 'mm' },
      toolId: 'gauge',
    };
    expect(() => judgeEntry(endFloat, elsewhere, context)).toThrow(/Centre main/);
    expect(() => judgeEntry(endFloat, read(0.17), { ...context, tools: [] })).toThrow(/register/);
    expect(() => judgeEntry(endFloat, { kind: 'check', outcome: 'pass' }, context)).toThrow(/measurement/);
  });
});

describe('wiring', () => {
  const wiring: WiringStep = {
    ...base,
    code: '11.8',
    title: 'Leads on the cap',
    kind: 'wiring',
    outletsAt: 'top',
    advance: 10,
    valveTiming: { ivo: 16, ivc: 56, evo: 51, evc: 21 },
    cap: { firingOrder: [1, 3, 4, 2], rotation: 'anticlockwise' },
  };

  it('passes only when right', () => {
    // Common practice, no source: 1-3-4-2 met by a rotor that turns anticlockwise runs 1, 2, 4, 3 clockwise.
    const right = { kind: 'wiring', fitted: { '1': 1, '2': 2, '3': 4, '4': 3 } } as const;
    const swapped = { kind: 'wiring', fitted: { '1': 1, '2': 2, '3': 3, '4': 4 } } as const;
    expect(judgeEntry(wiring, right, context).verdict).toBe('pass');
    expect(judgeEntry(wiring, swapped, context).verdict).toBe('fail');
  });
});

describe('valve timing', () => {
  const tdc: ValveTimingStep = {
    ...base,
    code: '11.1',
    title: 'No. 1 on compression',
    kind: 'valve-timing',
    firingOrder: [1, 3, 4, 2],
    valveTiming: { ivo: 16, ivc: 56, evo: 51, evc: 21 },
    cylinder: 1,
    wanted: 'compression-tdc',
  };
  const at = (rocking: number): EntryContent => ({
    kind: 'valve-timing',
    sightings: [
      [
        { cylinder: 1, piston: 'top' },
        { cylinder: rocking, rocking: true },
      ],
    ],
  });

  it('passes on the TDC that the step wants, fails on the other, doubts what cannot be told', () => {
    // Common practice, no source: on a four, No. 4's valves rock while No. 1 is on compression.
    expect(judgeEntry(tdc, at(4), context).verdict).toBe('pass');
    expect(judgeEntry(tdc, at(1), context).verdict).toBe('fail');
    const top: EntryContent = { kind: 'valve-timing', sightings: [[{ cylinder: 1, piston: 'top' }]] };
    expect(judgeEntry(tdc, top, context).verdict).toBe('doubtful');
  });
});
