import { InputError } from '../contracts/input-error.js';
import type { Agreement } from '../contracts/sheets.js';
import type { SecondReadingContent, StepDefinition } from '../contracts/steps.js';

type Second = Extract<SecondReadingContent, { kind: 'inspected' }>;

/** An inspection agrees when everything that was to be looked for was seen and found right. */
export function agreeInspection(definition: StepDefinition, second: Second): Agreement {
  const lookFor = definition.lookFor ?? [];
  const missing = lookFor.filter((item) => !second.seen.includes(item));
  if (second.outcome === 'pass' && missing.length > 0) {
    throw new InputError('content.seen', `Not looked at yet: ${missing.join('; ')}.`);
  }
  const agrees = second.outcome === 'pass';
  return {
    verdict: agrees ? 'pass' : 'fail',
    reason: second.note ?? (agrees ? 'Inspected and found right.' : 'Inspected and found wrong.'),
    rows: lookFor.map((item) => ({
      label: item,
      first: 'done',
      second: second.seen.includes(item) ? 'seen' : 'not seen',
      en: null,
      agrees: second.seen.includes(item),
    })),
  };
}
