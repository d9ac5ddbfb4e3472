import type { PersonName } from '@second-spanner/shared/contracts/people';
import type { Tool } from '@second-spanner/shared/contracts/registers';
import { canonicalHash } from '../platform/hashing/canonical.js';
import type { StepRecords } from './record.entity.js';
import type { SheetStage, WholeSheetRow } from './sheet.entity.js';
import type { StepAtHand } from './step-at-hand.js';
import type { StepRow } from './step.entity.js';

/** A step as it is signed: what it asked for, and all that was recorded. */
export interface ContentStep
  extends
    Pick<StepRow, 'code' | 'critical' | 'uncriticalReason' | 'round' | 'entriesFromRound'>,
    Omit<StepRecords, 'calls'> {}

/** Everything that a signature stands for. Plain JSON: it is hashed, and frozen when the sheet is released. */
export interface SheetContent {
  readonly format: 1;
  readonly id: string;
  readonly code: string;
  readonly carName: string;
  readonly engineCode: string;
  readonly engineNumber: string;
  readonly ownerName: string | null;
  readonly specTitle: string;
  readonly specEdition: number;
  readonly specHash: string;
  readonly builder: PersonName;
  readonly countersigner: PersonName;
  readonly stages: readonly SheetStage[];
  /** The tools that the figures were read with, as they stood in the register. */
  readonly tools: readonly Tool[];
  readonly steps: readonly ContentStep[];
}

/** The whole content of a sheet as it stands. */
export function contentOf(
  sheet: WholeSheetRow,
  steps: readonly StepAtHand[],
  tools: readonly Tool[],
): SheetContent {
  const { id, code, carName, engineCode, engineNumber, ownerName, specTitle, specEdition, specHash } = sheet;
  const { builder, countersigner, stages } = sheet;
  const used = new Set(steps.flatMap(({ records }) => toolsUsed(records)));
  return {
    ...{ format: 1, id, code, carName, engineCode, engineNumber, ownerName, specTitle, specEdition },
    ...{ specHash, builder, countersigner, stages },
    tools: tools.filter((tool) => used.has(tool.id)),
    steps: steps.map(toContentStep),
  };
}

/**
 * What a signature signs: the content, and the ledger up to the moment of signing.
 * @param ledgerHead the hash of the ledger line before the signature's own
 */
export const contentHash = (content: SheetContent, ledgerHead: string): string =>
  canonicalHash({ content, ledgerHead });

/** A sheet's row with the head that was frozen with it. */
export function withFrozenHead(row: WholeSheetRow, content: SheetContent): WholeSheetRow {
  const { carName, engineCode, engineNumber, ownerName, specTitle, specEdition, specHash } = content;
  const { builder, countersigner, stages } = content;
  return {
    ...row,
    ...{ carName, engineCode, engineNumber, ownerName, specTitle, specEdition, specHash },
    ...{ builder, countersigner, stages },
  };
}

/** Steps with the records that were frozen with their sheet. */
export function withFrozenRecords(steps: readonly StepAtHand[], content: SheetContent): StepAtHand[] {
  const frozen = new Map(content.steps.map((step) => [step.code, step]));
  return steps.map((step) => {
    const records = frozen.get(step.row.code);
    return records ? { ...step, records: { ...records, calls: [] } } : step;
  });
}

function toContentStep({ row, records }: StepAtHand): ContentStep {
  const { code, critical, uncriticalReason, round, entriesFromRound } = row;
  const { definition, entries, secondReadings, countersignatures, snags } = records;
  return {
    ...{ code, critical, uncriticalReason, round, entriesFromRound, definition },
    entries: entries.map(dated),
    secondReadings: secondReadings.map(dated),
    countersignatures: countersignatures.map(dated),
    snags: snags.map((snag) => ({ ...dated(snag), settled: snag.settled && dated(snag.settled) })),
  };
}

/** Times in the one form that is hashed. */
const dated = <T extends { readonly at: string }>(record: T): T => ({
  ...record,
  at: new Date(record.at).toISOString(),
});

const toolsUsed = ({ entries, secondReadings }: StepRecords): string[] =>
  [...entries, ...secondReadings].flatMap(({ content }) => ('toolId' in content ? [content.toolId] : []));
