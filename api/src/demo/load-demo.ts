import type { Services } from '../services.js';
import { DemoClock } from './demo-clock.js';
import { readDemo } from './demo-file.js';
import { seedDemo, type SeededShop } from './seed-demo.js';
import { seedDemoSheets } from './seed-demo-sheets.js';
import { seedKeptWorkings } from './seed-kept-workings.js';

/**
 * Loads the whole demo into an empty database: people and books first, then their sheets, played as if it had been
 * worked on them in the weeks before `today`.
 * @param servicesBy makes the services with a clock of ours
 */
export async function loadWholeDemo(
  servicesBy: (now: () => Date) => Services,
  today = new Date(),
): Promise<SeededShop[]> {
  const clock = new DemoClock();
  const services = servicesBy(clock.now);
  const { shops, sightings } = await readDemo();
  const seeded = await seedDemo(services, today);
  for (const shop of shops) {
    const ofShop = seeded.find(({ key }) => key === shop.key);
    if (!ofShop) continue;
    await seedDemoSheets(services, { shop, seeded: ofShop, sightings }, clock, today);
    await seedKeptWorkings(services, { shop, seeded: ofShop }, clock, today);
  }
  return seeded;
}
