import type { NewEntryRequest } from '@second-spanner/shared/contracts/sheets';
import { entryAt } from '@second-spanner/shared/sheet/current-entries';
import { slotKeyOf } from '@second-spanner/shared/sheet/slots';
import { badInput, conflict, refusedByRules } from '../platform/errors/http-problem.js';
import { whyPassShut } from './pass-order.js';
import { currentOf, type StepAtHand } from './step-at-hand.js';

/** A slot holds one entry: the first, and then corrections of it, each with its reason. */
export function requireItsPlace(step: StepAtHand, { content, replaces, reason }: NewEntryRequest): void {
  const current = currentOf(step);
  const slot = slotKeyOf(content);
  const holder = entryAt(current, slot);
  if (replaces === undefined) {
    if (reason !== undefined) throw badInput({ field: 'reason', message: 'Only a correction has a reason.' });
    if (holder) throw conflict('This is recorded already. Correct it with a reason.');
  } else {
    if (reason === undefined) throw badInput({ field: 'reason', message: 'Say why it is corrected.' });
    const old = step.records.entries.find(({ id }) => id === replaces);
    if (!old) throw badInput({ field: 'replaces', message: 'There is no such entry on this step.' });
    if (!current.some(({ id }) => id === replaces)) {
      throw conflict('This entry counts no longer: it was corrected, or the step was done again.');
    }
    if (slotKeyOf(old.content) !== slot) {
      throw badInput({
        field: 'replaces',
        message: 'A correction is of the same place as what it corrects.',
      });
    }
  }
  const shut = whyPassShut(step, content);
  if (shut !== null) throw refusedByRules(shut);
}
