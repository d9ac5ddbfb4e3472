import type { EntityManager } from 'typeorm';
import type { FrozenSheet } from '../sheets/frozen-sheet.js';

/** A released sheet as it was frozen, with what stands beside it. */
export interface ReleasedSheet {
  readonly id: string;
  readonly shopId: string;
  readonly code: string;
  readonly contentHash: string;
  readonly verificationCode: string;
  readonly releasedAt: Date;
  readonly frozen: FrozenSheet;
}

/** The released sheet with a code, of whichever shop; through the door that is open for that code. */
export async function findByCode(manager: EntityManager, code: string): Promise<ReleasedSheet | null> {
  const rows: ReleasedSheet[] = await manager.query(
    `SELECT id, shop_id AS "shopId", code, content_hash AS "contentHash",
       verification_code AS "verificationCode", released_at AS "releasedAt", frozen
     FROM sheets WHERE verification_code = $1 AND state = 'released'`,
    [code],
  );
  return rows[0] ?? null;
}
