import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Shops, their people, and the families of renewal tokens. */
export class People1764547200001 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE FUNCTION current_shop() RETURNS uuid LANGUAGE sql STABLE PARALLEL SAFE
        RETURN nullif(current_setting('second_spanner.shop', true), '')::uuid;

      CREATE TABLE shops (
        id uuid PRIMARY KEY,
        name text NOT NULL CHECK (name <> ''),
        dialect text NOT NULL CHECK (dialect IN ('british', 'american')),
        demo boolean NOT NULL DEFAULT false,
        created_at timestamptz NOT NULL DEFAULT now()
      );

      CREATE TABLE people (
        id uuid PRIMARY KEY,
        shop_id uuid NOT NULL REFERENCES shops (id),
        name text NOT NULL CHECK (name <> ''),
        email text NOT NULL CHECK (email = lower(email)),
        role text NOT NULL CHECK (role IN ('foreman', 'builder', 'countersigner', 'car-owner')),
        dialect text CHECK (dialect IN ('british', 'american')),
        password_hash text NOT NULL,
        locked_at timestamptz,
        created_at timestamptz NOT NULL DEFAULT now(),
        UNIQUE (email),
        UNIQUE (shop_id, id)
      );

      CREATE TABLE sessions (
        id uuid PRIMARY KEY,
        shop_id uuid NOT NULL,
        person_id uuid NOT NULL,
        token_hash text NOT NULL,
        created_at timestamptz NOT NULL DEFAULT now(),
        renewed_at timestamptz NOT NULL DEFAULT now(),
        expires_at timestamptz NOT NULL,
        ended_at timestamptz,
        end_reason text CHECK (end_reason IN ('signed-out', 'token-reused')),
        CHECK ((ended_at IS NULL) = (end_reason IS NULL)),
        FOREIGN KEY (shop_id, person_id) REFERENCES people (shop_id, id)
      );
      CREATE INDEX sessions_of_person ON sessions (shop_id, person_id) WHERE ended_at IS NULL;
    `);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE sessions, people, shops; DROP FUNCTION current_shop()');
  }
}
