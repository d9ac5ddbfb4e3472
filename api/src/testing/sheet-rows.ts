import { randomUUID } from 'node:crypto';
import type { TestDatabase } from '../platform/testing/test-database.js';
import type { Workshop } from './workshop.js';

const hash = 'f'.repeat(64);

/** A sheet with one critical step, written row by row past the application, to test what the database refuses. */
export class SheetRows {
  readonly spec = randomUUID();
  readonly edition = randomUUID();
  readonly sheet = randomUUID();
  readonly step = randomUUID();

  private constructor(
    private readonly db: TestDatabase,
    private readonly workshop: Workshop,
  ) {}

  static async make(db: TestDatabase, workshop: Workshop): Promise<SheetRows> {
    const rows = new SheetRows(db, workshop);
    const { nell, tomasz, imogen } = workshop.people;
    await rows.insert('specs', { id: rows.spec, code: rows.spec, title: 'A spec' });
    await rows.insert('spec_editions', {
      ...{ id: rows.edition, spec_id: rows.spec, edition: 1, state: 'approved', document: {}, hash },
      ...{ value_count: 0, rests_on: 'measured parts', approved_by: nell, approved_at: new Date() },
    });
    await rows.insert('sheets', {
      ...{ id: rows.sheet, code: rows.sheet, car_id: workshop.cars.ravis, spec_edition_id: rows.edition },
      ...{ builder_id: tomasz, countersigner_id: imogen, created_by: nell, steps_total: 1 },
    });
    await rows.insert('steps', {
      ...{ id: rows.step, sheet_id: rows.sheet, position: 1, code: '1.1', stage: 1, kind: 'check' },
      ...{ title: 'A check', hold: true, critical: true, second_check: 'inspected' },
      ...{ rests_on: [], definition: {}, of_total: 1 },
    });
    return rows;
  }

  async entry(by: string, round = 1, key = randomUUID()): Promise<string> {
    return this.onStep('entries', {
      ...{ round, content: {}, verdict: 'pass', reason: 'It is there.', recorded_by: by },
      ...{ idempotency_key: key, body_hash: hash },
    });
  }

  async secondReading(by: string, round = 1): Promise<string> {
    const once = { idempotency_key: randomUUID(), body_hash: hash };
    return this.onStep('second_readings', { round, content: {}, agreement: {}, person_id: by, ...once });
  }

  async countersignature(by: string, round = 1): Promise<string> {
    const once = { idempotency_key: randomUUID(), body_hash: hash };
    return this.onStep('countersignatures', { round, outcome: 'agree', person_id: by, ...once });
  }

  async snag(cause: string, by: string, parties: readonly string[] = []): Promise<string> {
    return this.onStep('snags', { round: 1, cause, words: 'It binds.', raised_by: by, parties });
  }

  async settlement(snag: string, by: string, how: string): Promise<string> {
    return this.onStep('snag_settlements', { snag_id: snag, how, reason: 'Done again.', settled_by: by });
  }

  async call(by: string, to: string): Promise<string> {
    return this.onStep('calls', { called_by: by, to_id: to });
  }

  async signature(meaning: string, by: string, round = 1): Promise<string> {
    return this.insert('signatures', {
      ...{ id: randomUUID(), sheet_id: this.sheet, sign_round: round, meaning, person_id: by },
      ...{ at: new Date(), content_hash: hash, binding: hash },
    });
  }

  async ledgerLine(seq: number, previous: string, own: string): Promise<string> {
    const line = { seq, prev_hash: previous, hash: own, body: '{}', at: new Date() };
    return this.insert('ledger_lines', { sheet_id: this.sheet, ...line });
  }

  /** Turns the sheet to released, as it stands. */
  async release(): Promise<void> {
    await this.db.sql(
      this.workshop.shop,
      `UPDATE sheets SET state = 'released', released_at = now(), frozen = '{}', content_hash = $2,
         verification_code = id::text WHERE id = $1`,
      [this.sheet, hash],
    );
  }

  /** From planned to signed off, each move with its signature already given. */
  async walkToSignedOff(): Promise<void> {
    for (const state of ['on-the-stand', 'countersigning', 'signed-off']) {
      await this.db.sql(this.workshop.shop, 'UPDATE sheets SET state = $2 WHERE id = $1', [
        this.sheet,
        state,
      ]);
    }
  }

  async releaseSigned(): Promise<void> {
    const { nell, tomasz, imogen } = this.workshop.people;
    await this.signature('built', tomasz);
    await this.signature('countersigned', imogen);
    await this.signature('released', nell);
    await this.walkToSignedOff();
    await this.release();
  }

  private async onStep(table: string, values: Readonly<Record<string, unknown>>): Promise<string> {
    return this.insert(table, { id: randomUUID(), sheet_id: this.sheet, step_id: this.step, ...values });
  }

  private async insert(table: string, values: Readonly<Record<string, unknown>>): Promise<string> {
    const all = { shop_id: this.workshop.shop, ...values };
    const places = Object.keys(all).map((_, i) => `$${i + 1}`);
    const statement = `INSERT INTO ${table} (${Object.keys(all).join(', ')}) VALUES (${places.join(', ')})`;
    await this.db.sql(this.workshop.shop, statement, Object.values(all));
    return typeof values['id'] === 'string' ? values['id'] : '';
  }
}
