import 'fake-indexeddb/auto';
import { IDBFactory } from 'fake-indexeddb';
import { provideHttpClient, withInterceptors } from '@angular/common/http';
import {
  HttpTestingController,
  provideHttpClientTesting,
  type TestRequest,
} from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { problemErrors } from '../http/problem-errors';
import { SessionStore } from '../session/session-store';
import { sessionOf } from '../session/testing/sessions';
import { checkStep, stepOf } from '../sheets/testing/steps';
import { TrayDb } from './tray-db';
import { WaitingTray, type ToKeep } from './waiting-tray';

const toKeep = (note: string): ToKeep => ({
  sheetId: 'sheet',
  sheetCode: 'LM-0147',
  stepCode: '8.3',
  words: `Right: ${note}`,
  request: { content: { kind: 'check', outcome: 'pass', note } },
});

const entries = '/api/sheets/sheet/steps/8.3/entries';

describe('the waiting tray', () => {
  let api: HttpTestingController;
  let tray: WaitingTray;

  const open = (): void => {
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(withInterceptors([problemErrors])),
        provideHttpClientTesting(),
        provideRouter([]),
      ],
    });
    api = TestBed.inject(HttpTestingController);
    TestBed.inject(SessionStore).load().subscribe();
    api.expectOne('/api/session').flush(sessionOf('builder'));
    tray = TestBed.inject(WaitingTray);
  };

  /** The next entry on its way, once it has left the device. */
  const onItsWay = (): Promise<TestRequest> => vi.waitFor(() => api.expectOne(entries));
  const cutTheLine = (request: TestRequest): void => request.error(new ProgressEvent('error'));
  const refuse = (request: TestRequest, detail: string): void =>
    request.flush(
      { type: 'about:blank', title: 'Refused', status: 422, detail },
      { status: 422, statusText: 'No' },
    );

  beforeEach(() => {
    globalThis.indexedDB = new IDBFactory();
    open();
  });

  afterEach(() => {
    TestBed.resetTestingModule();
    localStorage.clear();
  });

  it('sends an entry at once and keeps nothing of it', async () => {
    const kept = tray.keep(toKeep('a'));
    const request = await onItsWay();
    expect(tray.count()).toBe(1);
    request.flush(stepOf(checkStep));

    expect((await kept).state).toBe('kept');
    expect(tray.count()).toBe(0);
  });

  it('keeps an entry without a network, on the device and not only on the page', async () => {
    const kept = tray.keep(toKeep('a'));
    cutTheLine(await onItsWay());

    expect((await kept).state).toBe('waiting');
    const lying = await TestBed.inject(TrayDb).all();
    expect(lying.map(({ words }) => words)).toEqual(['Right: a']);
  });

  it('sends what waited in the order of keeping, each under the key it was made with', async () => {
    const first = tray.keep(toKeep('a'));
    const lost = await onItsWay();
    cutTheLine(lost);
    await first;
    const second = tray.keep(toKeep('b'));

    const again = await onItsWay();
    expect(again.request.body).toEqual(lost.request.body);
    expect(again.request.headers.get('Idempotency-Key')).toBe(lost.request.headers.get('Idempotency-Key'));
    again.flush(stepOf(checkStep));
    const next = await onItsWay();
    expect(next.request.body).toEqual(toKeep('b').request);
    expect(next.request.headers.get('Idempotency-Key')).not.toBe(
      again.request.headers.get('Idempotency-Key'),
    );
    next.flush(stepOf(checkStep));

    expect((await second).state).toBe('kept');
    expect(tray.count()).toBe(0);
  });

  it('goes on after the page was closed', async () => {
    const kept = tray.keep(toKeep('a'));
    cutTheLine(await onItsWay());
    await kept;
    TestBed.resetTestingModule();
    open();
    void tray.sendAll();

    const again = await onItsWay();
    expect(again.request.body).toEqual(toKeep('a').request);
    again.flush(stepOf(checkStep));
    await vi.waitFor(() => expect(tray.count()).toBe(0));
  });

  it('tells whoever stands at the page of a refusal, and keeps nothing behind their back', async () => {
    const kept = tray.keep(toKeep('a'));
    refuse(await onItsWay(), 'This step waits for 8.2.');

    const sent = await kept;
    expect(sent.state === 'refused' && sent.problem.sentence).toBe('This step waits for 8.2.');
    expect(tray.count()).toBe(0);
  });

  it('keeps what is refused after it waited, with the reason, and sends the others', async () => {
    const first = tray.keep(toKeep('a'));
    cutTheLine(await onItsWay());
    await first;
    const second = tray.keep(toKeep('b'));
    refuse(await onItsWay(), 'This step waits for 8.2.');
    (await onItsWay()).flush(stepOf(checkStep));
    await second;

    expect(tray.items().map(({ words, refused }) => [words, refused])).toEqual([
      ['Right: a', 'This step waits for 8.2.'],
    ]);
    const [refused] = tray.items();
    await tray.remove(refused?.seq ?? -1);
    expect(tray.count()).toBe(0);
  });

  it('neither shows nor sends what somebody else left on the device', async () => {
    const kept = tray.keep(toKeep('a'));
    cutTheLine(await onItsWay());
    await kept;
    TestBed.inject(SessionStore).load().subscribe();
    const other = sessionOf('countersigner');
    api.expectOne('/api/session').flush({ ...other, person: { ...other.person, id: 'somebody-else' } });
    await tray.sendAll();

    expect(tray.count()).toBe(0);
    api.expectNone(entries);
    expect(await TestBed.inject(TrayDb).all()).toHaveLength(1);
  });

  it('stores a photo once, though its entry has to be sent again', async () => {
    const photo = new Blob(['picture'], { type: 'image/jpeg' });
    const content = { kind: 'photo' as const, shows: 'Engine number', fileId: '' };
    const kept = tray.keep({ ...toKeep('a'), request: { content }, photo });
    (await vi.waitFor(() => api.expectOne('/api/files'))).flush({ id: 'file-1', width: 8, height: 6 });
    cutTheLine(await onItsWay());
    await kept;
    void tray.sendAll();

    const again = await onItsWay();
    expect(again.request.body).toEqual({ content: { ...content, fileId: 'file-1' } });
    api.expectNone('/api/files');
    again.flush(stepOf(checkStep));
    await vi.waitFor(() => expect(tray.count()).toBe(0));
  });
});
