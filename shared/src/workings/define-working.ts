import { InputError } from '../contracts/input-error.js';
import type { AnswerPart, Working, WorkingAnswer, WorkingOptions } from './working.js';
import { inWords } from '../drawing/words.js';
import { lowerFirst } from './lower-first.js';
import { readCase, type CaseReader } from './read-case.js';

export interface WorkedOut {
  readonly parts: readonly AnswerPart[];
  readonly assumed?: readonly string[];
  readonly cautions?: readonly string[];
}

type Definition = Omit<Working, 'workOut'> & {
  /** Formula and source with edition and section, one line each. */
  readonly basis: readonly string[];
  /**
   * The calculations of a case that is complete. An `InputError` of theirs is said at the field of the same
   * path, or where `fieldOf` puts it.
   */
  readonly answer: (read: CaseReader, options: WorkingOptions) => WorkedOut;
  /**
   * Paths of the calculations' requests by the field that they were typed in: `[/^gaps\.driverNear/, 'near']`, or
   * with what the pattern found, `[/^passes\[(\d+)\]/, 'passes.$1.to']`.
   */
  readonly fieldOf?: readonly (readonly [RegExp, string])[];
};

/** A working whose fields are read, and whose errors are put at their fields, in the same way as all others. */
export function defineWorking({ answer, basis, fieldOf = [], ...working }: Definition): Working {
  const fields = working.sections.flatMap((section) => section.fields);
  return {
    ...working,
    workOut: (typed, options): WorkingAnswer => {
      const { errors, missing, assumed: read, reader } = readCase(fields, typed);
      const nothing = { parts: [], assumed: [], cautions: [], basis };
      if (Object.keys(errors).length > 0 || missing.length > 0) {
        return { ...nothing, errors, missing: sayMissing(missing) };
      }
      try {
        const { parts, assumed = [], cautions = [] } = answer(reader, options);
        const { plain, rules } = rulesApart(parts);
        return {
          errors: {},
          missing: null,
          parts: plain,
          assumed: [...new Set([...read, ...assumed, ...rules])],
          cautions,
          basis,
        };
      } catch (error) {
        if (!(error instanceof InputError)) throw error;
        return { ...nothing, errors: { [fieldAt(error.field, fieldOf)]: error.message }, missing: null };
      }
    },
  };
}

/** The rule that a decision ends with, from every reason: a page says it once. */
function rulesApart(parts: readonly AnswerPart[]): {
  readonly plain: readonly AnswerPart[];
  readonly rules: readonly string[];
} {
  const rule = /\s*\b(Rule: [^.]*\.)/g;
  const judged = parts.flatMap((part) => (part.kind === 'judgement' ? [part.reason] : []));
  return {
    plain: parts.map((part) =>
      part.kind === 'judgement' ? { ...part, reason: part.reason.replace(rule, '') } : part,
    ),
    rules: judged.flatMap((reason) => [...reason.matchAll(rule)].map((match) => match[1] ?? '')),
  };
}

function fieldAt(path: string, fieldOf: NonNullable<Definition['fieldOf']>): string {
  const found = fieldOf.find(([pattern]) => pattern.test(path));
  if (found === undefined) return path;
  const [pattern, field] = found;
  return field.replace(/\$(\d)/g, (_, group: string) => pattern.exec(path)?.[Number(group)] ?? '');
}

function sayMissing(labels: readonly string[]): string | null {
  return labels.length === 0 ? null : `Still to be filled in: ${inWords(labels.map(lowerFirst))}.`;
}
