import type { ShopScope } from '../platform/database/database.js';
import type { FrozenSignature } from './frozen-sheet.js';

/** The signatures under one shop's sheets. */
export class SignaturesRepository {
  constructor(private readonly scope: ShopScope) {}

  async insert(id: string, sheetId: string, signRound: number, signature: FrozenSignature): Promise<void> {
    const { meaning, person, at, contentHash, binding } = signature;
    await this.scope.manager.query(
      `INSERT INTO signatures (id, shop_id, sheet_id, sign_round, meaning, person_id, at, content_hash, binding)
       VALUES ($1, $2, $3, $4, $5, $6, $7, $8, $9)`,
      [id, this.scope.shopId, sheetId, signRound, meaning, person.id, at, contentHash, binding],
    );
  }

  /** Whether a verification code is taken, by a sheet of whichever shop. */
  async isTaken(code: string): Promise<boolean> {
    const { manager } = this.scope;
    await manager.query(`SELECT set_config('second_spanner.verification', $1, true)`, [code]);
    const rows: unknown[] = await manager.query('SELECT 1 FROM sheets WHERE verification_code = $1', [code]);
    await manager.query(`SELECT set_config('second_spanner.verification', '', true)`);
    return rows.length > 0;
  }
}
