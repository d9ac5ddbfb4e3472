import { describe, expect, it } from 'vitest';
import { mark } from './mark.js';
import { pens } from './roles.js';
import { drawSign, signKinds, signWords } from './signs.js';
import { allShapes } from './drawing-case.js';

describe.each(signKinds)('the sign for %s', (kind) => {
  const sign = drawSign(kind);

  it('has a word', () => {
    expect(sign.title).toBe(signWords[kind]);
    expect(signWords[kind]).not.toBe('');
  });

  it('is drawn with pens that keep its shape at any size', () => {
    const used = allShapes(sign).flatMap((shape) => ('pen' in shape && shape.pen ? [shape.pen] : []));
    expect(used.filter((pen) => !('scales' in pens[pen]))).toEqual([]);
  });
});

it('has no two signs of the same shape', () => {
  const outlines = signKinds.map((kind) =>
    JSON.stringify(drawSign(kind).shapes.map(({ part: _, ...shape }) => shape)),
  );
  const withoutColour = outlines.map((outline) => outline.replace(/"(pen|fill)":"[^"]*"/g, ''));
  expect(new Set(withoutColour).size).toBe(signKinds.length);
});

it('has one spanner solid and one in outline', () => {
  const [first, second] = allShapes(mark).filter((shape) => shape.kind === 'path');
  expect([first?.fill, first?.pen]).toEqual(['blue', undefined]);
  expect([second?.fill, second?.pen]).toEqual([undefined, 'sign-blue']);
});
