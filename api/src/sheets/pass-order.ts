import type { EntryContent } from '@second-spanner/shared/contracts/steps';
import { isRecorded } from '@second-spanner/shared/sheet/facts';
import { finalPass, planOf } from '@second-spanner/shared/sheet/plan-of';
import { acceptedOf, currentOf, factsOf, readersOf, type StepAtHand } from './step-at-hand.js';

/**
 * Why a pull may not be recorded yet: a pass opens when the one before it is complete. Within a pass the fasteners
 * may be taken in any order. Null for everything else.
 */
export function whyPassShut(step: StepAtHand, content: EntryContent): string | null {
  const { definition } = step.records;
  if (content.kind !== 'tightening' || definition.kind !== 'tightening') return null;
  const accepted = acceptedOf(step.records);
  const good = currentOf(step).filter(({ id, verdict }) => verdict === 'pass' || accepted.has(id));
  const open = planOf(definition).steps.find(
    ({ pass, fastener }) =>
      pass < content.pass &&
      !good.some(
        ({ content: done }) => done.kind === 'tightening' && done.pass === pass && done.fastener === fastener,
      ),
  );
  if (!open) return whyUnwatched(step, content.pass);
  return `Pass ${content.pass} opens when pass ${open.pass} is complete: ${definition.group.noun} ${open.fastener} is missing.`;
}

/** A joint that is tight can't be measured again: the second person reads the wrench before the last torque pass. */
function whyUnwatched(step: StepAtHand, pass: number): string | null {
  const { row, records } = step;
  const { definition } = records;
  if (definition.kind !== 'tightening' || pass !== finalPass(definition)) return null;
  if (!row.critical || row.secondCheck !== 'setting-and-pull-witnessed' || readersOf(step).length > 0)
    return null;
  return `Pass ${pass} is pulled with ${step.secondPerson} watching, who reads the wrench’s setting first.`;
}

/** Why the last torque pass waits for the second person, once the passes before it are done; null otherwise. */
export function waitsForWitness(step: StepAtHand): string | null {
  const { definition } = step.records;
  if (definition.kind !== 'tightening' || isRecorded(factsOf(step))) return null;
  const pass = finalPass(definition);
  const first = planOf(definition).steps.find((each) => each.pass === pass);
  if (!first) return null;
  const why = whyPassShut(step, { kind: 'tightening', pass, fastener: first.fastener, toolId: '' });
  return why === whyUnwatched(step, pass) ? why : null;
}
