/** What is typed, by place. */
export type TextByPlace = Readonly<Record<string, string>>;

export function isTextByPlace(value: unknown): value is TextByPlace {
  return (
    typeof value === 'object' &&
    value !== null &&
    Object.values(value).every((each) => typeof each === 'string')
  );
}
