const prefix = 'second-spanner.';

/** What this device remembers under a name, or null; also where the browser keeps nothing. */
export function recall(name: string): string | null {
  try {
    return localStorage.getItem(prefix + name);
  } catch {
    return null;
  }
}

/** Remembers a text on this device; null forgets it. A browser that keeps nothing is no error. */
export function remember(name: string, text: string | null): void {
  try {
    if (text === null) localStorage.removeItem(prefix + name);
    else localStorage.setItem(prefix + name, text);
  } catch {
    // Private windows may refuse: the choice then lasts as long as the page.
  }
}
