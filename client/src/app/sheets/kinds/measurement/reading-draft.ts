/** Readings as they are being typed, each under its slot: one never slips to another, and none goes with another. */
export type ReadingDraft = Readonly<Record<string, string>>;

export const noReading: ReadingDraft = {};

export function isReadingDraft(value: unknown): value is ReadingDraft {
  return (
    typeof value === 'object' &&
    value !== null &&
    Object.values(value).every((each) => typeof each === 'string')
  );
}

/** The draft with what is typed for a slot; an empty text takes it out. */
export function withReading(draft: ReadingDraft, slot: string, text: string): ReadingDraft {
  const others = Object.entries(draft).filter(([key]) => key !== slot);
  return Object.fromEntries(text === '' ? others : [...others, [slot, text]]);
}
