import type { Settlement } from '@second-spanner/shared/contracts/sheets';

export const settlementWords: Record<Settlement, string> = {
  redone: 'redone',
  replaced: 'part replaced',
  'accepted-as-it-is': 'accepted as it is',
};
