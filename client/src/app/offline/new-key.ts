/**
 * A random UUID (version 4), made on the device. `crypto.randomUUID` is missing where the page came over plain
 * HTTP, as on a shop's own Wi-Fi.
 */
export function newKey(): string {
  const bytes = crypto.getRandomValues(new Uint8Array(16));
  const hex = Array.from(bytes, (byte, i) => {
    if (i === 6) return ((byte & 0x0f) | 0x40).toString(16);
    if (i === 8) return ((byte & 0x3f) | 0x80).toString(16);
    return byte.toString(16).padStart(2, '0');
  }).join('');
  return [hex.slice(0, 8), hex.slice(8, 12), hex.slice(12, 16), hex.slice(16, 20), hex.slice(20)].join('-');
}

/** The same key for the same thing sent again, a new one for another thing: for acts that are tried twice. */
export class KeyFor {
  private last: { readonly body: string; readonly key: string } | null = null;

  of(body: unknown): string {
    const text = JSON.stringify(body);
    if (this.last?.body !== text) this.last = { body: text, key: newKey() };
    return this.last.key;
  }
}
