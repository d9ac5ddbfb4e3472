import { describe, expect, it } from 'vitest';
import { exchangeTrouble, type Exchange } from './exchange-check.js';

const converted: Exchange = {
  ...{ method: 'POST', path: '/api/calculations/convert', status: 200, type: 'application/json' },
  sent: { quantity: { value: 27, unit: 'ft-lb' }, to: 'Nm' },
  body: { quantity: { value: 36.6, unit: 'N·m' } },
};

describe('an exchange', () => {
  it.each<[string, Partial<Exchange>]>([
    ['an answer as it is described, to units as a workshop spells them', {}],
    ['a page of the client', { method: 'GET', path: '/sheets/1', body: '', type: 'text/html' }],
    ['an address that is not there', { path: '/api/nothing', status: 404, body: {} }],
  ])('is in order with %s', (_what, part) => {
    expect(exchangeTrouble({ ...converted, ...part })).toBeNull();
  });

  it.each<[string, Partial<Exchange>, RegExp]>([
    ['a status that is not described', { status: 418 }, /status 418/],
    ['a field more in the answer', { body: { ...(converted.body as object), note: '' } }, /off its schema/],
    [
      'a unit spelt otherwise in the answer',
      { body: { quantity: { value: 1, unit: 'Nm' } } },
      /off its schema/,
    ],
    ['a field less in a request that was taken', { sent: { to: 'N·m' } }, /request was taken/],
    ['another type', { type: 'text/html' }, /no text\/html for 200/],
    ['a route that is not described', { path: '/api/calculations/other' }, /route is not in/],
    [
      'a problem without a title',
      { status: 400, type: 'application/problem+json', body: {} },
      /off its schema/,
    ],
  ])('is told for %s', (_what, part, trouble) => {
    expect(exchangeTrouble({ ...converted, ...part })).toMatch(trouble);
  });
});
