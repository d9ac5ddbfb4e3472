/** A wrong input's beginning, short and printable, to name it in a message. */
export function clip(input: unknown): string {
  if (typeof input !== 'string') return input === null ? 'null' : typeof input;
  const start = input.slice(0, 24).replace(/[\p{C}\p{Z}]+/gu, ' ');
  return input.length > 24 ? `${start}…` : start;
}
