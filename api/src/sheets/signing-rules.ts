import type { Person } from '@second-spanner/shared/contracts/people';
import type { SignatureMeaning } from '@second-spanner/shared/contracts/sheets';
import { isDone } from '@second-spanner/shared/sheet/gates';
import { signing } from '@second-spanner/shared/sheet/sheet-states';
import { sheetStateWords } from '@second-spanner/shared/sheet/words';
import type { WholeSheetRow } from './sheet.entity.js';
import { toGateStep } from './step-at-hand.js';
import type { WhyNot } from './step-rules.js';
import type { StepRow } from './step.entity.js';

/** Why a person may not give a signature now, as a sentence; null when they may. Their role is checked before. */
export function whyNotSign(
  meaning: SignatureMeaning,
  row: Pick<WholeSheetRow, 'state' | 'builder' | 'signatures'>,
  steps: readonly StepRow[],
  person: Person,
): WhyNot {
  if (row.state !== signing[meaning].from) {
    return `The sheet is ${sheetStateWords[row.state]}; this signature is given when it is ${sheetStateWords[signing[meaning].from]}.`;
  }
  if (meaning === 'built') {
    if (row.builder.id !== person.id)
      return `${row.builder.name}, the builder of this sheet, signs it as built.`;
    return whatIsMissing(steps);
  }
  const built = row.signatures.find((signature) => signature.meaning === 'built');
  if (meaning === 'countersigned' && built?.person.id === person.id) {
    return 'You signed this sheet as built: somebody else countersigns it.';
  }
  if (meaning === 'countersigned' && steps.some(({ recorderIds }) => recorderIds.includes(person.id))) {
    return 'You recorded on this sheet: somebody who did not countersigns it.';
  }
  return null;
}

function whatIsMissing(steps: readonly StepRow[]): WhyNot {
  const missing = steps.filter((step) => !isDone(toGateStep(step)));
  if (missing.length === 0) return null;
  const named = missing.slice(0, 5).map(({ code }) => code);
  const more = missing.length - named.length;
  const snags = steps.reduce((sum, { openSnags }) => sum + openSnags, 0);
  const open = snags > 0 ? ` Open {snags}: ${snags}.` : '';
  return `Not done yet: ${named.join(', ')}${more > 0 ? ` and ${more} more` : ''}.${open}`;
}
