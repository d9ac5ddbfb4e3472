/** Canonical unit symbols. Spellings a workshop uses are turned into these when text is read. */
export const units = {
  torque: ['N·m', 'lbf·ft', 'lbf·in', 'kgf·m', 'kgf·cm'],
  length: ['m', 'cm', 'mm', 'µm', 'in', 'thou', 'ft'],
  area: ['mm2', 'cm2', 'in2'],
  force: ['N', 'kN', 'lbf', 'kgf'],
  pressure: ['Pa', 'kPa', 'MPa', 'bar', 'psi'],
  volume: ['m3', 'l', 'cm3', 'mm3', 'in3'],
  temperature: ['°C', '°F', 'K'],
  time: ['s', 'min', 'h', 'd'],
  resistance: ['Ω', 'kΩ', 'MΩ'],
  mass: ['kg', 'g', 'lb'],
} as const;

export type Kind = keyof typeof units;
export type Unit = { readonly [K in Kind]: (typeof units)[K][number] }[Kind];

/** A physical figure with its unit. There is no default unit. */
export interface Quantity {
  readonly value: number;
  readonly unit: Unit;
}
