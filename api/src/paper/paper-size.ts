import { requireOneOf } from '@second-spanner/shared/quantities/require';

export const papers = ['a4', 'letter'] as const;
export type Paper = (typeof papers)[number];

/** The paper that an address asks for: A4 unless it says otherwise. Throws an InputError on `paper`. */
export const parsePaper = (text: unknown): Paper =>
  text === undefined ? 'a4' : requireOneOf(text, papers, 'paper');
