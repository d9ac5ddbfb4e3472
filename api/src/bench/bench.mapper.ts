import type { BenchItem } from '@second-spanner/shared/contracts/sheets';
import { secondCheckWords } from '@second-spanner/shared/sheet/words';
import type { AwaitingRow, WaitingSheetRow } from './bench.entity.js';

/** A step that waits, with a sentence that tells no figure that is covered. */
export function toStepItem(row: AwaitingRow): BenchItem {
  const { sheetId, sheetCode, stepCode, stepKind, carName, title, since } = row;
  return {
    kind: row.awaiting,
    ...{ sheetId, sheetCode, stepCode, stepKind, carName, title },
    sentence: row.awaiting === 'snag' ? snagSentence(row) : checkSentence(row),
    since: since.toISOString(),
  };
}

function snagSentence({ snag, covered }: AwaitingRow): string {
  if (!snag) return 'A {snag} is open.';
  if (snag.cause !== 'raised' && covered) {
    return snag.cause === 'disagreement'
      ? 'Two people disagree on this step; a third settles it.'
      : `A {snag} is open, from ${snag.by}.`;
  }
  return `${snag.by}: ${snag.words}`;
}

function checkSentence({ calledBy, secondCheck }: AwaitingRow): string {
  const how = secondCheck === null ? 'seen' : secondCheckWords[secondCheck];
  const called = calledBy === null ? '' : `${calledBy} called you. `;
  return `${called}Recorded, and waits for a second person: ${how}.`;
}

/** A sheet that waits as a whole. */
export function toSheetItem(row: WaitingSheetRow): BenchItem {
  const { sheetId, sheetCode, carName, since } = row;
  return {
    ...{ sheetId, sheetCode, carName, stepCode: null, stepKind: null },
    ...sheetWords(row),
    since: since.toISOString(),
  };
}

type Words = Pick<BenchItem, 'kind' | 'title' | 'sentence'> &
  Partial<Pick<BenchItem, 'stepCode' | 'stepKind'>>;

function sheetWords(row: WaitingSheetRow): Words {
  const { sheetCode, stepsDone, stepsTotal, openSnags, builderName } = row;
  switch (row.state) {
    case 'planned':
      return {
        kind: 'next-step',
        title: `Put ${sheetCode} on the stand`,
        sentence: `It is planned with ${stepsTotal} steps.`,
      };
    case 'on-the-stand':
      if (stepsDone === stepsTotal && openSnags === 0) {
        return {
          kind: 'sign',
          title: `Sign ${sheetCode} as built`,
          sentence: 'Every step is done and countersigned.',
        };
      }
      return {
        kind: 'next-step',
        title: row.nextTitle ?? `Go on with ${sheetCode}`,
        sentence:
          row.nextCode === null
            ? `${stepsDone} of ${stepsTotal} steps are done; the others wait for somebody.`
            : `Next on the stand; ${stepsDone} of ${stepsTotal} steps are done.`,
        stepCode: row.nextCode,
        stepKind: row.nextKind,
      };
    case 'countersigning':
      return {
        kind: 'sign',
        title: `Countersign ${sheetCode}`,
        sentence: `${builderName} signed it as built.`,
      };
    case 'signed-off':
      return {
        kind: 'release',
        title: `Release ${sheetCode}`,
        sentence: 'Builder and second person have signed it.',
      };
    case 'released':
      return { kind: 'read', title: `Read ${sheetCode}`, sentence: 'It is released, with its build sheet.' };
  }
}
