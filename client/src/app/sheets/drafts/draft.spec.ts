import { signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { beforeEach, describe, expect, it } from 'vitest';
import { draft, hasTexts } from './draft';

interface Typed {
  readonly slot: string;
  readonly text: string;
}
const empty: Typed = { slot: '', text: '' };
const isTyped = (value: unknown): value is Typed => hasTexts(value, ['slot', 'text']);

/** A draft as a page has it; calling it again is opening the page again. */
function openDraft(key: () => string) {
  const held = TestBed.runInInjectionContext(() => draft(key, empty, isTyped));
  TestBed.tick();
  return held;
}

describe('a draft', () => {
  beforeEach(() => sessionStorage.clear());

  it('outlives the page', () => {
    openDraft(() => 'sheet/8.6').set({ slot: 'pull/1/6', text: '55.4' });
    TestBed.tick();

    expect(openDraft(() => 'sheet/8.6')()).toEqual({ slot: 'pull/1/6', text: '55.4' });
  });

  it('belongs to its step alone', () => {
    const code = signal('8.6');
    const held = openDraft(() => code());
    held.set({ slot: 'a', text: '1' });
    TestBed.tick();
    code.set('8.7');
    TestBed.tick();

    expect(held()).toEqual(empty);
    code.set('8.6');
    expect(held()).toEqual({ slot: 'a', text: '1' });
  });

  it('leaves nothing behind when it is emptied', () => {
    const held = openDraft(() => 'sheet/8.6');
    held.set({ slot: 'a', text: '1' });
    TestBed.tick();
    held.set(empty);
    TestBed.tick();

    expect(sessionStorage).toHaveLength(0);
  });

  it('ignores what is not of its shape any more', () => {
    sessionStorage.setItem('second-spanner.draft.sheet/8.6', '{"text":1}');
    expect(openDraft(() => 'sheet/8.6')()).toEqual(empty);
    sessionStorage.setItem('second-spanner.draft.sheet/8.6', '{"te');
    expect(openDraft(() => 'sheet/8.6')()).toEqual(empty);
  });
});
