import type { FormulaRequest } from '@second-spanner/shared/contracts/measuring';
import { compressionRatio } from '@second-spanner/shared/measuring/compression-ratio';
import { cylinderTest } from '@second-spanner/shared/measuring/cylinder-test';
import { limitDecision } from '@second-spanner/shared/measuring/limit-decision';
import { plasticStrip } from '@second-spanner/shared/measuring/plastic-strip';
import { ringGap } from '@second-spanner/shared/measuring/ring-gap';
import { roundReadings } from '@second-spanner/shared/measuring/round-readings';
import { runningClearance } from '@second-spanner/shared/measuring/running-clearance';
import { sweptVolume } from '@second-spanner/shared/measuring/swept-volume';
import { twoReadings } from '@second-spanner/shared/measuring/two-readings';
import { convertRequest } from '@second-spanner/shared/quantities/convert-request';
import { defineCalculation } from './define-calculation.js';
import { bar, cubicCm, mm, newtonMetres, poundFeet } from './quantities-in.js';

const at = (height: string, axis: string, value: number) => ({ height, axis, value: mm(value) });
const bore = [at('top', 'along', 80.012), at('top', 'across', 80.018), at('bottom', 'along', 80.01)];

export const measuringCalculations = [
  defineCalculation({
    name: 'convert',
    summary: 'One figure in another unit of its kind.',
    ...{ request: 'ConvertRequest', answer: 'ConvertAnswer', calculate: convertRequest },
    example: { quantity: poundFeet(27), to: 'N·m' },
  }),
  defineCalculation({
    name: 'limit-decision',
    summary: 'Whether a reading is inside its limits, with what the tool may be off taken into account.',
    ...{ request: 'LimitDecisionRequest', answer: 'LimitDecision', calculate: limitDecision },
    example: { value: mm(0.045), low: mm(0.025), high: mm(0.065), uncertainty: mm(0.003) },
  }),
  defineCalculation({
    name: 'two-readings',
    summary: 'Whether two readings of the same thing by two people agree, by their normalised error.',
    ...{ request: 'TwoReadingsRequest', answer: 'TwoReadings', calculate: twoReadings },
    example: {
      first: { value: newtonMetres(55), uncertainty: newtonMetres(1.1) },
      second: { value: newtonMetres(56), uncertainty: newtonMetres(1.2) },
    },
  }),
  defineCalculation({
    name: 'round-readings',
    summary:
      'Mean, ovality and taper of a bore, a journal or a shell from readings at several heights and axes.',
    ...{ request: 'RoundReadingsRequest', answer: 'RoundReadings', calculate: roundReadings },
    example: { of: 'bore', readings: bore, limits: { low: mm(80), high: mm(80.03) }, ovalityLimit: mm(0.02) },
  }),
  defineCalculation({
    name: 'running-clearance',
    summary:
      'The smallest, the mean and the greatest clearance between what was read of a hole and of its shaft.',
    ...{ request: 'RunningClearanceRequest', answer: 'RunningClearance', calculate: runningClearance },
    example: { hole: bore, shaft: [at('top', 'across', 79.962)], limits: { low: mm(0.04), high: mm(0.065) } },
  }),
  defineCalculation({
    name: 'ring-gap',
    summary: 'Whether a piston ring’s gap is wide enough for its bore, and what it closes by when hot.',
    ...{ request: 'RingGapRequest', answer: 'RingGap', calculate: ringGap },
    example: { bore: mm(80), gap: mm(0.36), perBore: { low: 0.004, high: 0.006 } },
  }),
  defineCalculation({
    name: 'plastic-strip',
    summary:
      'The clearance that a crushed strip of plastic stands for, by its volume: a check of the printed scale.',
    ...{ request: 'PlasticStripRequest', answer: 'PlasticStrip', calculate: plasticStrip },
    example: { diameter: mm(0.2), width: mm(0.7) },
  }),
  defineCalculation({
    name: 'formula',
    summary: 'A formula on named readings, such as a spec states it, worked out with its units.',
    ...{ request: 'FormulaRequest', answer: 'FormulaAnswer' },
    // The arithmetic is large, and few ask for it: it is loaded when it is first needed.
    calculate: async (request: FormulaRequest) =>
      (await import('@second-spanner/shared/measuring/formula/formula')).formula(request),
    example: {
      formula: 'bore_min - journal_max',
      readings: { bore_min: mm(60.02), journal_max: mm(59.975) },
      unit: 'mm',
    },
  }),
  defineCalculation({
    name: 'swept-volume',
    summary: 'What the pistons sweep, of one cylinder and of all.',
    ...{ request: 'SweptVolumeRequest', answer: 'SweptVolume', calculate: sweptVolume },
    example: { bore: mm(80), stroke: mm(90), cylinders: 4 },
  }),
  defineCalculation({
    name: 'compression-ratio',
    summary: 'The compression ratio from bore, stroke, chamber, gasket, deck and dish, and the squish.',
    ...{ request: 'CompressionRatioRequest', answer: 'CompressionRatio', calculate: compressionRatio },
    example: {
      ...{ bore: mm(80), stroke: mm(90), chamber: cubicCm(42), deck: mm(0.2) },
      gasket: { bore: mm(82), thickness: mm(1.1) },
    },
  }),
  defineCalculation({
    name: 'cylinder-test',
    summary: 'What compression or leak-down readings of all cylinders say of rings, valves and gasket.',
    ...{ request: 'CylinderTestRequest', answer: 'CylinderTest', calculate: cylinderTest },
    example: {
      test: 'compression',
      readings: [11.2, 11, 8.1, 11.4].map((value, index) => ({ cylinder: index + 1, dry: bar(value) })),
    },
  }),
];
