// @ts-check
// Sheets of bare measurements in the demo's shop, on the stand and with nothing recorded yet.
import { one } from './sheets.js';

/** @typedef {import('pg').Client} Client */

const mm = (/** @type {number} */ value) => ({ value, unit: 'mm' });

/** Well inside the limits, whatever the gauge's uncertainty. */
export const reading = mm(0.045);

/** @param {number} places */
export const placesOf = (places) => Array.from({ length: places }, (_, index) => `Place ${index + 1}`);

/** @param {number} places */
const definitionOf = (places) => ({
  ...{ stage: 1, kind: 'measurement', title: 'Main clearance', instruction: 'Read it.', restsOn: [] },
  ...{ method: 'bore-gauge', unit: 'mm', at: placesOf(places), critical: false, hold: false },
  limits: { low: mm(0.025), high: mm(0.065) },
});

const stages = JSON.stringify(
  Array.from({ length: 10 }, (_, index) => ({
    stage: index + 1,
    title: `Stage ${index + 1}`,
    hold: false,
    cautions: [],
  })),
);

/** A gauge of our own, so that the demo's may change. @param {Client} client @returns {Promise<string>} its id */
export const addGauge = async (client) => {
  const { id } = await one(
    client,
    `INSERT INTO tools (id, shop_id, code, name, kind, low, high, resolution, uncertainty, calibration_due)
     SELECT gen_random_uuid(), shop_id, 'B-01', 'Bore gauge', 'bore-gauge', $1, $2, $3, $3, '2999-12-31'
     FROM people WHERE email = 'tomasz@lowmill.example' RETURNING id`,
    [mm(0), mm(100), mm(0.001)],
  );
  return id;
};

const sheetsOfCar = 4;

/** One car for every few sheets; the demo's own when they are fewer still. @param {Client} client @param {{ prefix: string, from: number, to: number }} wanted @returns {Promise<string[]>} */
const addCars = async (client, { prefix, from, to }) => {
  const added = await client.query(
    `INSERT INTO cars (id, shop_id, code, name, year, engine_code, engine_number, chassis_number)
     SELECT gen_random_uuid(), c.shop_id, $1::text || n, c.name, c.year, c.engine_code, c.engine_number, c.chassis_number
     FROM sheets s JOIN cars c ON c.id = s.car_id, generate_series($2::int, $3::int) n
     WHERE s.code = 'LM-0147' AND n % ${sheetsOfCar} = 0 RETURNING id`,
    [prefix, from, to],
  );
  return added.rows.map(({ id }) => id);
};

/**
 * Adds sheets numbered from one number to another, Tomasz their builder.
 * @param {Client} client
 * @param {{ prefix: string, from: number, to: number, steps: number, places: number, state?: string }} wanted
 * `state` is SQL over the number `n`
 * @returns {Promise<string[]>} their ids
 */
export const addSheets = async (client, wanted) => {
  const { prefix, from, to, steps, places, state = "'on-the-stand'" } = wanted;
  const cars = await addCars(client, wanted);
  const added = await client.query(
    `INSERT INTO sheets (id, shop_id, code, state, car_id, spec_edition_id, builder_id, countersigner_id, created_by,
       steps_total, next_step, stages, changed_at, content_hash, verification_code, frozen, released_at)
     SELECT gen_random_uuid(), s.shop_id, $1::text || n, new.state,
       coalesce(($6::uuid[])[1 + n % ${Math.max(1, cars.length)}], s.car_id), s.spec_edition_id, s.builder_id, s.countersigner_id,
       s.builder_id, $4, '1.1', $5, now() - n * interval '1 hour',
       CASE new.state WHEN 'released' THEN repeat('0', 64) END,
       CASE new.state WHEN 'released' THEN $1::text || n END,
       CASE new.state WHEN 'released' THEN '{}'::jsonb END,
       CASE new.state WHEN 'released' THEN now() END
     FROM sheets s, generate_series($2::int, $3::int) n, LATERAL (SELECT ${state} AS state) new
     WHERE s.code = 'LM-0147' RETURNING id`,
    [prefix, from, to, steps, stages, cars],
  );
  const ids = added.rows.map(({ id }) => id);
  await client.query(
    `INSERT INTO steps (id, shop_id, sheet_id, position, code, stage, kind, title, hold, critical, rests_on, definition, of_total)
     SELECT gen_random_uuid(), s.shop_id, s.id, n, b.code, a.stage, 'measurement', 'Main clearance', false, false, '{}',
       $3::jsonb || jsonb_build_object('code', b.code, 'stage', a.stage), $4
     FROM sheets s, generate_series(1, $2::int) n,
       LATERAL (SELECT 1 + (n - 1) * 10 / $2::int AS stage) a,
       LATERAL (SELECT a.stage || '.' || n AS code) b
     WHERE s.id = ANY ($1)`,
    [ids, steps, JSON.stringify(definitionOf(places)), places],
  );
  return ids;
};
