import type { Services } from '../services.js';
import { workingTime, type DemoClock } from './demo-clock.js';
import type { DemoShop } from './demo-file.js';
import { demoId, demoPerson } from './demo-person.js';
import type { SeededShop } from './seed-demo.js';

/** Keeps the workings of a demo shop through the service that people use, dated by `clock`. */
export async function seedKeptWorkings(
  { keptWorkings }: Services,
  { shop, seeded }: { readonly shop: DemoShop; readonly seeded: SeededShop },
  clock: DemoClock,
  today: Date,
): Promise<void> {
  for (const { car, by, daysAgo, ...working } of shop.keptWorkings) {
    await clock.tell(workingTime(today, daysAgo, daysAgo, 0), () =>
      keptWorkings.keep(demoPerson(shop, seeded, by), demoId(seeded.cars, car), working),
    );
  }
}
