import { InputError } from '../contracts/input-error.js';
import type { Quantity } from '../contracts/quantity.js';
import type { Shim, ShimRequest } from '../contracts/valve-figures.js';
import { limitDecision } from '../measuring/limit-decision.js';
import { convert } from '../quantities/convert.js';
import { digitsFor, printQuantity } from '../quantities/print.js';
import { requireList, requireQuantity, requireRecord } from '../quantities/require.js';

const mostSizes = 200;

interface Figures {
  readonly fitted: Quantity;
  readonly measured: Quantity;
  readonly low: Quantity;
  readonly high: Quantity;
  readonly sizes: readonly Quantity[];
}

/**
 * The shim that gives the lash wanted: fitted + measured − middle of what is wanted; and of the sizes at hand the
 * one that comes nearest, with the lash that it leaves. Passes where the lash measured is within what is wanted
 * already. The shim is in the unit of the one fitted, lash in that of the lash measured.
 *
 * @throws InputError on `fitted`, `measured`, `wanted.low`, `wanted.high`, `sizes[i]`; on `wanted.low` above
 * `wanted.high`; on `fitted` where no shim is thin enough
 * Source: old + measured − wanted, by definition of the lash. Example: 2.50 mm, 0.15 mm, 0.20 to 0.30 mm: 2.40 mm.
 */
export function shim(request: ShimRequest): Shim {
  const figures = readFigures(requireRecord(request, 'request'));
  const { fitted, measured, low, high, sizes } = figures;
  const judged = limitDecision({ value: measured, low, high });
  const stack = fitted.value + convert(measured, fitted.unit).value;
  const middle = (convert(low, fitted.unit).value + convert(high, fitted.unit).value) / 2;
  if (stack <= middle) {
    throw new InputError('fitted', 'No shim is thin enough to leave this lash: measure both again.');
  }
  const needed = { value: stack - middle, unit: fitted.unit };
  const choice = sizes.length === 0 ? undefined : nearest(sizes, needed, stack, measured.unit);
  return {
    verdict: judged.verdict,
    reason: [judged.reason, whatToDo(figures, needed, judged.verdict === 'pass', choice)].join(' '),
    shim: needed,
    ...(choice === undefined ? {} : { choice }),
  };
}

function readFigures(given: Readonly<Record<string, unknown>>): Figures {
  const length = (input: unknown, field: string, zero = true): Quantity =>
    requireQuantity(input, 'length', field, { zero });
  const fitted = length(given['fitted'], 'fitted', false);
  const measured = length(given['measured'], 'measured');
  const wanted = requireRecord(given['wanted'], 'wanted');
  const low = length(wanted['low'], 'wanted.low');
  const high = length(wanted['high'], 'wanted.high');
  if (convert(low, high.unit).value > high.value) {
    throw new InputError(
      'wanted.low',
      `The least, ${printQuantity(low)}, is more than the most, ${printQuantity(high)}.`,
    );
  }
  const list = given['sizes'] === undefined ? [] : requireList(given['sizes'], 'sizes', { max: mostSizes });
  return { fitted, measured, low, high, sizes: list.map((size, i) => length(size, `sizes[${i}]`, false)) };
}

type Choice = NonNullable<Shim['choice']>;

function nearest(
  sizes: readonly Quantity[],
  needed: Quantity,
  stack: number,
  lashUnit: Quantity['unit'],
): Choice {
  const off = (size: Quantity): number => Math.abs(convert(size, needed.unit).value - needed.value);
  const size = sizes.reduce((best, one) => (off(one) < off(best) ? one : best));
  const lash = { value: stack - convert(size, needed.unit).value, unit: needed.unit };
  return { shim: size, lash: convert(lash, lashUnit) };
}

function whatToDo(figures: Figures, needed: Quantity, isRight: boolean, choice: Choice | undefined): string {
  const { measured, low, high } = figures;
  if (isRight) return 'The shim fitted can stay.';
  const first =
    measured.value === 0
      ? ' With no clearance at all the valve may be held open, so this is a first guess: fit it and measure again.'
      : '';
  const ideal = `A shim of ${print(needed, figures)} gives the middle of what is wanted.${first}`;
  if (choice === undefined) return ideal;
  const left = limitDecision({ value: choice.lash, low, high }).verdict === 'pass';
  const which = `The nearest at hand, ${printQuantity(choice.shim)}, leaves ${print(choice.lash, figures)}`;
  return `${ideal} ${which}, which is ${left ? 'within' : 'not within'} what is wanted.`;
}

/** To two digits past the width of what is wanted. */
function print(quantity: Quantity, { low, high }: Figures): string {
  // Twelve figures: 0.3 less 0.2 is 0.1 and not a hair under it.
  const width = Number(
    (convert(high, quantity.unit).value - convert(low, quantity.unit).value).toPrecision(12),
  );
  const tolerance = width > 0 ? width : convert(high, quantity.unit).value;
  return printQuantity(quantity, {
    digits: digitsFor({ tolerance: tolerance === 0 ? quantity.value : tolerance }),
  });
}
