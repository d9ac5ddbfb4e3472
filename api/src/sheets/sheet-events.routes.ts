import { Router, type Response } from 'express';
import { may } from '@second-spanner/shared/contracts/permissions';
import type { SheetEvents } from '../platform/live-events/sheet-events.js';
import { allow, type ReadSession } from '../platform/signing-in/authentication.js';
import { signedIn, type SignedIn } from '../platform/signing-in/signed-in.js';
import { parseId } from '../platform/validation/parse-id.js';
import { OpenStreams } from './open-streams.js';
import type { SheetReading } from './sheet-reading.service.js';

export interface LiveDependencies {
  readonly events: Pick<SheetEvents, 'subscribe'>;
  readonly readSession: ReadSession;
  readonly reading: Pick<SheetReading, 'version'>;
  /** How often a stream shows that it lives, and is asked whether it still may. */
  readonly heartbeatMs: number;
}

/** `/sheets/:id/events`: told when something on the sheet changed, never what. */
export function sheetEventRoutes(live: LiveDependencies): Router {
  const router = Router();
  const streams = new OpenStreams();
  router.get('/:id/events', allow('sheets.read'), async (request, response) => {
    const who = signedIn(request);
    const id = parseId(request.params['id'], 'sheet');
    const stream = new Stream(response);
    const version = await live.reading.version(who, id);
    if (response.destroyed) return;
    open(response);
    // What happened before the stream stood would otherwise be missed.
    tell(response, id, version);
    follow(live, who, id, stream);
    stream.onEnd(streams.add(who.person.id, stream.end));
  });
  return router;
}

/** An answer that stays open, and what is to be cleared away once it ends, whichever side ends it. */
class Stream {
  private readonly clearing: (() => void)[] = [];
  private ended = false;

  /** Make it before anything is awaited: a client that leaves meanwhile says so only once. */
  constructor(readonly response: Response) {
    response.once('close', this.end);
  }

  onEnd(clear: () => void): void {
    if (this.ended) clear();
    else this.clearing.push(clear);
  }

  readonly end = (): void => {
    this.ended = true;
    for (const clear of this.clearing.splice(0)) clear();
    if (!this.response.destroyed) this.response.end();
  };
}

function open(response: Response): void {
  response.set({
    'Content-Type': 'text/event-stream; charset=utf-8',
    'Cache-Control': 'no-store',
    // A proxy that gathers the answer would hold the events back.
    'X-Accel-Buffering': 'no',
  });
  response.flushHeaders();
  response.write('retry: 2000\n\n');
}

const tell = (response: Response, sheetId: string, version: number): void => {
  response.write(`event: changed\ndata: ${JSON.stringify({ sheetId, version })}\n\n`);
};

function follow(live: LiveDependencies, who: SignedIn, id: string, stream: Stream): void {
  const { response, end } = stream;
  const unsubscribe = live.events.subscribe(id, {
    changed: (change) => {
      tell(response, change.sheetId, change.version);
    },
    // The client connects again by itself and is then told where the sheet stands.
    interrupted: end,
  });
  const heartbeat = setInterval(() => {
    void stillMay(live, who, id).then((may) => {
      if (!may) end();
      else if (!response.writableEnded) response.write(': here\n\n');
    });
  }, live.heartbeatMs);
  stream.onEnd(() => {
    clearInterval(heartbeat);
    unsubscribe();
  });
}

/** Whether the session still runs and the person may still read the sheet; false too when nobody can tell. */
async function stillMay(
  { readSession, reading }: LiveDependencies,
  who: SignedIn,
  id: string,
): Promise<boolean> {
  try {
    const { sessionId, person, shop } = who;
    const now = await readSession({ sessionId, personId: person.id, shopId: shop.id });
    if (!now || !may(now.person.role, 'sheets.read')) return false;
    await reading.version(now, id);
    return true;
  } catch {
    return false;
  }
}
