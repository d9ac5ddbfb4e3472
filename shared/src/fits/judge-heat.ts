import type { HeatToAssemble } from '../contracts/fits.js';
import type { Quantity, Unit } from '../contracts/quantity.js';
import type { Verdict } from '../contracts/verdict.js';
import { fromSi, toSi } from '../quantities/convert.js';
import { printNumber, printQuantity } from '../quantities/print.js';
import { heatLimits } from './tables/heat-limits.js';

export interface HeatWorkedOut {
  /** Differences, K. */
  readonly rise: number;
  readonly drop: number;
  readonly hub: Quantity;
  readonly shaft: Quantity;
  readonly hottestAllowed?: Quantity;
  readonly coldestAllowed?: Quantity;
}

interface Finding {
  readonly verdict: Verdict;
  readonly words: string;
}

/** Temperatures closer than this are equal, K. */
const noise = 1e-6;
const ranks = ['fail', 'not-judged', 'pass'] as const satisfies readonly Verdict[];

/** Judges the temperatures of `heatToAssemble` by what is allowed, and says what they ask care for. */
export function judgeHeat(
  worked: HeatWorkedOut,
): Pick<HeatToAssemble, 'verdict' | 'reason' | 'cautions' | 'assumed'> {
  const findings = [...hubFinding(worked), ...shaftFinding(worked)];
  const verdict = ranks.find((rank) => findings.some((one) => one.verdict === rank)) ?? 'pass';
  return {
    verdict,
    reason:
      findings.length === 0
        ? 'It goes together as it is: nothing needs heat or cold.'
        : findings.map(({ words }) => words).join(' '),
    cautions: cautionsOf(worked),
    assumed: [
      'Both parts are at the room’s temperature to begin with, and evenly hot or cold when they go together.',
      'Coefficients are means over the way; a material’s is the least of its alloys in the table.',
      'Heat lost on the way to the joint is left out: the clearance wanted must cover it.',
    ],
  };
}

function hubFinding({ rise, hub, hottestAllowed }: HeatWorkedOut): readonly Finding[] {
  if (rise === 0) return [];
  const to = `Heat the outer part to ${shown(hub)}, ${risen(rise, hub.unit)} above the room`;
  if (hottestAllowed === undefined) {
    return [{ verdict: 'not-judged', words: `${to}; nothing says how hot it may get.` }];
  }
  const over = toSi(hub) - toSi(hottestAllowed);
  return over > noise
    ? [
        {
          verdict: 'fail',
          words: `${to}: more than the ${shown(hottestAllowed)} that it and its neighbours stand.`,
        },
      ]
    : [{ verdict: 'pass', words: `${to}; up to ${shown(hottestAllowed)} is allowed.` }];
}

function shaftFinding({ drop, shaft, coldestAllowed }: HeatWorkedOut): readonly Finding[] {
  if (drop === 0) return [];
  const to = `Cool the inner part to ${shown(shaft)}, ${risen(drop, shaft.unit)} below the room`;
  if (coldestAllowed === undefined) {
    return [{ verdict: 'not-judged', words: `${to}; nothing says how cold it may get.` }];
  }
  const under = toSi(coldestAllowed) - toSi(shaft);
  return under > noise
    ? [{ verdict: 'fail', words: `${to}: colder than the ${shown(coldestAllowed)} that it stands.` }]
    : [{ verdict: 'pass', words: `${to}; down to ${shown(coldestAllowed)} is allowed.` }];
}

function cautionsOf({ rise, drop, hub, shaft }: HeatWorkedOut): readonly string[] {
  const hubC = celsius(hub);
  const limit = (value: number, unit: Unit): string => shown(fromSi(value + 273.15, unit));
  const said = [
    rise > 0 &&
      'Hot metal looks like cold metal: gloves, eye protection, and no flame near oil, fuel or solvent.',
    rise > 0 &&
      hubC > heatLimits.sealedBearing &&
      `A sealed or greased bearing stands at most ${limit(heatLimits.sealedBearing, hub.unit)}, an open one ${limit(heatLimits.openBearing, hub.unit)}, and none over ${limit(heatLimits.bearingNeverAbove, hub.unit)}.`,
    rise > 0 &&
      hubC > 150 &&
      'So hot, aluminium and hardened steel may lose their temper: ask the maker of the part.',
    drop > 0 && 'Cold burns as heat does: gloves and eye protection, and dry the frost off the part.',
    drop > 0 &&
      celsius(shaft) < heatLimits.dryIce &&
      `Dry ice reaches only ${limit(heatLimits.dryIce, shaft.unit)}; liquid nitrogen reaches ${limit(heatLimits.liquidNitrogen, shaft.unit)}.`,
    drop > 0 &&
      celsius(shaft) < -40 &&
      'Dry ice and liquid nitrogen drive out the air: work in the open or with the doors wide open.',
  ];
  return said.filter((words) => words !== false);
}

const celsius = (quantity: Quantity): number => toSi(quantity) - 273.15;
const shown = (quantity: Quantity): string => printQuantity(quantity, { digits: 0 });

/** A difference in degrees of the room's scale: never converted with the scale's zero point. */
function risen(kelvin: number, unit: Unit): string {
  return `${printNumber(unit === '°F' ? kelvin * 1.8 : kelvin, 0)} ${unit === '°F' ? '°F' : 'K'}`;
}
