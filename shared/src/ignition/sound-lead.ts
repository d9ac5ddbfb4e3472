import type { LeadTest, LeadTestRequest } from '../contracts/ignition-checks.js';
import { InputError } from '../contracts/input-error.js';
import type { Unit } from '../contracts/quantity.js';
import { fromSi, toSi } from '../quantities/convert.js';
import { digitsFor, printQuantity, roundInwards } from '../quantities/print.js';
import { requireQuantity, requireRecord } from '../quantities/require.js';

/** A wire core with its joints reads less than this, and a resistive one more, ohms: common practice, no source. */
export const nearZero = 10;

/** How far a suppressor in an end fitting may be from its marking: common practice, no source. */
const fittingSpread = 0.2;

/** What a lead that is sound may read. */
export interface SoundLead {
  readonly limits: LeadTest['limits'];
  /** The end fittings' own resistance, ohms. */
  readonly fitted: number;
  readonly assumed: readonly string[];
}

/**
 * What a sound lead of its kind and length may read, `limits` in `unit`: by the maker's resistance per length plus
 * the end fittings, within the maker's limits for a whole lead, where there are any. Without either a wire-core lead
 * may read next to nothing but its end fittings, and of a resistive one nothing is known: null.
 */
export function soundLead(
  given: Readonly<Record<string, unknown>>,
  kind: LeadTestRequest['kind'],
  unit: Unit,
): SoundLead {
  const length = toSi(requireQuantity(given['length'], 'length', 'length', { zero: false }));
  const fitted = given['endFittings'] === undefined ? 0 : ohms(given['endFittings'], 'endFittings');
  const byLength = readByLength(given['nominal'], length);
  const whole = readWhole(given['whole']);
  const known = byMaker(byLength, whole, fitted);
  const limits = known ?? (kind === 'wire-core' ? wireCore(fitted) : null);
  if (limits !== null && limits.low > limits.high) {
    throw new InputError(
      whole === undefined ? 'nominal.low' : 'whole.high',
      'These figures leave no resistance that is right.',
    );
  }
  return {
    limits: limits && { low: fromSi(limits.low, unit), high: fromSi(limits.high, unit) },
    fitted,
    assumed: assumedOf(known === null && kind === 'wire-core', given['endFittings'] === undefined, fitted),
  };
}

type Limits = NonNullable<LeadTest['limits']>;

/** The limits rounded inwards to two digits past the width between them. */
export function roundedLimits({ low, high }: Limits): Limits {
  const digits = digitsFor({ tolerance: high.value - low.value });
  const rounded = {
    low: roundInwards(low, low.unit, digits, 'low'),
    high: roundInwards(high, high.unit, digits, 'high'),
  };
  return rounded.low.value > rounded.high.value ? { low, high } : rounded;
}

interface Range {
  readonly low: number;
  readonly high: number;
}

const ohms = (input: unknown, field: string): number => toSi(requireQuantity(input, 'resistance', field));

function readByLength(input: unknown, length: number): Range | undefined {
  if (input === undefined) return undefined;
  const given = requireRecord(input, 'nominal');
  const per = toSi(requireQuantity(given['per'], 'length', 'nominal.per', { zero: false }));
  const [low, high] = [ohms(given['low'], 'nominal.low'), ohms(given['high'], 'nominal.high')];
  if (low > high) throw new InputError('nominal.low', 'The least must not be more than the most.');
  return { low: (low / per) * length, high: (high / per) * length };
}

function readWhole(input: unknown): Range | undefined {
  if (input === undefined) return undefined;
  const given = requireRecord(input, 'whole');
  const low = given['low'] === undefined ? 0 : ohms(given['low'], 'whole.low');
  const high = ohms(given['high'], 'whole.high');
  if (low > high) throw new InputError('whole.low', 'The least must not be more than the most.');
  return { low, high };
}

function wireCore(fitted: number): Range {
  return { low: fitted * (1 - fittingSpread), high: fitted * (1 + fittingSpread) + nearZero };
}

function byMaker(byLength: Range | undefined, whole: Range | undefined, fitted: number): Range | null {
  const core = byLength && { low: byLength.low + fitted, high: byLength.high + fitted };
  if (core === undefined) return whole ?? null;
  if (whole === undefined) return core;
  return { low: Math.max(core.low, whole.low), high: Math.min(core.high, whole.high) };
}

function assumedOf(byPractice: boolean, unsaid: boolean, fitted: number): readonly string[] {
  const ends = unsaid ? ['The end fittings have no resistance of their own.'] : [];
  if (!byPractice) return ends;
  const spread =
    fitted > 0
      ? [`Suppressors in the end fittings may be ${fittingSpread * 100} % off: common practice.`]
      : [];
  const most = printQuantity({ value: nearZero, unit: 'Ω' });
  return [`A wire core with its joints reads at most ${most}: common practice.`, ...ends, ...spread];
}
