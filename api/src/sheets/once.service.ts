import { badInput, keyTaken } from '../platform/errors/http-problem.js';
import { canonicalHash } from '../platform/hashing/canonical.js';
import { isId } from '../platform/validation/parse-id.js';
import type { Once } from './records.repository.js';

/** What a request says of itself so that it counts once, however often it is sent. */
export interface OnceRequest {
  readonly personId: string;
  readonly sheetId: string;
  readonly code: string;
  readonly body: unknown;
}

/** The `Idempotency-Key` of a request. Throws a 400 problem when it is missing or no UUID. */
export function parseKey(header: string | undefined): string {
  if (!isId(header)) {
    const message = 'Send a UUID of your own making, the same whenever this request is sent again.';
    throw badInput({ field: 'Idempotency-Key', message });
  }
  return header.toLowerCase();
}

export const onceFor = (key: string, request: OnceRequest): Once => ({
  key,
  bodyHash: canonicalHash(request),
});

/** Whether the request was sent before. Throws a 409 problem when its key stood under something else. */
export function isReplay(sentBefore: string | null, { bodyHash }: Once): boolean {
  if (sentBefore === null) return false;
  if (sentBefore !== bodyHash) throw keyTaken();
  return true;
}
