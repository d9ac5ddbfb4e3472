import { colours, faces, fills, haloWidth, inks, pens, type Pen, type PenStyle } from './roles.js';
import type { Drawing, Point, Shape, TextShape } from './shapes.js';

/** An SVG element as data. Attribute values and text are plain: whoever writes them out escapes them. */
export interface SvgNode {
  readonly tag: 'path' | 'line' | 'circle' | 'rect' | 'polygon' | 'text' | 'g';
  readonly attributes: Readonly<Record<string, string>>;
  readonly text?: string;
  readonly children?: readonly SvgNode[];
}

/** The elements of a drawing, styled by the classes of `svgStyles`. */
export function svgNodes(drawing: Pick<Drawing, 'shapes'>): readonly SvgNode[] {
  return drawing.shapes.map(svgNode);
}

/** One shape as an SVG element. */
export function svgNode(shape: Shape): SvgNode {
  switch (shape.kind) {
    case 'path':
      return node('path', shape, { d: shape.d });
    case 'line':
      return node('line', shape, {
        x1: shape.from.x,
        y1: shape.from.y,
        x2: shape.to.x,
        y2: shape.to.y,
      });
    case 'circle':
      return node('circle', shape, { cx: shape.centre.x, cy: shape.centre.y, r: shape.radius });
    case 'rect': {
      const { x, y, width, height, radius } = shape;
      return node('rect', shape, { x, y, width, height, ...(radius === undefined ? {} : { rx: radius }) });
    }
    case 'polygon':
      return node('polygon', shape, { points: shape.points.map(pair).join(' ') });
    case 'text':
      return textNode(shape);
    case 'group': {
      const transform = `translate(${pair(shape.at)}) rotate(${shape.rotate})`;
      const attributes = { transform, ...partAttribute(shape.part) };
      return { tag: 'g', attributes, children: shape.shapes.map(svgNode) };
    }
  }
}

function textNode(shape: TextShape): SvgNode {
  const classes = [`face-${shape.face}`, `ink-${shape.ink}`, ...(shape.halo ? ['halo'] : [])];
  return {
    tag: 'text',
    attributes: {
      x: String(shape.at.x),
      y: String(shape.at.y),
      class: classes.join(' '),
      'font-size': String(shape.size),
      'font-weight': String(shape.weight),
      'text-anchor': shape.anchor,
      ...partAttribute(shape.part),
    },
    text: shape.content,
  };
}

function node(
  tag: SvgNode['tag'],
  shape: Exclude<Shape, { kind: 'text' | 'group' }>,
  geometry: Readonly<Record<string, number | string>>,
): SvgNode {
  const scales = shape.pen === undefined || ('scales' in pens[shape.pen] && true);
  return {
    tag,
    attributes: {
      ...Object.fromEntries(Object.entries(geometry).map(([name, value]) => [name, String(value)])),
      class: [`pen-${shape.pen ?? 'none'}`, `fill-${shape.fill ?? 'none'}`].join(' '),
      ...(scales ? {} : { 'vector-effect': 'non-scaling-stroke' }),
      ...partAttribute(shape.part),
    },
  };
}

function partAttribute(part: string | undefined): Readonly<Record<string, string>> {
  return part === undefined ? {} : { 'data-part': part };
}

function pair(point: Point): string {
  return `${point.x} ${point.y}`;
}

/**
 * The style sheet of every class that `svgNodes` gives, under one selector. On screen the colours are the
 * page's tokens, so that a drawing follows the light; alone, pass `day` or `print` to have them fixed.
 */
export function svgStyles(selector: string, light: 'token' | 'day' | 'print' = 'token'): string {
  const colour = (role: keyof typeof colours): string =>
    light === 'token' ? `var(${colours[role].token})` : colours[role][light];
  const penRules = (Object.keys(pens) as Pen[]).map((name) => {
    const { colour: role, width, dash }: PenStyle = pens[name];
    const end = dash === undefined ? 'stroke-linecap:round' : `stroke-dasharray:${dash.join(' ')}`;
    return `${selector} .pen-${name}{stroke:${colour(role)};stroke-width:${width}px;stroke-linejoin:round;${end}}`;
  });
  const faceRules = (Object.keys(faces) as (keyof typeof faces)[]).map(
    (name) => `${selector} .face-${name}{font-family:var(${faces[name].token})}`,
  );
  return [
    `${selector}{fill:none;stroke:none}`,
    ...penRules,
    ...fills.map((name) => `${selector} .fill-${name}{fill:${colour(name)}}`),
    ...inks.map((name) => `${selector} .ink-${name}{fill:${colour(name)}}`),
    ...faceRules,
    `${selector} .face-figures{font-variant-numeric:tabular-nums;letter-spacing:-0.02em}`,
    `${selector} .halo{paint-order:stroke;stroke:${colour('paper')};stroke-width:${haloWidth}px;stroke-linejoin:round}`,
  ].join('\n');
}

/** A drawing as a whole SVG document, with its title and description. */
export function toSvg(drawing: Drawing, light: 'token' | 'day' | 'print' = 'token'): string {
  const { width, height, title, description } = drawing;
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" class="drawing" viewBox="0 0 ${width} ${height}" role="img">`,
    `<title>${escaped(title)}</title><desc>${escaped(description)}</desc>`,
    `<style>${svgStyles('.drawing', light)}</style>`,
    ...svgNodes(drawing).map(written),
    '</svg>',
  ].join('');
}

function written({ tag, attributes, text, children }: SvgNode): string {
  const list = Object.entries(attributes).map(([name, value]) => ` ${name}="${escaped(value)}"`);
  const inside = text === undefined ? (children ?? []).map(written).join('') : escaped(text);
  return `<${tag}${list.join('')}>${inside}</${tag}>`;
}

const entities: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

function escaped(value: string): string {
  return value.replace(/[&<>"']/g, (character) => entities[character] ?? '');
}
