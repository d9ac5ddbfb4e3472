import type { CylinderTest, CylinderTestRequest } from '../contracts/measuring.js';
import { InputError } from '../contracts/input-error.js';
import type { Judgement } from '../contracts/verdict.js';
import { toSi } from '../quantities/convert.js';
import { printNumber, printQuantity } from '../quantities/print.js';
import { requireNumber, requireOneOf, requireQuantity, requireRecord } from '../quantities/require.js';
import { cylinderFindings } from './cylinder-findings.js';
import { readCylinders, type CylinderRead, type CylinderTestKind } from './cylinder-readings.js';
import { quantityIfGiven } from './limits-input.js';

/** Lowest over highest that still counts as even. Common practice, no source. */
const usualShare = 0.75;
const noise = 1e-9;

/**
 * Compression readings (pressures) or leak-down readings (percent lost, 0 to 100) of 1 to 64 cylinders, in the
 * order they stand. Compression is even when the lowest is at least `leastShare` (0.75) of the highest; one
 * cylinder alone has nothing to be compared with. A leak is judged against `mostLeak`, and only by a tester
 * with the orifice and the supply pressure that it was set with (to 2 %): otherwise `not-judged`. A rebuilt
 * engine's rings are not bedded: `not-judged`, and only the trend counts.
 *
 * Findings: which are low, which low ones are neighbours, and whether oil in a low one changes its reading by
 * a tenth or more.
 *
 * @throws InputError on the request's fields
 * Source: common practice, no source. Example: 10.0, 9.8, 7.0 and 9.9 bar: lowest 70 % of the highest, `fail`.
 */
export function cylinderTest(request: CylinderTestRequest): CylinderTest {
  const given = requireRecord(request, 'request');
  const test = requireOneOf(given['test'], ['compression', 'leak-down'] as const, 'test');
  const { cylinders, unit } = readCylinders(given['readings'], test);
  const rebuilt = given['rebuilt'] ?? false;
  if (typeof rebuilt !== 'boolean') throw new InputError('rebuilt', 'This must be true or false.');
  const leastShare =
    given['leastShare'] === undefined
      ? usualShare
      : requireNumber(given['leastShare'], 'leastShare', { min: 0, max: 1 });
  const mostLeak =
    given['mostLeak'] === undefined
      ? undefined
      : requireNumber(given['mostLeak'], 'mostLeak', { min: 0, max: 100 });
  const comparison = readTesters(given);

  const lowest = cylinders.reduce((a, b) => (b.dry < a.dry ? b : a));
  const highest = cylinders.reduce((a, b) => (b.dry > a.dry ? b : a));
  const print = (value: number): string =>
    unit === null ? `${printNumber(value, 1).replace(/\.0$/, '')} %` : printQuantity({ value, unit });
  const share = test === 'leak-down' || highest.dry === 0 ? null : lowest.dry / highest.dry;
  const isLow = ({ dry }: CylinderRead): boolean =>
    test === 'compression'
      ? dry < leastShare * highest.dry * (1 - noise)
      : comparison === null && mostLeak !== undefined && dry > mostLeak + noise;
  const judgement =
    test === 'compression'
      ? judgeShare({ lowest, highest, share, leastShare, print }, cylinders.length)
      : judgeLeak(highest, mostLeak, comparison, print);
  return {
    ...(rebuilt ? trendOnly(judgement) : judgement),
    lowest: lowest.cylinder,
    highest: highest.cylinder,
    share,
    findings: cylinderFindings({ test, cylinders, isLow, print }),
    cautions: cautionsOf(test),
  };
}

/** Why a leak can't be held against its limit, or null where it can. */
function readTesters(given: Readonly<Record<string, unknown>>): string | null {
  const orifice = quantityIfGiven(given['orifice'], 'length', 'orifice', { zero: false });
  const supply = quantityIfGiven(given['supply'], 'pressure', 'supply', { zero: false });
  const unknown =
    'A leak compares only with one read through the same orifice at the same supply pressure: say both, of this tester and of the limit.';
  if (given['mostLeakAt'] === undefined) return unknown;
  const limit = requireRecord(given['mostLeakAt'], 'mostLeakAt');
  const itsOrifice = requireQuantity(limit['orifice'], 'length', 'mostLeakAt.orifice', { zero: false });
  const itsSupply = requireQuantity(limit['supply'], 'pressure', 'mostLeakAt.supply', { zero: false });
  if (orifice === undefined || supply === undefined) return unknown;
  const alike = (a: number, b: number): boolean => Math.abs(a - b) <= 0.02 * Math.max(a, b);
  if (alike(toSi(orifice), toSi(itsOrifice)) && alike(toSi(supply), toSi(itsSupply))) return null;
  return `The limit was set with ${printQuantity(itsOrifice)} and ${printQuantity(itsSupply)}, this was read with ${printQuantity(orifice)} and ${printQuantity(supply)}: the two do not compare.`;
}

interface Shares {
  readonly lowest: CylinderRead;
  readonly highest: CylinderRead;
  readonly share: number | null;
  readonly leastShare: number;
  readonly print: (value: number) => string;
}

function judgeShare({ lowest, highest, share, leastShare, print }: Shares, count: number): Judgement {
  if (count < 2) {
    return {
      verdict: 'not-judged',
      reason: `Cylinder ${lowest.cylinder} reads ${print(lowest.dry)}: one cylinder has nothing to be compared with.`,
    };
  }
  if (share === null) return { verdict: 'fail', reason: 'No cylinder shows any pressure.' };
  const is = `Cylinder ${lowest.cylinder} with ${print(lowest.dry)} has ${percent(share)} of cylinder ${highest.cylinder} with ${print(highest.dry)}`;
  return share >= leastShare * (1 - noise)
    ? { verdict: 'pass', reason: `${is}; ${percent(leastShare)} or more is even.` }
    : { verdict: 'fail', reason: `${is}; less than ${percent(leastShare)} is uneven.` };
}

const percent = (share: number): string => `${printNumber(100 * share, 1).replace(/\.0$/, '')} %`;

function judgeLeak(
  leakiest: CylinderRead,
  mostLeak: number | undefined,
  cannot: string | null,
  print: (value: number) => string,
): Judgement {
  const worst = `Cylinder ${leakiest.cylinder} loses most, ${print(leakiest.dry)}`;
  if (mostLeak === undefined) {
    return { verdict: 'not-judged', reason: `${worst}; there is no limit to judge it by.` };
  }
  if (cannot !== null) return { verdict: 'not-judged', reason: `${worst}. ${cannot}` };
  return leakiest.dry <= mostLeak + noise
    ? { verdict: 'pass', reason: `${worst}, within the ${print(mostLeak)} allowed.` }
    : { verdict: 'fail', reason: `${worst}, over the ${print(mostLeak)} allowed.` };
}

const trendOnly = ({ reason }: Judgement): Judgement => ({
  verdict: 'not-judged',
  reason: `The engine is newly rebuilt and its rings are not bedded: only the trend over the next readings counts. ${reason}`,
});

function cautionsOf(test: CylinderTestKind): readonly string[] {
  return test === 'compression'
    ? [
        'Ignition and fuel off, all plugs out, throttle wide open, battery strong, engine warm: otherwise figures do not compare.',
        'A spoonful of oil is enough for the wet reading. Much more fills the chamber, raises the figure by itself and can lock the engine.',
      ]
    : [
        'Air pressure turns the crank when the piston is not exactly at TDC: keep hands, tools and rags away, and hold the crank by its bolt.',
        'Listen where the air goes: inlet, exhaust, oil filler, the next plug hole, bubbles in the radiator.',
      ];
}
