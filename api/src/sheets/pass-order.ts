import type { EntryContent } from '@second-spanner/shared/contracts/steps';
import { planOf } from '@second-spanner/shared/sheet/plan-of';
import { currentOf, type StepAtHand } from './step-at-hand.js';

/**
 * Why a pull may not be recorded yet: a pass opens when the one before it is complete. Within a pass the fasteners
 * may be taken in any order. Null for everything else.
 */
export function whyPassShut(step: StepAtHand, content: EntryContent): string | null {
  const { definition, snags } = step.records;
  if (content.kind !== 'tightening' || definition.kind !== 'tightening') return null;
  const accepted = snags.filter(({ settled }) => settled?.how === 'accepted-as-it-is');
  const good = currentOf(step).filter(
    ({ id, verdict }) => verdict === 'pass' || accepted.some(({ entryId }) => entryId === id),
  );
  const open = planOf(definition).steps.find(
    ({ pass, fastener }) =>
      pass < content.pass &&
      !good.some(
        ({ content: done }) => done.kind === 'tightening' && done.pass === pass && done.fastener === fastener,
      ),
  );
  if (!open) return null;
  return `Pass ${content.pass} opens when pass ${open.pass} is complete: ${definition.group.noun} ${open.fastener} is missing.`;
}
