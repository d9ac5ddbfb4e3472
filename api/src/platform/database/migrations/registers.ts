import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Cars, tools and stored photos. */
export class Registers1764547200002 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE cars (
        id uuid PRIMARY KEY,
        shop_id uuid NOT NULL REFERENCES shops (id),
        code text NOT NULL CHECK (code <> ''),
        name text NOT NULL CHECK (name <> ''),
        year int NOT NULL CHECK (year BETWEEN 1880 AND 2100),
        engine_code text NOT NULL,
        engine_number text NOT NULL,
        chassis_number text NOT NULL,
        registration text,
        colour text,
        notes text NOT NULL DEFAULT '',
        owner_id uuid,
        owner_name text,
        created_at timestamptz NOT NULL DEFAULT now(),
        UNIQUE (shop_id, code),
        UNIQUE (shop_id, id),
        FOREIGN KEY (shop_id, owner_id) REFERENCES people (shop_id, id)
      );
      CREATE INDEX cars_of_owner ON cars (shop_id, owner_id) WHERE owner_id IS NOT NULL;

      CREATE TABLE tools (
        id uuid PRIMARY KEY,
        shop_id uuid NOT NULL REFERENCES shops (id),
        code text NOT NULL CHECK (code <> ''),
        name text NOT NULL CHECK (name <> ''),
        kind text NOT NULL,
        low jsonb NOT NULL,
        high jsonb NOT NULL,
        resolution jsonb NOT NULL,
        uncertainty jsonb,
        uncertainty_share double precision CHECK (uncertainty_share > 0),
        length jsonb,
        calibration_due date NOT NULL,
        UNIQUE (shop_id, code),
        UNIQUE (shop_id, id),
        CHECK ((uncertainty IS NULL) <> (uncertainty_share IS NULL))
      );

      CREATE TABLE files (
        id uuid PRIMARY KEY,
        shop_id uuid NOT NULL REFERENCES shops (id),
        media_type text NOT NULL,
        width int NOT NULL CHECK (width > 0),
        height int NOT NULL CHECK (height > 0),
        bytes int NOT NULL CHECK (bytes > 0),
        sha256 text NOT NULL CHECK (sha256 ~ '^[0-9a-f]{64}$'),
        uploaded_by uuid NOT NULL,
        uploaded_at timestamptz NOT NULL DEFAULT now(),
        UNIQUE (shop_id, id),
        FOREIGN KEY (shop_id, uploaded_by) REFERENCES people (shop_id, id)
      );
    `);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE files, tools, cars');
  }
}
