import { InputError } from '../contracts/input-error.js';
import { requireAxis, type RoundRead } from './read-round.js';

/** Which readings count, and what must be said of them. */
export interface Judged {
  readonly readings: readonly RoundRead[];
  /** Why nothing can be judged, or null. */
  readonly cannot: string | null;
  readonly cautions: readonly string[];
}

/**
 * The readings of a set that count: in shells those on `judgedAxis`, at 90° to the split, or all but those on
 * `splitAxis`, where the shell is relieved. Throws `InputError` on `splitAxis` and `judgedAxis` (an axis not
 * read, or none left) and on `capTorqued`.
 */
export function judgedReadings(
  all: readonly RoundRead[],
  isShell: boolean,
  given: Readonly<Record<string, unknown>>,
): Judged {
  const split = requireAxis(given['splitAxis'], all, 'splitAxis');
  const square = requireAxis(given['judgedAxis'], all, 'judgedAxis');
  if (split !== undefined && split === square) {
    throw new InputError('judgedAxis', 'This must be the axis at 90° to the split, not the one at it.');
  }
  const readings = all.filter(({ axis }) => (square === undefined ? axis !== split : axis === square));
  if (readings.length === 0) {
    throw new InputError('splitAxis', 'At least one reading must be off the split, at 90° to it.');
  }
  const torqued = given['capTorqued'];
  if (torqued !== undefined && typeof torqued !== 'boolean') {
    throw new InputError('capTorqued', 'This must be true or false.');
  }
  if (!isShell) return { readings, cannot: null, cautions: [] };
  return { readings, ...shellWords(readings, split ?? square, torqued) };
}

function shellWords(
  readings: readonly RoundRead[],
  named: string | undefined,
  torqued: boolean | undefined,
): Pick<Judged, 'cannot' | 'cautions'> {
  const axes = new Set(readings.map(({ axis }) => axis)).size;
  if (torqued === false) {
    return {
      cannot: 'Shells take their size only with the cap torqued: torque it and read again.',
      cautions: [],
    };
  }
  if (named === undefined && axes > 1) {
    return {
      cannot:
        'Shells are relieved at the split, and it was not said which axis lies there: their size is judged at 90° to it.',
      cautions: [],
    };
  }
  return {
    cannot: null,
    cautions: [
      ...(torqued === undefined ? ['The shells are taken as measured with the cap torqued.'] : []),
      ...(named === undefined ? ['The one axis read is taken to be at 90° to the split.'] : []),
      ...(axes > 1
        ? [
            'A shell thins towards its split: of several axes, the one at 90° to it gives the bearing its size.',
          ]
        : ['Shells are relieved at the split: readings there do not count.']),
    ],
  };
}
