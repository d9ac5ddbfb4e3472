import { InputError } from '@second-spanner/shared/contracts/input-error';
import type { Quantity, Unit } from '@second-spanner/shared/contracts/quantity';
import { parseQuantity } from '@second-spanner/shared/quantities/parse';

/** What a reading field holds: nothing yet, a figure, or something that is none. */
export type FigureRead =
  | { readonly quantity: Quantity; readonly error: null }
  | { readonly quantity: null; readonly error: string | null };

/** Reads what was typed: comma or point, fractions, and a unit where one is typed too. */
export function readFigure(text: string, unit: Unit): FigureRead {
  if (text.trim() === '') return { quantity: null, error: null };
  try {
    return { quantity: parseQuantity(text, unit, 'reading'), error: null };
  } catch (error) {
    if (error instanceof InputError) return { quantity: null, error: error.message };
    throw error;
  }
}
