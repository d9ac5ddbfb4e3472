import type { ShopScope } from '../platform/database/database.js';
import type { StepRecords } from './record.entity.js';
import { StepEntity, type StepRow } from './step.entity.js';

const lines = `
  s.id, s.position, s.code, s.stage, s.kind, s.title, s.hold, s.critical, s.second_check AS "secondCheck",
  s.rests_on AS "restsOn", s.uncritical_reason AS "uncriticalReason", s.round,
  s.entries_from_round AS "entriesFromRound", s.done, s.of_total AS "of", s.verdict,
  s.recorder_ids AS "recorderIds", s.countersigned, s.open_snags AS "openSnags", s.awaiting,
  s.awaiting_since AS "awaitingSince"`;

const by = (column: string): string =>
  `(SELECT json_build_object('id', id, 'name', name, 'role', role) FROM people WHERE id = ${column})`;

/** All rows of a table that belong to the step at hand, as one JSON list. */
const listOf = (
  table: string,
  fields: Readonly<Record<string, string>>,
  at: string,
  tie = 'r.id',
): string => {
  const pairs = Object.entries(fields).map(([key, value]) => `'${key}', ${value}`);
  return `(SELECT coalesce(json_agg(json_build_object(${pairs.join(', ')}) ORDER BY ${at}, ${tie}), '[]')
    FROM ${table} r WHERE r.step_id = s.id)`;
};

const entries = listOf(
  'entries',
  {
    ...{ id: 'r.id', round: 'r.round', content: 'r.content', verdict: 'r.verdict', reason: 'r.reason' },
    ...{ replaces: 'r.replaces', replaceReason: 'r.replace_reason' },
    ...{ by: by('r.recorded_by'), at: 'r.recorded_at' },
  },
  'r.recorded_at',
);

const secondReadings = listOf(
  'second_readings',
  {
    ...{ id: 'r.id', round: 'r.round', content: 'r.content', agreement: 'r.agreement' },
    ...{ by: by('r.person_id'), at: 'r.at' },
  },
  'r.at',
);

const countersignatures = listOf(
  'countersignatures',
  {
    ...{ id: 'r.id', round: 'r.round', outcome: 'r.outcome', reason: 'r.reason' },
    ...{ pullsWitnessed: 'r.pulls_witnessed', by: by('r.person_id'), at: 'r.at' },
  },
  'r.at',
);

const settled = `(SELECT json_build_object('how', t.how, 'reason', t.reason, 'by', ${by('t.settled_by')},
  'at', t.settled_at) FROM snag_settlements t WHERE t.snag_id = r.id)`;

const snags = listOf(
  'snags',
  {
    ...{ id: 'r.id', round: 'r.round', cause: 'r.cause', words: 'r.words', parties: 'r.parties' },
    ...{ entryId: 'r.entry_id', by: by('r.raised_by'), at: 'r.raised_at', settled },
  },
  'r.raised_at',
);

const calls = listOf('calls', { to: by('r.to_id'), at: 'r.called_at' }, 'r.called_at');

const columns = { definition: 's.definition', entries, secondReadings, countersignatures, snags, calls };

const whole = Object.entries(columns)
  .map(([name, value]) => `${value} AS "${name}"`)
  .join(', ');

/** Worked out for the one step whose code is the third parameter. */
const atHand = Object.entries(columns)
  .map(([name, value]) => `CASE WHEN s.code = $3 THEN ${value} END AS "${name}"`)
  .join(', ');

/** One step among the steps of its sheet. */
export interface StepOfSheet {
  readonly steps: readonly StepRow[];
  readonly row: StepRow;
  readonly records: StepRecords;
}

export type StepCounts = Pick<
  StepEntity,
  | ('round' | 'entriesFromRound' | 'done' | 'verdict' | 'recorderIds' | 'countersigned')
  | ('openSnags' | 'awaiting' | 'awaitingSince' | 'critical' | 'uncriticalReason')
>;

export type CoverRow = Pick<
  StepRow,
  'code' | 'critical' | 'secondCheck' | 'countersigned' | 'recorderIds'
> & {
  /** Whose second reading of the round at hand is in. */
  readonly readers: readonly string[];
};

/** The steps of sheets of one shop. */
export class StepsRepository {
  constructor(private readonly scope: ShopScope) {}

  /** All steps of a sheet in order, without their definitions. */
  async list(sheetId: string): Promise<StepRow[]> {
    return this.scope.manager.query(
      `SELECT ${lines} FROM steps s WHERE s.shop_id = $1 AND s.sheet_id = $2 ORDER BY s.position`,
      [this.scope.shopId, sheetId],
    );
  }

  /** All steps of a sheet, and one of them with everything that was recorded on it, as of one moment. */
  async atHand(sheetId: string, code: string): Promise<StepOfSheet | null> {
    const steps: (StepRow & Partial<StepRecords>)[] = await this.scope.manager.query(
      `SELECT ${lines}, ${atHand} FROM steps s
       WHERE s.shop_id = $1 AND s.sheet_id = $2 ORDER BY s.position`,
      [this.scope.shopId, sheetId, code],
    );
    const found = steps.find((step): step is StepRow & StepRecords => step.code === code);
    return found ? { steps, row: found, records: found } : null;
  }

  /** Every step of a sheet with its records, in the sheet's order. */
  async allWithRecords(sheetId: string): Promise<(StepRow & StepRecords)[]> {
    return this.scope.manager.query(
      `SELECT ${lines}, ${whole} FROM steps s
       WHERE s.shop_id = $1 AND s.sheet_id = $2 ORDER BY s.position`,
      [this.scope.shopId, sheetId],
    );
  }

  /** What decides for every critical step from whom its figures are kept. */
  async coverCases(sheetId: string): Promise<CoverRow[]> {
    return this.scope.manager.query(
      `SELECT s.code, s.critical, s.second_check AS "secondCheck", s.countersigned,
         s.recorder_ids AS "recorderIds",
         ARRAY(SELECT r.person_id FROM second_readings r
           WHERE r.step_id = s.id AND r.round = s.round) AS readers
       FROM steps s WHERE s.shop_id = $1 AND s.sheet_id = $2 AND s.critical AND NOT s.countersigned`,
      [this.scope.shopId, sheetId],
    );
  }

  async insertAll(steps: readonly Omit<StepEntity, 'shopId'>[]): Promise<void> {
    const { shopId, manager } = this.scope;
    // A definition is written whole; the deep partial type of an insert has no use for its unions.
    const rows = steps.map(({ definition, ...step }) => ({
      ...step,
      definition: definition as object,
      shopId,
    }));
    await manager.insert(StepEntity, rows);
  }

  /** What moves on a step: its rounds, what is counted of its records, and what it waits for. */
  async setCounts(id: string, counts: StepCounts): Promise<void> {
    await this.scope.manager.update(StepEntity, { id, shopId: this.scope.shopId }, counts);
  }
}
