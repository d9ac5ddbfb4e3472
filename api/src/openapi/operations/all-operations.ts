import type { Operation } from '../operation.js';
import { bookOperations } from './book-operations.js';
import { calculationOperations } from './calculation-operations.js';
import { carOperations } from './car-operations.js';
import { ownOperations } from './own-operations.js';
import { peopleOperations } from './people-operations.js';
import { sheetOperations } from './sheet-operations.js';
import { stepOperations } from './step-operations.js';

/** Every route of the api, in the order that it is read. */
export const allOperations = async (): Promise<readonly Operation[]> => [
  ...ownOperations,
  ...peopleOperations,
  ...bookOperations,
  ...carOperations,
  ...sheetOperations,
  ...stepOperations,
  ...(await calculationOperations()),
];
