import { threadFigures } from '../fastening/thread-figures.js';
import type { ThreadFigures } from '../contracts/fastening.js';
import { printNumber, printQuantity } from '../quantities/print.js';
import { convert } from '../quantities/convert.js';
import type { Quantity } from '../contracts/quantity.js';
import { defineWorking } from './define-working.js';
import { threadField } from './fastening/fields.js';
import { casesByThread } from './fastening/groups-of-spec.js';

const seriesWords: Readonly<Record<ThreadFigures['series'], string>> = {
  'metric-coarse': 'metric, coarse',
  'metric-fine': 'metric, fine',
  UNC: 'Unified coarse',
  UNF: 'Unified fine',
  BSW: 'British Standard Whitworth',
  BSF: 'British Standard Fine',
};

/** The figures of one thread. */
export const threadWorking = defineWorking({
  key: 'thread',
  group: 'tightening',
  title: 'Figures of a thread',
  asks: 'What are the pitch, the diameters and the stress area of this thread?',
  sections: [{ heading: 'The thread', fields: [threadField] }],
  example: {
    typed: { thread: 'M10x1.5' },
    from: 'a handbook’s table of metric thread stress areas: 57.99 mm²',
  },
  basis: [
    'Sizes: ISO 261 and ISO 262, ASME B1.1, BS 84, from memory.',
    'Metric: ISO 724 and ISO 898-1:2013, 9.1.6.1: As = π/4·((d2 + d3)/2)², d2 = d − 0.6495P, d3 = d − 1.2269P.',
    'Unified: As = 0.7854(D − 0.9743/n)², ASME B1.1. Whitworth form: D − 0.6403/n and D − 1.2807/n, BS 84, the area from their mean.',
  ],
  fromSpec: (document) => casesByThread(document, (group) => ({ thread: group.thread.value })),
  answer: (read) => {
    const figures = threadFigures({ thread: read.text('thread') });
    const { name, series, perInch } = figures;
    return {
      parts: [
        {
          kind: 'facts',
          heading: name,
          facts: [
            { name: 'Series', value: seriesWords[series] },
            ...(perInch === undefined ? [] : [{ name: 'Threads an inch', value: `${perInch}` }]),
            { name: 'Pitch', value: both(figures.pitch) },
            { name: 'Nominal diameter', value: both(figures.diameter) },
            { name: 'Pitch diameter', value: both(figures.pitchDiameter) },
            { name: 'Root diameter of the bolt', value: both(figures.minorDiameter) },
            { name: 'Stress area', value: bothAreas(figures.stressArea) },
          ],
        },
      ],
      assumed: ['Nominal figures: a real thread is a little smaller by its class of fit.'],
    };
  },
});

function both(length: Quantity): string {
  const [mm, inch] = [convert(length, 'mm'), convert(length, 'in')];
  const texts = [printQuantity(mm, { digits: 3 }), printQuantity(inch, { digits: 4 })];
  return length.unit === 'in'
    ? `${texts[1] ?? ''} (${texts[0] ?? ''})`
    : `${texts[0] ?? ''} (${texts[1] ?? ''})`;
}

function bothAreas(area: Quantity): string {
  const mm = `${printNumber(convert(area, 'mm2').value, 2)}\u2009mm²`;
  const inch = `${printNumber(convert(area, 'in2').value, 4)}\u2009in²`;
  return area.unit === 'in2' ? `${inch} (${mm})` : `${mm} (${inch})`;
}
