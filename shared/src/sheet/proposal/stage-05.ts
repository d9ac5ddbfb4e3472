import type { SpecDocument } from '../../contracts/spec.js';
import { check, inspection, photo, readAt, reading, type Draft } from './draft.js';
import { printQuantity } from '../../quantities/print.js';
import { firstCylinder, valveTimingOf } from './from-spec.js';
import { tightening } from './tightening.js';
import { turning } from './turning.js';

/** Timing drive, cam timing. */
export function stage05(document: SpecDocument): readonly Draft[] {
  const slack = readAt(document, 'timing').filter(({ critical }) => !critical);
  return [
    ...driveOn(document),
    ...slack.map((spec) =>
      reading(spec, { after: ['drive-on'], words: 'Slack run pressed and pulled by a finger.' }),
    ),
    check({
      id: 'tensioner',
      after: ['drive-on'],
      title: 'Tensioner set free',
      instruction: 'Tensioner fitted, its travel free and its lock out; slipper unworn and its bolts locked.',
    }),
    turning(document, 'turning-timing', {
      of: 'the timing drive',
      after: ['drive-on', 'tight:cam-sprocket', 'tensioner'],
    }),
    photo({
      id: 'marks-seen',
      after: ['read:running-torque:turning-timing', 'turned:turning-timing'],
      title: 'Timing marks after two turns',
      instruction: 'Back at the marks, photograph both sprockets square on.',
      shows: ['Marks together, square on'],
    }),
    ...camTiming(document),
  ];
}

function driveOn(document: SpecDocument): readonly Draft[] {
  const cylinder = firstCylinder(document);
  const { marksTogether } = document.valveTrain;
  return [
    inspection({
      id: 'true-tdc',
      title: 'True TDC by positive stop',
      instruction: `Degree wheel on the crank, a stop in cylinder ${cylinder}; turn gently to the stop from both sides and set the pointer half way between. Never find it by the pulley's mark alone.`,
      lookFor: [
        'The wheel reads the same number either side of zero at the stop',
        'Pointer fixed where it cannot be knocked',
        'Stop taken out again',
      ],
    }),
    check({
      id: 'drive-on',
      after: ['true-tdc'],
      title: 'Sprockets and chain on, marks together',
      instruction:
        'Keys home, sprockets in one plane by a straight edge, marks in line before and after the slack is taken up.',
    }),
    ...tightening(document, 'cam-sprocket', { after: ['drive-on'] }),
    {
      id: 'marks-tdc',
      after: ['drive-on'],
      body: {
        kind: 'valve-timing',
        title: 'Which TDC the marks mean',
        instruction: `With the marks together, watch what the {followers} of cylinder ${cylinder} and its companion do a little before and after. Enter what was seen.`,
        ...(marksTogether.source && { source: marksTogether.source }),
        critical: true,
        secondCheck: 'read-again',
        firingOrder: document.engine.firingOrder.value,
        valveTiming: valveTimingOf(document),
        cylinder,
        wanted: marksTogether.value === 'compression' ? 'compression-tdc' : 'exhaust-tdc',
      },
    },
  ];
}

/** The stage is about the cam's timing, so its reading comes last and holds. */
function camTiming(document: SpecDocument): readonly Draft[] {
  const after = ['true-tdc', 'marks-tdc', 'tight:cam-sprocket', 'marks-seen'];
  const words = 'Against the true TDC, turning only the way the engine runs.';
  const readings = readAt(document, 'timing').filter(({ critical }) => critical);
  if (readings.length > 0) return readings.map((spec) => reading(spec, { after, words }));
  const { timing, timingQuotedAt } = document.valveTrain;
  const { lift, lash } = timingQuotedAt.value;
  const at = lift ?? lash;
  return [
    inspection({
      id: 'cam-timing',
      after,
      title: 'Cam timing against the spec',
      instruction: `${words} {Inlet} opens ${timing.value.ivo}° before TDC and exhaust shuts ${timing.value.evc}° after${at ? `, at ${printQuantity(at)}` : ''}.`,
      lookFor: [
        'Opening and shutting read off the wheel twice',
        'Figures quoted at the lift that the spec states',
      ],
    }),
  ];
}
