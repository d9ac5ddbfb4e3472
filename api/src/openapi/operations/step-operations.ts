import type { Permission } from '@second-spanner/shared/contracts/permissions';
import { callAnswer, reading, step } from '../examples/sheet-examples.js';
import { contract, idempotencyKey, type Content, type Operation } from '../operation.js';

const path = '/sheets/{id}/steps/{code}';
const detail = contract('StepDetail', step);
const refused = 'The rules of the sheet refuse it; the problem says which hold or step.';

/** What is recorded once, however often it is sent. */
const recorded = (record: {
  readonly to: string;
  readonly who: Permission;
  readonly summary: string;
  readonly body: Content;
  readonly hasKey: boolean;
}): Operation => ({
  ...{ method: 'post', path: `${path}/${record.to}`, tag: 'Steps', who: record.who },
  ...{ summary: record.summary, body: record.body, headers: record.hasKey ? [idempotencyKey] : [] },
  answers: {
    200: { description: 'It was recorded before; the step as it stands.', content: detail },
    201: { description: 'The step as it then stands.', content: detail },
  },
  refusals: { 409: 'Something happened meanwhile, or the key stands under another request.', 422: refused },
});

export const stepOperations: readonly Operation[] = [
  {
    ...{ method: 'get', path, tag: 'Steps', who: 'sheets.read' },
    summary: 'One step: what it asks, and what was recorded on it as far as the person who asks may see.',
    answers: { 200: { description: 'The step.', content: detail } },
  },
  recorded({
    ...{ to: 'entries', who: 'entries.record', hasKey: true },
    summary: 'Record one reading, one pull or one look. It never changes; a correction replaces it.',
    body: contract('NewEntryRequest', { content: reading }),
  }),
  recorded({
    ...{ to: 'second-readings', who: 'second-checks.make', hasKey: true },
    summary: 'Give the second person’s own reading, before the first is shown.',
    body: contract('NewSecondReadingRequest', {
      content: {
        ...{ kind: 'measured-again', toolId: '95148b4e-0692-4ff1-93f5-92a3b4c5d6e7' },
        readings: [{ at: 'Main 1', value: { value: 0.046, unit: 'mm' } }],
      },
    }),
  }),
  recorded({
    ...{ to: 'countersignatures', who: 'second-checks.make', hasKey: true },
    summary: 'Countersign a step, or dispute it.',
    body: contract('NewCountersignatureRequest', { outcome: 'agree' }),
  }),
  recorded({
    ...{ to: 'snags', who: 'snags.raise', hasKey: false, summary: 'Raise a snag on a step.' },
    body: contract('NewSnagRequest', { words: 'The shell rocks in its cap.' }),
  }),
  {
    ...{ method: 'put', path: `${path}/unmarking`, tag: 'Steps', who: 'sheets.unmark-critical' },
    summary: 'Take a step out of those that a second person checks, for a reason.',
    body: contract('UnmarkCriticalRequest', { reason: 'The cover carries no load.' }),
    answers: { 200: { description: 'The step as it then stands.', content: detail } },
    refusals: { 409: 'Something happened meanwhile.', 422: refused },
  },
  {
    ...{ method: 'post', path: `${path}/calls`, tag: 'Steps', who: 'entries.record' },
    summary: 'Call the second person to a step, by mail.',
    answers: {
      200: {
        description: 'The step, and whether the mail went out.',
        content: contract('CallAnswer', callAnswer),
      },
    },
    refusals: { 409: 'They were called a moment ago.', 422: refused },
  },
];
