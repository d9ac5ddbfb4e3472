import type { SpecDocument } from '../contracts/spec.js';
import { drawValveClock } from '../drawing/valve-clock.js';
import { printQuantity } from '../quantities/print.js';
import { valveClock } from '../valve-train/valve-clock.js';
import { defineWorking } from './define-working.js';
import {
  engineErrors,
  firingCase,
  firingFields,
  firingOf,
  timingCase,
  timingFields,
  timingOf,
} from './engine/engine-fields.js';
import { assumedEven, printAngle, printLength, stateWords } from './engine/engine-words.js';

/** What every cylinder does at one crank angle. */
export const valveClockWorking = defineWorking({
  key: 'valve-clock',
  group: 'valve-timing',
  title: 'Valve clock',
  asks: 'What does every cylinder do at this crank angle?',
  sections: [
    {
      heading: 'The crank',
      fields: [
        {
          kind: 'turn',
          name: 'crank',
          label: 'Crank, degrees after the firing TDC of the first cylinder',
          from: 0,
          to: 720,
          optional: '0°, the first cylinder’s firing TDC',
        },
      ],
    },
    { heading: 'The engine', fields: [...firingFields, ...timingFields()] },
    {
      heading: 'For the pistons’ height',
      fields: [
        {
          kind: 'quantity',
          of: 'length',
          unit: 'mm',
          name: 'stroke',
          label: 'Stroke',
          optional: 'no heights are given',
        },
        {
          kind: 'quantity',
          of: 'length',
          unit: 'mm',
          name: 'rod',
          label: 'Rod length, centre to centre',
          optional: 'no heights are given',
        },
      ],
    },
  ],
  example: {
    typed: { crank: '0', order: '1-3-4-2', ivo: '7', ivc: '39', evo: '51', evc: '3' },
    from: 'article on camshaft duration: 7/39 and 51/3',
  },
  fromSpec: (document) => [{ name: 'The engine', typed: fromDocument(document) }],
  basis: [
    'Exhaust open from 180° − EVO to 360° + EVC of a cylinder’s cycle, {inlet} from 360° − IVO to 540° + IVC: definition of the four figures.',
    'Piston height by the slider-crank, without offset: any text on engine kinematics.',
  ],
  fieldOf: [...engineErrors, [/^rodLength/, 'rod']],
  answer: (read, options) => {
    const firing = firingOf(read);
    const [stroke, rodLength] = [read.quantityIf('stroke'), read.quantityIf('rod')];
    const request = {
      ...firing,
      valveTiming: timingOf(read),
      crank: read.numberIf('crank') ?? 0,
      ...(stroke && { stroke }),
      ...(rodLength && { rodLength }),
    };
    const clock = valveClock(request);
    const withHeight = stroke !== undefined && rodLength !== undefined;
    return {
      parts: [
        {
          kind: 'drawing',
          caption: 'Once round is two turns of the crank',
          drawing: drawValveClock({ request, clock }, options),
        },
        {
          kind: 'table',
          heading: `At ${printAngle(request.crank)} of crank`,
          columns: [
            { name: 'Cylinder', figures: true },
            { name: 'Stroke' },
            { name: 'In its cycle', figures: true },
            { name: '{Inlet}' },
            { name: 'Exhaust' },
            ...(withHeight ? [{ name: 'Piston below top', figures: true as const }] : []),
          ],
          rows: clock.cylinders.map((one) => [
            String(one.cylinder),
            one.stroke === 'inlet' ? '{inlet}' : one.stroke,
            printAngle(one.phase),
            stateWords[one.inlet],
            stateWords[one.exhaust],
            ...(one.pistonFromTop === undefined ? [] : [printLength(one.pistonFromTop)]),
          ]),
        },
        {
          kind: 'facts',
          heading: 'The camshaft',
          facts: [
            { name: '{Inlet} open', value: printAngle(clock.duration.inlet), note: 'of crank' },
            { name: 'Exhaust open', value: printAngle(clock.duration.exhaust), note: 'of crank' },
            { name: 'Overlap', value: printAngle(clock.overlap), note: 'of crank' },
            { name: 'Lobe separation', value: printAngle(clock.lobeSeparation), note: 'of camshaft' },
          ],
        },
      ],
      assumed: [
        ...assumedEven(firing.intervals),
        'Opening and closing are where the timing is quoted: a valve is a little open before and after.',
      ],
    };
  },
});

function fromDocument(document: SpecDocument): Record<string, string> {
  const { stroke, rodLength } = document.engine;
  return {
    ...firingCase(document),
    ...timingCase(document),
    stroke: printQuantity(stroke.value),
    rod: printQuantity(rodLength.value),
  };
}
