import type {
  CapDiagnosis,
  CapDiagnosisRequest,
  CylinderSpark,
  LeadSwap,
} from '../contracts/calculations.js';
import { InputError } from '../contracts/input-error.js';
import type { Verdict } from '../contracts/verdict.js';
import { requireNumber, requireOneOf, requireRecord } from '../quantities/require.js';
import { requireValveTiming } from '../valve-train/valve-timing.js';
import { causes, causesOf } from './causes/causes.js';
import { movedBy } from './causes/whole-set-moved.js';
import { cautionsFor } from './cautions.js';
import { cureInWords } from './cure-in-words.js';
import { fewestSwaps } from './fewest-swaps.js';
import { spacingDoubt } from './post-spacing.js';
import { requireFitted } from './require-fitted.js';
import { resolveCap, type ResolvedCap } from './resolve-cap.js';
import { sparkPosition } from './spark-position.js';
import { sequenceOf, wiringOf, type Wiring } from './wiring.js';

/** Crank degrees before TDC, where none is given. */
const usualAdvance = 10;

/**
 * What is wrong with the leads as they are fitted: which mistake explains it, where each cylinder's spark
 * falls in its own cycle, and the fewest exchanges of two leads that cure it (cylinders less the cycles of
 * the permutation), done in the order listed. Four-stroke engines only.
 *
 * `late` is in crank degrees, (−360, 360], positive is late; stroke and valves are taken at the spark itself,
 * TDC minus the advance. A right wiring passes, or is `doubtful` on a cap whose spacing is; any other fails.
 * Throws `InputError`: what `capMap` refuses (fields under `cap`), a two-stroke, a post or outlet that is
 * unknown, empty or has a cylinder that another has too, valve timing or advance (−20° to 90°) out of reason.
 * Source: geometry of the cap and of the four-stroke cycle.
 * Example: 1-3-4-2 set out on posts 1, 4, 3 and 2 of a clockwise rotor is wired against it; one swap, of posts 2
 * and 4, cures it.
 */
export function capDiagnosis(request: CapDiagnosisRequest): CapDiagnosis {
  const given = requireRecord(request, 'request');
  const { fittedBy = 'post', advance: before = usualAdvance, valveTiming } = given;
  const cap = requireFourStroke(given['cap']);
  const by = requireOneOf(fittedBy, ['post', 'outlet'] as const, 'fittedBy');
  const wiring = wiringOf(cap, requireFitted(given['fitted'], cap, by, 'fitted'));
  const timing = valveTiming === undefined ? undefined : requireValveTiming(valveTiming, 'valveTiming');
  const advance = requireNumber(before, 'advance', { min: -20, max: 90 });
  const { cause, alsoFits } = causesOf(wiring);
  const moved = movedBy(wiring);
  const swaps = swapsFor(wiring);
  const doubt = spacingDoubt(cap);
  const sentences = [causes[cause].explain(wiring), cureInWords(swaps), doubt ?? ''];
  return {
    verdict: verdictOf(cause === 'right', doubt),
    reason: sentences.filter((one) => one !== '').join(' '),
    cause,
    alsoFits,
    ...(moved === null ? {} : { movedBy: moved }),
    asFitted: sequenceOf(wiring),
    cylinders: wiring.leads.map(({ cylinder, on, late }): CylinderSpark => {
      const { stroke, inletOpen, exhaustOpen } = sparkPosition(late, advance, timing);
      return { cylinder, post: on.post, late, stroke, inletOpen, exhaustOpen };
    }),
    swaps,
    cautions: cautionsFor(wiring, advance, timing),
  };
}

function requireFourStroke(input: unknown): ResolvedCap {
  const cap = resolveCap(input, 'cap');
  if (cap.strokesPerCycle === 4) return cap;
  throw new InputError('cap.strokesPerCycle', 'Only the wiring of four-stroke engines can be diagnosed.');
}

function verdictOf(right: boolean, doubt: string | null): Verdict {
  if (!right) return 'fail';
  return doubt === null ? 'pass' : 'doubtful';
}

function swapsFor({ cap, belongs }: Wiring): readonly LeadSwap[] {
  return fewestSwaps(belongs).flatMap(([place, from]): readonly LeadSwap[] => {
    const one = cap.rows[place];
    const other = cap.rows[from];
    if (one === undefined || other === undefined) return [];
    return [{ between: [one.post, other.post], outlets: [one.outlet, other.outlet] }];
  });
}
