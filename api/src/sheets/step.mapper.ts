import type { Person } from '@second-spanner/shared/contracts/people';
import { may } from '@second-spanner/shared/contracts/permissions';
import type { EntryView, SnagView, StepDetail, WaitsFor } from '@second-spanner/shared/contracts/sheets';
import { waitsFor } from '@second-spanner/shared/sheet/gates';
import type { SnagRow, StepRecords } from './record.entity.js';
import { toStepLines } from './sheet.mapper.js';
import {
  coveredFrom,
  currentOf,
  hasOpenDisagreement,
  readersOf,
  toGateStep,
  type StepAtHand,
} from './step-at-hand.js';
import { waitsForWitness } from './pass-order.js';
import {
  mayDecideFailures,
  whyNotCall,
  whyNotCountersign,
  whyNotReadAgain,
  whyNotRecord,
  whyNotSettle,
  whyNotUnmark,
  whySheetClosed,
} from './step-rules.js';

const iso = (at: string): string => new Date(at).toISOString();

export interface DetailCase {
  readonly sheetId: string;
  readonly version: number;
  readonly step: StepAtHand;
  readonly person: Person;
}

/** A step as one person may see it: covered figures stay here. */
export function toStepDetail({ sheetId, version, step, person }: DetailCase): StepDetail {
  const { row, records, steps } = step;
  const at = steps.findIndex(({ code }) => code === row.code);
  const line = toStepLines(steps)[at];
  if (!line) throw new Error(`Step ${row.code} is not among the steps of its sheet.`);
  const covered = coveredFrom(row, readersOf(step), person.id);
  return {
    ...line,
    ...{ sheetId, version, covered },
    definition: records.definition,
    round: row.round,
    waitsFor: [...waitsFor(steps.map(toGateStep), row.code, step.secondPerson), ...witnessWanted(step)],
    entries: covered ? [] : toEntries(step),
    secondReadings: covered ? [] : toSecondReadings(records),
    countersignatures: records.countersignatures.map(
      ({ by, at: when, round, outcome, reason, pullsWitnessed }) => ({
        ...{ by, at: iso(when), round, outcome, pullsWitnessed },
        reason: covered && reason !== null ? coveredWords : reason,
      }),
    ),
    snags: records.snags.map((snag) => toSnag(step, snag, person)),
    calls: records.calls.map(({ to, at: when }) => ({ to, at: iso(when) })),
    uncriticalReason: row.uncriticalReason,
    can: canDo(step, person),
  };
}

function witnessWanted(step: StepAtHand): WaitsFor[] {
  const sentence = waitsForWitness(step);
  if (sentence === null) return [];
  return [{ what: 'second-check', code: step.row.code, sentence, person: step.secondPerson }];
}

const coveredWords = 'Covered until your own reading is in.';

function toEntries(step: StepAtHand): EntryView[] {
  const { entries } = step.records;
  const replacedBy = new Map(entries.map(({ id, replaces }) => [replaces, id]));
  const current = new Set(currentOf(step).map(({ id }) => id));
  return entries.map(({ id, content, verdict, reason, by, at, round, replaces, replaceReason }) => ({
    ...{ id, content, verdict, reason, by, at: iso(at), round, replaces, replaceReason },
    replacedBy: replacedBy.get(id) ?? null,
    current: current.has(id),
  }));
}

const toSecondReadings = ({ secondReadings }: StepRecords): StepDetail['secondReadings'] =>
  secondReadings.map(({ at, ...reading }) => ({ ...reading, at: iso(at) }));

/** A snag as one person may see it: words that tell a covered figure are kept from them. */
export function toSnag(step: StepAtHand, snag: SnagRow, person: Person): SnagView {
  // Who must decide on a failed reading has to see it; whoever accepts it gives no second reading of it.
  const undecided = snag.settled === null || snag.settled.how === 'accepted-as-it-is';
  const decides = snag.cause === 'failed' && undecided && mayDecideFailures(step, person);
  const covered = snag.cause !== 'raised' && !decides && coveredFrom(step.row, readersOf(step), person.id);
  const { id, cause, by, at, settled } = snag;
  return {
    ...{ id, cause, by, at: iso(at), stepCode: step.row.code },
    words: covered ? coveredWords : snag.words,
    settled: settled && {
      ...settled,
      at: iso(settled.at),
      reason: covered ? coveredWords : settled.reason,
    },
    maySettle:
      settled === null && may(person.role, 'snags.settle') && whyNotSettle(step, snag, person.id) === null,
  };
}

function canDo(step: StepAtHand, { id, role }: Person): StepDetail['can'] {
  const { row, records } = step;
  const hasRead = readersOf(step).includes(id);
  const hasSigned = records.countersignatures.some(
    ({ round, by, outcome }) =>
      round === row.round && (outcome === 'agree' || (by.id === id && hasOpenDisagreement(records))),
  );
  return {
    record: may(role, 'entries.record') && whyNotRecord(step, id) === null,
    readAgain: may(role, 'second-checks.make') && !hasRead && whyNotReadAgain(step, { id, role }) === null,
    countersign: may(role, 'second-checks.make') && !hasSigned && whyNotCountersign(step, id) === null,
    raiseSnag: may(role, 'snags.raise') && whySheetClosed(step.sheetState) === null,
    unmarkCritical: may(role, 'sheets.unmark-critical') && whyNotUnmark(step) === null,
    call: may(role, 'entries.record') && whyNotCall(step) === null,
  };
}
