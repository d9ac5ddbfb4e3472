import { beltAlignment } from '@second-spanner/shared/belt-drive/belt-alignment';
import { beltLength } from '@second-spanner/shared/belt-drive/belt-length';
import { beltLine } from '@second-spanner/shared/belt-drive/belt-line';
import { beltTension } from '@second-spanner/shared/belt-drive/belt-tension';
import { defineCalculation } from './define-calculation.js';
import { mm } from './quantities-in.js';

const gaps = { driverNear: mm(0), driverFar: mm(0), drivenNear: mm(1.2), drivenFar: mm(1.6) };
const open = { driverDiameter: mm(150), drivenDiameter: mm(110), centres: mm(300) };

export const beltCalculations = [
  defineCalculation({
    name: 'belt-alignment',
    summary: 'How far two pulleys are out of one plane, sideways and by angle, from gaps to a straight edge.',
    ...{ request: 'BeltAlignmentRequest', answer: 'BeltAlignment', calculate: beltAlignment },
    example: { span: mm(300), gaps, driverDiameter: mm(150), drivenDiameter: mm(110) },
  }),
  defineCalculation({
    name: 'belt-line',
    summary:
      'One or two driven pulleys against their driver: what is out, run-out apart from tilt, and how to cure it.',
    ...{ request: 'BeltLineRequest', answer: 'BeltLine', calculate: beltLine },
    example: {
      driver: { name: 'Crank', diameter: mm(150) },
      driven: [{ name: 'Dynamo', diameter: mm(110), span: mm(300), gaps, shim: mm(0.5) }],
    },
  }),
  defineCalculation({
    name: 'belt-length',
    summary:
      'The length of an open belt, the ratio of the speeds, and how far the belt lies round each pulley.',
    ...{ request: 'BeltLengthRequest', answer: 'BeltLength', calculate: beltLength, example: open },
  }),
  defineCalculation({
    name: 'belt-tension',
    summary: 'How far a belt should give at mid-span, and whether what was measured is near enough.',
    ...{ request: 'BeltTensionRequest', answer: 'BeltTension', calculate: beltTension },
    example: { ...open, measured: mm(4.6) },
  }),
];
