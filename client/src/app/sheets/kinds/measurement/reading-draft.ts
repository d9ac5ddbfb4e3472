import { hasTexts } from '../../drafts/draft';

/** A reading as it is being typed: for one place, so that it never slips to another. */
export interface ReadingDraft {
  readonly slot: string;
  readonly text: string;
}

export const noReading: ReadingDraft = { slot: '', text: '' };

export const isReadingDraft = (value: unknown): value is ReadingDraft => hasTexts(value, ['slot', 'text']);
