import { lashOrder } from '@second-spanner/shared/valve-train/lash-order';
import { lifterPreload } from '@second-spanner/shared/valve-train/lifter-preload';
import { pistonHeight } from '@second-spanner/shared/valve-train/piston-position';
import { positiveStop } from '@second-spanner/shared/valve-train/positive-stop';
import { shim } from '@second-spanner/shared/valve-train/shim';
import { timingFigures } from '@second-spanner/shared/valve-train/timing-figures';
import { valveClock } from '@second-spanner/shared/valve-train/valve-clock';
import { whichTdc } from '@second-spanner/shared/valve-train/which-tdc';
import { defineCalculation } from './define-calculation.js';
import { mm } from './quantities-in.js';

const firingOrder = [1, 3, 4, 2];
const valveTiming = { ivo: 12, ivc: 52, evo: 52, evc: 12 };

export const valveCalculations = [
  defineCalculation({
    name: 'valve-clock',
    summary:
      'What every cylinder does at an angle of the crank: its stroke, its valves, and how far its piston is down.',
    ...{ request: 'ValveClockRequest', answer: 'ValveClock', calculate: valveClock },
    example: { firingOrder, valveTiming, crank: 0, stroke: mm(86), rodLength: mm(150) },
  }),
  defineCalculation({
    name: 'which-tdc',
    summary: 'Which TDC a cylinder stands at, from what was seen of the valves, and what to look for next.',
    ...{ request: 'WhichTdcRequest', answer: 'WhichTdc', calculate: whichTdc },
    example: { firingOrder, valveTiming, cylinder: 1, sightings: [[{ cylinder: 1, rocking: true }]] },
  }),
  defineCalculation({
    name: 'lash-order',
    summary: 'In which order valve clearances are set, with the fewest stops of the crank.',
    ...{ request: 'LashOrderRequest', answer: 'LashOrder', calculate: lashOrder },
    example: {
      ...{ firingOrder, valveTiming },
      valves: [1, 2, 3, 4].flatMap((cylinder) => [
        {
          valve: String(cylinder * 2 - 1),
          cylinder,
          type: cylinder % 2 === 1 ? ('exhaust' as const) : ('inlet' as const),
        },
        {
          valve: String(cylinder * 2),
          cylinder,
          type: cylinder % 2 === 1 ? ('inlet' as const) : ('exhaust' as const),
        },
      ]),
    },
  }),
  defineCalculation({
    name: 'timing-figures',
    summary:
      'Durations, overlap, lobe centres and advance from valve timing, held against a spec where one is given.',
    ...{ request: 'TimingFiguresRequest', answer: 'TimingFigures', calculate: timingFigures },
    example: { timing: valveTiming, quotedAt: { lash: mm(0.35) } },
  }),
  defineCalculation({
    name: 'positive-stop',
    summary: 'True TDC from the two readings of a degree wheel against a positive stop.',
    ...{ request: 'PositiveStopRequest', answer: 'PositiveStop', calculate: positiveStop },
    example: { forward: 330, back: 34 },
  }),
  defineCalculation({
    name: 'shim',
    summary: 'The shim that brings a valve clearance into its limits.',
    ...{ request: 'ShimRequest', answer: 'Shim', calculate: shim },
    example: { fitted: mm(2.5), measured: mm(0.42), wanted: { low: mm(0.3), high: mm(0.35) } },
  }),
  defineCalculation({
    name: 'lifter-preload',
    summary: 'How far a hydraulic lifter is pushed in by turns of its adjuster.',
    ...{ request: 'LifterPreloadRequest', answer: 'LifterPreload', calculate: lifterPreload },
    example: { turns: 0.75, pitch: mm(1) },
  }),
  defineCalculation({
    name: 'piston-height',
    summary: 'How far a piston is from its top at an angle of the crank, or the angle for a travel.',
    ...{ request: 'PistonHeightRequest', answer: 'PistonHeight', calculate: pistonHeight },
    example: { stroke: mm(86), rodLength: mm(150), crank: 90 },
  }),
];
