import type { Dialect } from '../contracts/people.js';
import { tradeText } from '../contracts/trade-words.js';

/** How a person wants a drawing's words and figures. */
export interface DrawingOptions {
  /** British by default. */
  readonly dialect?: Dialect;
  /** Prints a figure, by default with a decimal point. */
  readonly figure?: (value: number, decimals: number) => string;
}

/** The same with nothing left open: `say` puts in the trade words of a text written with `{word}` tokens. */
export interface Wording {
  readonly say: (text: string) => string;
  readonly figure: (value: number, decimals: number) => string;
}

export function wording({ dialect = 'british', figure }: DrawingOptions = {}): Wording {
  return {
    say: (text) => tradeText(text, dialect),
    figure: figure ?? ((value, decimals) => value.toFixed(decimals)),
  };
}

/** The decimals a figure needs, at most `most`. */
export function decimalsOf(value: number, most: number): number {
  for (let decimals = 0; decimals < most; decimals += 1) {
    if (Math.abs(value - Number(value.toFixed(decimals))) < 10 ** -(most + 2)) {
      return decimals;
    }
  }
  return most;
}

/** `one`, `one and two`, `one, two and three`. */
export function inWords(items: readonly string[]): string {
  const last = items.at(-1) ?? '';
  return items.length < 2 ? last : `${items.slice(0, -1).join(', ')} and ${last}`;
}

/** A name cut to what its place on a drawing can hold; the table has it whole. */
export function shortened(name: string, most: number): string {
  const characters = [...name];
  return characters.length <= most ? name : `${characters.slice(0, most - 1).join('')}…`;
}
