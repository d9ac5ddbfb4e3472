import { beltCalculations } from './belt-calculations.js';
import { curingCalculations } from './curing-calculations.js';
import type { Calculation } from './define-calculation.js';
import { fasteningCalculations } from './fastening-calculations.js';
import { fitCalculations } from './fit-calculations.js';
import { ignitionCalculations } from './ignition-calculations.js';
import { measuringCalculations } from './measuring-calculations.js';
import { valveCalculations } from './valve-calculations.js';

/** Every calculation that has a route. */
export const calculations: readonly Calculation[] = [
  ...ignitionCalculations,
  ...valveCalculations,
  ...fasteningCalculations,
  ...fitCalculations,
  ...beltCalculations,
  ...measuringCalculations,
  ...curingCalculations,
];
