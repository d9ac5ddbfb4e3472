import { arc } from './geometry.js';
import { circle, line, path, polygon, rect, type Drawing, type Shape } from './shapes.js';

export const signKinds = ['pass', 'fail', 'doubtful', 'not-judged', 'waiting', 'hold', 'caution'] as const;
export type SignKind = (typeof signKinds)[number];

/** The word that always stands beside the sign. */
export const signWords: Record<SignKind, string> = {
  pass: 'Pass',
  fail: 'Fail',
  doubtful: 'Doubtful',
  'not-judged': 'Not judged',
  waiting: 'Waiting',
  hold: 'Hold',
  caution: 'Take care',
};

const middle = { x: 12, y: 12 };

/** One sign on a square of 24 units. Shapes differ, so that it can be read without its colour. */
export function drawSign(kind: SignKind): Drawing {
  return {
    title: signWords[kind],
    description: signWords[kind],
    width: 24,
    height: 24,
    shapes: signShapes(kind),
    table: { columns: [], rows: [] },
  };
}

function signShapes(kind: SignKind): readonly Shape[] {
  switch (kind) {
    case 'pass':
      return [
        circle(12, 12, 10, { fill: 'pass' }),
        path('M7.4 12.4L10.7 15.7L16.8 9', { pen: 'sign-on-verdict' }),
      ];
    case 'fail':
      return [
        rect(2.5, 2.5, 19, 19, { fill: 'fail' }),
        path('M8 8L16 16M16 8L8 16', { pen: 'sign-on-verdict' }),
      ];
    case 'doubtful':
      return [
        polygon(diamond, { pen: 'sign-doubt', fill: 'paper' }),
        polygon(
          [
            [2, 12],
            [12, 2],
            [22, 12],
          ],
          { fill: 'doubt' },
        ),
      ];
    case 'not-judged':
      return [circle(12, 12, 9, { pen: 'sign-wait' }), line(7.5, 12, 16.5, 12, 'sign-wait')];
    case 'waiting':
      return [...brokenCircle(), path('M12 6.8L12 12.4L15.6 14.2', { pen: 'sign-wait' })];
    case 'hold':
      return [
        rect(2.5, 3, 3.6, 18, { fill: 'hold' }),
        rect(17.9, 3, 3.6, 18, { fill: 'hold' }),
        rect(6, 9.4, 12, 5.2, { fill: 'hold' }),
      ];
    case 'caution':
      return [
        path('M12 3L22 20.5L2 20.5Z', { pen: 'sign-ink' }),
        line(12, 9.4, 12, 14.4, 'sign-ink'),
        circle(12, 17.4, 1.2, { fill: 'ink' }),
      ];
  }
}

const diamond = [
  [12, 2],
  [22, 12],
  [12, 22],
  [2, 12],
] as const;

/** Eight short arcs: a circle that has not closed yet. */
function brokenCircle(): readonly Shape[] {
  return Array.from({ length: 8 }, (_, i) =>
    path(arc(middle, 9.2, i * 45 - 13, i * 45 + 13), { pen: 'sign-wait' }),
  );
}
