import { describe, expect, it } from 'vitest';
import type { CapMapRequest, Cylinder } from '../contracts/calculations.js';
import { capDiagnosis } from '../ignition/cap-diagnosis.js';
import { capMap } from '../ignition/cap-map.js';
import { drawCap, type CapDrawingInput } from './cap.js';
import { allShapes, partsOf, unreadable, wordsOf } from './drawing-case.js';
import { bearing } from './geometry.js';
import type { CircleShape, Drawing, GroupShape, PathShape, Point, PolygonShape } from './shapes.js';

/** Side outlets: the post at 225° comes out at A, that at 315° at B. An invented trace. */
const four: CapMapRequest = {
  firingOrder: [1, 3, 4, 2],
  rotation: 'anticlockwise',
  posts: [
    { post: 'I', angle: 45 },
    { post: 'II', angle: 135 },
    { post: 'III', angle: 225 },
    { post: 'IV', angle: 315 },
  ],
  firstPost: 'IV',
  trace: { I: 'C', II: 'D', III: 'A', IV: 'B' },
};
const six: CapMapRequest = { firingOrder: [1, 5, 3, 6, 2, 4], rotation: 'clockwise' };
const eight: CapMapRequest = { firingOrder: [1, 8, 4, 3, 6, 5, 7, 2], rotation: 'clockwise' };
const others: readonly CapMapRequest[] = [
  { firingOrder: [1, 3, 2], rotation: 'anticlockwise' },
  { firingOrder: [1, 2, 4, 5, 3], rotation: 'clockwise' },
  { firingOrder: [1, 12, 5, 8, 3, 10, 6, 7, 2, 11, 4, 9], rotation: 'clockwise' },
  { firingOrder: ['left front', 'right front'], rotation: 'clockwise' },
];

function right(request: CapMapRequest): Drawing {
  return drawCap({ map: capMap(request), request, showRequired: true });
}

function asFitted(request: CapMapRequest, fitted: Record<string, Cylinder>): Drawing {
  const diagnosis = capDiagnosis({ cap: request, fitted, fittedBy: 'outlet' });
  const input: CapDrawingInput = {
    map: capMap(request),
    request,
    fitted,
    fittedBy: 'outlet',
    diagnosis,
    showRequired: true,
  };
  return drawCap(input);
}

function circleOf(drawing: Drawing, part: string): CircleShape {
  const found = partsOf(drawing, part).find((shape) => shape.kind === 'circle');
  if (found === undefined) {
    throw new Error(`no circle ${part}`);
  }
  return found;
}

/** The text that stands in the middle of a circle. */
function textIn(drawing: Drawing, { centre }: CircleShape): string | undefined {
  return allShapes(drawing)
    .filter((shape) => shape.kind === 'text')
    .find(({ at }) => at.x === centre.x && Math.abs(at.y - centre.y) < 8)?.content;
}

describe.each([
  ['four', four],
  ['six', six],
  ['eight', eight],
])('the cap of a %s', (_, request) => {
  const drawing = right(request);
  const { rows } = capMap(request);
  const middle = circleOf(drawing, 'cap').centre;

  it('has every post at its angle, clockwise from the mark at the top', () => {
    const drawn = rows.map(({ post }) =>
      Math.round(bearing(middle, circleOf(drawing, `post:${post}`).centre)),
    );
    expect(drawn.map((angle) => angle % 360)).toEqual(rows.map(({ angle }) => angle));
    const mark = partsOf(drawing, 'mark')[0] as PolygonShape;
    expect(mark.points[0]).toMatchObject({ x: middle.x });
    expect(mark.points[0]?.y).toBeLessThan(middle.y);
  });

  it('has the rotor point at the post of the first cylinder', () => {
    const rotor = partsOf(drawing, 'rotor')[0] as GroupShape;
    expect(rotor.rotate).toBe(rows[0]?.angle);
    expect(rotor.at).toEqual(middle);
    const arm = rotor.shapes[0] as PolygonShape;
    const furthest = arm.points.reduce((a, b) => (Math.hypot(b.x, b.y) > Math.hypot(a.x, a.y) ? b : a));
    expect(furthest.y).toBeLessThan(-20);
  });

  it('shows the table’s cylinder at the table’s outlet', () => {
    const outlets = new Map(rows.map((row) => [row.outlet, String(row.cylinder)]));
    for (const [outlet, cylinder] of outlets) {
      expect(textIn(drawing, circleOf(drawing, `cylinder-at:${outlet}`))).toBe(cylinder);
    }
    expect(drawing.table.rows.map((row) => row.at(-1))).toEqual([...outlets.values()]);
    expect(drawing.table.rows.map((row) => row[0])).toEqual(rows.map(({ angle }) => `${angle}°`));
  });

  it('can be read', () => {
    expect(unreadable(drawing)).toEqual([]);
  });
});

describe('the rotation arrow', () => {
  /** Above zero for clockwise as seen: y runs downwards. */
  const turn = (drawing: Drawing): number => {
    const middle = circleOf(drawing, 'cap').centre;
    const start = /^M(\S+) ([\d.-]+)/.exec((partsOf(drawing, 'rotation')[0] as PathShape).d);
    const from: Point = { x: Number(start?.[1]), y: Number(start?.[2]) };
    const tip = (partsOf(drawing, 'rotation-head')[0] as PolygonShape).points[0] ?? from;
    return (from.x - middle.x) * (tip.y - middle.y) - (from.y - middle.y) * (tip.x - middle.x);
  };

  it('runs the way the rotor turns, as seen on the cap', () => {
    expect(turn(right(four))).toBeLessThan(0);
    expect(turn(right(six))).toBeGreaterThan(0);
  });

  it('is turned round for a rotation seen from the drive', () => {
    expect(turn(right({ ...six, rotationSeenFrom: 'drive' }))).toBeLessThan(0);
  });
});

describe('what is fitted', () => {
  const wrong = (drawing: Drawing): readonly (string | undefined)[] =>
    allShapes(drawing)
      .filter(
        (shape) =>
          shape.kind === 'circle' && shape.part?.startsWith('cylinder-at:') && shape.fill === 'oxide',
      )
      .map(({ part }) => part);

  it('marks the two leads that are in each other’s outlets, and shows the swap', () => {
    const drawing = asFitted(four, { A: 1, B: 3, C: 2, D: 4 });
    expect(wrong(drawing)).toEqual(['cylinder-at:B', 'cylinder-at:A']);
    expect(partsOf(drawing, 'swap')).toHaveLength(2);
    expect(wordsOf(drawing)).toContain('both right');
    expect(drawing.description).toContain('Swap the leads of');
    expect(drawing.table.rows.map((row) => row.at(-1))).toEqual(['to A', 'to B', 'right', 'right']);
    expect(unreadable(drawing)).toEqual([]);
  });

  it('says where leads go that are not neighbours', () => {
    const drawing = asFitted(four, { A: 2, B: 1, C: 3, D: 4 });
    expect(wrong(drawing)).toEqual(['cylinder-at:A', 'cylinder-at:C']);
    expect(wordsOf(drawing)).toEqual(expect.arrayContaining(['to C', 'to A']));
    expect(partsOf(drawing, 'swap')).toEqual([]);
  });

  it('calls every outlet of a traced cap by its letter, also those with the name of the post they lead to', () => {
    const named: CapMapRequest = {
      ...four,
      posts: [
        { post: 'C', angle: 45 },
        { post: 'D', angle: 135 },
        { post: 'B', angle: 225 },
        { post: 'A', angle: 315 },
      ],
      firstPost: 'A',
      trace: { A: 'B', B: 'A', C: 'C', D: 'D' },
    };
    const drawing = asFitted(named, { A: 2, B: 1, C: 3, D: 4 });
    expect(wordsOf(drawing)).toEqual(expect.arrayContaining(['A', 'B', 'C', 'D', 'to C', 'to A']));
    expect(drawing.table.rows.map((row) => row.at(-1))).toEqual(['right', 'to C', 'right', 'to A']);
    expect(unreadable(drawing)).toEqual([]);
  });

  it('marks nothing on a cap that is right', () => {
    expect(wrong(asFitted(four, { A: 3, B: 1, C: 2, D: 4 }))).toEqual([]);
  });

  it('shows a swap of neighbours all round an eight', () => {
    // Post 6 has 5 and post 7 has 7 when right: order 1 8 4 3 6 5 7 2 on posts 1 to 8, clockwise.
    const drawing = asFitted(eight, { 1: 1, 2: 8, 3: 4, 4: 3, 5: 6, 6: 7, 7: 5, 8: 2 });
    expect(wrong(drawing)).toEqual(['cylinder-at:6', 'cylinder-at:7']);
    expect(partsOf(drawing, 'swap')).toHaveLength(2);
    expect(unreadable(drawing)).toEqual([]);
  });

  it('is still all on the page when the whole set of a six is moved', () => {
    const drawing = asFitted(six, { 1: 4, 2: 1, 3: 5, 4: 3, 5: 6, 6: 2 });
    expect(wrong(drawing)).toHaveLength(6);
    expect(unreadable(drawing)).toEqual([]);
  });
});

describe('while it is being entered', () => {
  const drawing = drawCap({
    map: capMap(four),
    request: four,
    fitted: { A: 1 },
    fittedBy: 'outlet',
    inHand: 'B',
    showRequired: false,
  });

  it('shows outlets and what was entered, and nothing of what ought to be', () => {
    expect(
      ['rotor', 'rotation', 'conductor:A', 'conductor:B', 'swap'].flatMap((part) => partsOf(drawing, part)),
    ).toEqual([]);
    expect(wordsOf(drawing).filter((word) => /^\d+$/.test(word))).toEqual(['1']);
    expect(drawing.description).toBe('4 leads. Entered so far: cylinder 1 in A.');
    expect(drawing.table).toEqual({
      columns: ['Outlet', 'Fitted'],
      rows: [
        ['A', '1'],
        ['B', 'not yet'],
        ['C', 'not yet'],
        ['D', 'not yet'],
      ],
    });
  });

  it('shows no cylinder before any has been entered', () => {
    const blank = drawCap({ map: capMap(eight), request: eight, showRequired: false });
    expect(wordsOf(blank).filter((word) => /^\d+$/.test(word))).toEqual([]);
    expect(blank.description).toBe('8 leads. None entered yet.');
  });

  it('does not call a lead wrong, and marks the outlet in hand', () => {
    expect(circleOf(drawing, 'cylinder-at:A').fill).toBe('paper');
    expect(circleOf(drawing, 'cylinder-at:B').pen).toBe('oxide');
    expect(circleOf(drawing, 'cylinder-at:C').pen).toBe('hidden');
  });
});

it('crosses the conductors inside that the trace crosses, and no others', () => {
  const crossing = ['A', 'B', 'C', 'D'].filter(
    (outlet) =>
      partsOf(right(four), `conductor:${outlet}`)[0]?.kind === 'line' &&
      (partsOf(right(four), `conductor:${outlet}`)[0] as { pen?: string }).pen === 'blue-hidden',
  );
  expect(crossing).toEqual(['A', 'B']);
});

it.each(others)('can be read for $firingOrder', (request) => {
  const drawing = right(request);
  expect(unreadable(drawing)).toEqual([]);
  expect(drawing.table.rows).toHaveLength(request.firingOrder.length);
});

it('speaks American where that is wanted', () => {
  const drawing = drawCap({ map: capMap(four), request: four, showRequired: true }, { dialect: 'american' });
  expect(drawing.table.columns).toEqual(['Post', 'Tower', 'Cylinder']);
  expect(drawing.description).toContain('turns counter-clockwise');
});
