import supertest from 'supertest';
import { exchangeTrouble } from '../openapi/testing/exchange-check.js';

interface Sent {
  readonly method: string;
  readonly url: string;
  readonly _data?: unknown;
}

/** Fails a request whose answer, or whose body where it was taken, is not as the document of the api says. */
const documented = (test: supertest.Test): void => {
  test.expect((response) => {
    const { method, url, _data: sent } = test as unknown as Sent;
    const { pathname, search } = new URL(url);
    const { status, type, body } = response;
    const trouble = exchangeTrouble({ method, path: pathname + search, sent, status, type, body });
    if (trouble !== null) throw new Error(`${method} ${pathname}, ${status}: ${trouble}`);
  });
};

/** A browser without a session. It holds every answer against the document of the api. */
export const browser = (address: string): ReturnType<typeof supertest.agent> =>
  supertest.agent(address).use(documented as never);
