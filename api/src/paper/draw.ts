import type { faces } from '@second-spanner/shared/drawing/roles';
import {
  colours,
  haloWidth,
  pens,
  type ColourRole,
  type Pen,
  type PenStyle,
} from '@second-spanner/shared/drawing/roles';
import type { Drawing, Shape, TextShape } from '@second-spanner/shared/drawing/shapes';
import { printable, type FontName } from './fonts.js';

type Document = PDFKit.PDFDocument;

const ink = (role: ColourRole): string => colours[role].print;

/** Draws a drawing with its top left corner at a point, scaled to a width; the pens keep their own width. */
export function draw(document: Document, drawing: Drawing, x: number, y: number, width: number): void {
  const scale = width / drawing.width;
  document.save();
  document.translate(x, y).scale(scale).lineJoin('round');
  for (const shape of drawing.shapes) drawShape(document, shape, scale);
  document.restore();
}

/** The height that a drawing takes at a width. */
export const heightOf = (drawing: Drawing, width: number): number => (drawing.height * width) / drawing.width;

function drawShape(document: Document, shape: Shape, scale: number): void {
  switch (shape.kind) {
    case 'group':
      document.save();
      document.translate(shape.at.x, shape.at.y).rotate(shape.rotate);
      for (const inner of shape.shapes) drawShape(document, inner, scale);
      document.restore();
      return;
    case 'text':
      drawText(document, shape);
      return;
    default:
      outline(document, shape);
      paint(document, shape.pen, shape.fill && ink(shape.fill), scale);
  }
}

function outline(document: Document, shape: Exclude<Shape, { kind: 'group' | 'text' }>): void {
  switch (shape.kind) {
    case 'path':
      document.path(shape.d);
      return;
    case 'line':
      document.moveTo(shape.from.x, shape.from.y).lineTo(shape.to.x, shape.to.y);
      return;
    case 'circle':
      document.circle(shape.centre.x, shape.centre.y, shape.radius);
      return;
    case 'rect':
      if (shape.radius) document.roundedRect(shape.x, shape.y, shape.width, shape.height, shape.radius);
      else document.rect(shape.x, shape.y, shape.width, shape.height);
      return;
    case 'polygon':
      document.polygon(...shape.points.map(({ x, y }) => [x, y] as [number, number]));
  }
}

function paint(document: Document, pen: Pen | undefined, fill: string | undefined, scale: number): void {
  if (!pen) {
    if (fill) document.fill(fill);
    return;
  }
  const style: PenStyle = pens[pen];
  const dash = style.dash;
  document.lineWidth(style.scales ? style.width : (style.width * 0.75) / scale);
  document.lineCap(dash ? 'butt' : 'round');
  if (dash) document.dash(dash[0] ?? 1, { space: dash[1] ?? 1 });
  if (fill) document.fillAndStroke(fill, ink(style.colour));
  else document.stroke(ink(style.colour));
  if (dash) document.undash();
}

const fontOf: Record<TextShape['face'], Record<TextShape['weight'], FontName>> = {
  text: { 400: 'text', 500: 'text-medium', 600: 'text-strong' },
  plate: { 400: 'plate', 500: 'plate', 600: 'plate' },
  figures: { 400: 'figures', 500: 'figures-medium', 600: 'figures-medium' },
} satisfies Record<keyof typeof faces, Record<number, FontName>>;

function drawText(document: Document, shape: TextShape): void {
  const words = printable(shape.content);
  document.font(fontOf[shape.face][shape.weight]).fontSize(shape.size);
  const width = document.widthOfString(words);
  const x = shape.at.x - (shape.anchor === 'end' ? width : shape.anchor === 'middle' ? width / 2 : 0);
  const place = { lineBreak: false, baseline: 'alphabetic' } as const;
  if (shape.halo) {
    const pad = haloWidth / 2;
    document
      .rect(x - pad, shape.at.y - shape.size * 0.78 - pad / 2, width + pad * 2, shape.size + pad)
      .fill(ink('paper'));
  }
  document.fillColor(ink(shape.ink)).text(words, x, shape.at.y, place);
}
