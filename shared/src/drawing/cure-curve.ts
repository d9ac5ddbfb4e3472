import type { Cure, CureRequest } from '../contracts/curing.js';
import { requireMoment, sayClock, saySpan } from '../curing/moments.js';
import { cureTimes, timeTicks, type CureTimes } from './cure-scale.js';
import { arrowHead, corners, hatching, round, track } from './geometry.js';
import { circle, line, path, text, textWidth, type Drawing, type Shape } from './shapes.js';
import { wording, type DrawingOptions } from './words.js';

const width = 340;
const left = 68;
const right = 328;
const top = 48;
const bottom = 150;
const levels = { handle: 116, load: 82, full: 48 } as const;

/**
 * How far a joint has set: its stages over the time since it was closed, with now marked and the wait hatched.
 * The line runs only between the stages that the data sheet gives. Null where nothing was worked out.
 */
export function drawCureCurve(request: CureRequest, answer: Cure, options?: DrawingOptions): Drawing | null {
  const times = cureTimes(request, answer);
  if (times === null || answer.loadAt === undefined) return null;
  const { say } = wording(options);
  const applied = requireMoment(request.applied, 'applied');
  const clock = (iso: string): string => sayClock(requireMoment(iso, 'time').at, applied);
  const wait = times.load - times.now;
  const words = {
    now: `now ${clock(request.now)}`,
    load: `load from ${clock(answer.loadAt)}`,
    wait: wait > 0 ? `${saySpan(wait)} to wait` : 'ready',
  };
  const at = (time: number): number => round(left + (time / times.end) * (right - left));
  return {
    title: 'Cure with the time since the joint was closed',
    description: say(
      `It may be loaded ${saySpan(times.load)} after closing, at ${clock(answer.loadAt)}. ` +
        `Now is ${clock(request.now)}, ${saySpan(times.now)} after closing: ${words.wait}.`,
    ),
    width,
    height: 194,
    shapes: [
      ...waiting(times, at),
      ...axes(times, at, request.closed === undefined),
      ...stages(times, at),
      ...loadMark(at(times.load), words.load),
      ...nowMark(times, at, words.now),
      text(12, 14, words.wait, { weight: 600, ink: wait > 0 ? 'oxide' : 'ink' }),
    ],
    table: {
      columns: ['Stage', 'After closing', 'At'],
      rows: [
        ...stageRow('May be handled', times.handle, answer.handleAt, clock),
        ...stageRow('May be loaded', times.load, answer.loadAt, clock),
        ...stageRow('Full strength', times.full, answer.fullAt, clock),
        ['Now', saySpan(times.now), clock(request.now)],
      ],
    },
  };
}

const stageRow = (
  name: string,
  span: number | undefined,
  iso: string | undefined,
  clock: (iso: string) => string,
): readonly (readonly string[])[] =>
  span === undefined || iso === undefined ? [] : [[name, saySpan(span), clock(iso)]];

/** The hatched time in which it may not be loaded yet. */
function waiting({ now, load }: CureTimes, at: (time: number) => number): readonly Shape[] {
  if (at(load) - at(now) < 1) return [];
  const zone = corners(at(now), top - 8, at(load) - at(now), bottom - top + 8);
  return [{ ...hatching(zone, 45, 6.5), part: 'wait' }];
}

function axes({ end }: CureTimes, at: (time: number) => number, fromApplied: boolean): readonly Shape[] {
  const { unit, ticks } = timeTicks(end);
  const since = fromApplied ? 'it was applied' : 'the joint was closed';
  return [
    line(left, bottom, left, top - 8, 'edge'),
    line(left, bottom, right, bottom, 'outline'),
    ...Object.entries(levels).flatMap(([name, y]) => [
      line(left, y, right, y, 'thin'),
      text(left - 6, y + 4.5, name, { anchor: 'end', ink: 'ink-2' }),
    ]),
    ...ticks.flatMap(({ at: time, label }) => [
      line(at(time), bottom, at(time), bottom + 4, 'edge'),
      text(at(time), bottom + 18, label, { anchor: 'middle', face: 'figures' }),
    ]),
    text(right, bottom + 36, `${unit} since ${since}`, { anchor: 'end', ink: 'ink-2' }),
  ];
}

interface Stage {
  readonly time: number;
  readonly y: number;
}

function stagesOf({ handle, load, full }: CureTimes): readonly Stage[] {
  return [
    ...(handle === undefined ? [] : [{ time: handle, y: levels.handle }]),
    { time: load, y: levels.load },
    ...(full === undefined ? [] : [{ time: full, y: levels.full }]),
  ];
}

function stages(times: CureTimes, at: (time: number) => number): readonly Shape[] {
  const points = stagesOf(times).map(({ time, y }) => ({ x: at(time), y }));
  return [
    ...(points.length > 1 ? [path(track(points), { pen: 'blue', part: 'curve' })] : []),
    ...points.map(({ x, y }) => circle(x, y, 3.4, { pen: 'edge', fill: 'paper', part: 'stage' })),
  ];
}

function loadMark(x: number, words: string): readonly Shape[] {
  return [line(x, bottom, x, 34, 'outline', 'load'), besides(x, 32, words, 'ink')];
}

function nowMark(times: CureTimes, at: (time: number) => number, words: string): readonly Shape[] {
  if (times.now > times.end) {
    return [
      { ...arrowHead({ x: right + 8, y: 100 }, 90, 'oxide', 11, 3.4), part: 'now' },
      text(right - 6, 100 + 4.5, words, { anchor: 'end', ink: 'oxide', halo: true }),
    ];
  }
  const x = at(times.now);
  const y = heightAt(times);
  return [
    line(x, bottom, x, top - 8, 'oxide', 'now'),
    ...(y === undefined ? [] : [circle(x, round(y), 4, { fill: 'oxide', part: 'now-dot' })]),
    besides(x, bottom - 8, words, 'oxide'),
  ];
}

/** Where the line is now, or undefined outside its ends. */
function heightAt(times: CureTimes): number | undefined {
  const points = stagesOf(times);
  const next = points.findIndex(({ time }) => time >= times.now);
  const [a, b] = [points[next - 1], points[next]];
  if (a === undefined || b === undefined || b.time === a.time) return undefined;
  return a.y + ((b.y - a.y) * (times.now - a.time)) / (b.time - a.time);
}

/** A label right of a line, or left of it where there is no room. */
function besides(x: number, y: number, words: string, ink: 'ink' | 'oxide'): Shape {
  const label = text(x + 5, y, words, { weight: 600, halo: true, ink });
  if (x + 5 + textWidth(label) <= width - 2) return label;
  return { ...label, at: { x: x - 5, y }, anchor: 'end' };
}
