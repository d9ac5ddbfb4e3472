export const roles = ['foreman', 'builder', 'countersigner', 'car-owner'] as const;
export type Role = (typeof roles)[number];

export const dialects = ['british', 'american'] as const;
export type Dialect = (typeof dialects)[number];

export interface Person {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  /** The person's own trade words; null follows the shop. */
  readonly dialect: Dialect | null;
}

export interface Shop {
  readonly id: string;
  readonly name: string;
  readonly dialect: Dialect;
  /** Invented data, and said so on every page. */
  readonly demo: boolean;
}

export interface Session {
  readonly person: Person;
  readonly shop: Shop;
}

export interface SignInRequest {
  readonly email: string;
  readonly password: string;
}

export interface PreferencesRequest {
  readonly dialect: Dialect | null;
}

/** A person as others in the shop see them. */
export interface PersonName {
  readonly id: string;
  readonly name: string;
  readonly role: Role;
}
