import { InputError } from '../contracts/input-error.js';
import type { EntryContent, StepDefinition, StepKind } from '../contracts/steps.js';
import type { Judgement } from '../contracts/verdict.js';
import type { JudgingContext } from './judging-context.js';

/** Judges what was recorded on a step; throws an `InputError` for content that does not belong to it. */
export type Judge = (definition: StepDefinition, content: EntryContent, context: JudgingContext) => Judgement;

type Of<T, K extends StepKind> = Extract<T, { kind: K }>;

const isOf = <T extends { readonly kind: StepKind }, K extends StepKind>(it: T, kind: K): it is Of<T, K> =>
  it.kind === kind;

/** A judge of steps of one kind, which refuses every other content. */
export function judgeOf<K extends StepKind>(
  kind: K,
  judge: (
    definition: Of<StepDefinition, K>,
    content: Of<EntryContent, K>,
    context: JudgingContext,
  ) => Judgement,
): Judge {
  return (definition, content, context) => {
    if (isOf(definition, kind) && isOf(content, kind)) return judge(definition, content, context);
    throw new InputError('content.kind', `This step takes a ${definition.kind}, not a ${content.kind}.`);
  };
}
