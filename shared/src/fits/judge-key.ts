import type { KeyForm } from '../contracts/fits.js';
import type { Unit } from '../contracts/quantity.js';
import type { Judgement, Verdict } from '../contracts/verdict.js';
import { fromSi } from '../quantities/convert.js';
import { printQuantity } from '../quantities/print.js';
import { classLimits, leastSize } from './class-limits.js';
import { fitNoise, settled } from './fit-noise.js';

/** Lengths in metres; `unit` is what they are printed in. */
export interface KeyInPlace {
  readonly form: KeyForm;
  readonly width: number;
  readonly play: { readonly shaft: number; readonly hub: number; readonly top: number };
  /** How far the key's top stands over the shaft's own, negative below it. */
  readonly standsOut: number;
  readonly unit: Unit;
}

interface Finding {
  readonly verdict: Verdict;
  readonly words: string;
}

/** Tighter by no more than this is a usual tight slot, m. */
const usualTightness = 0.045e-3;
/** Tighter by more than this no key enters without harm, m. */
const mostTightness = 0.08e-3;
const ranks = ['fail', 'doubtful', 'not-judged', 'pass'] as const satisfies readonly Verdict[];

/** Judges the plays of a key by the rules of `keyFit`, the worst finding giving the verdict. */
export function judgeKey(key: KeyInPlace): Judgement {
  const findings = [side(key, 'shaft'), side(key, 'hub'), top(key)];
  const verdict = ranks.find((rank) => findings.some((one) => one.verdict === rank)) ?? 'pass';
  const telling = findings.filter((one) => verdict === 'pass' || one.verdict !== 'pass');
  return { verdict, reason: telling.map(({ words }) => words).join(' ') };
}

/**
 * The most play of a free fit at this key width, m: the slot's largest less the smallest key h9.
 * Widths under 1 mm count as 1 mm.
 */
export function mostPlay(width: number, where: 'shaft' | 'hub', form: KeyForm): number {
  const size = Math.max(width * 1000, leastSize);
  const slot = where === 'hub' || form === 'taper' ? 'D10' : 'H9';
  const key = classLimits(size, 'h9', 'shaft', 'key');
  return (classLimits(size, slot, 'hole', 'key').upper - key.lower) * 1e-6;
}

function side({ form, width, play, unit }: KeyInPlace, where: 'shaft' | 'hub'): Finding {
  const found = play[where];
  const most = mostPlay(width, where, form);
  const figure = printed(Math.abs(found), unit);
  if (found < -mostTightness - fitNoise) {
    return {
      verdict: 'fail',
      words: `The key will not enter the ${where}: it is ${beyond(-found, mostTightness, unit)} wider than the slot, and a slot is at most ${printed(mostTightness, unit)} tighter.`,
    };
  }
  if (found < -usualTightness - fitNoise) {
    return {
      verdict: 'doubtful',
      words: `In the ${where} the key is ${beyond(-found, usualTightness, unit)} wider than its slot; over ${printed(usualTightness, unit)} it goes in only by force.`,
    };
  }
  if (found > most + fitNoise) {
    const harm = where === 'shaft' ? 'it falls out on assembly' : 'the hub rocks on it';
    return {
      verdict: 'fail',
      words: `The key has ${beyond(found, most, unit)} of play in the ${where}, and a free fit has at most ${printed(most, unit)}: ${harm}.`,
    };
  }
  return { verdict: 'pass', words: goodWords(found, where, figure, printed(most, unit)) };
}

function goodWords(found: number, where: 'shaft' | 'hub', figure: string, most: string): string {
  if (found < 0) return `The key is ${figure} tight in the ${where}, as a slot may be.`;
  return found === 0
    ? `The key just fills its slot in the ${where}.`
    : `The key has ${figure} of play in the ${where} (at most ${most}).`;
}

function top({ form, play, standsOut, unit }: KeyInPlace): Finding {
  const figure = printed(Math.abs(play.top), unit);
  if (form === 'taper') {
    return play.top > fitNoise
      ? {
          verdict: 'fail',
          words: `The taper key does not bear on its top: there is ${figure} left over it.`,
        }
      : { verdict: 'pass', words: 'The taper key bears on its top, as it must.' };
  }
  if (standsOut <= fitNoise) {
    return {
      verdict: 'fail',
      words: `The key does not reach the hub: it ${settled(standsOut) === 0 ? 'ends at the shaft’s top' : `lies ${printed(-standsOut, unit)} below the shaft’s top`}.`,
    };
  }
  return play.top <= fitNoise
    ? {
        verdict: 'fail',
        words: `The key touches at the top${settled(play.top) === 0 ? '' : ` (${figure} too high)`}: it would push the hub off its centre.`,
      }
    : { verdict: 'pass', words: `Over the key ${figure} is free.` };
}

/** Three significant digits: what a micrometer reads on a play. */
function printed(length: number, unit: Unit, digits = 3): string {
  const { value } = fromSi(length, unit);
  return printQuantity({ value: Number(value.toPrecision(digits)), unit });
}

/** The same with digits enough to tell it from the limit that it is beyond. */
function beyond(length: number, limit: number, unit: Unit): string {
  const isTold = (digits: number): boolean => printed(length, unit, digits) !== printed(limit, unit, digits);
  return printed(length, unit, [3, 4, 5].find(isTold) ?? 6);
}
