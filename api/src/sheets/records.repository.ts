import { toSi } from '@second-spanner/shared/quantities/convert';
import type { ShopScope } from '../platform/database/database.js';
import type {
  CountersignatureRow,
  EntryRow,
  SecondReadingRow,
  SettlementRow,
  SnagRow,
} from './record.entity.js';

/** Where a record belongs. */
export interface OfStep {
  readonly sheetId: string;
  readonly stepId: string;
}

/** What makes a request count once. */
export interface Once {
  readonly key: string;
  readonly bodyHash: string;
}

type OnceTable = 'entries' | 'second_readings' | 'countersignatures';

/** Writes what people record on steps. Nothing here is ever changed afterwards. */
export class RecordsRepository {
  constructor(private readonly scope: ShopScope) {}

  /** The hash of what was sent under a key before; null when the key is new. */
  async sentUnder(table: OnceTable, key: string): Promise<string | null> {
    const rows: { bodyHash: string }[] = await this.scope.manager.query(
      `SELECT body_hash AS "bodyHash" FROM ${table} WHERE shop_id = $1 AND idempotency_key = $2`,
      [this.scope.shopId, key],
    );
    return rows[0]?.bodyHash ?? null;
  }

  async addEntry(of: OfStep, entry: EntryRow, { key, bodyHash }: Once): Promise<void> {
    await this.insert('entries', of, {
      ...{ id: entry.id, round: entry.round, content: JSON.stringify(entry.content) },
      ...{ si_value: siOf(entry), verdict: entry.verdict, reason: entry.reason },
      ...{ replaces: entry.replaces, replace_reason: entry.replaceReason },
      ...{ recorded_by: entry.by.id, recorded_at: entry.at, idempotency_key: key, body_hash: bodyHash },
    });
  }

  async addSecondReading(of: OfStep, reading: SecondReadingRow, { key, bodyHash }: Once): Promise<void> {
    await this.insert('second_readings', of, {
      ...{ id: reading.id, round: reading.round, content: JSON.stringify(reading.content) },
      ...{ agreement: JSON.stringify(reading.agreement), person_id: reading.by.id, at: reading.at },
      ...{ idempotency_key: key, body_hash: bodyHash },
    });
  }

  async addCountersignature(of: OfStep, signature: CountersignatureRow, once: Once): Promise<void> {
    await this.insert('countersignatures', of, {
      ...{ id: signature.id, round: signature.round, outcome: signature.outcome, reason: signature.reason },
      ...{ pulls_witnessed: signature.pullsWitnessed, person_id: signature.by.id, at: signature.at },
      ...{ idempotency_key: once.key, body_hash: once.bodyHash },
    });
  }

  async addSnag(of: OfStep, snag: SnagRow): Promise<void> {
    await this.insert('snags', of, {
      ...{ id: snag.id, round: snag.round, cause: snag.cause, words: snag.words, parties: snag.parties },
      ...{ entry_id: snag.entryId, raised_by: snag.by.id, raised_at: snag.at },
    });
  }

  async addSettlement(of: OfStep, id: string, snagId: string, settled: SettlementRow): Promise<void> {
    await this.insert('snag_settlements', of, {
      ...{ id, snag_id: snagId, how: settled.how, reason: settled.reason },
      ...{ settled_by: settled.by.id, settled_at: settled.at },
    });
  }

  async addCall(of: OfStep, call: { id: string; byId: string; toId: string; at: string }): Promise<void> {
    const { id, byId, toId, at } = call;
    await this.insert('calls', of, { id, called_by: byId, to_id: toId, called_at: at });
  }

  private async insert(
    table: string,
    { sheetId, stepId }: OfStep,
    values: Readonly<Record<string, unknown>>,
  ): Promise<void> {
    const row = { ...values, shop_id: this.scope.shopId, sheet_id: sheetId, step_id: stepId };
    const places = Object.keys(row).map((_column, at) => `$${at + 1}`);
    await this.scope.manager.query(
      `INSERT INTO ${table} (${Object.keys(row).join(', ')}) VALUES (${places.join(', ')})`,
      Object.values(row),
    );
  }
}

/** The figure of an entry in SI, where it has one. */
function siOf({ content }: EntryRow): number | null {
  if (content.kind === 'measurement') return toSi(content.value);
  const figure = content.kind === 'tightening' ? (content.reading ?? content.setting) : undefined;
  return figure ? toSi(figure) : null;
}
