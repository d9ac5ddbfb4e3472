import type { MigrationInterface, QueryRunner } from 'typeorm';

/**
 * Two people means two, whatever the code above does. SQLSTATE SP002, with a sentence that can be shown.
 */
export class TwoPeople1764547200008 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(guardStepRecords);
    await runner.query(guardEntries);
    await runner.query(guardSecondReadings);
    await runner.query(guardCountersignatures);
    await runner.query(guardSettlements);
    await runner.query(guardSignatures);
    await runner.query(guardRelease);
    await runner.query(guardLedger);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query(`DROP FUNCTION guard_step_record, guard_entry, guard_second_reading,
      guard_countersignature, guard_settlement, guard_signature, guard_release, guard_new_sheet,
      guard_ledger CASCADE`);
  }
}

const guardStepRecords = `
  CREATE FUNCTION guard_step_record() RETURNS trigger LANGUAGE plpgsql AS $$
  BEGIN
    PERFORM FROM steps WHERE id = NEW.step_id AND sheet_id = NEW.sheet_id AND shop_id = NEW.shop_id;
    IF NOT FOUND THEN
      RAISE EXCEPTION 'There is no such step on this sheet.' USING ERRCODE = 'SP002';
    END IF;
    RETURN NEW;
  END $$;
  ${['entries', 'second_readings', 'countersignatures', 'snags', 'snag_settlements', 'calls']
    .map(
      (table) => `CREATE TRIGGER b_step_of_sheet BEFORE INSERT ON ${table}
        FOR EACH ROW EXECUTE FUNCTION guard_step_record();`,
    )
    .join('\n')}`;

const guardEntries = `
  CREATE FUNCTION guard_entry() RETURNS trigger LANGUAGE plpgsql AS $$
  BEGIN
    IF EXISTS (SELECT FROM second_readings WHERE step_id = NEW.step_id AND round = NEW.round
        AND person_id = NEW.recorded_by) THEN
      RAISE EXCEPTION 'Who gave the second reading does not record in the same round.' USING ERRCODE = 'SP002';
    END IF;
    IF NEW.replaces IS NOT NULL AND NOT EXISTS
        (SELECT FROM entries WHERE id = NEW.replaces AND step_id = NEW.step_id) THEN
      RAISE EXCEPTION 'A correction replaces an entry of the same step.' USING ERRCODE = 'SP002';
    END IF;
    RETURN NEW;
  END $$;
  CREATE TRIGGER c_guard BEFORE INSERT ON entries FOR EACH ROW EXECUTE FUNCTION guard_entry();`;

const guardSecondReadings = `
  CREATE FUNCTION guard_second_reading() RETURNS trigger LANGUAGE plpgsql AS $$
  BEGIN
    IF EXISTS (SELECT FROM entries WHERE step_id = NEW.step_id AND recorded_by = NEW.person_id) THEN
      RAISE EXCEPTION 'Who recorded on a step does not give its second reading.' USING ERRCODE = 'SP002';
    END IF;
    IF NOT EXISTS (SELECT FROM steps WHERE id = NEW.step_id AND round = NEW.round) THEN
      RAISE EXCEPTION 'A second reading belongs to the round at hand.' USING ERRCODE = 'SP002';
    END IF;
    IF EXISTS (SELECT FROM snag_settlements WHERE step_id = NEW.step_id AND settled_by = NEW.person_id
        AND how = 'accepted-as-it-is') THEN
      RAISE EXCEPTION 'Who accepted a reading as it is does not give the second one.' USING ERRCODE = 'SP002';
    END IF;
    RETURN NEW;
  END $$;
  CREATE TRIGGER c_guard BEFORE INSERT ON second_readings
    FOR EACH ROW EXECUTE FUNCTION guard_second_reading();`;

const guardCountersignatures = `
  CREATE FUNCTION guard_countersignature() RETURNS trigger LANGUAGE plpgsql AS $$
  BEGIN
    IF EXISTS (SELECT FROM entries WHERE step_id = NEW.step_id AND recorded_by = NEW.person_id) THEN
      RAISE EXCEPTION 'Who recorded on a step does not countersign it.' USING ERRCODE = 'SP002';
    END IF;
    IF NOT EXISTS (SELECT FROM steps WHERE id = NEW.step_id AND round = NEW.round) THEN
      RAISE EXCEPTION 'A countersignature belongs to the round at hand.' USING ERRCODE = 'SP002';
    END IF;
    IF NOT EXISTS (SELECT FROM second_readings WHERE step_id = NEW.step_id AND round = NEW.round
        AND person_id = NEW.person_id) THEN
      RAISE EXCEPTION 'A countersignature needs the same person''s own reading first.' USING ERRCODE = 'SP002';
    END IF;
    IF EXISTS (SELECT FROM snag_settlements WHERE step_id = NEW.step_id AND settled_by = NEW.person_id
        AND how = 'accepted-as-it-is') THEN
      RAISE EXCEPTION 'Who accepted a reading as it is does not countersign it.' USING ERRCODE = 'SP002';
    END IF;
    RETURN NEW;
  END $$;
  CREATE TRIGGER c_guard BEFORE INSERT ON countersignatures
    FOR EACH ROW EXECUTE FUNCTION guard_countersignature();`;

const guardSettlements = `
  CREATE FUNCTION guard_settlement() RETURNS trigger LANGUAGE plpgsql AS $$
  DECLARE snag snags%ROWTYPE;
  BEGIN
    SELECT * INTO snag FROM snags WHERE id = NEW.snag_id AND step_id = NEW.step_id;
    IF NOT FOUND THEN
      RAISE EXCEPTION 'There is no such snag on this step.' USING ERRCODE = 'SP002';
    END IF;
    IF snag.cause = 'disagreement' AND (NEW.settled_by = ANY (snag.parties) OR EXISTS (
        SELECT FROM entries e JOIN steps s ON s.id = e.step_id
        WHERE e.step_id = NEW.step_id AND e.round >= s.entries_from_round AND e.round <= snag.round
          AND e.recorded_by = NEW.settled_by)) THEN
      RAISE EXCEPTION 'Neither of the two who disagree settles it.' USING ERRCODE = 'SP002';
    END IF;
    IF snag.cause = 'disagreement' AND EXISTS (SELECT FROM second_readings WHERE step_id = NEW.step_id
        AND round = snag.round AND person_id = NEW.settled_by) THEN
      RAISE EXCEPTION 'Neither of the two who disagree settles it.' USING ERRCODE = 'SP002';
    END IF;
    IF NEW.how = 'accepted-as-it-is' AND EXISTS (SELECT FROM entries WHERE id = snag.entry_id
        AND recorded_by = NEW.settled_by) THEN
      RAISE EXCEPTION 'Nobody accepts as it is what they recorded themselves.' USING ERRCODE = 'SP002';
    END IF;
    IF NEW.how = 'accepted-as-it-is' AND NOT EXISTS
        (SELECT FROM people WHERE id = NEW.settled_by AND role = 'foreman') THEN
      RAISE EXCEPTION 'Only a foreman accepts a snag as it is.' USING ERRCODE = 'SP002';
    END IF;
    RETURN NEW;
  END $$;
  CREATE TRIGGER c_guard BEFORE INSERT ON snag_settlements
    FOR EACH ROW EXECUTE FUNCTION guard_settlement();`;

const guardSignatures = `
  CREATE FUNCTION guard_signature() RETURNS trigger LANGUAGE plpgsql AS $$
  BEGIN
    IF NEW.meaning IN ('built', 'countersigned') AND EXISTS
        (SELECT FROM signatures WHERE sheet_id = NEW.sheet_id AND sign_round = NEW.sign_round
          AND meaning IN ('built', 'countersigned') AND person_id = NEW.person_id) THEN
      RAISE EXCEPTION 'Builder and countersigner are two people.' USING ERRCODE = 'SP002';
    END IF;
    IF NEW.meaning = 'countersigned' AND EXISTS
        (SELECT FROM entries WHERE sheet_id = NEW.sheet_id AND recorded_by = NEW.person_id) THEN
      RAISE EXCEPTION 'Who recorded on a sheet does not countersign it.' USING ERRCODE = 'SP002';
    END IF;
    IF NEW.meaning = 'released' AND NOT EXISTS
        (SELECT FROM people WHERE id = NEW.person_id AND role = 'foreman') THEN
      RAISE EXCEPTION 'Only a foreman releases a sheet.' USING ERRCODE = 'SP002';
    END IF;
    RETURN NEW;
  END $$;
  CREATE TRIGGER c_guard BEFORE INSERT ON signatures FOR EACH ROW EXECUTE FUNCTION guard_signature();`;

const guardRelease = `
  CREATE FUNCTION guard_release() RETURNS trigger LANGUAGE plpgsql AS $$
  BEGIN
    IF NEW.state = 'released'
      AND (SELECT count(*) FROM signatures WHERE sheet_id = NEW.id AND sign_round = NEW.sign_round) < 3 THEN
      RAISE EXCEPTION 'A sheet is released with three signatures under it.' USING ERRCODE = 'SP002';
    END IF;
    IF NOT (
      (OLD.state = 'planned' AND NEW.state = 'on-the-stand')
      OR (NEW.state = 'on-the-stand' AND NEW.sign_round = OLD.sign_round + 1)
      OR EXISTS (SELECT FROM signatures WHERE sheet_id = NEW.id AND sign_round = NEW.sign_round
        AND (OLD.state, meaning, NEW.state) IN (('on-the-stand', 'built', 'countersigning'),
          ('countersigning', 'countersigned', 'signed-off'), ('signed-off', 'released', 'released')))
    ) THEN
      RAISE EXCEPTION 'A sheet moves on with the signature for it, or back to the stand.' USING ERRCODE = 'SP002';
    END IF;
    RETURN NEW;
  END $$;
  CREATE TRIGGER release BEFORE UPDATE ON sheets FOR EACH ROW
    WHEN (NEW.state <> OLD.state) EXECUTE FUNCTION guard_release();
  CREATE FUNCTION guard_new_sheet() RETURNS trigger LANGUAGE plpgsql AS $$
  BEGIN
    RAISE EXCEPTION 'A sheet begins planned.' USING ERRCODE = 'SP002';
  END $$;
  CREATE TRIGGER begins_planned BEFORE INSERT ON sheets FOR EACH ROW
    WHEN (NEW.state <> 'planned') EXECUTE FUNCTION guard_new_sheet();`;

/** The first line follows sixty-four noughts. */
const guardLedger = `
  CREATE FUNCTION guard_ledger() RETURNS trigger LANGUAGE plpgsql AS $$
  DECLARE last_seq int; last_hash text;
  BEGIN
    SELECT seq, hash INTO last_seq, last_hash FROM ledger_lines
      WHERE sheet_id = NEW.sheet_id ORDER BY seq DESC LIMIT 1;
    IF NEW.seq <> coalesce(last_seq, 0) + 1 OR NEW.prev_hash <> coalesce(last_hash, repeat('0', 64)) THEN
      RAISE EXCEPTION 'A ledger line follows the last one.' USING ERRCODE = 'SP002';
    END IF;
    RETURN NEW;
  END $$;
  CREATE TRIGGER c_guard BEFORE INSERT ON ledger_lines FOR EACH ROW EXECUTE FUNCTION guard_ledger();`;
