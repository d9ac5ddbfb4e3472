import { turnBetween } from './cap-posts.js';
import type { ResolvedCap } from './resolve-cap.js';
import { counted, degrees, named } from './words.js';

/** How far the posts' spacing may differ from the firing intervals, degrees of distributor. */
export const spacingTolerance = 2;

/** Rounding noise of angles. */
const noise = 1e-9;

/** Crank degrees to one of the distributor: it turns at half crank speed, on a two-stroke at crank speed. */
export function crankPerDistributor(cap: ResolvedCap): number {
  return cap.cycle / 360;
}

/**
 * What is wrong with the spacing of a cap's posts for its engine's firing intervals, as a sentence; null if
 * every gap follows its interval within 2° of distributor.
 */
export function spacingDoubt(cap: ResolvedCap): string | null {
  const gaps = cap.rows.map((row, i) => {
    const next = cap.rows[(i + 1) % cap.rows.length] ?? row;
    const gap = next === row ? 360 : turnBetween(row.angle, next.angle, cap.rotation);
    const crank = cap.intervals.each[i] ?? 0;
    const wanted = crank / crankPerDistributor(cap);
    return { from: row.post, to: next.post, gap, crank, wanted, off: Math.abs(gap - wanted) };
  });
  const wrong = gaps.filter(({ off }) => off > spacingTolerance + noise).sort((a, b) => b.off - a.off);
  const [worst] = wrong;
  if (worst === undefined) return null;
  const { from, to, gap, crank, wanted } = worst;
  return (
    `The posts are not spaced as the engine fires: from post ${named(from)} to post ${named(to)} ` +
    `the cap has ${degrees(gap)}, and ${degrees(crank)} of crank between the sparks needs ${degrees(wanted)} ` +
    `of distributor (${spacingTolerance}° either way is allowed; ${counted(wrong.length, 'gap')} of ` +
    `${gaps.length} out). An engine that fires unevenly needs a cap spaced to match: check ` +
    `the posts' angles, the intervals and the firing order.`
  );
}
