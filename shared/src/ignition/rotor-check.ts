import type { CapMapRow, Cylinder } from '../contracts/calculations.js';
import type { RotorCheck, RotorCheckRequest } from '../contracts/ignition-checks.js';
import { InputError } from '../contracts/input-error.js';
import { around } from '../quantities/around.js';
import { requireNumber, requireOneOf, requireRecord } from '../quantities/require.js';
import { turnBetween } from './cap-posts.js';
import { companionsOf } from './companions.js';
import { crankPerDistributor } from './post-spacing.js';
import { requireCapByRotor } from './rotor-rotation.js';
import type { ResolvedCap } from './resolve-cap.js';
import { judgeRotor, howToTell, type RotorSeen } from './rotor-words.js';
import { requireStaticTiming } from './static-timing.js';
import { requireCylinderRow } from './require-cylinder-row.js';
import { degrees, named } from './words.js';

/** Distributor degrees that the rotor may be off, where none are given: common practice, no source. */
const usualTolerance = 5;

/**
 * Where the rotor points with the crank at a cylinder's static timing mark, or at its TDC, against where it
 * should. Angles clockwise from the cap's mark; `error` in distributor degrees, positive the way the rotor turns.
 *
 * At the mark the rotor points at the cylinder's own post; at TDC it is past it by the advance over 2 (four-stroke:
 * the distributor turns at half crank speed), and that is taken off before the nearest post is named. A stamped
 * rotation may be a magneto armature's, beside which a geared rotor turns the same way or the other. Half a turn
 * out on a four-stroke is exhaust TDC or the distributor half a turn out: `doubtful`, with how to tell.
 *
 * @throws InputError on what `capMap` refuses (fields under `cap`), `rotorAngle` (−360 to 360), `rotorSeenFrom`,
 * `timing`, `crankAt`, `cylinder`, `rotationOf`, `gearedRotor`, `tolerance` (0 to 45, and less than half way from
 * post to post)
 * Source: geometry of the cap; the distributor turns once a cycle. The usual 5° is common practice, no source.
 * Example: 1-3-4-2 clockwise, 10° of advance, rotor at 5° with the crank at TDC: right.
 */
export function rotorCheck(request: RotorCheckRequest): RotorCheck {
  const given = requireRecord(request, 'request');
  const cap = requireCapByRotor(given);
  const side = requireOneOf(given['rotorSeenFrom'] ?? 'cap', ['cap', 'drive'] as const, 'rotorSeenFrom');
  const angle = requireNumber(given['rotorAngle'], 'rotorAngle', { min: -360, max: 360 });
  const advance = requireStaticTiming(given['timing'], 'timing');
  const crankAt = requireOneOf(given['crankAt'] ?? 'static-mark', ['static-mark', 'tdc'] as const, 'crankAt');
  const wanted = requireCylinderRow(cap, given['cylinder'], 'cylinder');
  const tolerance = requireTolerance(given['tolerance'], cap);

  const past = crankAt === 'tdc' ? advance / crankPerDistributor(cap) : 0;
  const pastPost = (post: CapMapRow): number => pastBy(cap, post, side === 'cap' ? angle : -angle, past);
  const nearest = cap.rows.reduce((best, row) => (off(pastPost(row)) < off(pastPost(best)) ? row : best));
  const error = pastPost(wanted);
  const companion = companionRow(cap, wanted);
  const halfATurnOut = isHalfATurnOut(cap, error, tolerance, companion, pastPost);
  const seen: RotorSeen = {
    cap,
    wanted,
    nearest,
    companion,
    error,
    past,
    crankAt,
    tolerance,
    halfATurnOut,
    // On a cap spaced wrong the rotor may stand half a turn out and yet not at the companion's post.
    atCompanion: halfATurnOut && nearest === companion,
  };
  return {
    ...judgeRotor(seen),
    rotorTurns: cap.rotation,
    nearestPost: nearest.post,
    nearestCylinder: nearest.cylinder,
    outlet: nearest.outlet,
    wantedPost: wanted.post,
    error,
    crankError: error * crankPerDistributor(cap),
    atCompanion: seen.atCompanion,
    ...(halfATurnOut ? { howToTell: howToTell(seen) } : {}),
    assumed: assumedBy(given, seen),
  };
}

/** Less than half way from post to post: a rotor is never within the tolerance of two of them. */
function requireTolerance(input: unknown, { rows, rotation }: ResolvedCap): number {
  const gaps = rows.map((row, i) => turnBetween(row.angle, (rows[i + 1] ?? rows[0] ?? row).angle, rotation));
  const half = rows.length === 1 ? 180 : Math.min(...gaps) / 2;
  const tolerance = requireNumber(input ?? Math.min(usualTolerance, half / 2), 'tolerance', {
    min: 0,
    max: 45,
  });
  if (tolerance < half) return tolerance;
  throw new InputError('tolerance', `This must be less than ${degrees(half)}, half way from post to post.`);
}

/** Signed distributor degrees by which the rotor is past a post, (−180, 180]. */
function pastBy(cap: ResolvedCap, post: CapMapRow, angle: number, past: number): number {
  const turn = around(turnBetween(post.angle, angle, cap.rotation) - past);
  return turn > 180 ? turn - 360 : turn;
}

const off = (error: number): number => Math.abs(error);

function isHalfATurnOut(
  cap: ResolvedCap,
  error: number,
  tolerance: number,
  companion: CapMapRow | undefined,
  pastPost: (post: CapMapRow) => number,
): boolean {
  if (cap.strokesPerCycle === 2 || off(error) <= tolerance) return false;
  const atPost = companion !== undefined && off(pastPost(companion)) <= tolerance;
  return atPost || off(error) >= 180 - tolerance;
}

function companionRow(cap: ResolvedCap, { cylinder }: CapMapRow): CapMapRow | undefined {
  const pair = companionsOf(cap).find((one) => one.includes(cylinder));
  const mate: Cylinder | undefined = pair?.find((one) => one !== cylinder);
  return cap.rows.find((row) => row.cylinder === mate);
}

function assumedBy(
  given: Readonly<Record<string, unknown>>,
  { wanted, tolerance }: RotorSeen,
): readonly string[] {
  const taken: readonly (readonly [string, string])[] = [
    ['tolerance', `The rotor may be ${degrees(tolerance)} of distributor off: common practice.`],
    ['cylinder', `The crank was set for cylinder ${named(wanted.cylinder)}, the first of the firing order.`],
    ['crankAt', 'The crank stands at the static timing mark.'],
    ['rotationOf', 'The rotation given is the rotor’s own, not a magneto armature’s.'],
    ['rotorSeenFrom', 'The rotor’s angle was read looking at the outside of the cap.'],
  ];
  return taken.flatMap(([field, words]) => (given[field] === undefined ? [words] : []));
}
