import type { Database } from '../platform/database/database.js';
import type { AccessClaims } from '../platform/signing-in/access-token.js';
import type { ReadSession } from '../platform/signing-in/authentication.js';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import { toSignedIn } from './person.mapper.js';
import { SessionsRepository } from './sessions.repository.js';

interface Batch {
  readonly ids: Set<string>;
  readonly answer: Promise<ReadonlyMap<string, SignedIn>>;
}

/**
 * Reads sessions anew for every request; requests of one shop that come while a read is on its way share
 * the next one. A read never begins before the request that waits for it, so a change counts at once.
 */
export function sessionReader(database: Database): ReadSession {
  const waiting = new Map<string, Batch>();
  const running = new Map<string, Promise<unknown>>();

  const read = async (shopId: string, ids: Set<string>): Promise<ReadonlyMap<string, SignedIn>> => {
    await running.get(shopId);
    waiting.delete(shopId);
    const rows = database.readShop(shopId, (scope) => new SessionsRepository(scope).running([...ids]));
    const settled = rows.then(
      () => undefined,
      () => undefined,
    );
    running.set(shopId, settled);
    void settled.then(() => {
      if (running.get(shopId) === settled) running.delete(shopId);
    });
    return new Map((await rows).map((row) => [row.sessionId, toSignedIn(row, shopId)]));
  };

  return async ({ shopId, sessionId, personId }: AccessClaims) => {
    let batch = waiting.get(shopId);
    if (!batch) {
      const ids = new Set<string>();
      batch = { ids, answer: read(shopId, ids) };
      waiting.set(shopId, batch);
    }
    batch.ids.add(sessionId);
    const found = (await batch.answer).get(sessionId);
    return found?.person.id === personId ? found : null;
  };
}
