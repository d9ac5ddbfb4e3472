import { degrees } from '../ignition/words.js';

const cycle = 720;

/**
 * Windows of a cylinder's phase as they lie about a TDC of it, in words: `26° before to 31° after TDC`. `windows`
 * are pairs within 0 to 720°, one that runs over 720° in two; `top` is 0 or 360. Undefined where they are not one
 * stretch with that TDC in it.
 */
export function aroundTop(windows: readonly (readonly [number, number])[], top: 0 | 360): string | undefined {
  const [first, last] = [windows[0], windows.at(-1)];
  if (first === undefined || last === undefined) return undefined;
  const isSplit = windows.length === 2 && first[0] === 0 && last[1] === cycle;
  if (windows.length > 1 && !isSplit) return undefined;
  const [from, to] = isSplit ? [last[0] - cycle, first[1]] : first;
  if (from > top || to < top) return undefined;
  return `${degrees(top - from)} before to ${degrees(to - top)} after TDC`;
}
