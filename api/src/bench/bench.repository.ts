import type { ShopScope } from '../platform/database/database.js';
import type { AwaitingRow, WaitingSheetRow } from './bench.entity.js';

/** What one person looks for: their id, and whether they run the shop. */
export interface Seeker {
  readonly personId: string;
  readonly isForeman: boolean;
}

const most = 50;

const stepColumns = `
  st.awaiting, st.awaiting_since AS since, st.sheet_id AS "sheetId", c.name AS "carName",
  st.code AS "stepCode", st.kind AS "stepKind", st.title, st.second_check AS "secondCheck",
  st.critical AND st.second_check <> 'inspected' AND NOT st.countersigned
    AND NOT ($2 = ANY (st.recorder_ids)) AS covered`;

/**
 * What waits in one shop. Each query goes by an index that holds only what waits, and looks up the rest for the few
 * rows that are shown: a step waits only while its sheet is on the stand.
 */
export class BenchRepository {
  constructor(private readonly scope: ShopScope) {}

  /** Open snags that the person may settle: all for a foreman, a builder's on their own sheets. */
  async snags({ personId, isForeman }: Seeker): Promise<AwaitingRow[]> {
    return this.scope.manager.query(
      `SELECT ${stepColumns}, s.code AS "sheetCode", NULL AS "calledBy",
         json_build_object('cause', n.cause, 'words', n.words, 'by', p.name) AS snag
       FROM steps st
       JOIN sheets s ON s.id = st.sheet_id
       JOIN cars c ON c.id = s.car_id
       JOIN LATERAL (
         SELECT n.cause, n.words, n.raised_by FROM snags n
         WHERE n.step_id = st.id AND NOT EXISTS (SELECT FROM snag_settlements t WHERE t.snag_id = n.id)
           AND NOT (n.cause = 'disagreement' AND $2 = ANY (n.parties))
         ORDER BY n.raised_at LIMIT 1) n ON true
       JOIN people p ON p.id = n.raised_by
       WHERE st.shop_id = $1 AND st.awaiting = 'snag'
         AND ($3 OR s.builder_id = $2)
       ORDER BY st.awaiting_since LIMIT ${most}`,
      [this.scope.shopId, personId, isForeman],
    );
  }

  /** Steps that wait for a second person: a foreman sees all, others theirs and those they were called to. */
  async secondChecks({ personId, isForeman }: Seeker): Promise<AwaitingRow[]> {
    return this.scope.manager.query(
      `SELECT ${stepColumns}, st.sheet_code AS "sheetCode", NULL AS snag,
         (SELECT p.name FROM calls k JOIN people p ON p.id = k.called_by
           WHERE k.step_id = st.id AND k.to_id = $2 ORDER BY k.called_at DESC LIMIT 1) AS "calledBy"
       FROM (
         SELECT st.*, s.code AS sheet_code, s.car_id
         FROM steps st JOIN sheets s ON s.id = st.sheet_id
         WHERE st.shop_id = $1 AND st.awaiting = 'second-check' AND NOT ($2 = ANY (st.recorder_ids))
           AND ($3 OR s.countersigner_id = $2
             OR EXISTS (SELECT FROM calls k WHERE k.step_id = st.id AND k.to_id = $2))
         ORDER BY st.awaiting_since LIMIT ${most}) st
       JOIN cars c ON c.id = st.car_id
       ORDER BY st.awaiting_since`,
      [this.scope.shopId, personId, isForeman],
    );
  }

  /** Sheets that wait for the person: to go on with, to sign, to release. */
  async sheets({ personId, isForeman }: Seeker): Promise<WaitingSheetRow[]> {
    return this.scope.manager.query(
      `SELECT ${sheetColumns}
       FROM (
         SELECT s.* FROM sheets s
         WHERE s.shop_id = $1 AND s.state <> 'released' AND (
           (s.builder_id = $2 AND s.state IN ('planned', 'on-the-stand'))
           OR (s.countersigner_id = $2 AND s.state = 'countersigning')
           OR ($3 AND s.state = 'signed-off'))
         ORDER BY s.changed_at DESC LIMIT ${most}) s
       ${besideSheet}
       ORDER BY s.changed_at DESC`,
      [this.scope.shopId, personId, isForeman],
    );
  }

  /** Released sheets of an owner's cars, newest first. */
  async released(ownerId: string): Promise<WaitingSheetRow[]> {
    return this.scope.manager.query(
      `SELECT ${sheetColumns}
       FROM sheets s
       ${besideSheet}
       WHERE s.shop_id = $1 AND c.owner_id = $2 AND s.state = 'released'
       ORDER BY s.changed_at DESC LIMIT ${most}`,
      [this.scope.shopId, ownerId],
    );
  }
}

const sheetColumns = `
  s.id AS "sheetId", s.code AS "sheetCode", c.name AS "carName", s.state, s.changed_at AS since,
  s.steps_done AS "stepsDone", s.steps_total AS "stepsTotal", s.open_snags AS "openSnags",
  b.name AS "builderName", n.code AS "nextCode", n.title AS "nextTitle", n.kind AS "nextKind"`;

const besideSheet = `
  JOIN cars c ON c.id = s.car_id
  JOIN people b ON b.id = s.builder_id
  LEFT JOIN steps n ON n.sheet_id = s.id AND n.code = s.next_step`;
