import type { Dialect } from '@second-spanner/shared/contracts/people';
import type { Working, WorkingAnswer, WorkingCase } from '@second-spanner/shared/workings/working';
import { workingNamed } from '@second-spanner/shared/workings/registry';
import { badInput } from '../platform/errors/http-problem.js';

/** The working of a key, loaded; null when there is none. */
export async function loadWorking(key: string): Promise<Working | null> {
  return (await workingNamed(key)?.load()) ?? null;
}

/**
 * The answer to a case that can be worked out. `path` goes before a field's name in problems.
 * Throws a 400 problem with every field that is wrong, or with what is still missing.
 */
export function workOut(working: Working, typed: WorkingCase, dialect: Dialect, path: string): WorkingAnswer {
  const answer = working.workOut(typed, { dialect });
  const wrong = Object.entries(answer.errors);
  if (wrong.length > 0)
    throw badInput(...wrong.map(([field, message]) => ({ field: path + field, message })));
  if (answer.missing !== null) throw badInput({ field: path.replace(/\.$/, ''), message: answer.missing });
  return answer;
}
