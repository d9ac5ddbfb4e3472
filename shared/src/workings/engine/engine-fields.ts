import type { Cylinder, ValveTiming } from '../../contracts/calculations.js';
import { InputError } from '../../contracts/input-error.js';
import type { SpecDocument } from '../../contracts/spec.js';
import type { CaseReader } from '../read-case.js';
import type { NumberField, TextField, WorkingCase } from '../working.js';
import { readIntervals, readOrder } from '../wiring-map/read-texts.js';

/** The engine's firing, as every working asks for it. */
export const firingFields: readonly TextField[] = [
  {
    kind: 'text',
    name: 'order',
    label: 'Firing order',
    hint: '1-3-4-2, or names such as L1-R1-L2-R2',
    figures: true,
  },
  {
    kind: 'text',
    name: 'intervals',
    label: 'Firing intervals',
    hint: 'Degrees of crank from each to the next, such as 90-150-90-150-90-150',
    optional: 'it fires evenly',
    figures: true,
  },
];

const event = (name: string, label: string): NumberField => ({
  kind: 'number',
  name,
  label,
  counts: '°',
  signed: true,
});

/** The four figures of a valve timing; `prefix` where a working asks for two timings. */
export function timingFields(prefix = ''): readonly NumberField[] {
  return [
    event(`${prefix}ivo`, '{Inlet} opens, before TDC'),
    event(`${prefix}ivc`, '{Inlet} closes, after BDC'),
    event(`${prefix}evo`, 'Exhaust opens, before BDC'),
    event(`${prefix}evc`, 'Exhaust closes, after TDC'),
  ];
}

/** Where the calculations' errors on these fields belong. */
export const engineErrors: readonly (readonly [RegExp, string])[] = [
  [/^(cap\.)?firingOrder/, 'order'],
  [/^(cap\.)?intervals/, 'intervals'],
  [/^valveTiming\.ivo/, 'ivo'],
  [/^valveTiming\.ivc/, 'ivc'],
  [/^valveTiming\.evo/, 'evo'],
  [/^valveTiming\.evc/, 'evc'],
];

export interface TypedFiring {
  readonly firingOrder: readonly Cylinder[];
  readonly intervals?: readonly number[];
}

export function firingOf(read: CaseReader): TypedFiring {
  const firingOrder = readOrder(read.text('order'));
  const typed = read.textIf('intervals');
  if (typed === undefined) return { firingOrder };
  const intervals = readIntervals(typed);
  if (intervals !== null) return { firingOrder, intervals };
  throw new InputError('intervals', 'Write numbers of degrees with dashes between them: 90-150-90-150.');
}

export function timingOf(read: CaseReader, prefix = ''): ValveTiming {
  const figure = (name: string): number => read.number(`${prefix}${name}`);
  return { ivo: figure('ivo'), ivc: figure('ivc'), evo: figure('evo'), evc: figure('evc') };
}

/** A typed cylinder as the order has it: a number where the order's cylinders are. */
export function cylinderOf(typed: string, { firingOrder }: TypedFiring): Cylinder {
  return typeof firingOrder[0] === 'number' && /^\d+$/.test(typed) ? Number(typed) : typed;
}

/** The engine of a spec, as typed. */
export function firingCase({ engine }: SpecDocument): WorkingCase {
  return { order: engine.firingOrder.value.join('-') };
}

export function timingCase({ valveTrain }: SpecDocument, prefix = ''): WorkingCase {
  const { ivo, ivc, evo, evc } = valveTrain.timing.value;
  return Object.fromEntries(
    Object.entries({ ivo, ivc, evo, evc }).map(([name, figure]) => [`${prefix}${name}`, String(figure)]),
  );
}
