import type { EntryContent, SecondReadingContent } from '@second-spanner/shared/contracts/steps';
import type { SmallSheet } from './small-sheet.js';

type Tools = SmallSheet['tools'];

/** What is recorded on the small sheet's steps, and what the second person reads. */
export const scenes = {
  check: (outcome: 'pass' | 'fail' = 'pass'): EntryContent => ({ kind: 'check', outcome }),

  clearance: (tools: Tools, at: string, value: number): EntryContent => ({
    ...{ kind: 'measurement', at, toolId: tools['T-02'] },
    value: { value, unit: 'mm' },
  }),

  clearanceAgain: (tools: Tools, first: number, second: number): SecondReadingContent => ({
    ...{ kind: 'measured-again', toolId: tools['T-03'] },
    readings: [
      { at: 'Main 1', value: { value: first, unit: 'mm' } },
      { at: 'Main 2', value: { value: second, unit: 'mm' } },
    ],
  }),

  pull: (tools: Tools, pass: number, fastener: string, setting: number): EntryContent => ({
    ...{ kind: 'tightening', pass, fastener, toolId: tools['T-07'] },
    setting: { value: setting, unit: 'N·m' },
  }),

  settingSeen: (tools: Tools, setting: number): SecondReadingContent => ({
    ...{ kind: 'setting-and-pull-witnessed', toolId: tools['T-07'] },
    setting: { value: setting, unit: 'N·m' },
  }),

  // Order 1-3-4-2, anticlockwise, posts 1 to 4 clockwise: post 1, then 4, 3, 2. Common practice, no source.
  leads: { '1': 1, '4': 3, '3': 4, '2': 2 },
  // 3 and 4 exchanged, as 1-4-3-2 would be.
  leadsWrong: { '1': 1, '4': 4, '3': 3, '2': 2 },

  // No. 1 at the top, both valves shut, the exhaust opening next: compression. Common practice, no source.
  sightings: {
    about: 0,
    sightings: [
      [{ cylinder: 1, piston: 'top', inlet: 'shut', exhaust: 'shut' }],
      [{ cylinder: 1, exhaust: 'opening' }],
    ],
  },
} as const;
