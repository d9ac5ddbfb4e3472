import type {
  FastenerLayout,
  TighteningPass,
  TighteningPlan,
  TighteningPlanRequest,
} from '../contracts/calculations.js';
import type { FastenerGroup } from '../contracts/spec.js';
import { drawTightening, fastenerPositions } from '../drawing/tightening.js';
import { tighteningPlan } from '../fastening/tightening-plan.js';
import { defineWorking } from './define-working.js';
import { newtonMetresBeside } from './fastening/figures.js';
import { printFigure } from '../fastening/print-figure.js';
import { casesOfGroups, torqueOfGroup } from './fastening/groups-of-spec.js';
import { passInWords, readPass, usualPasses, writePass } from './fastening/passes.js';
import { planSections } from './fastening/plan-fields.js';
import { toleranceOf } from './fastening/tolerance.js';
import type { CaseReader } from './read-case.js';
import { writeRows } from './rows.js';
import type { AnswerPart, WorkingCase } from './working.js';

/** In which order a group is tightened, and to what in each pass. */
export const tighteningPlanWorking = defineWorking({
  key: 'tightening-plan',
  group: 'tightening',
  title: 'Tightening order and passes',
  asks: 'In which order are these tightened, and to what in each pass?',
  sections: planSections,
  example: {
    typed: { layout: 'circle', count: '4', torque: '27 lbf·ft', passes: '30 %;60 %;100 %' },
    from: 'a gasket maker’s guidance, opposite pairs in passes of 30, 60 and 100 %: 8.1, 16.2 and 27 lbf·ft',
  },
  fieldOf: [
    [/^fasteners\.positions\[(\d+)\]\.(fastener|x|y)/, 'positions.$1.$2'],
    [/^fasteners\.positions\[(\d+)\]/, 'positions.$1.fastener'],
    [/^fasteners\.(rows|columns|count|positions)/, '$1'],
    [/^sequence/, 'sequence'],
    [/^final/, 'torque'],
    [/^tolerance\.high/, 'above'],
    [/^tolerance/, 'below'],
    [/^passes\[(\d+)\]/, 'passes.$1.to'],
  ],
  basis: [
    'The maker’s sequence where there is one. Without it general practice: from the centre outwards; circles opposite and crossing, of 4, 8, 12 and 16 after the star pattern of ASME PCC-1, from memory.',
    'Loosening is the same order backwards.',
  ],
  fromSpec: (document) => casesOfGroups(document, caseOfGroup),
  answer: (read, options) => {
    const final = read.quantityIf('torque');
    const passes = read.rows('passes').map((row, i) => readPass(row.text('to'), `passes.${i}.to`));
    const request: TighteningPlanRequest = {
      fasteners: layoutOf(read),
      sequence: read
        .textIf('sequence')
        ?.split(/[\s,;>→-]+/)
        .filter((name) => name !== ''),
      final,
      tolerance: final && toleranceOf(read, final),
      passes: passes.length === 0 ? usualPasses : passes,
    };
    const plan = tighteningPlan(request);
    return {
      parts: [
        {
          kind: 'judgement',
          verdict: plan.verdict,
          ...(plan.verdict === 'pass' ? { word: 'Order worked out' } : {}),
          reason: plan.reason,
        },
        {
          kind: 'drawing',
          caption: 'The number on each is its place in the order',
          drawing: drawTightening(
            {
              plan,
              positions: fastenerPositions(request.fasteners),
              outline:
                'pattern' in request.fasteners && request.fasteners.pattern === 'circle'
                  ? 'circle'
                  : read.choice('part'),
            },
            options,
          ),
        },
        ...ordersOf(plan),
        passTable(plan, request.passes),
      ],
      assumed: [
        ...(passes.length === 0 ? ['Two passes, half the torque and all of it: common practice.'] : []),
        ...(plan.basis === 'maker' ? [] : ['The order is general practice, not the maker’s.']),
      ],
      cautions: [
        'Threads and faces are clean, and oiled or dry as the torque is printed for; each pass goes all round before the next.',
        ...(passes.some((pass) => 'angle' in pass)
          ? ['Bolts that are turned by an angle may be for one use only: look in the maker’s data.']
          : []),
      ],
    };
  },
});

function layoutOf(read: CaseReader): FastenerLayout {
  switch (read.choice<'grid' | 'circle' | 'line' | 'positions'>('layout')) {
    case 'grid':
      return { pattern: 'grid', rows: read.number('rows'), columns: read.number('columns') };
    case 'circle':
      return { pattern: 'circle', count: read.number('count') };
    case 'line':
      return { pattern: 'line', count: read.number('count') };
    case 'positions':
      return {
        positions: read
          .rows('positions')
          .map((row) => ({ fastener: row.text('fastener'), x: row.number('x'), y: row.number('y') })),
      };
  }
}

function ordersOf({ sequence, loosening }: TighteningPlan): readonly AnswerPart[] {
  if (sequence.length < 2) return [];
  return [
    {
      kind: 'facts',
      heading: 'Order, by fastener',
      facts: [
        { name: 'Tighten', value: sequence.join(', ') },
        { name: 'Loosen', value: loosening.join(', ') },
      ],
    },
  ];
}

/** A row a pass: all fasteners of the group have one torque here. */
function passTable({ steps }: TighteningPlan, passes: readonly TighteningPass[]): AnswerPart {
  const rows = passes.map((pass, i) => {
    const step = steps.find((one) => one.pass === i + 1);
    const { target, low, high } = step ?? {};
    const limits = low && high ? `${printFigure(low)} to ${printFigure(high)}` : '–';
    return [
      `${i + 1}`,
      passInWords(pass),
      target === undefined ? `${step?.angle ?? 0}°` : newtonMetresBeside(target),
      limits,
    ];
  });
  return {
    kind: 'table',
    heading: 'Passes, each all round in that order',
    columns: [
      { name: 'Pass', figures: true },
      { name: 'What' },
      { name: 'Each to', figures: true },
      { name: 'Between', figures: true },
    ],
    rows,
  };
}

function caseOfGroup(group: FastenerGroup): WorkingCase {
  const sequence = group.sequence?.value.join(', ');
  return {
    ...writeLayout(group.layout),
    part: group.outline === 'head' ? 'head' : 'plain',
    ...torqueOfGroup(group),
    ...(sequence !== undefined && { sequence }),
    passes: writeRows(
      group.passes.value.map((pass) => ({ to: writePass(pass) })),
      ['to'],
    ),
  };
}

function writeLayout(layout: FastenerLayout): WorkingCase {
  if ('positions' in layout) {
    const rows = layout.positions.map(({ fastener, x, y }) => ({ fastener, x: `${x}`, y: `${y}` }));
    return { layout: 'positions', positions: writeRows(rows, ['fastener', 'x', 'y']) };
  }
  return layout.pattern === 'grid'
    ? { layout: 'grid', rows: `${layout.rows}`, columns: `${layout.columns}` }
    : { layout: layout.pattern, count: `${layout.count}` };
}
