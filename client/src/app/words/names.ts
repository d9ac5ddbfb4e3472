import type { Role } from '@second-spanner/shared/contracts/people';
import type { SheetState } from '@second-spanner/shared/contracts/sheets';

export const roleNames: Readonly<Record<Role, string>> = {
  foreman: 'foreman',
  builder: 'builder',
  countersigner: 'countersigner',
  'car-owner': 'car owner',
};

export const stateNames: Readonly<Record<SheetState, string>> = {
  planned: 'planned',
  'on-the-stand': 'on the stand',
  countersigning: 'countersigning',
  'signed-off': 'signed off',
  released: 'released',
};
