import type { MigrationInterface, QueryRunner } from 'typeorm';

/**
 * Assembly sheets and their steps. What a list of steps shows stands in columns of its own, so that reading
 * a long sheet leaves the definitions alone; what is counted of a step's records stands beside it.
 */
export class Sheets1764547200004 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    await runner.query(sheets);
    await runner.query(steps);
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP TABLE steps, sheets');
  }
}

const sheets = `
  CREATE TABLE sheets (
    id uuid PRIMARY KEY,
    shop_id uuid NOT NULL REFERENCES shops (id),
    code text NOT NULL CHECK (code <> ''),
    state text NOT NULL DEFAULT 'planned'
      CHECK (state IN ('planned', 'on-the-stand', 'countersigning', 'signed-off', 'released')),
    version int NOT NULL DEFAULT 1 CHECK (version > 0),
    sign_round int NOT NULL DEFAULT 1 CHECK (sign_round > 0),
    car_id uuid NOT NULL,
    spec_edition_id uuid NOT NULL,
    builder_id uuid NOT NULL,
    countersigner_id uuid NOT NULL,
    created_by uuid NOT NULL,
    created_at timestamptz NOT NULL DEFAULT now(),
    changed_at timestamptz NOT NULL DEFAULT now(),
    steps_done int NOT NULL DEFAULT 0 CHECK (steps_done BETWEEN 0 AND steps_total),
    steps_total int NOT NULL DEFAULT 0,
    open_snags int NOT NULL DEFAULT 0 CHECK (open_snags >= 0),
    next_step text,
    content_hash text CHECK (content_hash ~ '^[0-9a-f]{64}$'),
    verification_code text,
    frozen jsonb,
    released_at timestamptz,
    UNIQUE (shop_id, code),
    UNIQUE (shop_id, id),
    UNIQUE (verification_code),
    CHECK (builder_id <> countersigner_id),
    CHECK ((state = 'released') = (frozen IS NOT NULL)),
    CHECK ((state = 'released') = (released_at IS NOT NULL)),
    CHECK (state <> 'released' OR (content_hash IS NOT NULL AND verification_code IS NOT NULL)),
    FOREIGN KEY (shop_id, car_id) REFERENCES cars (shop_id, id),
    FOREIGN KEY (shop_id, spec_edition_id) REFERENCES spec_editions (shop_id, id),
    FOREIGN KEY (shop_id, builder_id) REFERENCES people (shop_id, id),
    FOREIGN KEY (shop_id, countersigner_id) REFERENCES people (shop_id, id),
    FOREIGN KEY (shop_id, created_by) REFERENCES people (shop_id, id)
  );
  CREATE INDEX sheets_by_change ON sheets (shop_id, changed_at DESC, id);
  CREATE INDEX sheets_by_state ON sheets (shop_id, state, changed_at DESC, id);
  CREATE INDEX sheets_of_car ON sheets (shop_id, car_id, changed_at DESC);
  CREATE INDEX sheets_running ON sheets (shop_id, changed_at DESC) WHERE state <> 'released';`;

const steps = `
  CREATE TABLE steps (
    id uuid PRIMARY KEY,
    shop_id uuid NOT NULL,
    sheet_id uuid NOT NULL,
    position int NOT NULL CHECK (position > 0),
    code text NOT NULL CHECK (code <> ''),
    stage int NOT NULL CHECK (stage > 0),
    kind text NOT NULL
      CHECK (kind IN ('check', 'measurement', 'tightening', 'wiring', 'valve-timing', 'photo')),
    title text NOT NULL,
    hold boolean NOT NULL,
    critical boolean NOT NULL,
    second_check text CHECK (second_check IN
      ('measured-again', 'strip-read-again', 'read-again', 'setting-and-pull-witnessed', 'inspected')),
    rests_on text[] NOT NULL,
    definition jsonb NOT NULL,
    uncritical_reason text CHECK (uncritical_reason <> ''),
    round int NOT NULL DEFAULT 1 CHECK (round > 0),
    entries_from_round int NOT NULL DEFAULT 1 CHECK (entries_from_round BETWEEN 1 AND round),
    done int NOT NULL DEFAULT 0 CHECK (done >= 0),
    of_total int NOT NULL CHECK (of_total >= 0),
    verdict text CHECK (verdict IN ('pass', 'fail', 'doubtful', 'not-judged')),
    recorder_ids uuid[] NOT NULL DEFAULT '{}',
    countersigned boolean NOT NULL DEFAULT false,
    open_snags int NOT NULL DEFAULT 0 CHECK (open_snags >= 0),
    awaiting text CHECK (awaiting IN ('second-check', 'snag')),
    awaiting_since timestamptz,
    UNIQUE (sheet_id, code),
    UNIQUE (sheet_id, position),
    CHECK (NOT critical OR second_check IS NOT NULL),
    CHECK ((awaiting IS NULL) = (awaiting_since IS NULL)),
    FOREIGN KEY (shop_id, sheet_id) REFERENCES sheets (shop_id, id)
  );
  CREATE INDEX steps_awaiting ON steps (shop_id, awaiting, awaiting_since) WHERE awaiting IS NOT NULL;`;
