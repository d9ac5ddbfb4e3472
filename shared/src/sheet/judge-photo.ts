import { InputError } from '../contracts/input-error.js';
import type { EntryContent, PhotoStep } from '../contracts/steps.js';
import type { Judgement } from '../contracts/verdict.js';

/**
 * A photo passes when it shows what the step names.
 * @throws InputError for a photo of something else
 */
export function judgePhoto(
  definition: PhotoStep,
  content: Extract<EntryContent, { kind: 'photo' }>,
): Judgement {
  if (definition.shows.includes(content.shows))
    return { verdict: 'pass', reason: `Photo of: ${content.shows}.` };
  throw new InputError('content.shows', `Photos wanted here: ${definition.shows.join(', ')}.`);
}
