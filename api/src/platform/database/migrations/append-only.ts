import type { MigrationInterface, QueryRunner } from 'typeorm';

/** What was recorded stays as it was recorded, and a released sheet takes nothing more. SQLSTATE SP001. */
export class AppendOnly1764547200007 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(refuseChange);
    for (const table of appendOnly) {
      await runner.query(`
        CREATE TRIGGER append_only BEFORE UPDATE OR DELETE ON ${table}
          FOR EACH ROW EXECUTE FUNCTION refuse_change();
        CREATE TRIGGER no_truncate BEFORE TRUNCATE ON ${table}
          FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();`);
    }
    await runner.query(guardEditions);
    await runner.query(guardSheets);
    await runner.query(guardSteps);
    await runner.query(refuseReleased);
    for (const table of ofSheet) {
      // Triggers fire in the order of their names: this one first.
      await runner.query(`
        CREATE TRIGGER a_sheet_open BEFORE INSERT ON ${table}
          FOR EACH ROW EXECUTE FUNCTION refuse_released();`);
    }
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query(`DROP FUNCTION refuse_change, guard_edition, guard_sheet, guard_step, refuse_released
      CASCADE`);
  }
}

const ofStep = ['entries', 'second_readings', 'countersignatures', 'snags', 'snag_settlements', 'calls'];
const ofSheet = [...ofStep, 'signatures', 'ledger_lines'];
const appendOnly = [...ofSheet, 'files'];

const refuseChange = `
  CREATE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $$
  BEGIN
    RAISE EXCEPTION 'What stands in % is never changed or taken away.', TG_TABLE_NAME USING ERRCODE = 'SP001';
  END $$;`;

const guardEditions = `
  CREATE FUNCTION guard_edition() RETURNS trigger LANGUAGE plpgsql AS $$
  BEGIN
    IF TG_OP = 'UPDATE' AND OLD.state = 'draft' THEN RETURN NEW; END IF;
    IF TG_OP = 'DELETE' AND OLD.state = 'draft' THEN RETURN OLD; END IF;
    -- A newer edition may take the place of an approved one; nothing else about it changes.
    IF TG_OP = 'UPDATE' AND OLD.state = 'approved' AND NEW.state = 'superseded'
      AND to_jsonb(NEW) - 'state' = to_jsonb(OLD) - 'state' THEN RETURN NEW; END IF;
    RAISE EXCEPTION 'An approved edition of a spec never changes.' USING ERRCODE = 'SP001';
  END $$;
  CREATE TRIGGER immutable BEFORE UPDATE OR DELETE ON spec_editions
    FOR EACH ROW EXECUTE FUNCTION guard_edition();
  CREATE TRIGGER no_truncate BEFORE TRUNCATE ON spec_editions
    FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();`;

const guardSheets = `
  CREATE FUNCTION guard_sheet() RETURNS trigger LANGUAGE plpgsql AS $$
  BEGIN
    IF TG_OP = 'DELETE' THEN
      RAISE EXCEPTION 'A sheet is never taken away.' USING ERRCODE = 'SP001';
    END IF;
    IF OLD.state = 'released' THEN
      RAISE EXCEPTION 'The sheet is released: nothing on it changes any more.' USING ERRCODE = 'SP001';
    END IF;
    IF (NEW.id, NEW.shop_id, NEW.code, NEW.car_id, NEW.spec_edition_id, NEW.builder_id, NEW.countersigner_id,
        NEW.created_by, NEW.created_at)
      IS DISTINCT FROM
      (OLD.id, OLD.shop_id, OLD.code, OLD.car_id, OLD.spec_edition_id, OLD.builder_id, OLD.countersigner_id,
        OLD.created_by, OLD.created_at) THEN
      RAISE EXCEPTION 'A sheet keeps its car, its spec edition and its two people.' USING ERRCODE = 'SP001';
    END IF;
    IF NEW.version < OLD.version OR NEW.sign_round < OLD.sign_round THEN
      RAISE EXCEPTION 'Versions and rounds of a sheet only rise.' USING ERRCODE = 'SP001';
    END IF;
    RETURN NEW;
  END $$;
  CREATE TRIGGER guard BEFORE UPDATE OR DELETE ON sheets FOR EACH ROW EXECUTE FUNCTION guard_sheet();
  CREATE TRIGGER no_truncate BEFORE TRUNCATE ON sheets
    FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();`;

/** Steps are made with the sheet; afterwards only what is counted of their records moves. */
const guardSteps = `
  CREATE FUNCTION guard_step() RETURNS trigger LANGUAGE plpgsql AS $$
  DECLARE sheet_state text;
  BEGIN
    IF TG_OP = 'DELETE' THEN
      RAISE EXCEPTION 'A step is never taken away.' USING ERRCODE = 'SP001';
    END IF;
    SELECT state INTO sheet_state FROM sheets WHERE id = NEW.sheet_id FOR SHARE;
    IF sheet_state = 'released' THEN
      RAISE EXCEPTION 'The sheet is released: nothing on it changes any more.' USING ERRCODE = 'SP001';
    END IF;
    IF TG_OP = 'INSERT' THEN
      IF sheet_state <> 'planned' THEN
        RAISE EXCEPTION 'Steps are laid out before the work begins.' USING ERRCODE = 'SP001';
      END IF;
      RETURN NEW;
    END IF;
    IF (NEW.id, NEW.shop_id, NEW.sheet_id, NEW.position, NEW.code, NEW.stage, NEW.kind, NEW.title, NEW.hold,
        NEW.second_check, NEW.rests_on, NEW.definition)
      IS DISTINCT FROM
      (OLD.id, OLD.shop_id, OLD.sheet_id, OLD.position, OLD.code, OLD.stage, OLD.kind, OLD.title, OLD.hold,
        OLD.second_check, OLD.rests_on, OLD.definition) THEN
      RAISE EXCEPTION 'What a step asks for is frozen with its sheet.' USING ERRCODE = 'SP001';
    END IF;
    IF NEW.round < OLD.round OR NEW.entries_from_round < OLD.entries_from_round THEN
      RAISE EXCEPTION 'The rounds of a step only rise.' USING ERRCODE = 'SP001';
    END IF;
    IF OLD.critical AND NOT NEW.critical AND (OLD.hold
        OR EXISTS (SELECT FROM entries WHERE step_id = NEW.id)) THEN
      RAISE EXCEPTION 'Nobody takes the second person from a hold point, or from what is begun.'
        USING ERRCODE = 'SP001';
    END IF;
    IF NEW.countersigned AND NOT OLD.countersigned AND NOT EXISTS (SELECT FROM countersignatures
        WHERE step_id = NEW.id AND round = NEW.round AND outcome = 'agree') THEN
      RAISE EXCEPTION 'A step is countersigned by a person, not by hand.' USING ERRCODE = 'SP001';
    END IF;
    IF OLD.critical AND NOT NEW.critical AND NEW.uncritical_reason IS NULL THEN
      RAISE EXCEPTION 'Unmarking a critical step takes a reason.' USING ERRCODE = 'SP001';
    END IF;
    RETURN NEW;
  END $$;
  CREATE TRIGGER guard BEFORE INSERT OR UPDATE OR DELETE ON steps FOR EACH ROW EXECUTE FUNCTION guard_step();
  CREATE TRIGGER no_truncate BEFORE TRUNCATE ON steps FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();`;

/** Holds the sheet's row in share, so that a release and a late write cannot pass each other. */
const refuseReleased = `
  CREATE FUNCTION refuse_released() RETURNS trigger LANGUAGE plpgsql AS $$
  DECLARE sheet_state text;
  BEGIN
    SELECT state INTO sheet_state FROM sheets WHERE id = NEW.sheet_id AND shop_id = NEW.shop_id FOR SHARE;
    IF sheet_state IS NULL THEN
      RAISE EXCEPTION 'There is no such sheet in this shop.' USING ERRCODE = 'SP001';
    END IF;
    IF sheet_state = 'released' THEN
      RAISE EXCEPTION 'The sheet is released: nothing on it changes any more.' USING ERRCODE = 'SP001';
    END IF;
    RETURN NEW;
  END $$;`;
