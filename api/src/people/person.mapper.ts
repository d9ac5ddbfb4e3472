import type { PersonName } from '@second-spanner/shared/contracts/people';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import type { PersonEntity } from './person.entity.js';
import type { SessionRow } from './session.entity.js';

export const toPersonName = ({ id, name, role }: Pick<PersonEntity, 'id' | 'name' | 'role'>): PersonName => ({
  id,
  name,
  role,
});

export function toSignedIn(row: SessionRow, shopId: string): SignedIn {
  const { sessionId, id, name, email, role, dialect, shopName, shopDialect, shopDemo } = row;
  return {
    sessionId,
    person: { id, name, email, role, dialect },
    shop: { id: shopId, name: shopName, dialect: shopDialect, demo: shopDemo },
  };
}
