import { InputError } from '../contracts/input-error.js';
import type { LifterPreload, LifterPreloadRequest } from '../contracts/valve-figures.js';
import { limitDecision } from '../measuring/limit-decision.js';
import { printNumber, printQuantity } from '../quantities/print.js';
import { requireNumber, requireOneOf, requireQuantity, requireRecord } from '../quantities/require.js';
import { decimalsOf } from '../quantities/round.js';

/**
 * How far a hydraulic lifter's plunger is pressed in by turning the adjuster past zero lash: turns × pitch at the
 * push rod; at the rocker's pivot that times (1 + 1/ratio), for the rocker then tips about the valve. In the
 * pitch's unit. Judged by the maker's limits, where given.
 *
 * @throws InputError on `turns` (0 to 20), `pitch`, `rockerRatio` (0.5 to 4; needed with the adjuster at the
 * pivot), `limits.low` or `limits.high`
 * Source: pitch of a screw, and the rocker as a lever about the valve's tip; no printed source.
 * Example: three quarters of a turn of 24 threads an inch at the push rod: 0.03125 in.
 */
export function lifterPreload(request: LifterPreloadRequest): LifterPreload {
  const given = requireRecord(request, 'request');
  const turns = requireNumber(given['turns'], 'turns', { min: 0, max: 20 });
  const pitch = requireQuantity(given['pitch'], 'length', 'pitch', { zero: false });
  const adjuster = requireOneOf(given['adjuster'] ?? 'push-rod', ['push-rod', 'pivot'] as const, 'adjuster');
  const factor = adjuster === 'pivot' ? 1 + 1 / requireRatio(given['rockerRatio']) : 1;
  const preload = { value: turns * pitch.value * factor, unit: pitch.unit };
  const at = `${printNumber(turns, Math.min(3, decimalsOf(turns)))} ${turns === 1 ? 'turn' : 'turns'}`;
  return {
    ...judge(preload, given['limits'], at),
    preload,
    assumed: [
      'Zero clearance was found with the follower pumped up or dry and its plunger right out, on the base circle.',
      adjuster === 'pivot'
        ? 'The rocker tips about the valve’s tip, which stays where it is.'
        : 'The adjuster moves the push rod’s end by its pitch a turn.',
    ],
  };
}

function requireRatio(input: unknown): number {
  if (input !== undefined) return requireNumber(input, 'rockerRatio', { min: 0.5, max: 4 });
  throw new InputError(
    'rockerRatio',
    'With the adjuster at the pivot the rocker ratio is needed, such as 1.5.',
  );
}

function judge(
  preload: LifterPreload['preload'],
  input: unknown,
  at: string,
): Pick<LifterPreload, 'verdict' | 'reason'> {
  if (input === undefined) {
    const reason = `${at} past zero clearance: the plunger is pressed in by ${printQuantity(preload)}. No limits were given to judge that by.`;
    return { verdict: 'not-judged', reason };
  }
  const limits = requireRecord(input, 'limits');
  const low = requireQuantity(limits['low'], 'length', 'limits.low');
  const high = requireQuantity(limits['high'], 'length', 'limits.high');
  const { verdict, reason } = inLimits(preload, low, high);
  return { verdict, reason: `${at} past zero clearance: ${reason}` };
}

function inLimits(
  value: LifterPreload['preload'],
  low: typeof value,
  high: typeof value,
): Pick<LifterPreload, 'verdict' | 'reason'> {
  try {
    return limitDecision({ value, low, high });
  } catch (error) {
    if (error instanceof InputError) throw new InputError(`limits.${error.field}`, error.message);
    throw error;
  }
}
