import { round } from './geometry.js';
import { circle, line, path, rect, type Point, type Shape } from './shapes.js';

/** The box round the fasteners' middles, and the part's edge a margin outside it. */
export interface Extent {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** From the fasteners' middles to the part's edge. */
export const edgeMargin = 24;

/** A plain plate with rounded corners. */
export function plateOutline(box: Extent): readonly Shape[] {
  const plate = (inset: number, radius: number): Omit<Extract<Shape, { kind: 'rect' }>, 'pen' | 'fill'> => ({
    kind: 'rect',
    x: box.left - edgeMargin + inset,
    y: box.top - edgeMargin + inset,
    width: box.right - box.left + 2 * (edgeMargin - inset),
    height: box.bottom - box.top + 2 * (edgeMargin - inset),
    radius,
  });
  return [
    { ...plate(0, 16), pen: 'outline', fill: 'paper', part: 'outline' },
    { ...plate(4, 12), pen: 'thin' },
  ];
}

/** A round flange with its bore. */
export function flangeOutline(box: Extent): readonly Shape[] {
  const centre = middle(box);
  const bolts = Math.max(box.right - box.left, box.bottom - box.top) / 2;
  return [
    circle(centre.x, centre.y, round(bolts + edgeMargin), { pen: 'outline', fill: 'paper', part: 'outline' }),
    circle(centre.x, centre.y, bolts, { pen: 'centre' }),
    circle(centre.x, centre.y, round(Math.max(bolts - edgeMargin, bolts / 3)), { pen: 'edge' }),
    line(centre.x - 8, centre.y, centre.x + 8, centre.y, 'centre'),
    line(centre.x, centre.y - 8, centre.x, centre.y + 8, 'centre'),
  ];
}

function middle(box: Extent): Point {
  return { x: (box.left + box.right) / 2, y: (box.top + box.bottom) / 2 };
}

/** The middles of the bores, evenly spread between the outermost fasteners. */
function boreCentres(box: Extent, bores: number): readonly number[] {
  const pitch = (box.right - box.left) / bores;
  return Array.from({ length: bores }, (_, i) => round(box.left + pitch * (i + 0.5)));
}

/**
 * A cylinder head of no make in particular: recesses for the plugs along the top, pads for the manifolds
 * along the bottom, and inside it, dashed, the bores below, with two valves each
 * unless fasteners stand there.
 */
export function headOutline(
  box: Extent,
  bores: number,
  fasteners: readonly Point[],
  front: 'left' | 'right',
): readonly Shape[] {
  const centres = boreCentres(box, bores);
  const pitch = (box.right - box.left) / Math.max(bores, 1);
  const inner = edgeMargin - 10;
  const y = middle(box).y;
  const valves = fasteners.every((at) => Math.abs(at.y - y) > 24);
  return [
    neck(box, front),
    path(headEdge(box, centres, pitch), { pen: 'outline', fill: 'paper', part: 'outline' }),
    rect(box.left - inner, box.top - 16, box.right - box.left + 2 * inner, box.bottom - box.top + 32, {
      pen: 'thin',
      radius: 9,
    }),
    line(box.left - edgeMargin - 12, y, box.right + edgeMargin + 12, y, 'centre'),
    ...centres.flatMap((x) => bore(x, y, box, pitch, valves)),
  ];
}

function headEdge(box: Extent, centres: readonly number[], pitch: number): string {
  const left = box.left - edgeMargin;
  const right = box.right + edgeMargin;
  const top = box.top - edgeMargin;
  const bottom = box.bottom + edgeMargin;
  const recess = Math.min(17, pitch * 0.27);
  const pad = Math.min(19, pitch * 0.3);
  const recesses = centres.map(
    (x) =>
      `L${round(x - recess)} ${top}L${round(x - recess + 4)} ${top + 7}` +
      `L${round(x + recess - 4)} ${top + 7}L${round(x + recess)} ${top}`,
  );
  const pads = centres
    .slice()
    .reverse()
    .map((x) => {
      const [from, to] = [round(x + pad), round(x - pad)];
      return `L${from} ${bottom}L${from} ${bottom + 6}L${to} ${bottom + 6}L${to} ${bottom}`;
    });
  return [
    `M${left} ${top + 16}Q${left} ${top} ${left + 16} ${top}`,
    ...recesses,
    `L${right - 16} ${top}Q${right} ${top} ${right} ${top + 16}`,
    `L${right} ${bottom - 16}Q${right} ${bottom} ${right - 16} ${bottom}`,
    ...pads,
    `L${left + 16} ${bottom}Q${left} ${bottom} ${left} ${bottom - 16}Z`,
  ].join('');
}

/** The water outlet at the front end. */
function neck(box: Extent, front: 'left' | 'right'): Shape {
  const x = front === 'left' ? box.left - edgeMargin : box.right + edgeMargin;
  const out = front === 'left' ? -1 : 1;
  const { y } = middle(box);
  const d = `M${x} ${y - 14}L${x + out * 10} ${y - 14}Q${x + out * 14} ${y} ${x + out * 10} ${y + 14}L${x} ${y + 14}`;
  return path(d, { pen: 'outline', fill: 'paper' });
}

function bore(x: number, y: number, box: Extent, pitch: number, valves: boolean): readonly Shape[] {
  const radius = round(Math.min(25, pitch * 0.4, (box.bottom - box.top) / 2 - 11));
  const size = radius / 25;
  const valve = (dx: number, dy: number, head: number, stem: number): readonly Shape[] => [
    circle(round(x + dx * size), round(y + dy * size), round(head * size), { pen: 'edge', fill: 'paper' }),
    circle(round(x + dx * size), round(y + dy * size), round(stem * size), { pen: 'thin' }),
  ];
  return [
    circle(x, y, radius, { pen: 'hidden', part: 'bore' }),
    ...(valves ? [...valve(-9, 3, 10.5, 3), ...valve(11, 0, 8.5, 2.6)] : []),
    circle(x, box.top - 12, 5, { pen: 'edge', fill: 'paper' }),
    circle(x, box.top - 12, 2.4, { pen: 'thin' }),
    line(x, round(y - radius - 5), x, round(y + radius + 5), 'centre'),
  ];
}
