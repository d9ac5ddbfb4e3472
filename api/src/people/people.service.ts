import { randomUUID } from 'node:crypto';
import type { Dialect, PersonName, Role, Session } from '@second-spanner/shared/contracts/people';
import type { Database } from '../platform/database/database.js';
import type { Holding } from '../platform/database/loading.js';
import { badInput } from '../platform/errors/http-problem.js';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import { passwordTrouble } from './password-rules.js';
import type { Passwords } from './passwords.js';
import { demoFlags, PeopleRepository } from './people.repository.js';
import { toPersonName } from './person.mapper.js';

export interface NewShop {
  readonly name: string;
  readonly dialect: Dialect;
  readonly demo: boolean;
}

export interface NewPerson {
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  readonly password: string;
}

const shopRoles: readonly Role[] = ['foreman', 'builder', 'countersigner'];

/** Shops and their people. */
export class PeopleService {
  constructor(
    private readonly database: Database,
    private readonly passwords: Passwords,
  ) {}

  /** The people of the shop. A car owner sees those who work there, not the other owners. */
  async list({ shop, person }: SignedIn): Promise<PersonName[]> {
    const only = person.role === 'car-owner' ? { roles: shopRoles, orId: person.id } : undefined;
    const people = await this.database.readShop(shop.id, (scope) => new PeopleRepository(scope).list(only));
    return people.map(toPersonName);
  }

  /** Changes the person's own trade words. */
  async setDialect({ shop, person }: SignedIn, dialect: Dialect | null): Promise<Session> {
    await this.database.withShop(shop.id, (scope) =>
      new PeopleRepository(scope).setDialect(person.id, dialect),
    );
    return { person: { ...person, dialect }, shop };
  }

  /** Whether this is the person's password: asked again before a signature. */
  async knowsPassword({ shop, person }: SignedIn, password: string): Promise<boolean> {
    const hash = await this.database.readShop(shop.id, (scope) =>
      new PeopleRepository(scope).passwordHash(person.id),
    );
    return this.passwords.match(password, hash);
  }

  /** Whether the database holds no shop, only the demo's, or others too. */
  async holding(): Promise<Holding> {
    const flags = await this.database.through('setup', 'yes', demoFlags);
    if (flags.length === 0) return 'nothing';
    return flags.every(Boolean) ? 'demo' : 'work';
  }

  /** Opens a shop and answers its id. */
  async openShop(shop: NewShop): Promise<string> {
    const id = randomUUID();
    await this.database.withShop(id, (scope) => new PeopleRepository(scope).insertShop(shop));
    return id;
  }

  /** Adds a person to a shop and answers their id. Throws a 400 problem when the password cannot be taken. */
  async add(shopId: string, { name, email, role, password }: NewPerson): Promise<string> {
    const trouble = passwordTrouble(password);
    if (trouble !== null) throw badInput({ field: 'password', message: trouble });
    const passwordHash = await this.passwords.hash(password);
    const person = { id: randomUUID(), name, email: email.toLowerCase(), role, passwordHash };
    await this.database.withShop(shopId, (scope) => new PeopleRepository(scope).insert(person));
    return person.id;
  }
}
