import { compareParts } from '@second-spanner/shared/fits/compare-parts';
import { fit } from '@second-spanner/shared/fits/fit';
import { heatToAssemble } from '@second-spanner/shared/fits/heat-to-assemble';
import { keyFit } from '@second-spanner/shared/fits/key-fit';
import { defineCalculation } from './define-calculation.js';
import { celsius, mm } from './quantities-in.js';

export const fitCalculations = [
  defineCalculation({
    name: 'fit',
    summary:
      'The least and the most play between a hole and a shaft, by their limits or their ISO 286 classes.',
    ...{ request: 'FitRequest', answer: 'Fit', calculate: fit },
    example: { hole: { size: mm(40), class: 'H7' }, shaft: { size: mm(40), class: 'p6' } },
  }),
  defineCalculation({
    name: 'key-fit',
    summary: 'Whether a key fits the keyways of its shaft and its hub.',
    ...{ request: 'KeyFitRequest', answer: 'KeyFit', calculate: keyFit },
    example: {
      key: { width: mm(7.99), height: mm(6.98) },
      shaftKeyway: { width: mm(8.01), depth: mm(4.05) },
      hubKeyway: { width: mm(8.05), depth: mm(3.35) },
    },
  }),
  defineCalculation({
    name: 'heat-to-assemble',
    summary: 'How hot a hub, or how cold a shaft, must be for an interference fit to go together.',
    ...{ request: 'HeatToAssembleRequest', answer: 'HeatToAssemble', calculate: heatToAssemble },
    example: {
      ...{ diameter: mm(40), interference: mm(0.04), clearance: mm(0.02), room: celsius(20) },
      ...{ hub: 'steel', shaft: 'steel', by: 'heating-hub', hottestAllowed: celsius(250) },
    },
  }),
  defineCalculation({
    name: 'compare-parts',
    summary:
      'Two makers’ parts held side by side, dimension by dimension, and whether the other fits where it goes.',
    ...{ request: 'ComparePartsRequest', answer: 'CompareParts', calculate: compareParts },
    example: {
      original: { name: 'Original', dimensions: { bore: { low: mm(25), high: mm(25.021) } } },
      other: { name: 'Pattern part', dimensions: { bore: { low: mm(25.01), high: mm(25.03) } } },
    },
  }),
];
