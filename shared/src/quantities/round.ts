type Rounding = (value: number) => number;

/** Moves the decimal point in the number's own decimal digits, which a multiplication would disturb. */
function shift(value: number, places: number): number {
  const [mantissa = '0', exponent = '0'] = String(value).split('e');
  return Number(`${mantissa}e${Number(exponent) + places}`);
}

function roundWith(rounding: Rounding, value: number, digits: number): number {
  return shift(rounding(shift(value, digits)), -digits);
}

/** To so many decimals, a half away from zero, as the decimal digits of the number read (2.675 → 2.68). */
export function roundTo(value: number, digits: number): number {
  return Math.sign(value) * roundWith(Math.round, Math.abs(value), digits);
}

/** To so many decimals, downwards. */
export function floorTo(value: number, digits: number): number {
  return roundWith(Math.floor, value, digits);
}

/** To so many decimals, upwards. */
export function ceilTo(value: number, digits: number): number {
  return roundWith(Math.ceil, value, digits);
}

/** How many decimals a number is written with: 55.4 has one, 27 none, 1e-7 seven. */
export function decimalsOf(value: number): number {
  const [mantissa = '', exponent = '0'] = String(value).split('e');
  const fraction = mantissa.split('.')[1] ?? '';
  return Math.max(0, fraction.length - Number(exponent));
}
