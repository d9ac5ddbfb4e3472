import { afterAll, beforeAll, expect, it } from 'vitest';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import { DemoClock } from './demo-clock.js';
import { readDemo } from './demo-file.js';
import { seedDemo } from './seed-demo.js';
import { seedKeptWorkings } from './seed-kept-workings.js';

let app: TestApp;
beforeAll(async () => {
  app = await startTestApp();
});
afterAll(() => app.close());

it('the demo keeps its workings with their cars, by their people', async () => {
  const { shops } = await readDemo();
  const [shop] = shops;
  const today = new Date('2026-12-01T12:00:00Z');
  const [seeded] = await seedDemo(app.services, today);
  if (!shop || !seeded) throw new Error('The demo has no shop.');
  await seedKeptWorkings(app.services, { shop, seeded }, new DemoClock(), today);
  const rows = await app.db.sql(
    seeded.id,
    `SELECT car.code, keeper.name, kept.working FROM kept_workings kept
     JOIN cars car ON car.id = kept.car_id JOIN people keeper ON keeper.id = kept.kept_by
     ORDER BY kept.working`,
  );
  expect(rows).toEqual([
    { code: 'LM-C01', name: 'Tomasz Brandt', working: 'convert' },
    { code: 'LM-C01', name: 'Imogen Vale', working: 'wiring-map' },
  ]);
});
