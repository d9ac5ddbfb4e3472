// @ts-check
// Percentiles, and figures as the table prints them.

/** @param {number[]} times @param {number} share between 0 and 1 @returns {number} NaN when there are none */
export const percentile = (times, share) => {
  const sorted = [...times].sort((a, b) => a - b);
  return sorted[Math.max(0, Math.ceil(sorted.length * share) - 1)] ?? NaN;
};

/** The middle one. @param {number[]} values */
export const median = (values) => percentile(values, 0.5);

/** Two digits. @param {number} value */
export const two = (value) =>
  Math.abs(value) >= 100 ? String(Math.round(value)) : String(Number(value.toPrecision(2)));

/** @param {number} value */
export const ms = (value) => `${two(value)} ms`;

/** @param {number} bytes */
export const kB = (bytes) => `${Math.round(bytes / 1000)} kB`;
