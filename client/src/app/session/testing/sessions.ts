import type { Dialect, Role, Session } from '@second-spanner/shared/contracts/people';

/** A session of the demo shop, for tests. */
export function sessionOf(role: Role, dialect: Dialect | null = null): Session {
  return {
    person: { id: 'a-person', name: 'Tomasz Brandt', email: 'tomasz@lowmill.example', role, dialect },
    shop: { id: 'a-shop', name: 'Low Mill Motor Works', dialect: 'british', demo: true },
  };
}
