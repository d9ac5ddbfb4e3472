import { effect, linkedSignal, type WritableSignal } from '@angular/core';

const prefix = 'second-spanner.draft.';

function recallDraft<T>(key: string, empty: T, isDraft: (value: unknown) => value is T): T {
  try {
    const text = sessionStorage.getItem(prefix + key);
    const value: unknown = text === null ? null : JSON.parse(text);
    return isDraft(value) ? value : empty;
  } catch {
    return empty;
  }
}

function keepDraft<T>(key: string, draft: T, empty: T): void {
  try {
    const text = JSON.stringify(draft);
    if (text === JSON.stringify(empty)) sessionStorage.removeItem(prefix + key);
    else sessionStorage.setItem(prefix + key, text);
  } catch {
    // A window that keeps nothing: the draft then lasts as long as the page.
  }
}

/**
 * What is typed on a page before it is kept: a signal that outlives a reload of the window.
 * Call in an injection context.
 * @param key gives the draft's name, such as sheet and step
 * @param isDraft tells whether what was found under the name still has this shape
 */
export function draft<T>(
  key: () => string,
  empty: T,
  isDraft: (value: unknown) => value is T,
): WritableSignal<T> {
  const held = linkedSignal({ source: key, computation: (name) => recallDraft(name, empty, isDraft) });
  effect(() => keepDraft(key(), held(), empty));
  return held;
}

/** Whether a value is an object whose named fields are all texts: the shape of most drafts. */
export function hasTexts<K extends string>(value: unknown, fields: readonly K[]): value is Record<K, string> {
  return (
    typeof value === 'object' &&
    value !== null &&
    fields.every((field) => typeof (value as Partial<Record<K, unknown>>)[field] === 'string')
  );
}
