import type { MigrationInterface, QueryRunner } from 'typeorm';

/** What people record on a step. Nothing here is ever changed or taken away: see the guards. */
export class Records1764547200005 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(entries);
    await runner.query(secondChecks);
    await runner.query(snags);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query(
      'DROP TABLE calls, snag_settlements, snags, countersignatures, second_readings, entries',
    );
  }
}

const ofStep = `
  id uuid PRIMARY KEY,
  shop_id uuid NOT NULL,
  sheet_id uuid NOT NULL,
  step_id uuid NOT NULL REFERENCES steps (id),
  FOREIGN KEY (shop_id, sheet_id) REFERENCES sheets (shop_id, id)`;

/** The same key never records twice; another body under the same key is told by its hash. */
const onceOnly = `
  idempotency_key uuid NOT NULL,
  body_hash text NOT NULL CHECK (body_hash ~ '^[0-9a-f]{64}$'),
  UNIQUE (shop_id, idempotency_key)`;

const person = (column: string): string => `
  ${column} uuid NOT NULL,
  FOREIGN KEY (shop_id, ${column}) REFERENCES people (shop_id, id)`;

const entries = `
  CREATE TABLE entries (
    ${ofStep},
    round int NOT NULL CHECK (round > 0),
    content jsonb NOT NULL,
    si_value double precision,
    verdict text NOT NULL CHECK (verdict IN ('pass', 'fail', 'doubtful', 'not-judged')),
    reason text NOT NULL,
    replaces uuid UNIQUE REFERENCES entries (id),
    replace_reason text CHECK (replace_reason <> ''),
    recorded_at timestamptz NOT NULL DEFAULT now(),
    ${person('recorded_by')},
    ${onceOnly},
    CHECK ((replaces IS NULL) = (replace_reason IS NULL))
  );
  CREATE INDEX entries_of_step ON entries (step_id, recorded_at);
  CREATE INDEX entries_of_sheet ON entries (sheet_id);`;

const secondChecks = `
  CREATE TABLE second_readings (
    ${ofStep},
    round int NOT NULL CHECK (round > 0),
    content jsonb NOT NULL,
    agreement jsonb NOT NULL,
    at timestamptz NOT NULL DEFAULT now(),
    ${person('person_id')},
    ${onceOnly},
    UNIQUE (step_id, round, person_id)
  );
  CREATE INDEX second_readings_of_sheet ON second_readings (sheet_id);

  CREATE TABLE countersignatures (
    ${ofStep},
    round int NOT NULL CHECK (round > 0),
    outcome text NOT NULL CHECK (outcome IN ('agree', 'dispute')),
    reason text CHECK (reason <> ''),
    pulls_witnessed text[] NOT NULL DEFAULT '{}',
    at timestamptz NOT NULL DEFAULT now(),
    ${person('person_id')},
    ${onceOnly},
    UNIQUE (step_id, round),
    CHECK (outcome = 'agree' OR reason IS NOT NULL)
  );
  CREATE INDEX countersignatures_of_sheet ON countersignatures (sheet_id);`;

const snags = `
  CREATE TABLE snags (
    ${ofStep},
    round int NOT NULL CHECK (round > 0),
    cause text NOT NULL CHECK (cause IN ('failed', 'disagreement', 'raised')),
    words text NOT NULL CHECK (words <> ''),
    parties uuid[] NOT NULL DEFAULT '{}',
    raised_at timestamptz NOT NULL DEFAULT now(),
    ${person('raised_by')},
    UNIQUE (sheet_id, id),
    CHECK (cause <> 'disagreement' OR cardinality(parties) >= 2)
  );
  CREATE INDEX snags_of_step ON snags (step_id);

  CREATE TABLE snag_settlements (
    ${ofStep},
    snag_id uuid NOT NULL UNIQUE,
    how text NOT NULL CHECK (how IN ('redone', 'replaced', 'accepted-as-it-is')),
    reason text NOT NULL CHECK (reason <> ''),
    settled_at timestamptz NOT NULL DEFAULT now(),
    ${person('settled_by')},
    FOREIGN KEY (sheet_id, snag_id) REFERENCES snags (sheet_id, id)
  );
  CREATE INDEX snag_settlements_of_sheet ON snag_settlements (sheet_id);

  CREATE TABLE calls (
    ${ofStep},
    called_at timestamptz NOT NULL DEFAULT now(),
    ${person('called_by')},
    ${person('to_id')}
  );
  CREATE INDEX calls_of_step ON calls (step_id);`;
