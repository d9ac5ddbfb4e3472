import { computed, effect, inject, linkedSignal, type WritableSignal } from '@angular/core';
import { SessionStore } from '../../session/session-store';
import { keepDraft, recallDraft } from '../../remembered/kept-drafts';

/**
 * What is typed on a page before it is kept: a signal that outlives a reload of the window,
 * and is the signed-in person's alone: the next one at a shared tablet does not find it.
 * Call in an injection context.
 * @param key gives the draft's name, such as sheet and step
 * @param isDraft tells whether what was found under the name still has this shape
 */
export function draft<T>(
  key: () => string,
  empty: T,
  isDraft: (value: unknown) => value is T,
): WritableSignal<T> {
  const { person } = inject(SessionStore);
  const name = computed(() => `${person()?.id ?? ''}/${key()}`);
  const held = linkedSignal({ source: name, computation: (kept) => recallDraft(kept, empty, isDraft) });
  effect(() => keepDraft(name(), held(), empty));
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
