import { describe, expect, it } from 'vitest';
import type { Tool } from '../contracts/registers.js';
import type { EntryContent, TighteningStepDefinition } from '../contracts/steps.js';
import { judgeEntry } from './judge-entry.js';
import { requiredSetting } from './judge-tightening.js';

const wrench: Tool = {
  id: 'click',
  code: 'T-03',
  name: 'Click wrench',
  kind: 'click-wrench',
  low: { value: 10, unit: 'lbf·ft' },
  high: { value: 80, unit: 'lbf·ft' },
  resolution: { value: 0.5, unit: 'lbf·ft' },
  uncertaintyShare: 0.02,
  length: { value: 12, unit: 'in' },
  calibrationDue: '2027-01-31',
};
const digital: Tool = { ...wrench, id: 'digital', code: 'T-07', kind: 'digital-wrench' };
const feeler: Tool = { ...wrench, id: 'feeler', code: 'T-21', kind: 'feeler-set' };
const context = { tools: [wrench, digital, feeler], on: '2026-12-01' };

const pump: TighteningStepDefinition = {
  code: '10.4',
  stage: 10,
  title: 'Tighten the water pump',
  instruction: '',
  restsOn: [],
  hold: false,
  critical: true,
  secondCheck: 'setting-and-pull-witnessed',
  kind: 'tightening',
  group: {
    key: 'water-pump',
    name: 'water pump nuts',
    noun: 'nut',
    outline: 'circle',
    thread: { value: '3/8-16 UNC' },
    grade: { value: 'SAE 5' },
    condition: { value: 'dry' },
  },
  torque: { value: 27, unit: 'lbf·ft' },
  plan: {
    fasteners: { pattern: 'circle', count: 4 },
    final: { value: 27, unit: 'lbf·ft' },
    tolerance: { low: { value: 2, unit: 'lbf·ft' }, high: { value: 2, unit: 'lbf·ft' } },
    passes: [{ fraction: 0.5 }, { fraction: 1 }],
  },
};

const pull = (more: Partial<Extract<EntryContent, { kind: 'tightening' }>>): EntryContent => ({
  kind: 'tightening',
  pass: 2,
  fastener: '1',
  toolId: 'click',
  ...more,
});

describe('a pull with a click wrench', () => {
  it('is judged by its setting: 27 lbf·ft on the studs of a water pump', () => {
    // 27 lbf·ft on a water pump's studs: common practice, no source.
    expect(judgeEntry(pump, pull({ setting: { value: 27, unit: 'lbf·ft' } }), context).verdict).toBe('pass');
    expect(judgeEntry(pump, pull({ setting: { value: 36.6, unit: 'N·m' } }), context).verdict).toBe('pass');
    const wrong = judgeEntry(pump, pull({ setting: { value: 24, unit: 'lbf·ft' } }), context);
    expect(wrong.verdict).toBe('fail');
    expect(wrong.reason).toContain('27');
  });

  it('allows for an adapter in line: 27 lbf·ft, a 12 in wrench, a 1.5 in crow-foot, sets to 24', () => {
    // T·L/(L + E): 27·12/13.5 = 24, the usual crow-foot formula, common practice.
    const adapter = { length: { value: 1.5, unit: 'in' }, angle: 0 } as const;
    expect(requiredSetting(pump.torque, wrench, adapter).value).toBeCloseTo(24, 9);
    const set = (value: number) => pull({ adapter, setting: { value, unit: 'lbf·ft' } });
    expect(judgeEntry(pump, set(24), context).verdict).toBe('pass');
    expect(judgeEntry(pump, set(27), context).verdict).toBe('fail');
  });

  it('fails a setting past the wrench, and asks whether a point is missing', () => {
    const judged = judgeEntry(pump, pull({ setting: { value: 270, unit: 'lbf·ft' } }), context);
    expect(judged.verdict).toBe('fail');
    expect(judged.reason).toMatch(/range of T-03.*point/);
  });
});

describe('a pull with a digital wrench', () => {
  const shown = (value: number, pass = 2) =>
    pull({ toolId: 'digital', pass, reading: { value, unit: 'lbf·ft' } });

  it('is judged by its reading against the limits, less the uncertainty of the wrench', () => {
    expect(judgeEntry(pump, shown(27.4), context).verdict).toBe('pass');
    expect(judgeEntry(pump, shown(28.8), context).verdict).toBe('doubtful');
    expect(judgeEntry(pump, shown(31), context).verdict).toBe('fail');
  });

  it('is judged by the allowance of the wrench on a pass without limits', () => {
    // ISO 6789-1:2017, permissible deviation ±4 % (from memory): 13.5 ± 0.54.
    expect(judgeEntry(pump, shown(13.9, 1), context).verdict).toBe('pass');
    expect(judgeEntry(pump, shown(15, 1), context).verdict).toBe('fail');
  });
});

describe('what cannot be judged', () => {
  it('names the field', () => {
    expect(() => judgeEntry(pump, pull({ fastener: '9' }), context)).toThrow(/no nut 9/);
    expect(() => judgeEntry(pump, pull({ toolId: 'feeler' }), context)).toThrow(/not a torque wrench/);
    expect(() => judgeEntry(pump, pull({}), context)).toThrow(
      expect.objectContaining({ field: 'content.setting' }) as Error,
    );
  });
});
