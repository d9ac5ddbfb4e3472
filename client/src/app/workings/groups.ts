import { workings, type WorkingEntry } from '@second-spanner/shared/workings/registry';
import { workingGroups, type WorkingGroup } from '@second-spanner/shared/workings/working';

/** Trade-word tokens allowed. */
export const groupNames: Readonly<Record<WorkingGroup, string>> = {
  wiring: 'Wiring and ignition',
  'valve-timing': 'Valve timing',
  tightening: 'Tightening',
  'fits-and-keys': 'Fits and keys',
  'belt-drive': 'Belt drive',
  measuring: 'Measuring',
  curing: 'Curing',
  convert: 'Units',
};

export interface GroupOfWorkings {
  readonly key: WorkingGroup;
  readonly name: string;
  readonly workings: readonly WorkingEntry[];
}

/** The groups that have workings, each with its own in order. */
export const groups: readonly GroupOfWorkings[] = workingGroups
  .map((key) => ({ key, name: groupNames[key], workings: workings.filter(({ group }) => group === key) }))
  .filter((group) => group.workings.length > 0);

/** Where a working's page is. */
export const placeOf = ({ group, key }: Pick<WorkingEntry, 'group' | 'key'>): string =>
  `/workings/${group}/${key}`;
