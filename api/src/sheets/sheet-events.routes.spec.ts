import { createServer } from 'node:http';
import { once } from 'node:events';
import type { AddressInfo } from 'node:net';
import express, { type Response } from 'express';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import { sheetEventRoutes } from './sheet-events.routes.js';

const sheetId = '6f1c2c8e-5f0b-4a52-8f5c-0d2a3c9b7e41';
const who = { sessionId: 's', person: { id: 'p', role: 'builder' }, shop: { id: 'h' } } as SignedIn;

let version: Promise<number>;
let runs = true;
let subscribed = 0;
let asked: (response: Response) => void = () => undefined;
const server = createServer(
  express()
    .use((request, response, next) => {
      request.signedIn = who;
      asked(response);
      next();
    })
    .use(
      sheetEventRoutes({
        events: {
          subscribe: () => {
            subscribed += 1;
            return () => {
              subscribed -= 1;
            };
          },
        },
        readSession: () => Promise.resolve(runs ? who : null),
        reading: { version: () => version },
        heartbeatMs: 20,
      }),
    ),
);
let address: string;
beforeAll(async () => {
  await once(server.listen(0, '127.0.0.1'), 'listening');
  address = `http://127.0.0.1:${(server.address() as AddressInfo).port}/${sheetId}/events`;
});
beforeEach(() => {
  [version, runs, subscribed] = [Promise.resolve(1), true, 0];
});
afterAll(() => {
  server.closeAllConnections();
  server.close();
});

/** The next request's answer, as the server has it. */
const nextResponse = (): Promise<Response> =>
  new Promise((resolve) => {
    asked = resolve;
  });

describe('a stream of events', () => {
  it('is not begun for a client that left while its sheet was read', async () => {
    let read: (version: number) => void = () => undefined;
    version = new Promise((resolve) => {
      read = resolve;
    });
    const asking = nextResponse();
    const leaving = new AbortController();
    const answer = fetch(address, { signal: leaving.signal }).catch(() => null);
    const response = await asking;
    const closed = once(response, 'close');
    leaving.abort();
    await Promise.all([answer, closed]);
    read(1);
    await version;
    await new Promise(setImmediate);
    expect(subscribed).toBe(0);
    expect(response.headersSent).toBe(false);
  });

  it('leaves nothing behind once the session has ended', async () => {
    const answer = await fetch(address);
    expect(subscribed).toBe(1);
    runs = false;
    expect(await answer.text()).toContain('event: changed');
    expect(subscribed).toBe(0);
  });

  it('is the oldest of a person to end when there are more than twenty', async () => {
    const leaving = new AbortController();
    const first = await fetch(address);
    for (let i = 0; i < 20; i++) await fetch(address, { signal: leaving.signal });
    expect(await first.text()).toContain('event: changed');
    expect(subscribed).toBe(20);
    leaving.abort();
  });
});
