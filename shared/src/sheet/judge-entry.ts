import type { EntryContent, StepDefinition, StepKind } from '../contracts/steps.js';
import type { Judgement } from '../contracts/verdict.js';
import { judgeCheck } from './judge-check.js';
import { judgeMeasurement } from './judge-measurement.js';
import { judgeOf, type Judge } from './judge-of.js';
import { judgePhoto } from './judge-photo.js';
import { judgeTdc } from './judge-tdc.js';
import { judgeTightening } from './judge-tightening.js';
import { judgeWiring } from './judge-wiring.js';
import type { JudgingContext } from './judging-context.js';

const judges: Readonly<Record<StepKind, Judge>> = {
  check: judgeOf('check', judgeCheck),
  measurement: judgeOf('measurement', judgeMeasurement),
  tightening: judgeOf('tightening', judgeTightening),
  wiring: judgeOf('wiring', judgeWiring),
  'valve-timing': judgeOf('valve-timing', judgeTdc),
  photo: judgeOf('photo', judgePhoto),
};

/**
 * Judges what was recorded on a step. The api calls it before it keeps the entry; the page calls the judge of the
 * step's own kind as one types.
 * @throws InputError for content that does not belong to the step, with the path from `content`
 */
export function judgeEntry(
  definition: StepDefinition,
  content: EntryContent,
  context: JudgingContext,
): Judgement {
  return judges[definition.kind](definition, content, context);
}
