import type { SpecDocument } from '../contracts/spec.js';
import { beltRows, keyRows, measurementRows } from './rows/clearance-rows.js';
import { compoundRows, partRows } from './rows/compound-rows.js';
import { engineRows } from './rows/engine-rows.js';
import { ignitionRows } from './rows/ignition-rows.js';
import { tighteningRows } from './rows/tightening-rows.js';
import { valveTrainRows } from './rows/valve-train-rows.js';
import type { SpecRow } from './spec-row.js';

export { specSections, type SpecRow, type SpecSection } from './spec-row.js';
export { sourceText } from './source-text.js';

/** Every value of a spec with its source, a row each, in the order of `specSections`. */
export function specRows(document: SpecDocument): readonly SpecRow[] {
  return [
    ...engineRows(document.engine),
    ...ignitionRows(document.ignition),
    ...valveTrainRows(document.valveTrain),
    ...tighteningRows(document.fastenerGroups),
    ...measurementRows(document.measurements),
    ...keyRows(document.keys),
    ...beltRows(document.belt),
    ...compoundRows(document.compounds, document.consumables),
    ...partRows(document.parts, document.cautions),
  ];
}

/**
 * How many values a spec holds: its rows, and the second figures that a page prints beside a torque. A set of valve
 * timing or of cure points counts a value each.
 */
export function countValues(document: SpecDocument): number {
  return specRows(document).reduce((sum, row) => sum + (row.alsoPrinted === undefined ? 1 : 2), 0);
}
