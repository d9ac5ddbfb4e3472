import type { SignedIn } from '../platform/signing-in/signed-in.js';
import type { DemoShop } from './demo-file.js';
import type { SeededShop } from './seed-demo.js';

/** A person of the demo as they would be signed in. */
export function demoPerson(shop: DemoShop, seeded: SeededShop, key: string): SignedIn {
  const found = shop.people.find((each) => each.key === key);
  if (!found) throw new Error(`The demo names ${key}, who is not in its shop.`);
  const { name, email, role } = found;
  return {
    sessionId: '',
    person: { id: demoId(seeded.people, key), name, email, role, dialect: null },
    shop: { id: seeded.id, name: shop.name, dialect: shop.dialect, demo: true },
  };
}

/** The id of what the demo names by a key or a code. */
export function demoId(ids: ReadonlyMap<string, string>, key: string): string {
  const id = ids.get(key);
  if (id === undefined) throw new Error(`The demo names ${key}, which is not in its shop.`);
  return id;
}
