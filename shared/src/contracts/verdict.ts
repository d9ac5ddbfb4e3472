export const verdicts = ['pass', 'fail', 'doubtful', 'not-judged'] as const;
export type Verdict = (typeof verdicts)[number];

/** What a judgement says: never a bare boolean. The reason is a sentence with the numbers in it. */
export interface Judgement {
  readonly verdict: Verdict;
  readonly reason: string;
}
