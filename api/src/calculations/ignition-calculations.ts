import { capDiagnosis } from '@second-spanner/shared/ignition/cap-diagnosis';
import { capMap } from '@second-spanner/shared/ignition/cap-map';
import { dwell } from '@second-spanner/shared/ignition/dwell';
import { leadTest } from '@second-spanner/shared/ignition/lead-test';
import { rotorCheck } from '@second-spanner/shared/ignition/rotor-check';
import { timingMarks } from '@second-spanner/shared/ignition/timing-marks';
import { defineCalculation } from './define-calculation.js';
import { mm, ohms } from './quantities-in.js';

const cap = { firingOrder: [1, 3, 4, 2], rotation: 'anticlockwise' } as const;

export const ignitionCalculations = [
  defineCalculation({
    name: 'cap-map',
    summary:
      'Which cylinder each post of a distributor cap serves, from the firing order and the way the rotor turns.',
    ...{ request: 'CapMapRequest', answer: 'CapMap', example: cap, calculate: capMap },
  }),
  defineCalculation({
    name: 'cap-diagnosis',
    summary: 'What is wrong with the leads as they are fitted, and the fewest swaps that cure it.',
    ...{ request: 'CapDiagnosisRequest', answer: 'CapDiagnosis', calculate: capDiagnosis },
    example: { cap, fitted: { '1': 1, '2': 2, '3': 3, '4': 4 }, advance: 10 },
  }),
  defineCalculation({
    name: 'rotor-check',
    summary: 'Whether the rotor points where it should with the crank at its mark, and how far off it is.',
    ...{ request: 'RotorCheckRequest', answer: 'RotorCheck', calculate: rotorCheck },
    example: { cap, rotorAngle: 2, timing: { advance: 10 } },
  }),
  defineCalculation({
    name: 'lead-test',
    summary: 'Whether the resistance measured through a plug lead is that of a sound one.',
    ...{ request: 'LeadTestRequest', answer: 'LeadTest', calculate: leadTest },
    example: { reading: ohms(0.4), kind: 'wire-core', length: mm(600) },
  }),
  defineCalculation({
    name: 'timing-marks',
    summary: 'The arc on a pulley or damper for an angle of the crank, or the angle for an arc.',
    ...{ request: 'TimingMarksRequest', answer: 'TimingMarks', calculate: timingMarks },
    example: { diameter: mm(140), angle: 10 },
  }),
  defineCalculation({
    name: 'dwell',
    summary: 'How long the points stay closed and open, in degrees and in time.',
    ...{ request: 'DwellRequest', answer: 'Dwell', calculate: dwell },
    example: { cylinders: 4, dwell: 60, crankSpeed: 3000 },
  }),
];
