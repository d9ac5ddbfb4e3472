import type { Verdict } from '../contracts/verdict.js';
import { signWords } from '../drawing/signs.js';
import type { AnswerPart } from './working.js';

export type JudgementPart = Extract<AnswerPart, { kind: 'judgement' }>;

/** The sign of a judgement: what is only waited for is no failure. */
export const judgementSign = ({ verdict, waits }: JudgementPart): Verdict | 'waiting' =>
  waits === true ? 'waiting' : verdict;

/** The word beside that sign: the judgement's own where it has one. */
export const judgementWord = (part: JudgementPart): string => part.word ?? signWords[judgementSign(part)];
