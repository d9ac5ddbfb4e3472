import type { ShopScope } from '../database/database.js';

/** To be called inside the transaction that changed the sheet; everybody is told once it is committed. */
export function notifySheetChanged(scope: ShopScope, sheetId: string, version: number): void {
  scope.announce({ sheetId, version });
}
