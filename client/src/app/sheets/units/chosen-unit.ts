import { units, type Unit } from '@second-spanner/shared/contracts/quantity';
import type { Limits } from '@second-spanner/shared/contracts/spec';
import { convert, kindOf } from '@second-spanner/shared/quantities/convert';
import { digitsFor, roundInwards } from '@second-spanner/shared/quantities/print';
import { printLimits } from '@second-spanner/shared/spec/print-limits';
import { recall, remember } from '../../remembered/remembered';

/** Lengths that nobody measures an engine's clearances in are not offered. */
const unusual: readonly Unit[] = ['m', 'cm', 'ft'];

/** The units in which a figure of this unit's kind may be read, its own first. */
export function unitsLike(unit: Unit): readonly Unit[] {
  const all: readonly Unit[] = units[kindOf(unit)];
  return [unit, ...all.filter((other) => other !== unit && !unusual.includes(other))];
}

/** The unit in which this person last read figures that a spec prints in `printed`. */
export function chosenUnit(printed: Unit): Unit {
  const chosen = recall(`unit.${printed}`);
  return unitsLike(printed).find((unit) => unit === chosen) ?? printed;
}

export function rememberUnit(printed: Unit, chosen: Unit): void {
  remember(`unit.${printed}`, chosen === printed ? null : chosen);
}

/** Limits in a unit: as printed in their own, otherwise rounded to the good side. */
export function limitsIn({ low, high }: Limits, unit: Unit): Limits {
  const given = low ?? high;
  if (given === undefined || ((low?.unit ?? unit) === (high?.unit ?? unit) && given.unit === unit))
    return { low, high };
  const ends = [low, high].filter((limit) => limit !== undefined).map((limit) => convert(limit, unit).value);
  const band = Math.abs((ends[1] ?? 0) - (ends[0] ?? 0));
  const digits = digitsFor({ tolerance: band > 0 ? band : Math.abs(ends[0] ?? 1) });
  return {
    low: low && roundInwards(low, unit, digits, 'low'),
    high: high && roundInwards(high, unit, digits, 'high'),
  };
}

/** Limits in words, in the unit of choice; as printed behind it in brackets where that is another. */
export function limitsInWords(limits: Limits, unit: Unit): string {
  const shown = printLimits(limitsIn(limits, unit));
  const printed = printLimits(limits);
  return shown === printed ? shown : `${shown} (printed ${printed})`;
}
