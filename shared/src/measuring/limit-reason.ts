import type { Quantity } from '../contracts/quantity.js';
import { digitsFor, printQuantity, roundInwards } from '../quantities/print.js';
import { ceilTo, decimalsOf, roundTo } from '../quantities/round.js';
import { floatNoise } from './reading-input.js';

export interface Limit {
  readonly side: 'low' | 'high';
  readonly given: Quantity;
  /** In the reading's unit. */
  readonly at: number;
}

/** What a decision rests on; the bare numbers are in the reading's unit. */
export interface Figures {
  readonly reading: Quantity;
  readonly value: number;
  /** Low before high. */
  readonly limits: readonly Limit[];
  readonly uncertainty: number;
  readonly uncertaintyGiven: Quantity | undefined;
}

type Finding = 'pass' | 'fail' | 'doubtful' | 'too-coarse';

/**
 * The sentence that goes with a decision, and after it the rule that was used.
 * `clear` is how far the reading is inside the limit that decides, negative beyond it.
 */
export function limitReason(finding: Finding, figures: Figures, nearest: Limit, clear: number): string {
  const spare = spareOf(finding, figures, nearest, clear);
  const digits = digitsToShow(figures, spare);
  const print = (value: number): string => printQuantity({ value, unit: figures.reading.unit }, { digits });
  const words: Words = {
    value: printQuantity(figures.reading, { digits: Math.min(digits, decimalsMeasured(figures)) }),
    limit: clear === 0 ? print(nearest.at) : printLimit(nearest, figures, digits),
    spare: print(spare),
    isAt: roundTo(spare, digits) === 0,
    tool: `±${print(ceilTo(roundTo(figures.uncertainty, digits + 4), digits))}`,
    isSharp: figures.uncertainty === 0,
    where: clear >= 0 ? 'inside' : nearest.side === 'low' ? 'under' : 'over',
  };
  const sentence = finding === 'too-coarse' ? tooCoarse(words, figures, digits) : sentences[finding](words);
  return `${sentence} ${rule(figures)}`;
}

/** What the sentence names: how far beyond the limit, or how far inside what the tool leaves of it. */
function spareOf(finding: Finding, { value, uncertainty }: Figures, { at }: Limit, clear: number): number {
  if (finding !== 'pass') return Math.abs(clear);
  const left = clear - uncertainty;
  return left <= floatNoise(value, at, uncertainty) ? 0 : left;
}

interface Words {
  readonly value: string;
  readonly limit: string;
  readonly spare: string;
  readonly isAt: boolean;
  readonly tool: string;
  readonly isSharp: boolean;
  readonly where: 'inside' | 'under' | 'over';
}

const sentences: Record<'pass' | 'fail' | 'doubtful', (words: Words) => string> = {
  pass: ({ value, limit, spare, isAt, tool, isSharp }) => {
    const position = isAt ? 'just inside' : `${spare} inside`;
    const sharp = isAt ? `${value} is on the limit of ${limit}, which is still good.` : '';
    if (isSharp) return sharp || `${value} is ${position} the limit of ${limit}.`;
    return `${value} is ${position} the limit of ${limit}, after the tool's ${tool}.`;
  },
  fail: ({ value, limit, spare, tool, isSharp, where }) => {
    const excuse = isSharp ? '' : `, more than the tool's ${tool} can explain`;
    return `${value} is ${spare} ${where} the limit of ${limit}${excuse}.`;
  },
  doubtful: ({ value, limit, spare, isAt, tool, where }) => {
    const position = isAt ? `on the limit of ${limit}` : `${spare} ${where} the limit of ${limit}`;
    return `${value} is ${position}, within the tool's ${tool} of it: measure it with a finer tool.`;
  },
};

function tooCoarse(
  { value, limit, spare, isAt, tool, where }: Words,
  figures: Figures,
  digits: number,
): string {
  const [low, high] = figures.limits.map((one) => printLimit(one, figures, digits));
  const outside =
    where === 'inside' || isAt ? '' : ` ${value} is ${spare} ${where} the limit of ${limit} as read.`;
  return `The tool is too coarse: its ${tool} leaves no room to pass between ${low} and ${high}.${outside}`;
}

function rule({ uncertaintyGiven, uncertainty }: Figures): string {
  if (uncertaintyGiven === undefined) {
    return 'Rule: no uncertainty was given, so the figure as read decides; the limit itself is good.';
  }
  if (uncertainty === 0) {
    return 'Rule: the uncertainty was given as nothing, so the figure as read decides; the limit itself is good.';
  }
  return "Rule: it passes only when clear of the limit by the tool's whole uncertainty (k = 2), and fails only when beyond it by more than that.";
}

/** A limit in the reading's unit, rounded inwards; as it was given in brackets where the units differ. */
function printLimit(limit: Limit, { reading }: Figures, digits: number): string {
  const rounded = roundInwards(limit.given, reading.unit, digits, limit.side);
  const text = printQuantity(rounded, { digits });
  return limit.given.unit === reading.unit ? text : `${text} (${printQuantity(limit.given)})`;
}

/** As many decimals as the figures were given with, in the reading's unit; enough to show what decides. */
function digitsToShow(figures: Figures, spare: number): number {
  const { reading, limits, uncertainty } = figures;
  const [low, high] = limits;
  const band = low !== undefined && high !== undefined ? high.at - low.at : uncertainty;
  const most = digitsFor({ tolerance: band > 0 ? band : Math.abs(reading.value) });
  const isMixed = givenFigures(figures).some(({ unit }) => unit !== reading.unit);
  // Figures are shown as they were typed, but not the long tail of one that was converted before.
  const digits = isMixed ? most : Math.min(decimalsWritten(figures), most + 3);
  return spare > 0 ? Math.max(digits, Math.min(9, placesToFirstDigit(spare))) : digits;
}

/** The most decimals among the figures given in the reading's unit. */
function decimalsWritten(figures: Figures): number {
  return mostDecimals(givenFigures(figures), figures.reading.unit);
}

/** As many as the reading was taken to: a tool's uncertainty is often a share of it, with decimals of its own. */
function decimalsMeasured({ reading, limits }: Figures): number {
  return mostDecimals([reading, ...limits.map(({ given }) => given)], reading.unit);
}

function mostDecimals(figures: readonly Quantity[], unit: Quantity['unit']): number {
  const alike = figures.filter((figure) => figure.unit === unit);
  return Math.max(...alike.map(({ value }) => decimalsOf(value)));
}

function givenFigures({ reading, limits, uncertaintyGiven }: Figures): Quantity[] {
  const uncertainty = uncertaintyGiven === undefined ? [] : [uncertaintyGiven];
  return [reading, ...limits.map((limit) => limit.given), ...uncertainty];
}

/** How many decimals it takes until a number does not round to nothing: 0.04 takes two, 0.06 one. */
function placesToFirstDigit(value: number): number {
  return Math.ceil(-Math.log10(2 * value));
}
