import type { SizeLimits } from '../contracts/fits.js';
import type { Unit } from '../contracts/quantity.js';
import type { Judgement } from '../contracts/verdict.js';
import { convert, toSi } from '../quantities/convert.js';
import { printNumber } from '../quantities/print.js';
import { fit } from './fit.js';
import { fitNoise } from './fit-noise.js';

export interface Mate {
  readonly is: 'hole' | 'shaft';
  readonly mate: SizeLimits;
  readonly play: SizeLimits;
}

/** Judges one dimension of a part that is to stand in for another, by the rules of `compareParts`. */
export function judgeDimension(
  original: SizeLimits | null,
  other: SizeLimits | null,
  mate: Mate | undefined,
): Judgement {
  if (other === null) {
    return { verdict: 'not-judged', reason: 'not known of the other part; measure it.' };
  }
  if (mate !== undefined) return judgePlay(other, mate);
  if (original === null) {
    return {
      verdict: 'not-judged',
      reason: 'the original has no such dimension, and what it fits with is not given.',
    };
  }
  const figures = `${range(other)} against ${range(original, other.low.unit)}`;
  switch (within(other, original)) {
    case 'all':
      return { verdict: 'pass', reason: `${figures}: within the original’s limits.` };
    case 'some':
      return { verdict: 'doubtful', reason: `${figures}: some of these parts lie outside; measure yours.` };
    case 'none':
      return { verdict: 'fail', reason: `${figures}: wholly outside the original’s limits.` };
  }
}

function judgePlay(other: SizeLimits, { is, mate, play }: Mate): Judgement {
  const { least, most } =
    is === 'hole' ? fit({ hole: other, shaft: mate }) : fit({ hole: mate, shaft: other });
  const left = { low: least, high: most };
  const figures = `it leaves ${range(left)} of play, wanted ${range(play, least.unit)}`;
  switch (within(left, play)) {
    case 'all':
      return { verdict: 'pass', reason: `${figures}.` };
    case 'some':
      return { verdict: 'doubtful', reason: `${figures}: it depends on the two parts; measure them.` };
    case 'none':
      return { verdict: 'fail', reason: `${figures}: never right.` };
  }
}

/** How much of the first range lies in the second. */
function within(range: SizeLimits, limits: SizeLimits): 'all' | 'some' | 'none' {
  const [low, high, least, most] = [range.low, range.high, limits.low, limits.high].map(toSi);
  if (low === undefined || high === undefined || least === undefined || most === undefined) return 'none';
  if (low > most + fitNoise || high < least - fitNoise) return 'none';
  return low >= least - fitNoise && high <= most + fitNoise ? 'all' : 'some';
}

/** `16.00 to 16.02 mm`, both with as many decimals as either needs. */
function range({ low, high }: SizeLimits, unit: Unit = low.unit): string {
  const [from, to] = [convert(low, unit).value, convert(high, unit).value];
  const digits = Math.max(decimals(from), decimals(to));
  return `${printNumber(from, digits)} to ${printNumber(to, digits)} ${unit}`;
}

/** The decimals that a value needs, at most six. */
function decimals(value: number): number {
  const text = value.toFixed(6).replace(/0+$/, '');
  return text.length - text.indexOf('.') - 1;
}
