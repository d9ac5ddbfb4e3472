import type { Services } from '../services.js';
import { readDemo, readTestData, type DemoEdition, type DemoShop } from './demo-file.js';
import { differing } from './differing.js';

/** Ids of a shop's demo records, by the keys and codes of the demo's file; editions as `AT18/2`. */
export interface SeededShop {
  readonly key: string;
  readonly id: string;
  readonly people: ReadonlyMap<string, string>;
  readonly tools: ReadonlyMap<string, string>;
  readonly cars: ReadonlyMap<string, string>;
  readonly editions: ReadonlyMap<string, string>;
}

const day = 86_400_000;

/** Loads the demo's shops into an empty database. Times are counted from `today`, so that it never ages. */
export async function seedDemo(services: Services, today = new Date()): Promise<SeededShop[]> {
  const { password, shops } = await readDemo();
  const seeded: SeededShop[] = [];
  for (const shop of shops) seeded.push(await seedShop(services, shop, password, today));
  return seeded;
}

async function seedShop(
  services: Services,
  shop: DemoShop,
  password: string,
  today: Date,
): Promise<SeededShop> {
  const id = await services.people.openShop({ name: shop.name, dialect: shop.dialect, demo: true });
  const people = new Map<string, string>();
  for (const { key, ...person } of shop.people) {
    people.set(key, await services.people.add(id, { ...person, password }));
  }
  const tools = new Map<string, string>();
  for (const { calibrationDueInDays, ...tool } of shop.tools) {
    const calibrationDue = daysFrom(today, calibrationDueInDays).toISOString().slice(0, 10);
    tools.set(tool.code, await services.tools.add(id, { ...tool, calibrationDue }));
  }
  const cars = new Map<string, string>();
  for (const { owner, ...car } of shop.cars) {
    const ownerId = owner === null ? null : idOf(people, owner);
    cars.set(car.code, await services.cars.add(id, { ...car, ownerId }));
  }
  return {
    key: shop.key,
    id,
    people,
    tools,
    cars,
    editions: await seedSpecs(services, id, shop, people, today),
  };
}

async function seedSpecs(
  { specs }: Services,
  shopId: string,
  shop: DemoShop,
  people: ReadonlyMap<string, string>,
  today: Date,
): Promise<Map<string, string>> {
  const ids = new Map<string, string>();
  for (const { code, file, editions } of shop.specs) {
    const document = await readTestData(file);
    for (const edition of editions) {
      const id = await specs.add(shopId, {
        document: differing(document, edition.differs),
        restsOn: edition.restsOn,
        approval: approvalOf(edition, people, today),
      });
      ids.set(`${code}/${edition.edition}`, id);
    }
  }
  return ids;
}

function approvalOf(
  { approvedBy, approvedDaysAgo }: DemoEdition,
  people: ReadonlyMap<string, string>,
  today: Date,
): { by: string; at: Date } | null {
  if (approvedBy === null || approvedDaysAgo === null) return null;
  return { by: idOf(people, approvedBy), at: daysFrom(today, -approvedDaysAgo) };
}

const daysFrom = (date: Date, days: number): Date => new Date(date.getTime() + days * day);

function idOf(ids: ReadonlyMap<string, string>, key: string): string {
  const id = ids.get(key);
  if (id === undefined) throw new Error(`The demo names ${key}, who is not in its shop.`);
  return id;
}
