import { corners, hatching, round } from './geometry.js';
import { line, path, polygon, rect, type Shape } from './shapes.js';
import { halfBolt, seat, type StackLayout } from './thread-stack-layout.js';

/** The bolt's axis. */
export const axis = 140;
/** What is clamped reaches so far to either side of the axis. */
export const halfJoint = 70;
const clearance = 3;
const halfHead = 37;
const headHeight = 29;
/** From the outside of the thread to its root, on the drawing. */
const root = 4;

/** Head, shank and thread, drawn whole; where it jams or does not reach, its end is drawn as wrong. */
export function boltShapes({ boltEnd }: StackLayout, isWrong: boolean): readonly Shape[] {
  const [left, right] = [axis - halfBolt, axis + halfBolt];
  const threadTop = Math.max(seat + 6, boltEnd - 5 * halfBolt);
  const chamfer = Math.min(4, (boltEnd - seat) / 2);
  return [
    path(
      `M${left} ${seat}L${left} ${round(boltEnd - chamfer)}L${left + 4} ${boltEnd}L${right - 4} ${boltEnd}` +
        `L${right} ${round(boltEnd - chamfer)}L${right} ${seat}Z`,
      { pen: 'outline', fill: 'paper', part: 'bolt' },
    ),
    line(left + root, round(threadTop), left + root, boltEnd, 'thin'),
    line(right - root, round(threadTop), right - root, boltEnd, 'thin'),
    line(left, round(threadTop), right, round(threadTop), 'edge'),
    ...(isWrong ? [line(left + 4, boltEnd, right - 4, boltEnd, 'oxide', 'bolt-end')] : []),
    ...hexagon(seat - headHeight, seat, 'outline', 'head'),
  ];
}

/** A hexagon head or nut from the side, across its corners. */
function hexagon(top: number, bottom: number, pen: 'outline', part: string): readonly Shape[] {
  const edge = halfHead / 2;
  return [
    rect(axis - halfHead, top, 2 * halfHead, bottom - top, { pen, fill: 'paper', radius: 2, part }),
    line(axis - edge, top, axis - edge, bottom, 'edge'),
    line(axis + edge, top, axis + edge, bottom, 'edge'),
  ];
}

/** The washers as one, and the two parts that are clamped, cut through. */
export function jointShapes({ gripTop, face }: StackLayout): readonly Shape[] {
  const middle = round((gripTop + face) / 2);
  const washers =
    gripTop > seat
      ? [-1, 1].flatMap((side) => piece(side, halfHead + 8, seat, gripTop, 45, 3.2, 'washers'))
      : [];
  const parts = [-1, 1].flatMap((side) => [
    ...piece(side, halfJoint, gripTop, middle, 45, 6, 'grip'),
    ...piece(side, halfJoint, middle, face, 135, 6, 'grip'),
  ]);
  return [...washers, ...parts];
}

/** One side of a part that is cut through, from the clearance hole outwards. */
function piece(
  side: number,
  reach: number,
  top: number,
  bottom: number,
  angle: 45 | 135,
  spacing: number,
  part: string,
): readonly Shape[] {
  const inner = halfBolt + clearance;
  const x = side < 0 ? axis - reach : axis + inner;
  const [width, height] = [reach - inner, round(bottom - top)];
  return [
    rect(x, top, width, height, { fill: 'paper', part }),
    hatching(corners(x, top, width, height), angle, spacing),
    rect(x, top, width, height, { pen: 'outline' }),
  ];
}

/** Two freehand lines across joint and bolt, with nothing between them. */
export function breakShapes({ gripTop, face }: StackLayout): readonly Shape[] {
  const y = round(gripTop + (face - gripTop) / 4);
  const [from, to] = [axis - halfJoint - 6, axis + halfJoint + 6];
  const there = (at: number): string =>
    `C${from + 40} ${at - 5} ${from + 60} ${at + 5} ${axis} ${at}` +
    `C${axis + 40} ${at - 5} ${to - 40} ${at + 5} ${to} ${at}`;
  const back = (at: number): string =>
    `C${to - 40} ${at + 5} ${axis + 40} ${at - 5} ${axis} ${at}` +
    `C${from + 60} ${at + 5} ${from + 40} ${at - 5} ${from} ${at}`;
  const low = round(y + 7);
  return [
    path(`M${from} ${y}${there(y)}L${to} ${low}${back(low)}Z`, { fill: 'paper' }),
    path(`M${from} ${y}${there(y)}`, { pen: 'thin', part: 'break' }),
    path(`M${from} ${low}${there(low)}`, { pen: 'thin' }),
  ];
}

/** The nut, drawn whole, the bolt inside it dashed. */
export function nutShapes({ face, boltEnd }: StackLayout, nutBottom: number): readonly Shape[] {
  const end = Math.min(boltEnd, nutBottom);
  return [
    ...hexagon(face, nutBottom, 'outline', 'nut'),
    ...(end > face
      ? [
          line(axis - halfBolt, face, axis - halfBolt, end, 'hidden'),
          line(axis + halfBolt, face, axis + halfBolt, end, 'hidden'),
        ]
      : []),
    ...(boltEnd > face && boltEnd < nutBottom
      ? [line(axis - halfBolt, boltEnd, axis + halfBolt, boltEnd, 'oxide', 'bolt-end')]
      : []),
  ];
}

/** The part with the tapped hole, cut through; what of the bolt lies in it is drawn over this. */
export function holeShapes(layout: StackLayout, threadEnd: number): readonly Shape[] {
  const { face, holeEnd } = layout;
  const drill = halfBolt - root;
  const [left, right] = [axis - halfJoint, axis + halfJoint];
  const blindBottom = holeEnd === undefined ? undefined : Math.max(holeEnd, threadEnd);
  const bottom = blindBottom === undefined ? threadEnd : blindBottom + 26;
  const hole: readonly (readonly [number, number])[] =
    blindBottom === undefined
      ? [
          [axis - drill, face],
          [axis - drill, bottom],
          [axis + drill, bottom],
          [axis + drill, face],
        ]
      : [
          [axis - drill, face],
          [axis - drill, blindBottom],
          // The point of a 118° drill.
          [axis, round(blindBottom + drill * 0.6)],
          [axis + drill, blindBottom],
          [axis + drill, face],
        ];
  return [
    rect(left, face, right - left, round(bottom - face), { fill: 'paper', part: 'tapped' }),
    hatching(corners(left, face, right - left, round(bottom - face)), 45, 7),
    polygon(hole, { fill: 'paper' }),
    path(`M${left} ${bottom}L${left} ${face}L${right} ${face}L${right} ${bottom}`, { pen: 'outline' }),
    line(left, bottom, right, bottom, blindBottom === undefined ? 'outline' : 'thin'),
    path(hole.map(([x, y], i) => `${i === 0 ? 'M' : 'L'}${x} ${y}`).join(''), { pen: 'outline' }),
    line(axis - halfBolt, face, axis - halfBolt, threadEnd, 'thin'),
    line(axis + halfBolt, face, axis + halfBolt, threadEnd, 'thin'),
    line(axis - halfBolt, threadEnd, axis + halfBolt, threadEnd, 'edge', 'thread-end'),
  ];
}
