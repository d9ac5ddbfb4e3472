import type { AnswerPart } from '@second-spanner/shared/workings/working';
import type { Verdict } from '@second-spanner/shared/contracts/verdict';
import { signOf, signWords, type SignName } from '../../verdict/signs';

export type JudgementPart = Extract<AnswerPart, { kind: 'judgement' }>;

/** The sign of a judgement: what is only waited for is no failure. */
export const judgementSign = ({ verdict, waits }: JudgementPart): Verdict | SignName =>
  waits === true ? 'waiting' : verdict;

/** The word beside that sign: the judgement's own where it has one. */
export function judgementWord({ verdict, word, waits }: JudgementPart): string {
  if (word !== undefined) return word;
  if (waits === true) return signWords.waiting;
  return verdict === 'not-judged' ? 'Not judged' : signWords[signOf(verdict)];
}
