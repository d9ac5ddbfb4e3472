import { faces, type Face, type Fill, type Ink, type Pen } from './roles.js';

export interface Point {
  readonly x: number;
  readonly y: number;
}

interface Drawn {
  readonly pen?: Pen;
  readonly fill?: Fill;
  /** What the shape stands for, such as `lead:B`: for tests, and for a page that lets it be touched. */
  readonly part?: string;
}

export interface PathShape extends Drawn {
  readonly kind: 'path';
  /** SVG path data, absolute commands. */
  readonly d: string;
}
export interface LineShape extends Drawn {
  readonly kind: 'line';
  readonly from: Point;
  readonly to: Point;
}
export interface CircleShape extends Drawn {
  readonly kind: 'circle';
  readonly centre: Point;
  readonly radius: number;
}
export interface RectShape extends Drawn {
  readonly kind: 'rect';
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
  /** Corner radius. */
  readonly radius?: number;
}
export interface PolygonShape extends Drawn {
  readonly kind: 'polygon';
  readonly points: readonly Point[];
}
export interface TextShape {
  readonly kind: 'text';
  /** On the baseline. */
  readonly at: Point;
  readonly content: string;
  readonly size: number;
  readonly face: Face;
  readonly weight: 400 | 500 | 600;
  readonly anchor: 'start' | 'middle' | 'end';
  readonly ink: Ink;
  /** A border in paper colour, where the text crosses lines. */
  readonly halo: boolean;
  readonly part?: string;
}
export interface GroupShape {
  readonly kind: 'group';
  /** Where the group's own origin is set down. */
  readonly at: Point;
  /** Degrees clockwise about that origin. */
  readonly rotate: number;
  readonly shapes: readonly Shape[];
  readonly part?: string;
}
export type Shape = PathShape | LineShape | CircleShape | RectShape | PolygonShape | TextShape | GroupShape;

export interface DrawingTable {
  readonly columns: readonly string[];
  readonly rows: readonly (readonly string[])[];
}

/** A drawing as plain data: y runs downwards, later shapes cover earlier ones. */
export interface Drawing {
  readonly title: string;
  /** The drawing in words, for whoever cannot see it. */
  readonly description: string;
  readonly width: number;
  readonly height: number;
  readonly shapes: readonly Shape[];
  /** Says the same as the drawing. */
  readonly table: DrawingTable;
}

type Style = Drawn;

export function line(x1: number, y1: number, x2: number, y2: number, pen: Pen, part?: string): LineShape {
  return { kind: 'line', from: { x: x1, y: y1 }, to: { x: x2, y: y2 }, pen, part };
}

export function circle(x: number, y: number, radius: number, style: Style): CircleShape {
  return { kind: 'circle', centre: { x, y }, radius, ...style };
}

export function rect(
  x: number,
  y: number,
  width: number,
  height: number,
  style: Style & Pick<RectShape, 'radius'>,
): RectShape {
  return { kind: 'rect', x, y, width, height, ...style };
}

export function path(d: string, style: Style): PathShape {
  return { kind: 'path', d, ...style };
}

/** A closed polygon from pairs of x and y. */
export function polygon(points: readonly (readonly [number, number])[], style: Style): PolygonShape {
  return { kind: 'polygon', points: points.map(([x, y]) => ({ x, y })), ...style };
}

export function group(
  x: number,
  y: number,
  rotate: number,
  shapes: readonly Shape[],
  part?: string,
): GroupShape {
  return { kind: 'group', at: { x, y }, rotate, shapes, part };
}

export type TextOptions = Partial<Omit<TextShape, 'kind' | 'at' | 'content'>>;

/** A text on its baseline; by default 13 units, in the text face, ink, from its start. */
export function text(x: number, y: number, content: string, options: TextOptions = {}): TextShape {
  return {
    kind: 'text',
    at: { x, y },
    content,
    size: 13,
    face: 'text',
    weight: 400,
    anchor: 'start',
    ink: 'ink',
    halo: false,
    ...options,
  };
}

/** A text whose capitals and figures are centred on the point, both ways. */
export function centredText(x: number, y: number, content: string, options: TextOptions = {}): TextShape {
  const size = options.size ?? 13;
  return text(x, y + size * 0.36, content, { anchor: 'middle', ...options });
}

/** A generous estimate of a text's width, for placing it without measuring; drawing units. */
export function textWidth(shape: Pick<TextShape, 'content' | 'size' | 'face'>): number {
  return [...shape.content].length * shape.size * faces[shape.face].advance;
}
