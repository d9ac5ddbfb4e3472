import type { WorkingCase } from './working.js';

/**
 * Rows of cells as one text that an address can hold: cells parted by `|`, rows by `;`. A backslash goes
 * before any of the three in a cell. Rows at the end that are wholly empty are left out.
 */
export function writeRows(rows: readonly WorkingCase[], columns: readonly string[]): string {
  const lines = rows.map((row) => columns.map((name) => escape(row[name] ?? '')).join('|'));
  while (lines.length > 0 && /^\|*$/.test(lines.at(-1) ?? '')) lines.pop();
  return lines.join(';');
}

/** The rows of such a text, each cell by its column; cells that are not there are empty, those too many dropped. */
export function readRows(text: string, columns: readonly string[]): readonly WorkingCase[] {
  if (text === '') return [];
  return split(text, ';').map((line) => {
    const cells = split(line, '|').map(unescape);
    return Object.fromEntries(columns.map((name, i) => [name, cells[i] ?? '']));
  });
}

const escape = (cell: string): string => cell.replace(/[\\|;]/g, (sign) => `\\${sign}`);
const unescape = (cell: string): string => cell.replace(/\\(.)/gs, '$1');

/** At each sign that no backslash takes. */
function split(text: string, sign: string): readonly string[] {
  const parts: string[] = [''];
  for (let i = 0; i < text.length; i += 1) {
    const one = text.charAt(i);
    if (one === sign) parts.push('');
    else parts[parts.length - 1] += one === '\\' ? one + text.charAt((i += 1)) : one;
  }
  return parts;
}
