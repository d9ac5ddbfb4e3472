import { cure } from '@second-spanner/shared/curing/cure';
import { defineCalculation } from './define-calculation.js';
import { celsius, hours } from './quantities-in.js';

export const curingCalculations = [
  defineCalculation({
    name: 'cure',
    summary: 'When a compound may be loaded, from the points of its data sheet and how warm it was.',
    ...{ request: 'CureRequest', answer: 'Cure', calculate: cure },
    example: {
      sheet: [
        { temperature: celsius(10), toLoad: hours(6), full: hours(48) },
        { temperature: celsius(25), toLoad: hours(3), full: hours(24) },
      ],
      ...{ temperature: celsius(18), applied: '2026-12-01T08:00:00Z', now: '2026-12-01T10:00:00Z' },
    },
  }),
];
