import { describe, expect, it } from 'vitest';
import { colours, fills, inks, pens } from './roles.js';
import { circle, group, line, polygon, rect, text, type Drawing } from './shapes.js';
import { svgNodes, svgStyles, toSvg } from './to-svg.js';

const drawing: Drawing = {
  title: 'Lead <1> & "2"',
  description: 'A & B',
  width: 100,
  height: 50,
  table: { columns: [], rows: [] },
  shapes: [
    line(1, 2, 3, 4, 'hidden'),
    circle(5, 6, 7, { pen: 'outline', fill: 'paper', part: 'post:1' }),
    rect(1, 1, 8, 9, { fill: 'well', radius: 2 }),
    group(10, 20, 315, [
      polygon(
        [
          [0, 0],
          [1, 0],
          [0, 1],
        ],
        { pen: 'sign-wait' },
      ),
    ]),
    text(1, 30, '</text><script>alert(1)</script>', { halo: true, ink: 'ink-2', face: 'figures' }),
  ],
};

describe('the nodes', () => {
  const [first, second, third, fourth, fifth] = svgNodes(drawing);

  it('carry geometry as numbers, and roles as classes', () => {
    expect(first).toEqual({
      tag: 'line',
      attributes: {
        ...{ x1: '1', y1: '2', x2: '3', y2: '4' },
        class: 'pen-hidden fill-none',
        'vector-effect': 'non-scaling-stroke',
      },
    });
    expect(second?.attributes).toMatchObject({ class: 'pen-outline fill-paper', 'data-part': 'post:1' });
    expect(third?.attributes).toMatchObject({ rx: '2', class: 'pen-none fill-well' });
  });

  it('turn groups, and let only the pens of signs scale', () => {
    expect(fourth?.attributes).toEqual({ transform: 'translate(10 20) rotate(315)' });
    expect(fourth?.children?.[0]?.attributes).not.toHaveProperty('vector-effect');
  });

  it('keep a text as text', () => {
    expect(fifth?.text).toBe('</text><script>alert(1)</script>');
    expect(fifth?.attributes['class']).toBe('face-figures ink-ink-2 halo');
  });
});

describe('the document', () => {
  const svg = toSvg(drawing, 'print');

  it('escapes whatever a person may have typed', () => {
    expect(svg).not.toContain('<script>');
    expect(svg).toContain('&lt;script&gt;');
    expect(svg).toContain('<title>Lead &lt;1&gt; &amp; &quot;2&quot;</title><desc>A &amp; B</desc>');
  });

  it('has a rule for every role', () => {
    const rules = svgStyles('.x');
    const classes = [
      ...Object.keys(pens).map((name) => `pen-${name}`),
      ...fills.map((name) => `fill-${name}`),
      ...inks.map((name) => `ink-${name}`),
    ];
    expect(classes.filter((name) => !rules.includes(`.x .${name}{`))).toEqual([]);
    expect(rules).toContain('.x .pen-outline{stroke:var(--ss-line);stroke-width:1.8px');
  });

  it('is black and white on paper', () => {
    const greys = Object.values(colours).map(({ print }) => print.slice(1).match(/../g));
    for (const [red, green, blue] of greys.map((parts) => parts ?? [])) {
      expect([green, blue]).toEqual([red, red]);
    }
    expect(svg).not.toContain(colours.oxide.day);
  });
});
