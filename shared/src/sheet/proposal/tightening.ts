import type { TighteningPlanRequest } from '../../contracts/calculations.js';
import type { FastenerGroup, FastenerPlace, SpecDocument } from '../../contracts/spec.js';
import type { Draft } from './draft.js';

const threads: Readonly<Record<FastenerGroup['condition']['value'], string>> = {
  dry: 'Threads clean and dry',
  oiled: 'Oil the threads and the faces that turn',
  moly: 'Moly grease on the threads and the faces that turn',
  sealant: 'Sealant on the threads, none on the first two',
  'thread-lock': 'Degrease, then thread-lock on the threads that will be in the hole',
};

/** What the tightening plan is worked out from. */
export function planRequestOf(group: FastenerGroup): TighteningPlanRequest {
  const { layout, sequence, torque, tolerance, passes } = group;
  return {
    fasteners: layout,
    ...(sequence && { sequence: sequence.value }),
    final: torque.value,
    ...(tolerance && { tolerance: tolerance.value }),
    passes: passes.value,
  };
}

export function groupsAt(document: SpecDocument, place: FastenerPlace): readonly FastenerGroup[] {
  return document.fastenerGroups.filter((group) => group.place === place);
}

export interface Tightening {
  readonly after?: readonly string[];
  /** Goes before what is said of threads and passes. */
  readonly words?: string;
}

/** The tightening steps of a place: one a group, or one a repeat of it such as a cap, a rod or a bank. */
export function tightening(
  document: SpecDocument,
  place: FastenerPlace,
  options: Tightening = {},
): readonly Draft[] {
  return groupsAt(document, place).flatMap((group) =>
    group.repeats
      ? group.repeats.map((repeat) => tighten(group, options, repeat))
      : [tighten(group, options, undefined)],
  );
}

/** One tightening step; `repeat` names which cap, rod or bank it is. */
export function tighten(group: FastenerGroup, options: Tightening, repeat: string | undefined): Draft {
  const { key, place, name, noun, outline, thread, condition, grade, torque } = group;
  const which = repeat === undefined ? '' : `, ${repeat.charAt(0).toLowerCase()}${repeat.slice(1)}`;
  const words = options.words === undefined ? '' : `${options.words} `;
  return {
    id: ['tight', place, key, ...(repeat === undefined ? [] : [repeat])].join(':'),
    after: options.after ?? [],
    body: {
      kind: 'tightening',
      title: `Tighten the ${name}${which}`,
      instruction: `${words}${howToPull(group)}`,
      ...(torque.source && { source: torque.source }),
      critical: true,
      secondCheck: 'setting-and-pull-witnessed',
      group: { key, name, noun, outline, thread, condition, grade },
      plan: planRequestOf(group),
      torque: torque.value,
    },
  };
}

function howToPull({ layout, condition, passes, singleUse, locking }: FastenerGroup): string {
  const count = passes.value.length;
  const alone = 'count' in layout && layout.count === 1;
  const pull = alone ? 'one steady pull' : 'one steady pull each';
  const pulls = count === 1 ? pull : `${count} passes${alone ? '' : ' in the order drawn'}, ${pull}`;
  const sentences = [`${threads[condition.value]}; ${pulls}.`];
  if (singleUse?.value) sentences.push('Use new ones: these are tightened once only.');
  if (locking) sentences.push(`Locking: ${locking.value}.`);
  return sentences.join(' ');
}
