const prefix = 'second-spanner.draft.';

/** What is kept under a name in this window, or `empty` where nothing is or it has another shape. */
export function recallDraft<T>(key: string, empty: T, isDraft: (value: unknown) => value is T): T {
  try {
    const text = sessionStorage.getItem(prefix + key);
    const value: unknown = text === null ? null : JSON.parse(text);
    return isDraft(value) ? value : empty;
  } catch {
    return empty;
  }
}

/** Keeps a draft in this window; an empty one leaves nothing. */
export function keepDraft<T>(key: string, draft: T, empty: T): void {
  try {
    const text = JSON.stringify(draft);
    if (text === JSON.stringify(empty)) sessionStorage.removeItem(prefix + key);
    else sessionStorage.setItem(prefix + key, text);
  } catch {
    // A window that keeps nothing: the draft then lasts as long as the page.
  }
}

/** Forgets every draft of this window, as when the person signs out. */
export function forgetDrafts(): void {
  try {
    const keys = Object.keys(sessionStorage).filter((key) => key.startsWith(prefix));
    for (const key of keys) sessionStorage.removeItem(key);
  } catch {
    // A window that keeps nothing has nothing to forget.
  }
}
