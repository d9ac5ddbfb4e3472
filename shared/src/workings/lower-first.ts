/** `Wrench length` and `{Inlet} opens` as they stand in a sentence; `No. 1` and `M10` stay. */
export const lowerFirst = (label: string): string =>
  label.replace(
    /^(\{?)([A-Z])(?=[a-z]+(?![a-z]*\.))/,
    (_, brace: string, letter: string) => brace + letter.toLowerCase(),
  );
