import type { Role } from './people.js';

/**
 * What each role may do. The api refuses what is not here; the client does not offer it.
 * A car owner reads only their own cars and those cars' sheets.
 */
export const permissions = {
  calculate: ['foreman', 'builder', 'countersigner', 'car-owner'],
  'cars.read': ['foreman', 'builder', 'countersigner', 'car-owner'],
  'specs.read': ['foreman', 'builder', 'countersigner'],
  'tools.read': ['foreman', 'builder', 'countersigner'],
  'sheets.read': ['foreman', 'builder', 'countersigner', 'car-owner'],
  'sheets.start': ['foreman', 'builder'],
  'sheets.unmark-critical': ['foreman'],
  'entries.record': ['foreman', 'builder'],
  'second-checks.make': ['foreman', 'builder', 'countersigner'],
  'snags.raise': ['foreman', 'builder', 'countersigner'],
  'snags.settle': ['foreman', 'builder'],
  'snags.accept': ['foreman'],
  'sheets.sign-built': ['builder', 'foreman'],
  'sheets.sign-countersigned': ['countersigner', 'builder', 'foreman'],
  'sheets.send-back': ['foreman', 'countersigner'],
  'sheets.release': ['foreman'],
  'build-sheets.read': ['foreman', 'builder', 'countersigner', 'car-owner'],
  'files.read': ['foreman', 'builder', 'countersigner', 'car-owner'],
  'files.write': ['foreman', 'builder', 'countersigner'],
  'workings.keep': ['foreman', 'builder', 'countersigner'],
} as const satisfies Record<string, readonly Role[]>;

export type Permission = keyof typeof permissions;

/** Whether a role may do something at all; whose thing it is, the api asks besides. */
export function may(role: Role, permission: Permission): boolean {
  return (permissions[permission] as readonly Role[]).includes(role);
}
