import type { SheetState, SnagView } from '@second-spanner/shared/contracts/sheets';
import type { SecondCheckKind, StepKind } from '@second-spanner/shared/contracts/steps';

/** A step that waits for a person. */
export interface AwaitingRow {
  readonly awaiting: 'second-check' | 'snag';
  readonly since: Date;
  readonly sheetId: string;
  readonly sheetCode: string;
  readonly carName: string;
  readonly stepCode: string;
  readonly stepKind: StepKind;
  readonly title: string;
  readonly secondCheck: SecondCheckKind | null;
  /** The first figures are not for everybody yet, and this person recorded none of them. */
  readonly covered: boolean;
  /** The oldest open snag of the step, where it waits for one. */
  readonly snag: { readonly cause: SnagView['cause']; readonly words: string; readonly by: string } | null;
  /** Who called this person to the step, where somebody did. */
  readonly calledBy: string | null;
}

/** A sheet that waits for a person as a whole. */
export interface WaitingSheetRow {
  readonly sheetId: string;
  readonly sheetCode: string;
  readonly carName: string;
  readonly state: SheetState;
  readonly since: Date;
  readonly stepsDone: number;
  readonly stepsTotal: number;
  readonly openSnags: number;
  readonly builderName: string;
  readonly nextCode: string | null;
  readonly nextTitle: string | null;
  readonly nextKind: StepKind | null;
}
