import { tappedMaterials, type ThreadStack, type ThreadStackRequest } from '../contracts/fastening.js';
import { InputError } from '../contracts/input-error.js';
import type { Quantity, Unit } from '../contracts/quantity.js';
import { fromSi, toSi } from '../quantities/convert.js';
import { requireNumber, requireOneOf, requireQuantity, requireRecord } from '../quantities/require.js';
import { nutStack, type NutCase } from './nut-stack.js';
import { readThread } from './read-thread.js';
import { nutHeights } from './tables/nut-heights.js';
import type { StackFigures } from './stack-figures.js';
import { tappedStack, type TappedCase } from './tapped-stack.js';
import type { Thread } from './thread.js';

/**
 * Whether a bolt or stud is as long as its joint needs. Into a nut: protrusion = length − grip − washers − nut
 * height, against the least pitches that must show. Into a tapped hole: engagement against the diameter, by
 * material, and in a blind hole whether the bolt runs out of thread or bottoms before it clamps. Lengths are in
 * the unit of `boltLength`; `engagementInDiameters` is plain.
 *
 * @throws InputError on `thread`, `boltLength`, `grip`, `washers`, `into`, `into.nutHeight` (needed for inch
 * threads), `into.leastPitches`, `into.material`, `into.threadDepth`, `into.holeDepth`
 * Source: geometry; nut heights ISO 4032:2012 (from memory); least pitches and least engagement common practice,
 * no source.
 * Example: M10x1.5 × 50 through 35 mm and 2 mm of washers into a nut of 8.4 mm: 4.6 mm past it, 3.1 pitches.
 */
export function threadStack(request: ThreadStackRequest): ThreadStack {
  const given = requireRecord(request, 'request');
  const thread = readThread(given['thread']);
  const bolt = requireLength(given['boltLength'], 'boltLength', false);
  const grip = requireLength(given['grip'], 'grip', false);
  const washers = given['washers'] === undefined ? undefined : requireLength(given['washers'], 'washers');
  const joint = {
    thread,
    unit: bolt.unit,
    /** From the far face of what is clamped to the end of the bolt, metres. */
    reach: toSi(bolt) - toSi(grip) - (washers === undefined ? 0 : toSi(washers)),
    clamped: toSi(grip) + (washers === undefined ? 0 : toSi(washers)),
  };
  const into = requireRecord(given['into'], 'into');
  const stack =
    into['material'] === undefined
      ? nutStack({ ...joint, ...requireNut(into, thread) })
      : tappedStack({ ...joint, ...requireHole(into) });
  return inUnit(stack, bolt.unit, thread, washers === undefined ? ['No washers.'] : []);
}

function inUnit(
  { verdict, reason, engagement, protrusion, spare, nutHeight, lengthNeeded, assumed }: StackFigures,
  unit: Unit,
  thread: Thread,
  more: readonly string[],
): ThreadStack {
  const length = (metres: number): Quantity => fromSi(metres, unit);
  return {
    verdict,
    reason,
    engagement: length(engagement),
    engagementInDiameters: engagement / thread.diameter,
    ...(protrusion !== undefined && {
      protrusion: { length: length(protrusion), pitches: protrusion / thread.pitch },
    }),
    ...(spare !== undefined && { spare: length(spare) }),
    ...(nutHeight !== undefined && { nutHeight: length(nutHeight) }),
    lengthNeeded: length(lengthNeeded),
    assumed: [...more, ...assumed],
  };
}

/** Longer than this no fastener of an engine is, metres. */
const longest = 10;

function requireLength(input: unknown, field: string, zero = true): Quantity {
  const length = requireQuantity(input, 'length', field, { zero });
  if (toSi(length) > longest) throw new InputError(`${field}.value`, 'No bolt is longer than 10 m.');
  return length;
}

function requireNut(
  into: Readonly<Record<string, unknown>>,
  thread: Thread,
): Pick<NutCase, 'nutHeight' | 'isListed' | 'leastPitches' | 'isUsual'> {
  const isUsual = into['leastPitches'] === undefined;
  const rest = {
    isUsual,
    leastPitches: isUsual ? 1 : requireNumber(into['leastPitches'], 'into.leastPitches', { min: 0, max: 20 }),
  };
  if (into['nutHeight'] !== undefined) {
    const nutHeight = toSi(requireLength(into['nutHeight'], 'into.nutHeight', false));
    return { ...rest, nutHeight, isListed: false };
  }
  const listed = thread.nominal.unit === 'mm' ? nutHeights.get(thread.nominal.value) : undefined;
  if (listed === undefined) {
    throw new InputError(
      'into.nutHeight',
      `Measure the nut: the table of nut heights has none for ${thread.name}.`,
    );
  }
  return { ...rest, nutHeight: listed / 1000, isListed: true };
}

function requireHole(
  into: Readonly<Record<string, unknown>>,
): Pick<TappedCase, 'material' | 'threadDepth' | 'holeDepth'> {
  const material = requireOneOf(into['material'], tappedMaterials, 'into.material');
  const threadDepth = toSi(requireLength(into['threadDepth'], 'into.threadDepth', false));
  if (into['holeDepth'] === undefined) return { material, threadDepth, holeDepth: undefined };
  const holeDepth = toSi(requireLength(into['holeDepth'], 'into.holeDepth', false));
  if (holeDepth < threadDepth * (1 - 1e-9)) {
    throw new InputError('into.holeDepth', 'The hole cannot be shallower than the thread in it.');
  }
  return { material, threadDepth, holeDepth };
}
