import type { FastenerGroup, SpecDocument } from '../../contracts/spec.js';
import { InputError } from '../../contracts/input-error.js';
import { readThread } from '../../fastening/read-thread.js';
import type { WorkingCase } from '../working.js';
import { typed } from './figures.js';

interface NamedCase {
  readonly name: string;
  readonly typed: WorkingCase;
}

/** A case for every fastener group of a spec. */
export function casesOfGroups(
  document: SpecDocument,
  caseOf: (group: FastenerGroup) => WorkingCase,
): readonly NamedCase[] {
  return document.fastenerGroups.map((group) => ({ name: group.name, typed: caseOf(group) }));
}

/** The same for those groups whose thread is in the tables; a taper plug has none of them. */
export function casesByThread(
  document: SpecDocument,
  caseOf: (group: FastenerGroup) => WorkingCase,
): readonly NamedCase[] {
  const groups = document.fastenerGroups.filter(({ thread }) => isKnown(thread.value));
  return casesOfGroups({ ...document, fastenerGroups: groups }, caseOf);
}

function isKnown(thread: string): boolean {
  try {
    readThread(thread);
    return true;
  } catch (error) {
    if (error instanceof InputError) return false;
    throw error;
  }
}

/** The torque of a group and its tolerance, as typed. */
export function torqueOfGroup({ torque, tolerance }: FastenerGroup): WorkingCase {
  return {
    torque: typed(torque.value),
    ...(tolerance && { below: typed(tolerance.value.low), above: typed(tolerance.value.high) }),
  };
}
