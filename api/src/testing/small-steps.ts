import type { StepDefinition } from '@second-spanner/shared/contracts/steps';

const critical = { critical: true, hold: false } as const;
const plain = { critical: false, hold: false } as const;

/** One step of each kind. Figures are invented; what is asserted of them is named where it is asserted. */
export const smallSteps: readonly StepDefinition[] = [
  {
    ...{ code: '1.1', stage: 1, kind: 'check', title: 'Shells dry', instruction: 'Wipe them.', restsOn: [] },
    ...plain,
  },
  {
    ...{ code: '1.2', stage: 1, kind: 'measurement', title: 'Main clearance', instruction: 'Read it.' },
    ...{ restsOn: ['1.1'], method: 'bore-gauge', unit: 'mm', at: ['Main 1', 'Main 2'] },
    limits: { low: { value: 0.025, unit: 'mm' }, high: { value: 0.065, unit: 'mm' } },
    ...{ ...critical, secondCheck: 'measured-again' },
  },
  {
    ...{ code: '1.3', stage: 1, kind: 'tightening', title: 'Main cap nuts', instruction: 'Pull them.' },
    restsOn: ['1.2'],
    group: {
      ...{ key: 'mains', name: 'main cap nuts', noun: 'nut', outline: 'plain' },
      ...{ thread: { value: 'M10x1.5' }, grade: { value: '10.9' }, condition: { value: 'oiled' } },
    },
    plan: {
      fasteners: { pattern: 'line', count: 2 },
      final: { value: 55, unit: 'N·m' },
      tolerance: { low: { value: 4, unit: 'N·m' }, high: { value: 4, unit: 'N·m' } },
      passes: [{ torque: { value: 30, unit: 'N·m' } }, { fraction: 1 }],
    },
    torque: { value: 55, unit: 'N·m' },
    ...{ critical: true, hold: true, secondCheck: 'setting-and-pull-witnessed' },
  },
  {
    ...{ code: '2.1', stage: 2, kind: 'wiring', title: 'Wiring map, as fitted', instruction: 'Say it.' },
    restsOn: [],
    cap: { firingOrder: [1, 3, 4, 2], rotation: 'anticlockwise' },
    ...{ outletsAt: 'top', advance: 8, valveTiming: { ivo: 12, ivc: 52, evo: 52, evc: 12 } },
    ...{ ...critical, secondCheck: 'read-again' },
  },
  {
    ...{ code: '2.2', stage: 2, kind: 'valve-timing', title: 'Compression TDC', instruction: 'Look.' },
    restsOn: [],
    ...{ firingOrder: [1, 3, 4, 2], cylinder: 1, wanted: 'compression-tdc' },
    valveTiming: { ivo: 12, ivc: 52, evo: 52, evc: 12 },
    ...{ ...critical, secondCheck: 'read-again' },
  },
  {
    ...{ code: '2.3', stage: 2, kind: 'check', title: 'Strap on', instruction: 'Look.', restsOn: [] },
    ...{ ...critical, secondCheck: 'inspected', lookFor: ['strap', 'bolt'] },
  },
  {
    ...{ code: '2.4', stage: 2, kind: 'photo', title: 'Marks', instruction: 'Photograph.', restsOn: [] },
    ...{ ...plain, shows: ['Timing marks'] },
  },
];
