/**
 * What neighbours and parts stand when a joint is put together hot or cold. Temperatures in °C; rises are
 * differences in kelvin.
 *
 * Sources: a bearing supplier's note on hot mounting of 2013 (`BRG1` of the reference values: 80 to 90 K above
 * the shaft, never over 125 °C) and a bearing maker's chapter on it (`BRG2`: open bearings to 120 °C, sealed ones
 * to 80 °C, housings 20 to 50 K); dry ice and liquid nitrogen at the air's pressure, from memory.
 */
export const heatLimits = {
  bearingAboveShaft: { low: 80, high: 90 },
  bearingNeverAbove: 125,
  openBearing: 120,
  sealedBearing: 80,
  housingRise: { low: 20, high: 50 },
  dryIce: -78.5,
  liquidNitrogen: -196,
} as const;
