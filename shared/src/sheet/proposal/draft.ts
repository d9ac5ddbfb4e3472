import type { MeasurementSpec, Source, SpecDocument } from '../../contracts/spec.js';
import type { SecondCheckKind, StepDefinition } from '../../contracts/steps.js';
import { howToRead } from './how-to-read.js';

type Body<T> = T extends StepDefinition ? Omit<T, 'code' | 'stage' | 'restsOn' | 'hold'> : never;

/** A step before it has its code. */
export interface Draft {
  /** `read:mains:main-clearance`, `tight:head:head-nuts`: kind, place, key and, for one of several, which. */
  readonly id: string;
  /** Ids of earlier steps that this one rests on; `tight:head` means every step whose id begins so. */
  readonly after: readonly string[];
  readonly body: Body<StepDefinition>;
}

/** Proposes one stage's steps from a spec: only those that the spec has something for. */
export type StageProposal = (document: SpecDocument) => readonly Draft[];

interface Words {
  readonly id: string;
  readonly after?: readonly string[];
  readonly title: string;
  readonly instruction: string;
  readonly source?: Source | undefined;
}

const common = ({ title, instruction, source }: Omit<Words, 'id' | 'after'>) => ({
  title,
  instruction,
  ...(source && { source }),
});

/** Passed or failed by looking or trying. */
export function check({ id, after = [], ...words }: Words): Draft {
  return { id, after, body: { kind: 'check', ...common(words), critical: false } };
}

/** A check that a second person looks at too, with what they look for. */
export function inspection({ lookFor, ...words }: Words & { readonly lookFor: readonly string[] }): Draft {
  const { id, after = [], ...rest } = words;
  return {
    id,
    after,
    body: { kind: 'check', ...common(rest), critical: true, secondCheck: 'inspected', lookFor },
  };
}

export function photo({ shows, ...words }: Words & { readonly shows: readonly string[] }): Draft {
  const { id, after = [], ...rest } = words;
  return { id, after, body: { kind: 'photo', ...common(rest), critical: false, shows } };
}

interface Reading {
  readonly after?: readonly string[];
  /** Goes before the sentence on how the tool is read. */
  readonly words?: string;
  readonly title?: string;
  /** Which of several, where one measurement is read more than once. */
  readonly which?: string;
}

/** A measurement of the spec as a step: its places, limits and, where it is critical, its second check. */
export function reading(spec: MeasurementSpec, { after = [], words, title, which }: Reading = {}): Draft {
  const { key, place, name, method, limits, at, critical } = spec;
  const secondCheck: SecondCheckKind = method === 'plastic-gauge' ? 'strip-read-again' : 'measured-again';
  const unit = (limits.value.low ?? limits.value.high)?.unit;
  if (!unit) throw new Error(`The measurement ${key} has no limit.`);
  return {
    id: ['read', place, key, ...(which === undefined ? [] : [which])].join(':'),
    after,
    body: {
      kind: 'measurement',
      ...common({
        title: title ?? name,
        instruction: words === undefined ? howToRead[method] : `${words} ${howToRead[method]}`.trim(),
        source: limits.source,
      }),
      critical,
      ...(critical && { secondCheck }),
      method,
      limits: limits.value,
      unit,
      at,
    },
  };
}

/** The measurements of a spec at a place, in the spec's order. */
export function readAt(document: SpecDocument, place: MeasurementSpec['place']): readonly MeasurementSpec[] {
  return document.measurements.filter((spec) => spec.place === place);
}
