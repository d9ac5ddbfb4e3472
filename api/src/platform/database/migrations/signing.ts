import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Signatures under a sheet, and its ledger: one line for everything that happened, each bound to the one before. */
export class Signing1764547200006 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE signatures (
        id uuid PRIMARY KEY,
        shop_id uuid NOT NULL,
        sheet_id uuid NOT NULL,
        sign_round int NOT NULL CHECK (sign_round > 0),
        meaning text NOT NULL CHECK (meaning IN ('built', 'countersigned', 'released')),
        person_id uuid NOT NULL,
        at timestamptz NOT NULL,
        content_hash text NOT NULL CHECK (content_hash ~ '^[0-9a-f]{64}$'),
        binding text NOT NULL CHECK (binding ~ '^[0-9a-f]{64}$'),
        UNIQUE (sheet_id, sign_round, meaning),
        FOREIGN KEY (shop_id, sheet_id) REFERENCES sheets (shop_id, id),
        FOREIGN KEY (shop_id, person_id) REFERENCES people (shop_id, id)
      );

      CREATE TABLE ledger_lines (
        sheet_id uuid NOT NULL,
        seq int NOT NULL CHECK (seq > 0),
        shop_id uuid NOT NULL,
        prev_hash text NOT NULL CHECK (prev_hash ~ '^[0-9a-f]{64}$'),
        hash text NOT NULL CHECK (hash ~ '^[0-9a-f]{64}$'),
        body text NOT NULL,
        at timestamptz NOT NULL,
        PRIMARY KEY (sheet_id, seq),
        FOREIGN KEY (shop_id, sheet_id) REFERENCES sheets (shop_id, id)
      );
    `);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE ledger_lines, signatures');
  }
}
