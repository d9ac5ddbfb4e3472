import type { PersonName, Role } from '@second-spanner/shared/contracts/people';
import type { ShopScope } from '../platform/database/database.js';

export type Callable = PersonName & { readonly email: string };

/** Who may be called to steps. */
export class CallsRepository {
  constructor(private readonly scope: ShopScope) {}

  /** The people named, and everybody of a role; nobody who is locked out. */
  async people(ids: readonly string[], role: Role): Promise<Callable[]> {
    return this.scope.manager.query(
      `SELECT id, name, role, email FROM people
       WHERE shop_id = $1 AND (id = ANY ($2) OR role = $3) AND locked_at IS NULL ORDER BY name, id`,
      [this.scope.shopId, ids, role],
    );
  }
}
