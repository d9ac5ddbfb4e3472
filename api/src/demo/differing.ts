import type { Difference } from './demo-file.js';

/** A copy of a document with some values replaced. Throws where a path leads nowhere. */
export function differing(document: unknown, differences: readonly Difference[]): unknown {
  const copy = structuredClone(document);
  for (const { path, value } of differences) {
    const last = path.at(-1);
    const place = path.slice(0, -1).reduce(stepInto, copy);
    if (last === undefined || !isNamed(place)) throw new Error(`There is no ${path.join('.')} in the file.`);
    place[last] = value;
  }
  return copy;
}

const isNamed = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

function stepInto(place: unknown, step: string): unknown {
  if (Array.isArray(place)) return place.find((item: unknown) => isNamed(item) && item['key'] === step);
  return isNamed(place) ? place[step] : undefined;
}
