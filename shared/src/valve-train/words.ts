import type { Cylinder } from '../contracts/calculations.js';
import { degrees } from '../ignition/words.js';
import { clip } from '../quantities/clip.js';
import { anywhere, cycle, type Windows } from './windows.js';

/** `No. 3`, or `cylinder L1` where the cylinders have labels. */
export function nameOf(cylinder: Cylinder): string {
  return typeof cylinder === 'number' ? `No. ${cylinder}` : `cylinder ${clip(cylinder)}`;
}

/** Windows of a cylinder's phase for a sentence: `350° to 10°` where one runs over 720°. */
export function rangesOf(windows: Windows): string {
  if (windows === anywhere) return 'any angle';
  const ranges = windows.map(({ from, to }) =>
    to === from ? degrees(from) : `${degrees(from)} to ${degrees(to > cycle ? to - cycle : to)}`,
  );
  const last = ranges.pop() ?? 'nowhere';
  return ranges.length === 0 ? last : `${ranges.join(', ')} or ${last}`;
}
