import type { PersonName } from '@second-spanner/shared/contracts/people';
import type { ShopScope } from '../platform/database/database.js';
import { nextLine, type LedgerLine } from './ledger-chain.js';
import type { LedgerEvent } from './ledger-event.js';
import type { LedgerLineEntity } from './ledger-line.entity.js';
import { LedgerRepository } from './ledger.repository.js';

/** What happened, and when. */
export interface DatedEvent {
  readonly at: Date;
  readonly event: LedgerEvent;
}

/**
 * Appends what a person did to a sheet's ledger, in the transaction in which it was done; the sheet's row must be
 * locked.
 */
export async function appendToLedger(
  scope: ShopScope,
  sheetId: string,
  by: PersonName,
  events: readonly DatedEvent[],
): Promise<void> {
  if (events.length === 0) return;
  const ledger = new LedgerRepository(scope);
  let last: Pick<LedgerLine, 'seq' | 'hash'> | null = await ledger.last(sheetId);
  const lines = events.map(({ at, event }) => {
    const line = nextLine(last, { ...event, by, at: at.toISOString() });
    last = line;
    return { ...line, sheetId, at };
  });
  await ledger.insertAll(lines);
}

/** A sheet's whole ledger, from its first line. */
export async function wholeLedger(scope: ShopScope, sheetId: string): Promise<LedgerLine[]> {
  return (await new LedgerRepository(scope).all(sheetId)).map(toLedgerLine);
}

/** A piece of a sheet's ledger, newest first, older than line `before` where it is given. */
export async function newestLines(
  scope: ShopScope,
  sheetId: string,
  before: number | null,
  limit: number,
): Promise<LedgerLine[]> {
  return (await new LedgerRepository(scope).newest(sheetId, before, limit)).map(toLedgerLine);
}

const toLedgerLine = ({ seq, prevHash, hash, body, at }: LedgerLineEntity): LedgerLine => ({
  ...{ seq, prevHash, hash, body },
  at: at.toISOString(),
});
