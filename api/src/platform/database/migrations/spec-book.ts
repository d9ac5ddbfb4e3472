import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Engine specs and their numbered editions, each kept whole with its hash. */
export class SpecBook1764547200003 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE specs (
        id uuid PRIMARY KEY,
        shop_id uuid NOT NULL REFERENCES shops (id),
        code text NOT NULL CHECK (code <> ''),
        title text NOT NULL CHECK (title <> ''),
        created_at timestamptz NOT NULL DEFAULT now(),
        UNIQUE (shop_id, code),
        UNIQUE (shop_id, id)
      );

      CREATE TABLE spec_editions (
        id uuid PRIMARY KEY,
        shop_id uuid NOT NULL,
        spec_id uuid NOT NULL,
        edition int NOT NULL CHECK (edition > 0),
        state text NOT NULL CHECK (state IN ('draft', 'approved', 'superseded')),
        document jsonb NOT NULL,
        hash text NOT NULL CHECK (hash ~ '^[0-9a-f]{64}$'),
        value_count int NOT NULL CHECK (value_count >= 0),
        rests_on text NOT NULL,
        approved_by uuid,
        approved_at timestamptz,
        created_at timestamptz NOT NULL DEFAULT now(),
        UNIQUE (spec_id, edition),
        UNIQUE (shop_id, id),
        CHECK ((approved_at IS NULL) = (approved_by IS NULL)),
        CHECK ((state = 'draft') = (approved_at IS NULL)),
        FOREIGN KEY (shop_id, spec_id) REFERENCES specs (shop_id, id),
        FOREIGN KEY (shop_id, approved_by) REFERENCES people (shop_id, id)
      );
      CREATE UNIQUE INDEX one_approved_edition ON spec_editions (spec_id) WHERE state = 'approved';
    `);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE spec_editions, specs');
  }
}
