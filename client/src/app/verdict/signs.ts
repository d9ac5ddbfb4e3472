import type { Verdict } from '@second-spanner/shared/contracts/verdict';

/** What a verdict sign can say: a judgement, or that something waits or is held. */
export type SignName = 'pass' | 'fail' | 'doubtful' | 'waiting' | 'hold';

export const signWords: Readonly<Record<SignName, string>> = {
  pass: 'Pass',
  fail: 'Fail',
  doubtful: 'Doubtful',
  waiting: 'Waiting',
  hold: 'Hold',
};

/** The sign of a judgement. What could not be judged yet waits. */
export function signOf(verdict: Verdict): SignName {
  return verdict === 'not-judged' ? 'waiting' : verdict;
}
