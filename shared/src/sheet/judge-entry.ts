import { InputError } from '../contracts/input-error.js';
import type { EntryContent, PhotoStep, StepDefinition } from '../contracts/steps.js';
import type { Judgement } from '../contracts/verdict.js';
import type { JudgingContext } from './judging-context.js';
import { judgeMeasurement } from './judge-measurement.js';
import { judgeTdc } from './judge-tdc.js';
import { judgeTightening } from './judge-tightening.js';
import { diagnoseWiring } from './judge-wiring.js';

/**
 * Judges what was recorded on a step. The page calls it as one types, the api before it keeps the entry.
 * @throws InputError for content that does not belong to the step, with the path from `content`
 */
export function judgeEntry(
  definition: StepDefinition,
  content: EntryContent,
  context: JudgingContext,
): Judgement {
  if (definition.kind === 'check' && content.kind === 'check') return judgeCheck(content);
  if (definition.kind === 'measurement' && content.kind === 'measurement') {
    return judgeMeasurement(definition, content, context);
  }
  if (definition.kind === 'tightening' && content.kind === 'tightening') {
    return judgeTightening(definition, content, context);
  }
  if (definition.kind === 'wiring' && content.kind === 'wiring')
    return diagnoseWiring(definition, content.fitted);
  if (definition.kind === 'valve-timing' && content.kind === 'valve-timing')
    return judgeTdc(definition, content);
  if (definition.kind === 'photo' && content.kind === 'photo') return judgePhoto(definition, content);
  throw new InputError('content.kind', `This step takes a ${definition.kind}, not a ${content.kind}.`);
}

function judgeCheck(content: Extract<EntryContent, { kind: 'check' }>): Judgement {
  return content.outcome === 'pass'
    ? { verdict: 'pass', reason: content.note ?? 'Looked at and found right.' }
    : { verdict: 'fail', reason: content.note ?? 'Looked at and found wrong.' };
}

function judgePhoto(definition: PhotoStep, content: Extract<EntryContent, { kind: 'photo' }>): Judgement {
  if (definition.shows.includes(content.shows))
    return { verdict: 'pass', reason: `Photo of: ${content.shows}.` };
  throw new InputError('content.shows', `Photos wanted here: ${definition.shows.join(', ')}.`);
}
