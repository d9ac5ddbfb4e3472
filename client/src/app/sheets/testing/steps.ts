import type { EntryView, StepDetail } from '@second-spanner/shared/contracts/sheets';
import type { Tool } from '@second-spanner/shared/contracts/registers';
import type {
  CheckStep,
  MeasurementStep,
  StepDefinition,
  TighteningStepDefinition,
  ValveTimingStep,
  WiringStep,
} from '@second-spanner/shared/contracts/steps';

const base = {
  stage: 8,
  instruction: 'As the manual has it.',
  restsOn: [],
  hold: false,
  critical: false,
};

export const checkStep: CheckStep = { ...base, code: '8.3', title: 'Faces clean', kind: 'check' };

export const endFloat: MeasurementStep = {
  ...base,
  code: '3.14',
  stage: 3,
  title: 'Crankshaft {end float}',
  kind: 'measurement',
  method: 'dial-gauge',
  limits: { low: { value: 0.1, unit: 'mm' }, high: { value: 0.25, unit: 'mm' } },
  unit: 'mm',
  at: ['At the front'],
};

export const mainClearance: MeasurementStep = {
  ...endFloat,
  code: '3.4',
  title: 'Main bearing clearance',
  at: ['Main 1', 'Main 2', 'Main 3'],
};

/** Four nuts in two passes; the sequence is their own order. */
export const pumpNuts: TighteningStepDefinition = {
  ...base,
  code: '10.6',
  stage: 10,
  title: 'Tighten the water pump nuts',
  kind: 'tightening',
  group: {
    key: 'water-pump-nuts',
    name: 'water pump nuts',
    noun: 'nut',
    outline: 'circle',
    thread: { value: '3/8-24 UNF' },
    grade: { value: 'SAE 5' },
    condition: { value: 'dry' },
  },
  torque: { value: 36, unit: 'N·m' },
  plan: {
    fasteners: { pattern: 'circle', count: 4 },
    sequence: ['1', '2', '3', '4'],
    final: { value: 36, unit: 'N·m' },
    tolerance: { low: { value: 2, unit: 'N·m' }, high: { value: 2, unit: 'N·m' } },
    passes: [{ fraction: 0.5 }, { fraction: 1 }],
  },
};

export const wiring: WiringStep = {
  ...base,
  code: '11.13',
  stage: 11,
  title: 'Wiring map, as fitted',
  kind: 'wiring',
  cap: {
    firingOrder: [1, 3, 4, 2],
    rotation: 'anticlockwise',
    posts: [
      { post: '45', angle: 45 },
      { post: '135', angle: 135 },
      { post: '225', angle: 225 },
      { post: '315', angle: 315 },
    ],
    firstPost: '315',
    trace: { '45': 'C', '135': 'D', '225': 'A', '315': 'B' },
  },
  outletsAt: 'side',
  valveTiming: { ivo: 16, ivc: 56, evo: 51, evc: 21 },
  advance: 10,
};

export const whichTdcStep: ValveTimingStep = {
  ...base,
  code: '11.1',
  stage: 11,
  title: 'Cylinder 1 at compression TDC',
  kind: 'valve-timing',
  firingOrder: [1, 3, 4, 2],
  valveTiming: { ivo: 16, ivc: 56, evo: 51, evc: 21 },
  cylinder: 1,
  wanted: 'compression-tdc',
};

export const dialGauge: Tool = {
  id: 'gauge',
  code: 'T-04',
  name: 'Dial gauge',
  kind: 'dial-gauge',
  low: { value: 0, unit: 'mm' },
  high: { value: 10, unit: 'mm' },
  resolution: { value: 0.01, unit: 'mm' },
  uncertainty: { value: 0.01, unit: 'mm' },
  calibrationDue: '2999-01-01',
};

export const digitalWrench: Tool = {
  id: 'digital',
  code: 'T-07',
  name: 'Digital wrench',
  kind: 'digital-wrench',
  low: { value: 5, unit: 'N·m' },
  high: { value: 200, unit: 'N·m' },
  resolution: { value: 0.1, unit: 'N·m' },
  uncertaintyShare: 0.02,
  length: { value: 300, unit: 'mm' },
  calibrationDue: '2999-01-01',
};

export const clickWrench: Tool = {
  ...digitalWrench,
  id: 'click',
  code: 'T-08',
  name: 'Click wrench',
  kind: 'click-wrench',
};

const builder = { id: 'builder', name: 'Tomasz Brandt', role: 'builder' } as const;

export function entryOf(content: EntryView['content'], over: Partial<EntryView> = {}): EntryView {
  return {
    id: `entry-${JSON.stringify(content)}`,
    content,
    verdict: 'pass',
    reason: 'Within its limits.',
    by: builder,
    at: '2026-03-02T10:00:00Z',
    round: 1,
    replaces: null,
    replacedBy: null,
    replaceReason: null,
    current: true,
    ...over,
  };
}

/** A step as the api answers it, open to be worked. */
export function stepOf(definition: StepDefinition, over: Partial<StepDetail> = {}): StepDetail {
  return {
    sheetId: 'sheet',
    version: 1,
    code: definition.code,
    stage: definition.stage,
    kind: definition.kind,
    title: definition.title,
    status: 'open',
    hold: definition.hold,
    critical: definition.critical,
    secondCheck: definition.secondCheck ?? null,
    done: 0,
    of: 1,
    openSnags: 0,
    definition,
    round: 1,
    waitsFor: [],
    covered: false,
    entries: [],
    secondReadings: [],
    countersignatures: [],
    snags: [],
    calls: [],
    uncriticalReason: null,
    can: {
      record: true,
      readAgain: false,
      countersign: false,
      raiseSnag: true,
      unmarkCritical: false,
      call: false,
    },
    ...over,
  };
}
