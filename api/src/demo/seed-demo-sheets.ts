import type { Tool } from '@second-spanner/shared/contracts/registers';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import type { Services } from '../services.js';
import { workingTime, type DemoClock } from './demo-clock.js';
import type { DemoShop } from './demo-file.js';
import { demoPictures } from './demo-photos.js';
import type { DemoSheet, DemoSightings } from './demo-sheet-file.js';
import { DemoTools } from './demo-tools.js';
import { demoId, demoPerson } from './demo-person.js';
import { playSheet } from './play-sheet.js';
import type { Play } from './play-step.js';
import type { SeededShop } from './seed-demo.js';

export interface ShopToPlay {
  readonly shop: DemoShop;
  readonly seeded: SeededShop;
  readonly sightings: DemoSightings;
}

/**
 * Plays the sheets of a demo shop through the same services that people use, by the right people, dated by `clock`;
 * `services` must be made with that clock.
 */
export async function seedDemoSheets(
  services: Services,
  { shop, seeded, sightings }: ShopToPlay,
  clock: DemoClock,
  today: Date,
): Promise<void> {
  const person = (key: string): SignedIn => demoPerson(shop, seeded, key);
  const tellOne = async (sheet: DemoSheet): Promise<void> => {
    const builder = person(sheet.builder);
    const photos = await photosOf(services, builder, sheet);
    const tools: Tool[] = await services.tools.list(builder);
    const play: Play = {
      services: services.sheets,
      sheetId: await layOut(services, sheet, seeded, builder),
      ...{ builder, person, sightings, second: person(sheet.countersigner) },
      tools: new DemoTools(tools, shop),
      photo: (index) => photos[index % photos.length] ?? '',
    };
    await playSheet({ sheet, play, clock, today });
  };
  await Promise.all(
    shop.sheets.map((sheet) =>
      clock.tell(workingTime(today, sheet.begunDaysAgo, sheet.lastWorkedDaysAgo, 0), () => tellOne(sheet)),
    ),
  );
}

async function layOut(
  { sheets }: Services,
  sheet: DemoSheet,
  { cars, editions, people }: SeededShop,
  builder: SignedIn,
): Promise<string> {
  const request = {
    carId: demoId(cars, sheet.car),
    specEditionId: demoId(editions, `${sheet.spec}/${sheet.edition}`),
    builderId: demoId(people, sheet.builder),
    countersignerId: demoId(people, sheet.countersigner),
  };
  return sheets.layOut.layOut(builder, request, { code: sheet.code });
}

/** Photos are stored only for sheets that are worked. */
async function photosOf({ files }: Services, builder: SignedIn, { state }: DemoSheet): Promise<string[]> {
  if (state === 'planned') return [];
  const stored: string[] = [];
  for (const picture of await demoPictures()) stored.push((await files.add(builder, picture)).id);
  return stored;
}
