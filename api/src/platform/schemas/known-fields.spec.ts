import { describe, expect, it } from 'vitest';
import { unknownFieldsOf } from './known-fields.js';

const fieldsOf = (type: string, request: unknown): readonly string[] =>
  unknownFieldsOf(type)(request).map(({ field }) => field);

const mm = { value: 1, unit: 'mm' };

describe('unknown fields', () => {
  it.each<[string, string, unknown, string[]]>([
    ['at the top', 'ConvertRequest', { quantity: mm, to: 'm', colour: 1 }, ['colour']],
    ['inside', 'ConvertRequest', { quantity: { ...mm, colour: 1 }, to: 'm' }, ['quantity.colour']],
    ['in a list', 'CapMapRequest', { posts: [{ post: 'a' }, { post: 'b', tilt: 1 }] }, ['posts[1].tilt']],
    ['in a list of lists', 'WhichTdcRequest', { sightings: [[{ valve: 1 }]] }, ['sightings[0][0].valve']],
    ['under a free name', 'TighteningPlanRequest', { finals: { a: { ...mm, x: 1 } } }, ['finals.a.x']],
    ['called as what every object has', 'ConvertRequest', JSON.parse('{"__proto__":1}'), ['__proto__']],
    [
      'of another way that is told by a value',
      'TighteningPlanRequest',
      { fasteners: { pattern: 'circle', count: 4, rows: 2 } },
      ['fasteners.rows'],
    ],
    [
      'of another way that is told by nothing but its fields',
      'FitRequest',
      { hole: { size: mm, class: 'H7', low: mm }, shaft: { low: mm, high: mm } },
      ['hole.low'],
    ],
  ])('are told %s', (_where, type, request, fields) => {
    expect(fieldsOf(type, request)).toEqual(fields);
  });

  it.each<[string, unknown]>([
    ['FitRequest', { hole: { size: mm, class: 'H7' }, shaft: { low: mm, high: mm } }],
    ['CapMapRequest', { trace: { any: 'A', name: 'B' } }],
    ['TorqueDoubtRequest', { condition: { nutFactor: 0.2 } }],
    ['ConvertRequest', { quantity: 'no object', to: ['no', 'text'] }],
    ['ConvertRequest', null],
    ['ConvertRequest', [[[]]]],
  ])('are not seen where there are none: %s %j', (type, request) => {
    expect(fieldsOf(type, request)).toEqual([]);
  });

  it('are told ten at most', () => {
    const many = Object.fromEntries(Array.from({ length: 5000 }, (_, i) => [`f${i}`, 1]));
    expect(fieldsOf('ConvertRequest', many)).toHaveLength(10);
  });
});
