import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { startTestApp, type TestApp } from '../../testing/test-app.js';
import { openWorkshop, type Workshop } from '../../testing/workshop.js';
import { SheetRows } from '../../testing/sheet-rows.js';

let app: TestApp;
let workshop: Workshop;
let rows: SheetRows;
let people: Workshop['people'];

beforeAll(async () => {
  app = await startTestApp();
  workshop = await openWorkshop(app.services);
  people = workshop.people;
});
afterAll(() => app.close());
beforeEach(async () => {
  rows = await SheetRows.make(app.db, workshop);
});

const sql = (statement: string, values: unknown[] = []): Promise<object[]> =>
  app.db.sql(workshop.shop, statement, values);

describe('what was recorded', () => {
  const tables = [
    'entries',
    'second_readings',
    'countersignatures',
    'snags',
    'snag_settlements',
    'calls',
    'signatures',
    'ledger_lines',
  ];

  beforeEach(async () => {
    await rows.entry(people.tomasz);
    await rows.secondReading(people.imogen);
    await rows.countersignature(people.imogen);
    const snag = await rows.snag('raised', people.imogen);
    await rows.settlement(snag, people.nell, 'redone');
    await rows.call(people.tomasz, people.imogen);
    await rows.signature('built', people.tomasz);
    await rows.ledgerLine(1, '0'.repeat(64), 'a'.repeat(64));
  });

  it.each(tables)('in %s is not changed, taken away or emptied', async (table) => {
    const sentence = /never changed or taken away/;
    await expect(sql(`UPDATE ${table} SET shop_id = shop_id`)).rejects.toThrow(sentence);
    await expect(sql(`DELETE FROM ${table}`)).rejects.toThrow(sentence);
    await expect(sql(`TRUNCATE ${table} CASCADE`)).rejects.toThrow(sentence);
  });

  it('leaves what a step asks for as it was laid out', async () => {
    await expect(sql(`UPDATE steps SET definition = '{"kind":"photo"}'`)).rejects.toThrow(
      'frozen with its sheet',
    );
    await expect(sql('DELETE FROM steps')).rejects.toThrow('never taken away');
    await expect(sql('DELETE FROM sheets')).rejects.toThrow('never taken away');
    const own = 'WHERE id = $1';
    const unmark = `UPDATE steps SET critical = false, uncritical_reason = 'Dowelled.' ${own}`;
    await expect(sql(unmark, [rows.step])).rejects.toThrow('from a hold point');
    const other = randomUUID();
    await sql(
      `INSERT INTO steps (id, shop_id, sheet_id, position, code, stage, kind, title, hold, critical,
         second_check, rests_on, definition, of_total)
       SELECT $2, shop_id, sheet_id, 2, '1.2', 1, kind, title, false, true, second_check, rests_on,
         definition, 1 FROM steps WHERE id = $1`,
      [rows.step, other],
    );
    await expect(sql(`UPDATE steps SET countersigned = true ${own}`, [other])).rejects.toThrow('by a person');
    await expect(sql(`UPDATE steps SET critical = false ${own}`, [other])).rejects.toThrow('takes a reason');
    await sql(unmark, [other]);
  });
});

describe('an approved edition', () => {
  it('is not changed or taken away; only a newer one takes its place', async () => {
    const sentence = 'never changes';
    const where = `WHERE id = '${rows.edition}'`;
    await expect(sql(`UPDATE spec_editions SET document = '{}' ${where}`)).rejects.toThrow(sentence);
    await expect(sql(`UPDATE spec_editions SET state = 'draft' ${where}`)).rejects.toThrow(sentence);
    await expect(sql(`DELETE FROM spec_editions ${where}`)).rejects.toThrow(sentence);
    await expect(sql(`UPDATE spec_editions SET state = 'superseded', edition = 9 ${where}`)).rejects.toThrow(
      sentence,
    );
    await sql(`UPDATE spec_editions SET state = 'superseded' ${where}`);
    await expect(sql(`UPDATE spec_editions SET state = 'approved' ${where}`)).rejects.toThrow(sentence);
  });
});

describe('two people', () => {
  it('are needed: who recorded neither reads again nor countersigns', async () => {
    await rows.entry(people.tomasz);
    await expect(rows.secondReading(people.tomasz)).rejects.toThrow('does not give its second reading');
    await expect(rows.countersignature(people.tomasz)).rejects.toThrow('does not countersign');
  });

  it('who read again does not record in the same round', async () => {
    await rows.entry(people.tomasz);
    await rows.secondReading(people.imogen);
    await expect(rows.entry(people.imogen)).rejects.toThrow('does not record in the same round');
  });

  it('who countersigns has read again in this round', async () => {
    await rows.entry(people.tomasz);
    await expect(rows.countersignature(people.imogen)).rejects.toThrow('own reading first');
    await rows.secondReading(people.imogen);
    await sql('UPDATE steps SET round = 2 WHERE id = $1', [rows.step]);
    await expect(rows.countersignature(people.imogen, 1)).rejects.toThrow('the round at hand');
    await expect(rows.countersignature(people.imogen, 2)).rejects.toThrow('own reading first');
  });

  it('countersign once in a round, however many try', async () => {
    await rows.entry(people.tomasz);
    await rows.secondReading(people.imogen);
    await rows.secondReading(people.nell);
    const tries = Array.from({ length: 10 }, (_, i) =>
      rows.countersignature(i % 2 ? people.imogen : people.nell),
    );
    const done = await Promise.allSettled(tries);
    expect(done.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
  });

  it('who disagree do not settle it, and only a foreman accepts it as it is', async () => {
    await rows.entry(people.tomasz);
    await rows.secondReading(people.imogen);
    const snag = await rows.snag('disagreement', people.imogen, [people.tomasz, people.imogen]);
    for (const one of [people.tomasz, people.imogen]) {
      await expect(rows.settlement(snag, one, 'redone')).rejects.toThrow('Neither of the two');
    }
    await rows.settlement(snag, people.nell, 'accepted-as-it-is');
    const other = await rows.snag('raised', people.tomasz);
    await expect(rows.settlement(other, people.imogen, 'accepted-as-it-is')).rejects.toThrow(
      'Only a foreman accepts',
    );
    await expect(rows.settlement(snag, people.nell, 'redone')).rejects.toThrow(
      'snag_settlements_snag_id_key',
    );
  });

  it('sign as builder and countersigner, and a foreman releases', async () => {
    await rows.signature('built', people.tomasz);
    await expect(rows.signature('countersigned', people.tomasz)).rejects.toThrow('two people');
    await expect(rows.signature('built', people.nell)).rejects.toThrow(
      'signatures_sheet_id_sign_round_meaning',
    );
    await expect(rows.release()).rejects.toThrow('three signatures');
    await rows.signature('countersigned', people.imogen);
    await expect(rows.signature('released', people.tomasz)).rejects.toThrow('Only a foreman releases');
    await rows.signature('released', people.nell);
    await expect(rows.release()).rejects.toThrow('moves on with the signature');
    await rows.walkToSignedOff();
    await rows.release();
  });

  it('a sheet is never made released', async () => {
    await expect(
      sql(
        `INSERT INTO sheets (id, shop_id, code, state, car_id, spec_edition_id, builder_id, countersigner_id,
           created_by, frozen, released_at, content_hash, verification_code)
         SELECT gen_random_uuid(), shop_id, 'LM-9999', 'released', car_id, spec_edition_id, builder_id,
           countersigner_id, created_by, '{}', now(), repeat('a', 64), 'x' FROM sheets WHERE id = $1`,
        [rows.sheet],
      ),
    ).rejects.toThrow('begins planned');
  });
});

describe('a released sheet', () => {
  it('takes nothing more', async () => {
    const snag = await rows.snag('raised', people.imogen);
    await rows.releaseSigned();
    const sentence = 'The sheet is released';
    await expect(rows.entry(people.tomasz)).rejects.toThrow(sentence);
    await expect(rows.secondReading(people.imogen)).rejects.toThrow(sentence);
    await expect(rows.countersignature(people.imogen)).rejects.toThrow(sentence);
    await expect(rows.snag('raised', people.imogen)).rejects.toThrow(sentence);
    await expect(rows.settlement(snag, people.nell, 'redone')).rejects.toThrow(sentence);
    await expect(rows.call(people.tomasz, people.imogen)).rejects.toThrow(sentence);
    await expect(rows.signature('built', people.tomasz, 2)).rejects.toThrow(sentence);
    await expect(rows.ledgerLine(1, '0'.repeat(64), 'a'.repeat(64))).rejects.toThrow(sentence);
    await expect(sql('UPDATE steps SET done = 1 WHERE id = $1', [rows.step])).rejects.toThrow(sentence);
    await expect(sql('UPDATE sheets SET version = 99 WHERE id = $1', [rows.sheet])).rejects.toThrow(sentence);
    await expect(sql(`UPDATE sheets SET frozen = '{"a":1}' WHERE id = $1`, [rows.sheet])).rejects.toThrow(
      sentence,
    );
  });
});

describe('the ledger', () => {
  it('takes only the line that follows the last', async () => {
    const [first, second] = ['a'.repeat(64), 'b'.repeat(64)];
    const sentence = 'follows the last one';
    await expect(rows.ledgerLine(2, '0'.repeat(64), first)).rejects.toThrow(sentence);
    await expect(rows.ledgerLine(1, second, first)).rejects.toThrow(sentence);
    await rows.ledgerLine(1, '0'.repeat(64), first);
    await expect(rows.ledgerLine(2, second, second)).rejects.toThrow(sentence);
    await expect(rows.ledgerLine(3, first, second)).rejects.toThrow(sentence);
    await rows.ledgerLine(2, first, second);
  });
});

describe('the same key', () => {
  it('never records twice', async () => {
    const key = randomUUID();
    await rows.entry(people.tomasz, 1, key);
    await expect(rows.entry(people.tomasz, 1, key)).rejects.toThrow('entries_shop_id_idempotency_key_key');
  });
});
