import type { EntryContent } from '../contracts/steps.js';
import type { Judgement } from '../contracts/verdict.js';

/** A check passes as it was found; its note says how. */
export function judgeCheck(
  _definition: unknown,
  content: Extract<EntryContent, { kind: 'check' }>,
): Judgement {
  return content.outcome === 'pass'
    ? { verdict: 'pass', reason: content.note ?? 'Looked at and found right.' }
    : { verdict: 'fail', reason: content.note ?? 'Looked at and found wrong.' };
}
