/** A text with a capital: `head nuts` → `Head nuts`, `{sump} bolts` → `{Sump} bolts`. */
export function capital(text: string): string {
  const at = text.startsWith('{') ? 1 : 0;
  return text.slice(0, at) + text.charAt(at).toUpperCase() + text.slice(at + 1);
}

/** `a`, `a and b`, `a, b and c`. */
export function listed(items: readonly string[]): string {
  const last = items.at(-1) ?? '';
  return items.length < 2 ? last : `${items.slice(0, -1).join(', ')} and ${last}`;
}
