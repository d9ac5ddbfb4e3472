import { InputError } from '../contracts/input-error.js';
import type { Agreement } from '../contracts/sheets.js';
import type { SecondReadingContent, StepDefinition } from '../contracts/steps.js';
import { agreeInspection } from './agree-inspection.js';
import { agreeMeasured } from './agree-measured.js';
import { agreeSetting } from './agree-setting.js';
import { agreeTdc, agreeWiring } from './agree-seen.js';
import type { RecordedEntry } from './current-entries.js';
import { isRecorded, type StepFacts } from './facts.js';
import type { SecondCheckCase } from './second-check-case.js';
import { finalPass, planOf } from './plan-of.js';

/**
 * Puts the second person's reading beside the first and says whether they agree: `pass` agrees, `fail` does not.
 * @throws InputError for a reading that does not belong to the step, is incomplete, or whose tool is too coarse
 */
export function compareSecond(step: SecondCheckCase, second: SecondReadingContent): Agreement {
  const { definition } = step;
  if (second.kind !== definition.secondCheck) {
    throw new InputError(
      'content.kind',
      `The second check of this step is ${definition.secondCheck ?? 'not asked for'}.`,
    );
  }
  if (second.kind === 'inspected') return agreeInspection(definition, second);
  if (second.kind === 'setting-and-pull-witnessed') {
    if (definition.kind === 'tightening') return agreeSetting({ ...step, definition }, second);
  } else if (second.kind === 'read-again') {
    if (definition.kind === 'wiring' && 'fitted' in second)
      return agreeWiring({ ...step, definition }, second.fitted);
    if (definition.kind === 'valve-timing' && 'sightings' in second)
      return agreeTdc({ ...step, definition }, second);
  } else if (definition.kind === 'measurement') {
    return agreeMeasured({ ...step, definition }, second);
  }
  throw new InputError('content.kind', 'This reading does not belong to this step.');
}

/**
 * Whether the second reading may be given: when all is recorded; on a witnessed tightening from the moment when the
 * last torque pass is the next, so that the pulls can be watched.
 * @param accepted ids of entries whose fault the foreman accepted as it is
 */
export function mayReadAgain(
  definition: StepDefinition,
  entries: readonly RecordedEntry[],
  facts: StepFacts,
  accepted: ReadonlySet<string>,
): boolean {
  if (isRecorded(facts)) return true;
  if (definition.kind !== 'tightening' || definition.secondCheck !== 'setting-and-pull-witnessed')
    return false;
  const final = finalPass(definition);
  const before = planOf(definition).steps.filter(({ pass }) => pass < final);
  return before.every((step) =>
    entries.some(
      ({ id, content, verdict }) =>
        content.kind === 'tightening' &&
        content.pass === step.pass &&
        content.fastener === step.fastener &&
        (verdict === 'pass' || accepted.has(id)),
    ),
  );
}
