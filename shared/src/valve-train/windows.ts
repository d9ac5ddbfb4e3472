/**
 * Sets of closed windows on the circle of the four-stroke cycle, 720° of crank round, worked out from their
 * ends and not by sampling. A window starts in [0, 720) and may run on past 720; a set is sorted, its windows
 * do not touch, and a point is a window of no length.
 */
export interface Window {
  readonly from: number;
  readonly to: number;
}
export type Windows = readonly Window[];

export const cycle = 720;

/** Rounding noise of sums of firing angles; far below anything that can be seen on a crank. */
const noise = 1e-9;

export const nowhere: Windows = [];
export const anywhere: Windows = [{ from: 0, to: cycle }];

/** The window from one angle forwards to another, anywhere on the number line; `to` is not before `from`. */
export function windowFrom(from: number, to: number): Windows {
  return united([{ from, to }]);
}

/** All points that are in one set or the other. */
export function union(one: Windows, other: Windows): Windows {
  return united([...one, ...other]);
}

/** All points that are in both sets. */
export function intersection(one: Windows, other: Windows): Windows {
  const common: Window[] = [];
  for (const a of one) {
    for (const b of other) {
      for (const turn of [-cycle, 0, cycle]) {
        const from = Math.max(a.from, b.from + turn);
        const to = Math.min(a.to, b.to + turn);
        if (to >= from - noise) common.push({ from, to: Math.max(from, to) });
      }
    }
  }
  return united(common);
}

/** The set carried forwards by an angle; backwards if it is negative. */
export function shifted(windows: Windows, by: number): Windows {
  return united(windows.map(({ from, to }) => ({ from: from + by, to: to + by })));
}

/** Every point that can be reached from the set by going back at most `back` or on at most `on`. */
export function stretched(windows: Windows, back: number, on: number): Windows {
  return united(windows.map(({ from, to }) => ({ from: from - back, to: to + on })));
}

/** Whether an angle, taken round the circle, lies in the set; its ends belong to it. */
export function holds(windows: Windows, angle: number): boolean {
  const at = wrapped(angle);
  return windows.some(({ from, to }) =>
    [-cycle, 0, cycle].some((turn) => at + turn >= from - noise && at + turn <= to + noise),
  );
}

/** The set as pairs within 0–720, in order; a window that runs over 720 is split in two. */
export function asPairs(windows: Windows): [number, number][] {
  const pairs = windows.flatMap(({ from, to }): [number, number][] =>
    to > cycle
      ? [
          [0, to - cycle],
          [from, cycle],
        ]
      : [[from, to]],
  );
  return pairs.sort(([a], [b]) => a - b);
}

/** An angle brought into [0, 720); one that is 720 but for rounding noise is 0. */
export function wrapped(angle: number): number {
  const rest = angle % cycle;
  const positive = rest < 0 ? rest + cycle : rest;
  return cycle - positive < noise ? 0 : positive;
}

function united(windows: Windows): Windows {
  if (windows.some(({ from, to }) => to - from >= cycle)) return anywhere;
  const sorted = windows
    .map(({ from, to }) => ({ from: wrapped(from), to: wrapped(from) + (to - from) }))
    .sort((a, b) => a.from - b.from);
  const merged: Window[] = [];
  for (const window of sorted) {
    const last = merged.at(-1);
    if (last && window.from <= last.to + noise) {
      merged[merged.length - 1] = { from: last.from, to: Math.max(last.to, window.to) };
    } else merged.push(window);
  }
  return joinedOverTheTop(merged);
}

/** Of windows in order and apart, only the last can run over 720, and then into the first ones. */
function joinedOverTheTop(merged: Windows): Windows {
  const last = merged.at(-1);
  if (!last) return nowhere;
  let reach = last.to - cycle;
  let swallowed = 0;
  for (const first of merged.slice(0, -1)) {
    if (first.from > reach + noise) break;
    reach = Math.max(reach, first.to);
    swallowed += 1;
  }
  const joined = { from: last.from, to: Math.max(last.to, reach + cycle) };
  return joined.to - joined.from >= cycle - noise ? anywhere : [...merged.slice(swallowed, -1), joined];
}
