import type { MigrationInterface, QueryRunner } from 'typeorm';

/**
 * What a sheet needs besides its steps: the stages that it was laid out with; which entry a snag is about; and
 * countersigning after a dispute that the foreman accepted as it is.
 */
export class SheetContent1764547200010 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      ALTER TABLE sheets ADD COLUMN stages jsonb NOT NULL DEFAULT '[]';
      CREATE TRIGGER stages_stay BEFORE UPDATE ON sheets FOR EACH ROW
        WHEN (NEW.stages IS DISTINCT FROM OLD.stages) EXECUTE FUNCTION refuse_change();

      ALTER TABLE snags ADD COLUMN entry_id uuid REFERENCES entries (id);

      ALTER TABLE countersignatures DROP CONSTRAINT countersignatures_step_id_round_key;
      ALTER TABLE countersignatures ADD UNIQUE (step_id, round, person_id, outcome);
      CREATE UNIQUE INDEX one_agreement ON countersignatures (step_id, round) WHERE outcome = 'agree';
    `);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query(`
      DROP INDEX one_agreement;
      ALTER TABLE countersignatures DROP CONSTRAINT countersignatures_step_id_round_person_id_outcome_key;
      ALTER TABLE countersignatures ADD UNIQUE (step_id, round);
      ALTER TABLE snags DROP COLUMN entry_id;
      DROP TRIGGER stages_stay ON sheets;
      ALTER TABLE sheets DROP COLUMN stages;
    `);
  }
}
