import type { Judgement } from '../contracts/verdict.js';
import type { TimingFigures } from '../contracts/valve-figures.js';
import { degrees, listed } from '../ignition/words.js';
import { printQuantity } from '../quantities/print.js';
import type { Quoted } from './quoted-at.js';

export type Late = NonNullable<TimingFigures['late']>;

/** Rounding noise of differences of degrees. */
const noise = 1e-9;

const eventNames: Readonly<Record<keyof Late, string>> = {
  ivo: 'inlet opening',
  ivc: 'inlet closing',
  evo: 'exhaust opening',
  evc: 'exhaust closing',
};
const events = ['ivo', 'ivc', 'evo', 'evc'] as const satisfies readonly (keyof Late)[];

export const notCompared: Judgement = {
  verdict: 'not-judged',
  reason: 'No spec was given to hold these figures against.',
};

/** Why two timings are not compared. */
export function notAlike(measured: Quoted, spec: Quoted): Judgement {
  const words = ({ by, at }: Quoted): string =>
    by === 'lift' ? `at ${printQuantity(at)} of lift` : `with ${printQuantity(at)} of clearance`;
  return {
    verdict: 'not-judged',
    reason:
      `The timing measured is quoted ${words(measured)} and the spec’s ${words(spec)}: ` +
      'such figures differ by many degrees and are not compared. Measure again as the spec is quoted.',
  };
}

/** Whether each event is within the tolerance of the spec, and if not, whether the whole camshaft is out. */
export function judgeTiming(late: Late, tolerance: number): Judgement {
  const off = events.filter((event) => Math.abs(late[event]) > tolerance + noise);
  const each = listed(events.map((event) => `${eventNames[event]} ${lateness(late[event])}`));
  const allowed = `${degrees(tolerance)} of crank either way is allowed`;
  if (off.length === 0)
    return { verdict: 'pass', reason: `Every event is where the spec has it: ${each}; ${allowed}.` };
  const mean = events.reduce((sum, event) => sum + late[event], 0) / events.length;
  const alike = events.every((event) => Math.abs(late[event] - mean) <= tolerance + noise);
  const why = alike
    ? `All four are out alike, so the whole camshaft stands ${lateness(mean)}: look at the timing marks, the key and the chain or gear.`
    : 'They are not out alike, so the camshaft’s place does not explain it: look at the clearances, the degree wheel’s zero and whether this is the camshaft of the spec.';
  return { verdict: 'fail', reason: `${each.charAt(0).toUpperCase()}${each.slice(1)}; ${allowed}. ${why}` };
}

function lateness(late: number): string {
  const size = degrees(Math.abs(late));
  if (size === '0°') return 'right';
  return `${size} ${late > 0 ? 'late' : 'early'}`;
}
