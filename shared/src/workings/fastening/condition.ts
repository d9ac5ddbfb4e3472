import type { ThreadCondition } from '../../contracts/fastening.js';

/** Sealant and thread-lock fill a dry thread; what they do to the nut factor no source at hand says. */
export const threadLockFactor = 0.2;

/** A condition as it is chosen, with the nut factor where it is given by that. */
export function conditionOf(choice: string, nutFactor?: number): ThreadCondition {
  switch (choice) {
    case 'oiled':
    case 'moly':
      return choice;
    case 'thread-lock':
      return { nutFactor: threadLockFactor };
    case 'factor':
      return { nutFactor: nutFactor ?? threadLockFactor };
    default:
      return 'dry';
  }
}
