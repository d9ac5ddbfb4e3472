import { randomUUID } from 'node:crypto';
import { slotKeyOf } from '@second-spanner/shared/sheet/slots';
import type { LedgerEvent } from '../ledger/ledger-event.js';
import type { EntryRow, SettlementRow, SnagRow } from './record.entity.js';
import { RecordsRepository } from './records.repository.js';
import type { OpenSheet } from './sheet-work.service.js';
import { openSnagsOf, type StepAtHand } from './step-at-hand.js';

/** A step after something happened to it, and what the ledger is told. */
export interface After {
  readonly step: StepAtHand;
  readonly events: readonly LedgerEvent[];
}

export type NewSnag = Pick<SnagRow, 'cause' | 'words' | 'parties' | 'entryId'>;

/** Raises a snag on a step. */
export async function raiseSnag(open: OpenSheet, step: StepAtHand, raised: NewSnag): Promise<After> {
  const { by, at, scope, sheet } = open;
  const { row, records } = step;
  const snag: SnagRow = {
    ...{ id: randomUUID(), round: row.round, ...raised, by, at: at.toISOString(), settled: null },
  };
  await new RecordsRepository(scope).addSnag({ sheetId: sheet.id, stepId: row.id }, snag);
  const { id, round, cause, words, parties, entryId } = snag;
  return {
    step: { ...step, records: { ...records, snags: [...records.snags, snag] } },
    events: [{ kind: 'snag', step: row.code, id, round, cause, words, parties, entryId }],
  };
}

/** Settles a snag; what follows for the step's rounds is the caller's. */
export async function settle(
  open: OpenSheet,
  step: StepAtHand,
  snag: SnagRow,
  decision: Pick<SettlementRow, 'how' | 'reason'>,
): Promise<After> {
  const { by, at, scope, sheet } = open;
  const { row, records } = step;
  const settled = { ...decision, by, at: at.toISOString() };
  const of = { sheetId: sheet.id, stepId: row.id };
  await new RecordsRepository(scope).addSettlement(of, randomUUID(), snag.id, settled);
  const snags = records.snags.map((each) => (each.id === snag.id ? { ...each, settled } : each));
  const { id: snagId, cause } = snag;
  return {
    step: { ...step, records: { ...records, snags } },
    events: [{ kind: 'settlement', step: row.code, snagId, cause, ...decision }],
  };
}

/** A failing entry raises a snag by itself. */
export const raiseForFailure = (open: OpenSheet, step: StepAtHand, entry: EntryRow): Promise<After> =>
  raiseSnag(open, step, { cause: 'failed', words: entry.reason, parties: [], entryId: entry.id });

/** A correction that passes settles what failed at its place before. */
export async function settleByCorrection(open: OpenSheet, step: StepAtHand, entry: EntryRow): Promise<After> {
  if (entry.verdict !== 'pass' || entry.replaces === null) return { step, events: [] };
  const slot = slotKeyOf(entry.content);
  const failedHere = new Set(
    step.records.entries.filter(({ content }) => slotKeyOf(content) === slot).map(({ id }) => id),
  );
  let after: After = { step, events: [] };
  for (const snag of openSnagsOf(step.records)) {
    if (snag.cause !== 'failed' || snag.entryId === null || !failedHere.has(snag.entryId)) continue;
    const reason = entry.replaceReason ?? 'Read again.';
    const next = await settle(open, after.step, snag, { how: 'redone', reason });
    after = { step: next.step, events: [...after.events, ...next.events] };
  }
  return after;
}
