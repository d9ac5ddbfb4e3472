// @ts-check
// The table: what, goal, measured, verdict.
import { say } from '../lib/say.js';

/**
 * @typedef {object} Row
 * @property {string} what
 * @property {string} goal
 * @property {string} measured
 * @property {boolean} [met] left out where nothing was measured, or no goal is set
 */

export const notMeasured = 'not measured here';

/** @param {Row} row */
const verdictOf = ({ met }) => {
  if (met === undefined) return '-';
  return met ? 'met' : 'MISSED';
};

/** @param {Row[]} rows */
export const printTable = (rows) => {
  const lines = [
    ['what', 'goal', 'measured', 'verdict'],
    ...rows.map((row) => [row.what, row.goal, row.measured, verdictOf(row)]),
  ];
  const widths = [0, 1, 2].map((column) => Math.max(...lines.map((line) => line[column]?.length ?? 0)));
  say();
  for (const line of lines) {
    say(line.map((cell, column) => cell.padEnd(widths[column] ?? 0)).join('   '));
  }
};
