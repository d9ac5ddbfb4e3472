import { degrees } from '../../drawing/cap-input.js';
import type { WiringForm } from './wiring-form.js';
import type { WiringAnswer } from './work-out.js';

/** A caption and what stands under it. Both may hold trade-word tokens. */
export interface Fact {
  readonly caption: string;
  readonly words: string;
}

/** What an engine has, as it was understood: nothing while there is no map. */
export function engineFacts(form: WiringForm, answer: WiringAnswer): readonly Fact[] {
  const { cap, map, advance, posts } = answer;
  if (cap === null || map === null) return [];
  const firstRow = map.rows[0];
  return [
    { caption: 'Cylinders', words: `${cap.firingOrder.length}, four-stroke` },
    { caption: 'Firing order', words: cap.firingOrder.join('-') },
    { caption: 'Rotor turns', words: rotorWords(form) },
    ...(form.outlets === 'own'
      ? [{ caption: 'Posts', words: posts.map(({ key }) => `${key}°`).join(', ') }]
      : []),
    ...(firstRow === undefined
      ? []
      : [{ caption: 'Post for the first cylinder', words: `${degrees(firstRow.angle)}° from the mark` }]),
    ...(form.intervals.trim() === '' ? [] : [{ caption: 'Intervals', words: form.intervals.trim() }]),
    ...(advance === undefined ? [] : [{ caption: 'Static timing', words: `${advance}° before TDC` }]),
    ...timingFact(answer),
  ];
}

/** Which way the rotor turns, and from where that is seen. */
export function rotorWords({ turns, seenFrom }: WiringForm): string {
  return `${turns === 'anticlockwise' ? '{anticlockwise}' : turns}, seen from the ${seenFrom}`;
}

function timingFact({ valveTiming }: WiringAnswer): readonly Fact[] {
  if (valveTiming === undefined) return [];
  const { ivo, ivc, evo, evc } = valveTiming;
  return [
    {
      caption: 'Valve timing',
      words: `{inlet} ${ivo}° before TDC to ${ivc}° after BDC, exhaust ${evo}° before BDC to ${evc}° after TDC`,
    },
  ];
}
