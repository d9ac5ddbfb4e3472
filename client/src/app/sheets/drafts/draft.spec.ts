import { signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { beforeEach, describe, expect, it } from 'vitest';
import type { Person } from '@second-spanner/shared/contracts/people';
import { SessionStore } from '../../session/session-store';
import { sessionOf } from '../../session/testing/sessions';
import { draft, hasTexts } from './draft';
import { forgetDrafts } from '../../remembered/kept-drafts';

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
  const { person: somebody } = sessionOf('builder');
  const person = signal<Person | null>(somebody);

  beforeEach(() => {
    sessionStorage.clear();
    person.set(somebody);
    TestBed.configureTestingModule({ providers: [{ provide: SessionStore, useValue: { person } }] });
  });

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

  it('belongs to its person alone', () => {
    const held = openDraft(() => 'sheet/8.6');
    held.set({ slot: 'a', text: '55.4' });
    TestBed.tick();
    person.set({ ...somebody, id: 'another-person' });
    TestBed.tick();

    expect(held()).toEqual(empty);
    person.set(somebody);
    expect(held()).toEqual({ slot: 'a', text: '55.4' });
  });

  it('is gone once all are forgotten, and nothing else with it', () => {
    openDraft(() => 'sheet/8.6').set({ slot: 'a', text: '1' });
    TestBed.tick();
    sessionStorage.setItem('something-else', 'kept');
    forgetDrafts();

    expect(Object.keys(sessionStorage)).toEqual(['something-else']);
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
    sessionStorage.setItem('second-spanner.draft.a-person/sheet/8.6', '{"text":1}');
    expect(openDraft(() => 'sheet/8.6')()).toEqual(empty);
    sessionStorage.setItem('second-spanner.draft.a-person/sheet/8.6', '{"te');
    expect(openDraft(() => 'sheet/8.6')()).toEqual(empty);
  });
});
