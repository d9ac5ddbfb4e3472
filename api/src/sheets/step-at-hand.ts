import type { SheetState } from '@second-spanner/shared/contracts/sheets';
import { isCovered } from '@second-spanner/shared/sheet/covered';
import { currentEntries, type RecordedEntry } from '@second-spanner/shared/sheet/current-entries';
import { stepFacts, type StepFacts } from '@second-spanner/shared/sheet/facts';
import type { GateStep } from '@second-spanner/shared/sheet/gates';
import type { SnagRow, StepRecords } from './record.entity.js';
import type { StepRow } from './step.entity.js';

/** One step of a sheet with all that decides about it. */
export interface StepAtHand {
  readonly sheetState: SheetState;
  /** The sheet's second person: name and id. */
  readonly secondPerson: string;
  readonly secondPersonId: string;
  readonly steps: readonly StepRow[];
  readonly row: StepRow;
  readonly records: StepRecords;
}

/** A step as the rules about gates see it. */
export const toGateStep = (row: StepRow): GateStep => ({
  definition: { code: row.code, title: row.title, restsOn: row.restsOn, hold: row.hold },
  critical: row.critical,
  facts: {
    done: row.done,
    of: row.of,
    verdict: row.verdict,
    recorders: row.recorderIds,
    countersigned: row.countersigned,
    openSnags: row.openSnags,
  },
});

/** The entries as the rules see them: the person by their id. */
export const recordedOf = ({ entries }: StepRecords): RecordedEntry[] =>
  entries.map(({ id, content, verdict, round, replaces, by }) => ({
    ...{ id, content, verdict, round, replaces },
    by: by.id,
  }));

/** The entries that count now. */
export const currentOf = ({ row, records }: Pick<StepAtHand, 'row' | 'records'>): readonly RecordedEntry[] =>
  currentEntries(recordedOf(records), row.entriesFromRound);

/** What is known of the step, worked out from its records. */
export function factsOf({ row, records }: Pick<StepAtHand, 'row' | 'records'>): StepFacts {
  return stepFacts({
    definition: records.definition,
    entries: recordedOf(records),
    entriesFromRound: row.entriesFromRound,
    countersigned: records.countersignatures.some(
      ({ round, outcome }) => round === row.round && outcome === 'agree',
    ),
    openSnags: openSnagsOf(records).length,
    accepted: acceptedOf(records),
  });
}

/** Ids of the entries whose fault the foreman accepted as it is. */
export const acceptedOf = ({ snags }: StepRecords): ReadonlySet<string> =>
  new Set(
    snags
      .filter(({ settled }) => settled?.how === 'accepted-as-it-is')
      .map(({ entryId }) => entryId)
      .filter((id) => id !== null),
  );

export const openSnagsOf = ({ snags }: StepRecords): readonly SnagRow[] =>
  snags.filter(({ settled }) => settled === null);

export const hasOpenDisagreement = (records: StepRecords): boolean =>
  openSnagsOf(records).some(({ cause }) => cause === 'disagreement');

/** Ids of the people whose second reading of the round at hand is in. */
export const readersOf = ({ row, records }: Pick<StepAtHand, 'row' | 'records'>): string[] =>
  records.secondReadings.filter(({ round }) => round === row.round).map(({ by }) => by.id);

/** Whether the first figures are kept from a person. */
export const coveredFrom = (
  row: Pick<StepRow, 'critical' | 'secondCheck' | 'countersigned' | 'recorderIds'>,
  secondReaders: readonly string[],
  personId: string,
): boolean =>
  isCovered(
    {
      critical: row.critical,
      secondCheck: row.secondCheck ?? undefined,
      countersigned: row.countersigned,
      recorders: row.recorderIds,
      secondReaders,
    },
    personId,
  );
