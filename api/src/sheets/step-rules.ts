import type { Person } from '@second-spanner/shared/contracts/people';
import { may } from '@second-spanner/shared/contracts/permissions';
import type { SheetState } from '@second-spanner/shared/contracts/sheets';
import { isRecorded } from '@second-spanner/shared/sheet/facts';
import { mayRecord, waitsFor } from '@second-spanner/shared/sheet/gates';
import { mayReadAgain } from '@second-spanner/shared/sheet/second-check';
import { takesEntries } from '@second-spanner/shared/sheet/sheet-states';
import type { SnagRow } from './record.entity.js';
import {
  acceptedOf,
  currentOf,
  factsOf,
  hasOpenDisagreement,
  openSnagsOf,
  readersOf,
  toGateStep,
  type StepAtHand,
} from './step-at-hand.js';

/** Why something may not be done now, as a sentence for the person; null when it may. */
export type WhyNot = string | null;

const closedSentences: Record<SheetState, WhyNot> = {
  planned: 'The sheet is planned: put the engine on the stand first.',
  'on-the-stand': null,
  countersigning: 'The sheet is signed as built and takes nothing more unless it is sent back to the stand.',
  'signed-off': 'The sheet is signed off and takes nothing more unless it is sent back to the stand.',
  released: 'The sheet is released: nothing on it changes any more.',
};

/** Why a sheet takes nothing that is recorded. */
export const whySheetClosed = (state: SheetState): WhyNot =>
  takesEntries(state) ? null : closedSentences[state];

const disagreementOpen = 'Two people disagree on this step: the {snag} must be settled first.';

export function whyNotRecord(step: StepAtHand, personId: string): WhyNot {
  const closed = whySheetClosed(step.sheetState);
  if (closed !== null) return closed;
  if (readersOf(step).includes(personId)) {
    return 'You gave the second reading of this step, so you do not record on it as well.';
  }
  const disagreement = hasOpenDisagreement(step.records);
  const gates = step.steps.map(toGateStep);
  if (mayRecord(gates, step.row.code, disagreement)) return null;
  if (disagreement) return disagreementOpen;
  return waitsFor(gates, step.row.code, step.secondPerson)[0]?.sentence ?? 'This step is not open.';
}

export function whyNotReadAgain(step: StepAtHand, person: Pick<Person, 'id' | 'role'>): WhyNot {
  const { row, records, sheetState } = step;
  const personId = person.id;
  const closed = whySheetClosed(sheetState);
  if (closed !== null) return closed;
  if (!row.critical || row.secondCheck === null) return 'This step asks for no second check.';
  if (row.recorderIds.includes(personId)) {
    return 'You recorded on this step: the second reading is another person’s.';
  }
  const accepted = whyNotAfterAccepting(step, personId);
  if (accepted !== null) return accepted;
  if (row.secondCheck !== 'inspected' && mayDecideFailures(step, person) && hasFailed(step)) {
    return 'A failed reading of this step is shown to you to decide on: the second reading is another person’s.';
  }
  if (row.countersigned) return 'This step is countersigned already.';
  if (!mayReadAgain(records.definition, currentOf(step), factsOf(step), acceptedOf(records))) {
    return row.secondCheck === 'setting-and-pull-witnessed'
      ? 'The second reading can be given when the passes before the last one are done.'
      : 'The second reading can be given when everything on this step is recorded and good.';
  }
  return null;
}

export function whyNotCountersign(step: StepAtHand, personId: string): WhyNot {
  const closed = whySheetClosed(step.sheetState);
  if (closed !== null) return closed;
  if (!step.row.critical) return 'This step asks for no second check.';
  if (step.row.recorderIds.includes(personId)) {
    return 'You recorded on this step: somebody else countersigns it.';
  }
  if (!readersOf(step).includes(personId)) return 'Give your own reading first.';
  const accepted = whyNotAfterAccepting(step, personId);
  if (accepted !== null) return accepted;
  if (!isRecorded(factsOf(step))) return 'Not everything on this step is recorded and good yet.';
  return null;
}

/** Besides `whyNotCountersign`: why one may not agree. Accepting a disagreement as it is, is the foreman's. */
export function whyNotAgree(step: StepAtHand, personId: string): WhyNot {
  const { row, records } = step;
  if (openSnagsOf(records).length > 0) return 'An open {snag} on this step must be settled first.';
  const own = records.secondReadings.find(({ round, by }) => round === row.round && by.id === personId);
  const accepted = records.snags.some(
    ({ cause, round, settled }) =>
      cause === 'disagreement' && round === row.round && settled?.how === 'accepted-as-it-is',
  );
  if (own?.agreement.verdict === 'pass' || accepted) return null;
  return 'Your reading and the first one do not agree.';
}

/** Before anything is recorded, and never a hold point. */
export function whyNotUnmark({ row, records, sheetState }: StepAtHand): WhyNot {
  if (sheetState !== 'planned' && sheetState !== 'on-the-stand') return whySheetClosed(sheetState);
  if (!row.critical) return 'This step is not marked as critical.';
  if (row.hold) return 'This is a hold point: nobody takes the second person from it.';
  if (records.entries.length > 0) return 'Something is recorded on this step already: it stays critical.';
  return null;
}

export function whyNotCall(step: StepAtHand): WhyNot {
  const { row, records, sheetState } = step;
  const closed = whySheetClosed(sheetState);
  if (closed !== null) return closed;
  if (!row.critical || row.countersigned) return 'This step waits for no second person.';
  return mayReadAgain(records.definition, currentOf(step), factsOf(step), acceptedOf(records))
    ? null
    : 'There is nothing for the second person to check yet.';
}

/** Neither of two who disagree settles it: not the second person, and nobody who recorded what counts. */
export function whyNotSettle(step: StepAtHand, snag: SnagRow, personId: string): WhyNot {
  const closed = whySheetClosed(step.sheetState);
  if (closed !== null) return closed;
  if (snag.cause !== 'disagreement') return null;
  const readers = step.records.secondReadings.filter(({ round }) => round === snag.round);
  const parties = [
    ...snag.parties,
    ...currentOf(step).map(({ by }) => by),
    ...readers.map(({ by }) => by.id),
  ];
  return parties.includes(personId) ? 'Neither of the two who disagree settles it.' : null;
}

/** Nobody accepts as it is what they recorded themselves. */
export function whyNotAccept({ records }: StepAtHand, snag: SnagRow, personId: string): WhyNot {
  const entry = records.entries.find(({ id }) => id === snag.entryId);
  return entry?.by.id === personId ? 'You recorded this yourself: another foreman accepts it.' : null;
}

/** Who accepted a fault of a step neither reads it again nor countersigns it. */
function whyNotAfterAccepting({ records }: StepAtHand, personId: string): WhyNot {
  const accepted = records.snags.some(
    ({ settled }) => settled?.how === 'accepted-as-it-is' && settled.by.id === personId,
  );
  return accepted
    ? 'You accepted a reading of this step as it is: the second check is another person’s.'
    : null;
}

/** Whether a failed reading is shown to a person, who then can't read it again blind. */
export const mayDecideFailures = (step: StepAtHand, { id, role }: Pick<Person, 'id' | 'role'>): boolean =>
  may(role, 'snags.accept') && id !== step.secondPersonId;

const hasFailed = ({ row, records }: StepAtHand): boolean =>
  records.snags.some(({ cause, round }) => cause === 'failed' && round >= row.entriesFromRound);
