import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Workings kept with a car. What is kept is a record: it is never changed or taken away. */
export class KeptWorkings1796083200012 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE FUNCTION names_in(object jsonb) RETURNS int LANGUAGE sql IMMUTABLE AS
        'SELECT count(*)::int FROM jsonb_object_keys(object)';

      CREATE TABLE kept_workings (
        id uuid PRIMARY KEY,
        shop_id uuid NOT NULL,
        car_id uuid NOT NULL,
        working text NOT NULL CHECK (working ~ '^[a-z0-9-]{1,60}$'),
        title text NOT NULL CHECK (title <> '' AND char_length(title) <= 200),
        typed jsonb NOT NULL,
        kept_by uuid NOT NULL,
        kept_at timestamptz NOT NULL DEFAULT now(),
        FOREIGN KEY (shop_id, car_id) REFERENCES cars (shop_id, id),
        FOREIGN KEY (shop_id, kept_by) REFERENCES people (shop_id, id),
        CONSTRAINT typed_is_a_case CHECK (jsonb_typeof(typed) = 'object'),
        CONSTRAINT typed_names CHECK (CASE WHEN jsonb_typeof(typed) = 'object' THEN names_in(typed) <= 100 END),
        -- As text the database puts spaces between, so that a little more stands here than 20 kB.
        CONSTRAINT typed_size CHECK (octet_length(typed::text) <= 20480)
      );
      CREATE INDEX kept_workings_of_car ON kept_workings (shop_id, car_id, kept_at DESC, id DESC);

      CREATE TRIGGER append_only BEFORE UPDATE OR DELETE ON kept_workings
        FOR EACH ROW EXECUTE FUNCTION refuse_change();
      CREATE TRIGGER no_truncate BEFORE TRUNCATE ON kept_workings
        FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();

      ALTER TABLE kept_workings ENABLE ROW LEVEL SECURITY;
      ALTER TABLE kept_workings FORCE ROW LEVEL SECURITY;
      CREATE POLICY own_shop ON kept_workings USING (shop_id = current_shop());
    `);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE kept_workings; DROP FUNCTION names_in');
  }
}
