import type { QuantityField } from './working.js';
import type { Unit } from '../contracts/quantity.js';

const bareFraction = /^[+\-−–]?\s*(?:\d+[ -])?\d+ ?[/⁄∕] ?\d+$|^[+\-−–]?\s*\d* ?[¼-¾⅐-⅞]$/;
const metric: readonly Unit[] = ['µm', 'mm', 'cm', 'm'];

/**
 * The unit that a field takes a text in where the text has none: the field's own, but inches for a bare vulgar
 * fraction in a metric length, for nobody writes fractions of a millimetre. Common practice, no source.
 * Example: `3/16` in a field of mm is inches, `4.8` is mm.
 */
export function unitTaken(field: Pick<QuantityField, 'of' | 'unit'>, text: string): Unit {
  const isInches = field.of === 'length' && metric.includes(field.unit) && bareFraction.test(text.trim());
  return isInches ? 'in' : field.unit;
}
