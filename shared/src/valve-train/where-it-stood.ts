import type { Seen } from './seen.js';
import { anywhere, intersection, stretched, type Windows } from './windows.js';

/** From one position to the next the crank is turned forwards, by less than one turn. */
const underOneTurn = 360 - 1e-6;

/**
 * Where the cylinder asked about may have stood at one position of the crank, by all that was seen there,
 * before and after. Empty where not all of it can be true. Exact: each position is tied only to the next, so
 * what is known is carried on from the first to this one, and back from the last to this one.
 */
export function whereItStood(seen: readonly Seen[], about: number): Windows {
  const last = Math.max(about, ...seen.map(({ position }) => position));
  const at: Windows[] = Array.from({ length: last + 1 }, () => anywhere);
  for (const { position, windows } of seen) at[position] = intersection(at[position] ?? anywhere, windows);

  const fromBefore = at
    .slice(0, about)
    .reduce((known, here) => stretched(intersection(known, here), 0, underOneTurn), anywhere);
  const fromAfter = at
    .slice(about + 1)
    .reduceRight((known, here) => stretched(intersection(known, here), underOneTurn, 0), anywhere);
  return intersection(intersection(fromBefore, at[about] ?? anywhere), fromAfter);
}

/**
 * Of things that cannot all be true, a few that cannot be true together: two where two alone contradict each
 * other; one that the engine cannot do at all; more where only together they cannot be; none if all fit. The later ones of the
 * list are blamed last. Every subset of what fits fits too, so the shortest list that does not is found by
 * halving.
 */
export function contradicting(seen: readonly Seen[]): readonly Seen[] {
  if (fit(seen)) return [];
  const needed: Seen[] = [];
  while (fit(needed)) {
    const culprit = seen[shortestMisfit(seen, needed) - 1];
    if (!culprit) return needed;
    const partner = needed.length === 0 && fit([culprit]) ? partnerOf(culprit, seen) : undefined;
    if (partner) return [partner, culprit];
    needed.unshift(culprit);
  }
  return needed;
}

function partnerOf(culprit: Seen, seen: readonly Seen[]): Seen | undefined {
  const near = seen.filter((other) => Math.abs(other.position - culprit.position) <= 1);
  const earlier = near.slice(0, near.indexOf(culprit));
  return earlier.filter((other) => !fit([other, culprit])).at(-1);
}

/** How many from the beginning it takes, together with those needed already, until they cannot all be true. */
function shortestMisfit(seen: readonly Seen[], needed: readonly Seen[]): number {
  let fitting = 0;
  let misfit = seen.length;
  while (misfit - fitting > 1) {
    const middle = Math.floor((fitting + misfit) / 2);
    if (fit([...seen.slice(0, middle), ...needed])) fitting = middle;
    else misfit = middle;
  }
  return misfit;
}

function fit(seen: readonly Seen[]): boolean {
  return whereItStood(seen, 0).length > 0;
}
