import { threadFigures } from '@second-spanner/shared/fastening/thread-figures';
import { threadStack } from '@second-spanner/shared/fastening/thread-stack';
import { tighteningPlan } from '@second-spanner/shared/fastening/tightening-plan';
import { torqueDoubt } from '@second-spanner/shared/fastening/torque-doubt';
import { torqueReading } from '@second-spanner/shared/fastening/torque-reading';
import { wrenchSetting } from '@second-spanner/shared/fastening/wrench-setting';
import { wrenchSuits } from '@second-spanner/shared/fastening/wrench-suits';
import { defineCalculation } from './define-calculation.js';
import { mm, newtonMetres } from './quantities-in.js';

const tolerance = { low: newtonMetres(4), high: newtonMetres(4) };

export const fasteningCalculations = [
  defineCalculation({
    name: 'tightening-plan',
    summary:
      'The order and the passes that a set of fasteners is tightened in, with the limits of each pull.',
    ...{ request: 'TighteningPlanRequest', answer: 'TighteningPlan', calculate: tighteningPlan },
    example: {
      fasteners: { pattern: 'circle', count: 4 },
      final: newtonMetres(40),
      passes: [{ fraction: 0.5 }, { fraction: 1 }],
    },
  }),
  defineCalculation({
    name: 'wrench-setting',
    summary: 'What a wrench must be set to with an adapter or a crow-foot on it.',
    ...{ request: 'WrenchSettingRequest', answer: 'WrenchSetting', calculate: wrenchSetting },
    example: {
      ...{ torque: newtonMetres(40), wrenchLength: mm(350), adapterLength: mm(50), adapterAngle: 0 },
    },
  }),
  defineCalculation({
    name: 'torque-doubt',
    summary:
      'Whether a printed torque can be right for its thread and grade, by the share of the proof load it clamps with.',
    ...{ request: 'TorqueDoubtRequest', answer: 'TorqueDoubt', calculate: torqueDoubt },
    example: { torque: newtonMetres(45), thread: 'M10x1.5', grade: '8.8', condition: 'oiled' },
  }),
  defineCalculation({
    name: 'thread',
    summary: 'Diameter, pitch and tensile area of a metric, Unified or Whitworth-form thread.',
    ...{ request: 'ThreadFiguresRequest', answer: 'ThreadFigures', calculate: threadFigures },
    example: { thread: 'M10x1.5' },
  }),
  defineCalculation({
    name: 'thread-stack',
    summary: 'Whether a bolt is long enough for its nut or its tapped hole, and not too long.',
    ...{ request: 'ThreadStackRequest', answer: 'ThreadStack', calculate: threadStack },
    example: { thread: 'M10x1.5', boltLength: mm(60), grip: mm(45), into: { leastPitches: 1 } },
  }),
  defineCalculation({
    name: 'wrench-suits',
    summary: 'Whether a wrench suits a torque: its range, its deviation, its resolution and its calibration.',
    ...{ request: 'WrenchSuitsRequest', answer: 'WrenchSuits', calculate: wrenchSuits },
    example: {
      ...{ torque: newtonMetres(55), tolerance },
      wrench: { kind: 'click', range: { low: newtonMetres(10), high: newtonMetres(100) } },
    },
  }),
  defineCalculation({
    name: 'torque-reading',
    summary: 'Whether a pull is within the limits of its torque, by what the wrench was set to or showed.',
    ...{ request: 'TorqueReadingRequest', answer: 'TorqueReading', calculate: torqueReading },
    example: {
      ...{ torque: newtonMetres(55), tolerance, reading: newtonMetres(56) },
      wrench: { kind: 'digital', deviation: 0.02 },
    },
  }),
];
