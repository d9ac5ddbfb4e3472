import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { scenes } from '../testing/sheet-scenes.js';
import { openStage, type Hands, type SheetStage } from '../testing/sheet-stage.js';
import { cookieIn } from '../testing/test-client.js';

let stage: SheetStage;
let hands: Hands;
beforeAll(async () => {
  stage = await openStage();
  hands = await stage.newSheet();
});
afterAll(() => stage.close());

interface Stream {
  /** The next event's data, or null when the stream ends first. */
  next(): Promise<{ sheetId: string; version: number } | null>;
  cancel(): Promise<void>;
}

async function signIn(email: string): Promise<{ cookie: string; xsrf: string }> {
  const answer = await fetch(`${stage.app.address}/api/session`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ email, password: 'parallel-spanners-61' }),
  });
  const lines = answer.headers.getSetCookie();
  const xsrf = cookieIn({ headers: { 'set-cookie': lines } } as never, 'XSRF-TOKEN') ?? '';
  return { cookie: lines.map((line) => line.split(';', 1)[0]).join('; '), xsrf };
}

async function openStream(cookie: string, id = hands.id): Promise<Stream> {
  const answer = await fetch(`${stage.app.address}/api/sheets/${id}/events`, { headers: { cookie } });
  expect(answer.headers.get('content-type')).toBe('text/event-stream; charset=utf-8');
  const reader = answer.body!.pipeThrough(new TextDecoderStream()).getReader();
  let text = '';
  return {
    next: async () => {
      for (;;) {
        const found = /event: changed\ndata: (.*)\n\n/.exec(text);
        if (found) {
          text = text.slice(found.index + found[0].length);
          return JSON.parse(found[1] ?? 'null');
        }
        const { value, done } = await reader.read();
        if (done) return null;
        text += value;
      }
    },
    cancel: () => reader.cancel(),
  };
}

describe('the events of a sheet', () => {
  it('tell a write to everybody who looks, without a figure', async () => {
    const { cookie } = await signIn('imogen@lowmill.example');
    const stream = await openStream(cookie);
    const now = await stream.next();
    expect(now).toEqual({ sheetId: hands.id, version: 2 });
    await hands.tomasz.record('1.1', scenes.check()).expect(201);
    expect(await stream.next()).toEqual({ sheetId: hands.id, version: 3 });
    await stream.cancel();
  });

  it('end after a sign-out, at the next heartbeat', async () => {
    const { cookie, xsrf } = await signIn('imogen@lowmill.example');
    const stream = await openStream(cookie);
    await stream.next();
    const headers = { cookie, 'x-xsrf-token': xsrf };
    const out = await fetch(`${stage.app.address}/api/session`, { method: 'DELETE', headers });
    expect(out.status).toBe(204);
    expect(await stream.next()).toBeNull();
  });

  it('end when the person may no longer see the sheet', async () => {
    const { cookie } = await signIn('ravi@lowmill.example');
    const stream = await openStream(cookie);
    await stream.next();
    const statement = 'UPDATE cars SET owner_id = NULL WHERE id = $1';
    await stage.app.db.sql(stage.workshop.shop, statement, [stage.workshop.cars.ravis]);
    expect(await stream.next()).toBeNull();
  });

  it('are not for others', async () => {
    expect((await stage.clients.hana.get(`/sheets/${hands.id}/events`)).status).toBe(404);
    expect((await stage.clients.oona.get(`/sheets/${hands.id}/events`)).status).toBe(404);
  });
});
