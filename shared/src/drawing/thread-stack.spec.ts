import { describe, expect, it } from 'vitest';
import type { ThreadStackRequest } from '../contracts/fastening.js';
import type { Quantity } from '../contracts/quantity.js';
import { threadStack } from '../fastening/thread-stack.js';
import { allShapes, partsOf, unreadable, wordsOf } from './drawing-case.js';
import { drawThreadStack } from './thread-stack.js';
import type { Drawing, RectShape } from './shapes.js';

const mm = (value: number): Quantity => ({ value, unit: 'mm' });
const inch = (value: number): Quantity => ({ value, unit: 'in' });
const draw = (request: ThreadStackRequest): Drawing =>
  drawThreadStack({ request, answer: threadStack(request) });
const nutted: ThreadStackRequest = {
  thread: 'M10x1.5',
  boltLength: mm(40),
  grip: mm(25),
  washers: mm(2),
  into: { nutHeight: mm(8.4) },
};
const blind: ThreadStackRequest = {
  thread: 'M10',
  boltLength: mm(50),
  grip: mm(30),
  into: { material: 'aluminium', threadDepth: mm(25), holeDepth: mm(30) },
};

const heightOf = (drawing: Drawing, part: string): number =>
  Math.max(0, ...partsOf(drawing, part).map((shape) => (shape as RectShape).height));

describe('a bolt and its nut', () => {
  it('are drawn to one scale', () => {
    const drawing = draw(nutted);
    // The bolt is 44 units wide, so 4.4 to a millimetre of M10.
    expect(heightOf(drawing, 'nut')).toBeCloseTo(8.4 * 4.4, 1);
    expect(heightOf(drawing, 'washers')).toBeCloseTo(2 * 4.4, 1);
    expect(wordsOf(drawing)).toContain('To scale');
  });

  it('say the same in the table', () => {
    expect(draw(nutted).table.rows).toEqual([
      ['bolt, under its head', '40.0 mm'],
      ['washers', '2.0 mm'],
      ['grip', '25.0 mm'],
      ['nut', '8.4 mm'],
      ['past the nut', '4.6 mm'],
      ['bolt needed at least', '36.9 mm'],
      ['Drawn', 'To scale'],
    ]);
  });

  it('own up to a joint that is shortened, and to what does not fit', () => {
    const long = draw({ ...nutted, boltLength: mm(100), grip: mm(85) });
    expect(wordsOf(long)).toContain('To scale, grip shortened');
    expect(partsOf(long, 'break')).toHaveLength(1);
    expect(wordsOf(draw({ ...nutted, boltLength: mm(400) }))).toContain('Not to scale');
  });

  it('show a bolt that ends inside the nut, or short of it, as wrong', () => {
    const inside = draw({ ...nutted, boltLength: mm(34) });
    expect(partsOf(inside, 'bolt-end')).toHaveLength(1);
    expect(wordsOf(inside)).toEqual(expect.arrayContaining(['1.4', 'inside the nut']));
    const short = draw({ ...nutted, boltLength: mm(26) });
    expect(wordsOf(short)).toEqual(expect.arrayContaining(['1.0', 'short of it']));
  });
});

describe('a bolt in a tapped hole', () => {
  it('has its engagement and what is left of the thread', () => {
    expect(wordsOf(draw(blind))).toEqual(expect.arrayContaining(['20.0', 'engaged', '5.0', 'to spare']));
  });

  it('is wrong where it jams', () => {
    const jams = draw({ ...blind, boltLength: mm(57) });
    expect(wordsOf(jams)).toEqual(expect.arrayContaining(['2.0', 'too long']));
    expect(partsOf(jams, 'bolt-end')).toHaveLength(1);
  });
});

it.each<[string, ThreadStackRequest]>([
  ['no washers', { ...nutted, washers: undefined }],
  ['a thick stack of washers', { ...nutted, boltLength: mm(300), washers: mm(120) }],
  ['a very long bolt', { ...nutted, boltLength: mm(5000), grip: mm(0.1) }],
  ['a very short one', { ...nutted, boltLength: mm(0.5) }],
  ['a thin plate', { ...nutted, boltLength: mm(14), grip: mm(0.5) }],
  [
    'a stud in inches',
    { ...nutted, thread: '7/16-20 UNF', boltLength: inch(4), grip: inch(3.1), washers: inch(0.1) },
  ],
  ['a blind hole', blind],
  ['a deep hole', { ...blind, into: { material: 'steel', threadDepth: mm(300), holeDepth: mm(900) } }],
  ['a through hole', { ...blind, into: { material: 'brass', threadDepth: mm(8) } }],
  ['a bolt short of its hole', { ...blind, boltLength: mm(12) }],
  ['a small screw', { ...blind, thread: 'M3', boltLength: mm(40) }],
])('can be read with %s, and lies in its frame', (_, request) => {
  const drawing = draw(request);
  expect(unreadable(drawing)).toEqual([]);
  expect(drawing.height).toBeLessThan(460);
  for (const shape of allShapes(drawing)) {
    if (shape.kind !== 'rect') continue;
    expect(shape.y + shape.height).toBeLessThanOrEqual(drawing.height);
    expect(shape.height).toBeGreaterThan(0);
  }
});
