import { textWidth, type Drawing, type Shape, type TextShape } from './shapes.js';

/** For tests: every shape of a drawing, those inside groups too. */
export function allShapes(drawing: Pick<Drawing, 'shapes'>): readonly Shape[] {
  return drawing.shapes.flatMap((shape) => (shape.kind === 'group' ? [shape, ...allShapes(shape)] : [shape]));
}

/** For tests: the shapes that stand for something. */
export function partsOf(drawing: Drawing, part: string): readonly Shape[] {
  return allShapes(drawing).filter((shape) => shape.part === part);
}

/** For tests: the texts on a drawing, in the order in which they are drawn. */
export function wordsOf(drawing: Drawing): readonly string[] {
  return textsOf(drawing).map(({ content }) => content);
}

function textsOf(drawing: Drawing): readonly TextShape[] {
  return allShapes(drawing).filter((shape) => shape.kind === 'text');
}

/** For tests: what cannot be read at a phone's width, being too small or partly outside the drawing. */
export function unreadable(drawing: Drawing): readonly string[] {
  return textsOf(drawing)
    .filter((shape) => {
      const width = textWidth(shape);
      const left = shape.at.x - { start: 0, middle: width / 2, end: width }[shape.anchor];
      const inside =
        left >= 0 &&
        left + width <= drawing.width &&
        shape.at.y - 0.72 * shape.size >= 0 &&
        shape.at.y + 0.2 * shape.size <= drawing.height;
      return shape.size < 13 || !inside;
    })
    .map(({ content }) => content);
}
