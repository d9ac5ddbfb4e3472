import 'fake-indexeddb/auto';
import { provideHttpClient, withInterceptors } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { problemErrors } from '../http/problem-errors';
import { SessionStore } from '../session/session-store';
import { sessionOf } from '../session/testing/sessions';
import { SheetStore } from './sheet-store';
import { FakeEventSource } from './testing/fake-event-source';
import { sheetOf } from './testing/sheets';
import { checkStep, stepOf } from './testing/steps';

describe('a sheet while one works on it', () => {
  let api: HttpTestingController;
  let store: SheetStore;

  beforeEach(() => {
    FakeEventSource.opened.length = 0;
    vi.stubGlobal('EventSource', FakeEventSource);
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(withInterceptors([problemErrors])),
        provideHttpClientTesting(),
        provideRouter([]),
        SheetStore,
      ],
    });
    api = TestBed.inject(HttpTestingController);
    TestBed.inject(SessionStore).load().subscribe();
    // A car owner has no tools and reads nothing ahead: only what is under test is asked for.
    api.expectOne('/api/session').flush(sessionOf('car-owner'));
    store = TestBed.inject(SheetStore);
    store.open('sheet');
    store.openStep('8.3');
    TestBed.tick();
  });

  afterEach(() => {
    vi.unstubAllGlobals();
    TestBed.resetTestingModule();
    localStorage.clear();
  });

  const answer = async (version: number): Promise<void> => {
    api.expectOne('/api/sheets/sheet').flush(sheetOf({ version }));
    api.expectOne('/api/sheets/sheet/steps/8.3').flush(stepOf(checkStep, { version }));
    await TestBed.inject(SheetStore).detail.value();
    await vi.waitFor(() => expect(store.detail.isLoading()).toBe(false));
    TestBed.tick();
  };

  it('reads sheet and step', async () => {
    await answer(1);
    expect(store.step()?.code).toBe('8.3');
    expect(store.lines()).toEqual([]);
  });

  it('reads both anew when the api tells of a change, and not when it is known already', async () => {
    await answer(1);
    FakeEventSource.opened[0]?.tell({ sheetId: 'sheet', version: 1 });
    TestBed.tick();
    api.expectNone('/api/sheets/sheet');

    FakeEventSource.opened[0]?.tell({ sheetId: 'sheet', version: 2 });
    TestBed.tick();
    await answer(2);
    expect(store.detail.value()?.version).toBe(2);
  });

  it('takes a step that the api answered to an act, but never an older one', async () => {
    await answer(3);
    store.take(stepOf(checkStep, { version: 4, done: 1 }));
    expect(store.step()?.done).toBe(1);
    store.take(stepOf(checkStep, { version: 2, done: 0 }));
    expect(store.step()?.done).toBe(1);
    store.take(stepOf({ ...checkStep, code: '8.4' }, { version: 5 }));
    expect(store.step()?.code).toBe('8.3');
  });

  it('opens the line again when it was given up, and reads what was missed', async () => {
    await answer(1);
    vi.useFakeTimers();
    FakeEventSource.opened[0]?.giveUp();
    await vi.advanceTimersByTimeAsync(3_000);
    vi.useRealTimers();
    TestBed.tick();

    expect(FakeEventSource.opened).toHaveLength(2);
    await answer(2);
    expect(store.detail.value()?.version).toBe(2);
  });

  it('leaves the line of a sheet that one goes away from', () => {
    store.open('other');
    TestBed.tick();
    expect(FakeEventSource.opened.map(({ url, readyState }) => [url, readyState])).toEqual([
      ['/api/sheets/sheet/events', FakeEventSource.CLOSED],
      ['/api/sheets/other/events', FakeEventSource.OPEN],
    ]);
  });
});
