import type { CylinderClock, ValveClock, ValveClockRequest, ValveState } from '../contracts/calculations.js';
import { arrowHead, corners, fold, hatching, polar, ringPiece, round, track } from './geometry.js';
import { centredText, circle, line, path, rect, text, type Drawing, type Shape } from './shapes.js';
import { decimalsOf, shortened, wording, type DrawingOptions, type Wording } from './words.js';

export interface ValveClockInput {
  readonly request: Pick<ValveClockRequest, 'valveTiming' | 'crank'>;
  readonly clock: Pick<ValveClock, 'cylinders'>;
}

const width = 340;
const centre = { x: 170, y: 163 };
const ring = 135;
const hub = 37;
const widestTrack = 22;

/**
 * The valve clock: once round is 720° of crank, 0° at the top, clockwise. Each cylinder has a track, the
 * first of the order outermost, with its exhaust open on the outer half (hatched) and its inlet open on the
 * inner half; its number stands at its compression TDC. The hand stands at the crank's angle.
 */
export function drawValveClock(input: ValveClockInput, options?: DrawingOptions): Drawing {
  const words = wording(options);
  const { cylinders } = input.clock;
  const { crank, valveTiming } = input.request;
  const pitch = round(Math.min(widestTrack, (ring - 4 - hub - 3) / Math.max(1, cylinders.length)));
  const tracks = cylinders.map((cylinder, i) => ({
    cylinder,
    firesAt: fold(crank - cylinder.phase, 720),
    outer: round(ring - 4 - i * pitch),
  }));
  return {
    title: 'Valve clock',
    description: describe(input, words),
    width,
    height: centre.y * 2 + 22,
    shapes: [
      ...dial(),
      ...tracks.flatMap(({ firesAt, outer }) => valvesOpen(valveTiming, firesAt, outer, pitch)),
      ...tracks.map(({ outer }) => circle(centre.x, centre.y, round(outer - pitch + 1), { pen: 'thin' })),
      ...hand(crank, words),
      ...tracks.flatMap(({ cylinder, firesAt, outer }) => number(cylinder, firesAt, outer - pitch / 2)),
      ...key(words),
    ],
    table: {
      columns: ['Cylinder', 'Fires at', 'Stroke now', words.say('{Inlet}'), 'Exhaust'],
      rows: tracks.map(({ cylinder, firesAt }) => [
        String(cylinder.cylinder),
        degrees(firesAt, words),
        words.say(cylinder.stroke === 'inlet' ? '{inlet}' : cylinder.stroke),
        stateWords[cylinder.inlet],
        stateWords[cylinder.exhaust],
      ]),
    },
  };
}

const stateWords: Record<ValveState, string> = {
  shut: 'shut',
  opening: 'opening',
  full: 'fully open',
  closing: 'closing',
};

function degrees(angle: number, { figure }: Wording): string {
  return `${figure(angle, decimalsOf(angle, 1))}°`;
}

/** Crank degrees to degrees round the clock. */
function round720(crank: number): number {
  return round(crank / 2);
}

function dial(): readonly Shape[] {
  const ticks = Array.from({ length: 72 }, (_, i) => {
    const [long, pen] =
      i % 18 === 0 ? ([7, 'edge'] as const) : i % 3 === 0 ? ([5, 'thin'] as const) : ([2.5, 'thin'] as const);
    const [from, to] = [polar(centre, ring, i * 5), polar(centre, ring + (i % 18 === 0 ? 4 : long), i * 5)];
    return line(from.x, from.y, to.x, to.y, i % 9 === 0 ? 'edge' : pen);
  });
  const spokes = [0, 90, 180, 270].map((angle) => {
    const [from, to] = [polar(centre, hub, angle), polar(centre, ring, angle)];
    return line(from.x, from.y, to.x, to.y, 'centre');
  });
  const label = { face: 'figures', weight: 600 } as const;
  return [
    ...ticks,
    circle(centre.x, centre.y, ring, { pen: 'outline', fill: 'paper' }),
    ...spokes,
    text(centre.x, centre.y - ring - 9, '0°', { ...label, anchor: 'middle' }),
    text(width - 1, centre.y + 4.5, '180°', { ...label, anchor: 'end' }),
    text(centre.x, centre.y + ring + 19, '360°', { ...label, anchor: 'middle' }),
    text(1, centre.y + 4.5, '540°', { ...label }),
  ];
}

function valvesOpen(
  { ivo, ivc, evo, evc }: ValveClockRequest['valveTiming'],
  firesAt: number,
  outer: number,
  pitch: number,
): readonly Shape[] {
  const middle = outer - pitch / 2 + 0.5;
  const inner = outer - pitch + 1.5;
  const piece = (from: number, to: number, low: number, high: number): ReturnType<typeof ringPiece> =>
    ringPiece(centre, low, high, round720(firesAt + from), round720(firesAt + to));
  const exhaust = piece(180 - evo, 360 + evc, middle, outer - 0.5);
  const inlet = piece(360 - ivo, 540 + ivc, inner, middle);
  const isNarrow = pitch <= 14;
  const [edge, blue] = isNarrow ? (['dimension', 'blue-thin'] as const) : (['edge', 'blue'] as const);
  return [
    ...(evo + 180 + evc > 0
      ? [
          path(`${track(exhaust)}Z`, { fill: 'paper' }),
          hatching(exhaust, 45, isNarrow ? 3 : 4.2),
          path(`${track(exhaust)}Z`, { pen: edge, part: 'exhaust-open' }),
        ]
      : []),
    ...(ivo + 180 + ivc > 0
      ? [path(`${track(inlet)}Z`, { pen: blue, fill: 'blue-wash', part: 'inlet-open' })]
      : []),
  ];
}

function number({ cylinder }: CylinderClock, firesAt: number, radius: number): readonly Shape[] {
  const at = polar(centre, radius, round720(firesAt));
  const name = shortened(String(cylinder), 3);
  const disc = [8.5, 10.5, 13][name.length - 1] ?? 13;
  return [
    circle(at.x, at.y, disc, { pen: 'edge', fill: 'paper', part: `cylinder:${cylinder}` }),
    centredText(at.x, at.y, name, { face: 'figures', weight: 600 }),
  ];
}

function hand(crank: number, words: Wording): readonly Shape[] {
  const angle = round720(fold(crank, 720));
  const [from, to, tip] = [hub, ring - 6, ring + 2].map((radius) => polar(centre, radius, angle));
  if (from === undefined || to === undefined || tip === undefined) {
    return [];
  }
  return [
    circle(centre.x, centre.y, hub, { pen: 'edge', fill: 'paper' }),
    line(from.x, from.y, to.x, to.y, 'oxide', 'hand'),
    arrowHead(tip, angle, 'oxide', 10, 3.6),
    text(centre.x, centre.y + 3, degrees(fold(crank, 720), words), {
      anchor: 'middle',
      face: 'figures',
      weight: 600,
      size: 18,
    }),
    text(centre.x, centre.y + 19, 'crank now', { anchor: 'middle', ink: 'ink-2', face: 'plate' }),
  ];
}

function key({ say }: Wording): readonly Shape[] {
  const y = centre.y * 2 + 4;
  return [
    rect(4, y, 22, 11, { pen: 'blue', fill: 'blue-wash' }),
    text(32, y + 10, say('{inlet} open')),
    hatching(corners(width - 26, y, 22, 11), 45, 4.2),
    rect(width - 26, y, 22, 11, { pen: 'edge' }),
    text(width - 32, y + 10, 'exhaust open', { anchor: 'end' }),
  ];
}

function describe({ request, clock }: ValveClockInput, words: Wording): string {
  const open = clock.cylinders.filter(({ inlet, exhaust }) => inlet !== 'shut' || exhaust !== 'shut');
  const states = open.map(
    ({ cylinder, inlet, exhaust }) =>
      `Cylinder ${cylinder}: {inlet} ${stateWords[inlet]}, exhaust ${stateWords[exhaust]}.`,
  );
  return words.say(
    [
      `Once round is 720° of crank. The hand stands at ${degrees(fold(request.crank, 720), words)}.`,
      ...states,
      open.length < clock.cylinders.length ? 'All other valves are shut.' : '',
    ]
      .join(' ')
      .trim(),
  );
}
