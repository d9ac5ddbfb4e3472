import type { SpecDocument } from '../../contracts/spec.js';
import { check, readAt, reading, type Draft } from './draft.js';

/** First start. */
export function stage13(document: SpecDocument): readonly Draft[] {
  const pressures = readAt(document, 'pressures').filter(({ key }) => key.startsWith('oil'));
  const cranking = pressures.filter(({ key }) => key.includes('cranking'));
  const running = pressures.filter((spec) => !cranking.includes(spec));
  const { staticTiming } = document.ignition;
  const flat = document.engine.followers.value !== 'hydraulic';
  return [
    ...cranking.map((spec) =>
      reading(spec, { words: 'Plugs out, no spark, on the starter in short bursts until the gauge moves.' }),
    ),
    check({
      id: 'static-timing',
      after: ['read:pressures'],
      title: 'Static timing',
      instruction: `A lamp across the points goes out at ${staticTiming.value}° before TDC as the crank is turned the way it runs.`,
      source: staticTiming.source,
    }),
    check({
      id: 'starts',
      after: ['static-timing'],
      title: 'Starts',
      instruction:
        'One person at the switch, one at the engine. Off at once if the oil pressure does not come up.',
    }),
    ...running.map((spec) => reading(spec, { after: ['starts'], words: 'Read at the gauge, oil hot.' })),
    ...(flat ? [camRunIn()] : []),
    check({
      id: 'no-leaks',
      after: ['starts'],
      title: 'No leaks',
      instruction: 'Oil, water, fuel and exhaust looked at while it runs and again when it has stopped.',
    }),
    check({
      id: 'dynamic-timing',
      after: ['starts', 'cam-run-in'],
      title: 'Timing by the lamp, running',
      instruction: 'Advance at idle and at speed as the spec has it; it comes in smoothly and goes back.',
    }),
  ];
}

const camRunIn = (): Draft =>
  check({
    id: 'cam-run-in',
    after: ['starts'],
    title: 'Camshaft run in',
    instruction:
      'New flat {followers}: straight up to a fast idle and kept there some twenty minutes, speed changed now and then, unless its maker says otherwise.',
  });
