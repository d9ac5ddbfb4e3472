import type { Rotation } from '../contracts/calculations.js';
import { degrees, type LeadHere } from './cap-input.js';
import { badgeRadius, type CapLayout } from './cap-layout.js';
import { arc, arrowHead, bearing, distance, polar, track } from './geometry.js';
import {
  centredText,
  circle,
  group,
  line,
  path,
  polygon,
  text,
  textWidth,
  type Point,
  type Shape,
} from './shapes.js';
import { shortened } from './words.js';

/** The body of the cap: centre lines, ears, rim, and the reference mark at 0°. */
export function capBody({ centre, rim, ears, leads }: CapLayout): readonly Shape[] {
  const { x, y } = centre;
  const ear = (up: number): Shape =>
    path(
      track([
        { x: x - 15, y: y + up * (rim - 3) },
        { x: x - 12, y: y + up * (rim + 8) },
        { x: x + 12, y: y + up * (rim + 8) },
        { x: x + 15, y: y + up * (rim - 3) },
      ]),
      { pen: 'outline', fill: 'paper' },
    );
  const free = leads.every((lead) => lead.way !== 'out');
  return [
    ...(ears.top ? [line(x, y - rim - 16, x, y, 'centre')] : []),
    ...(ears.bottom ? [line(x, y, x, y + rim + 14, 'centre')] : []),
    ...(free ? [line(x - rim - 8, y, x + rim + 8, y, 'centre')] : []),
    ...(ears.top ? [ear(-1)] : []),
    ...(ears.bottom ? [ear(1)] : []),
  ];
}

/** The rim, drawn over the outlets' inner ends. */
export function capRim({ centre: { x, y }, rim, ears }: CapLayout): readonly Shape[] {
  const point = ears.top ? y - rim + 1 : y - rim + 8;
  const mark = (tip: number, at: number, part?: string): Shape =>
    polygon(
      [
        [at, tip],
        [at - 5, tip - 9],
        [at + 5, tip - 9],
      ],
      { fill: 'line', part },
    );
  return [
    circle(x, y, rim, { pen: 'outline', fill: 'paper', part: 'cap' }),
    circle(x, y, rim - 6, { pen: 'thin' }),
    mark(point, x, 'mark'),
    ...(ears.top
      ? [text(x + 19, y - rim - 7, '0°, mark', { ink: 'ink-2', halo: true })]
      : [mark(15, 10), text(20, 15, '0°, mark', { ink: 'ink-2' })]),
  ];
}

/** Dashed conductors inside a traced cap; those that cross another are blue, being what was found out. */
export function conductors({ leads, centre, ring }: CapLayout): readonly Shape[] {
  const runs = leads.map((lead) => ({ from: polar(centre, ring, lead.row.angle), to: lead.mouth, lead }));
  return runs.map((run) => {
    const crosses = runs.some((other) => other !== run && cross(run, other));
    const start = polar(run.from, 9, bearing(run.from, run.to));
    const part = `conductor:${run.lead.row.outlet}`;
    return line(start.x, start.y, run.to.x, run.to.y, crosses ? 'blue-hidden' : 'hidden', part);
  });
}

interface Run {
  readonly from: Point;
  readonly to: Point;
}

function cross(a: Run, b: Run): boolean {
  const side = (run: Run, p: Point): number =>
    (run.to.x - run.from.x) * (p.y - run.from.y) - (run.to.y - run.from.y) * (p.x - run.from.x);
  return side(a, b.from) * side(a, b.to) < 0 && side(b, a.from) * side(b, a.to) < 0;
}

/** The posts inside the cap, each with its angle. */
export function posts({ leads, centre, ring, sideOutlets }: CapLayout): readonly Shape[] {
  const face = leads.length > 8 ? 'plate' : 'figures';
  const radius = leads.length > 8 ? 6.5 : 7.5;
  return leads.flatMap(({ row }) => {
    const at = polar(centre, ring, row.angle);
    const beside = sideOutlets ? besidePost(centre, at) : polar(centre, 80, row.angle);
    return [
      circle(at.x, at.y, radius, { pen: 'outline', fill: 'paper', part: `post:${row.post}` }),
      circle(at.x, at.y, 3.4, { pen: 'edge', fill: 'well' }),
      centredText(beside.x, beside.y, `${degrees(row.angle)}°`, { face, halo: true }),
    ];
  });
}

/** An angle label above or below its post, a little outwards, clear of conductors that run to the sides. */
function besidePost(centre: Point, at: Point): Point {
  const outward = Math.abs(at.x - centre.x) < 1 ? 0 : Math.sign(at.x - centre.x);
  return { x: at.x + outward * 11, y: at.y + (at.y > centre.y + 1 ? 16 : -16) };
}

/** The rotor, its tip at an angle or at the first cylinder's post, and the way it turns. */
export function rotor(
  { centre, ring, leads }: CapLayout,
  rotation: Rotation,
  angle = leads[0]?.row.angle ?? 0,
): readonly Shape[] {
  const tip = -(ring - 11);
  const arm: Shape[] = [
    polygon(
      [
        [-9, 16],
        [-13, 0],
        [-11, -10],
        [-5.5, tip + 10],
        [-5.5, tip],
        [5.5, tip],
        [5.5, tip + 10],
        [11, -10],
        [13, 0],
        [9, 16],
      ],
      { pen: 'outline', fill: 'blue-wash' },
    ),
    polygon(
      [
        [-2.6, -2],
        [-2.6, tip],
        [2.6, tip],
        [2.6, -2],
      ],
      { pen: 'edge', fill: 'paper' },
    ),
    circle(0, 0, 6.5, { pen: 'edge', fill: 'paper' }),
    circle(0, 0, 1.4, { fill: 'line' }),
  ];
  return [group(centre.x, centre.y, angle, arm, 'rotor'), ...turning(centre, ring, angle, rotation)];
}

function turning(centre: Point, ring: number, rotorAngle: number, rotation: Rotation): readonly Shape[] {
  const way = rotation === 'clockwise' ? 1 : -1;
  const radius = ring - 18;
  const from = rotorAngle + 180 + way * 7;
  const to = from + way * 60;
  // The head lies along the chord that its own length spans, so that its tip stays on the arc.
  const head = way * (12 / radius) * (180 / Math.PI);
  const tip = polar(centre, radius, to + head);
  return [
    path(arc(centre, radius, from, to), { pen: 'blue', part: 'rotation' }),
    { ...arrowHead(tip, to + head / 2 + way * 90, 'blue', 12, 3.8), part: 'rotation-head' },
  ];
}

/** An outlet with its boot and lead, drawn straight up from the cap's middle and then turned. */
export function lead(layout: CapLayout, placed: LeadHere): readonly Shape[] {
  const { centre, rim } = layout;
  const { state } = placed;
  const out = placed.way === 'out';
  const from = out ? rim - 2 : Math.abs(placed.mouth.x - centre.x) - 4;
  const barrel = out ? rim + 9 : 98;
  const boot = barrel + (out ? 15 : 21);
  const end = (out ? distance(centre, placed.end) : Math.abs(placed.end.x - centre.x)) - badgeRadius - 1;
  const [pen, fill] = state.wrong ? (['oxide-thin', 'oxide-wash'] as const) : (['edge', 'well'] as const);
  const fitted = state.cylinder !== undefined;
  const wires = [-3.4, 3.4].map((x) => line(x, -boot + 1, x, -end, pen));
  const shapes: Shape[] = [
    ...(fitted ? [...wires, tapered(barrel, boot, 9, 5, pen, fill)] : []),
    polygon(
      [
        [-11, -from],
        [-10, -barrel],
        [10, -barrel],
        [11, -from],
      ],
      { pen: 'outline', fill: 'paper' },
    ),
  ];
  const origin = out ? centre : { x: centre.x, y: placed.end.y };
  return [
    group(origin.x, origin.y, placed.direction, shapes, `lead:${placed.row.outlet}`),
    ...outletName(layout, placed, (from + barrel) / 2),
    ...badge(placed),
  ];
}

function tapered(
  from: number,
  to: number,
  wide: number,
  narrow: number,
  pen: 'edge' | 'oxide-thin',
  fill: 'well' | 'oxide-wash',
): Shape {
  return polygon(
    [
      [-wide, -from],
      [-narrow, -to],
      [narrow, -to],
      [wide, -from],
    ],
    { pen, fill },
  );
}

function outletName({ centre }: CapLayout, placed: LeadHere, reach: number): readonly Shape[] {
  if (!placed.lettered) {
    return [];
  }
  const at =
    placed.way === 'out'
      ? polar(centre, reach + 3, placed.direction)
      : { x: centre.x + (placed.way === 'left' ? -1 : 1) * Math.max(reach, 89), y: placed.end.y };
  const options = { face: 'figures', weight: 600, halo: placed.way === 'out' } as const;
  return [centredText(at.x, at.y, shortened(placed.row.outlet, 3), options)];
}

/** The circled cylinder number; empty and dashed while nothing has been entered. */
function badge({ row, end, state: { cylinder, wrong, inHand } }: LeadHere): readonly Shape[] {
  const part = `cylinder-at:${row.outlet}`;
  if (cylinder === undefined) {
    const style = { pen: inHand ? 'oxide' : 'hidden', fill: inHand ? 'oxide-wash' : 'paper', part } as const;
    return [circle(end.x, end.y, badgeRadius, style)];
  }
  const name = shortened(String(cylinder), 4);
  const size = name.length <= 2 ? 17 : 13;
  const number = centredText(end.x, end.y, name, {
    size,
    face: 'figures',
    weight: 600,
    ink: wrong ? 'on-oxide' : 'ink',
  });
  const style = wrong ? ({ fill: 'oxide', part } as const) : ({ pen: 'edge', fill: 'paper', part } as const);
  const radius = Math.max(badgeRadius, Math.min(20, textWidth(number) / 2 + 3));
  return [
    circle(end.x, end.y, radius, style),
    ...(inHand ? [circle(end.x, end.y, radius, { pen: 'oxide' })] : []),
    number,
  ];
}
