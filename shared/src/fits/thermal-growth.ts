/**
 * How much a length grows when it is warmed by `rise`: α·d·ΔT. Length in metres, coefficient in 10⁻⁶ per kelvin,
 * rise in kelvin (a difference, negative for cooling); answer in metres. A bore grows as the solid would.
 *
 * Source: definition of the mean coefficient of linear expansion.
 * Example: 30 mm of steel (11.7) warmed by 85 K grows 29.8 µm.
 */
export function thermalGrowth(length: number, coefficient: number, rise: number): number {
  return coefficient * 1e-6 * length * rise;
}
