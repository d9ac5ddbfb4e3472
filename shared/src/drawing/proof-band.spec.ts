import { describe, expect, it } from 'vitest';
import { partsOf, unreadable, wordsOf } from './drawing-case.js';
import { drawProofBand, type ProofBandPoint } from './proof-band.js';
import { textWidth, type CircleShape, type LineShape } from './shapes.js';

const point = (share: number, label = '27 lbf·ft'): ProofBandPoint => ({
  label,
  share,
  low: share / 1.3,
  high: share / 0.7,
});
const draw = (first: ProofBandPoint, second?: ProofBandPoint) =>
  drawProofBand({ points: [first, second], of: 'SAE 5 at 3/8-16 UNC', least: 0.25, most: 0.9 });

const xOf = (drawing: ReturnType<typeof draw>, part: string): number =>
  (partsOf(drawing, part)[0] as LineShape).from.x;

describe('a clamp load on its band', () => {
  const drawing = draw(point(0.65), point(0.66, '37 N·m'));

  it('stands where its share of the proof load is, on a linear axis', () => {
    const [low, proof] = [xOf(drawing, 'bound:low'), xOf(drawing, 'bound:proof')];
    const perShare = (proof - low) / 0.75;
    const { centre } = partsOf(drawing, 'point:first')[0] as CircleShape;
    expect(centre.x).toBeCloseTo(low + (0.65 - 0.25) * perShare, 1);
    const { from, to } = partsOf(drawing, 'range')[0] as LineShape;
    expect(from.x).toBeCloseTo(low + (0.5 - 0.25) * perShare, 1);
    expect(to.x).toBeCloseTo(low + (0.65 / 0.7 - 0.25) * perShare, 1);
  });

  it('keeps the figure of a believable torque short of the line where doubt begins', () => {
    const high = xOf(draw(point(0.75)), 'bound:high');
    const figure = draw(point(0.75)).shapes.find(
      (shape) => shape.kind === 'text' && shape.content === '75 %',
    );
    expect(figure?.kind === 'text' ? figure.at.x + textWidth(figure) : Infinity).toBeLessThan(high);
  });

  it('says the same in its table', () => {
    expect(drawing.table.rows).toEqual([
      ['27 lbf·ft', '65 %', '50 %', '93 %'],
      ['37 N·m', '66 %', '51 %', '94 %'],
    ]);
    expect(wordsOf(drawing)).toEqual(expect.arrayContaining(['27 lbf·ft', '65 %', '25', '90', '100']));
  });

  it('that is beyond the axis is an arrow', () => {
    expect(partsOf(draw(point(1.49)), 'off-the-scale')).toEqual([]);
    expect(partsOf(draw(point(7)), 'off-the-scale')).toHaveLength(1);
  });

  it.each([0.001, 0.25, 0.9, 1, 1.3, 40])('can be read at %s', (share) => {
    expect(unreadable(draw(point(share)))).toEqual([]);
    expect(unreadable(draw(point(0.5), point(share, '1234.5 kgf·cm')))).toEqual([]);
  });
});
