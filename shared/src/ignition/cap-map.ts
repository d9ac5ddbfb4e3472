import type { CapLead, CapMap, CapMapRequest } from '../contracts/calculations.js';
import { companionsOf } from './companions.js';
import { crankPerDistributor, spacingDoubt } from './post-spacing.js';
import { resolveCap, reversed, type ResolvedCap } from './resolve-cap.js';
import { cylindersNamed, degrees, listed } from './words.js';

/**
 * Which lead goes on which post and outlet of a distributor cap, worked out from the firing order, the way
 * the rotor turns, the cap's posts and the trace inside it.
 *
 * Angles are degrees clockwise from the cap's mark, looking at the outside of the cap; `firesAt` and
 * `crankInterval` are degrees of crank, `distributorInterval` degrees of distributor (half crank speed on a
 * four-stroke, crank speed on a two-stroke). Posts whose spacing differs from the firing intervals by more
 * than 2° of distributor make the answer `doubtful`.
 * Throws `InputError`: an order that is not a permutation of 1…n (1 to 16 cylinders) or of text labels, an
 * unknown rotation or side, another number of posts than of cylinders, two posts at one angle or of one name,
 * an unknown first post, intervals that do not add up to the cycle, a trace that is not one to one.
 * Source: geometry; the distributor turns once in a cycle.
 * Example: 1-3-4-2 with a rotor that turns anticlockwise goes on posts 1, 4, 3 and 2.
 */
export function capMap(request: CapMapRequest): CapMap {
  const cap = resolveCap(request);
  const doubt = spacingDoubt(cap);
  const { even } = cap.intervals;
  return {
    verdict: doubt === null ? 'pass' : 'doubtful',
    reason: doubt === null ? mapInWords(cap) : `${doubt} As given: ${mapInWords(cap)}`,
    rows: cap.rows,
    leads: leadsOf(cap),
    companions: companionsOf(cap),
    crankInterval: even,
    distributorInterval: even === null ? null : even / crankPerDistributor(cap),
  };
}

/** The leads by cylinder: numbers upwards, labels by the alphabet's code order. */
function leadsOf(cap: ResolvedCap): readonly CapLead[] {
  const leads = cap.rows.map(({ cylinder, post, outlet }): CapLead => ({ cylinder, post, outlet }));
  return leads.sort((a, b) => (a.cylinder < b.cylinder ? -1 : 1));
}

function mapInWords(cap: ResolvedCap): string {
  const { rows, rotation, rotationSeenFrom, intervals } = cap;
  const turned = rotationSeenFrom === 'drive' ? ` (${reversed(rotation)} seen from the drive)` : '';
  const one = rows.length === 1;
  const traced = rows.some(({ post, outlet }) => post !== outlet);
  const outlets = traced
    ? `, by ${one ? 'outlet' : 'outlets'} ${listed(rows.map(({ outlet }) => outlet))}`
    : '';
  const spacing =
    intervals.even === null
      ? 'the sparks are unevenly spaced'
      : `a spark comes every ${degrees(intervals.even)} of crank`;
  return (
    `The rotor turns ${rotation}, seen on the cap${turned}, and meets ` +
    `${one ? 'post' : 'posts'} ${listed(rows.map(({ post }) => post))} ` +
    `for ${cylindersNamed(rows.map(({ cylinder }) => cylinder))}${outlets}; ${spacing}.`
  );
}
