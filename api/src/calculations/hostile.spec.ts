import { InputError } from '@second-spanner/shared/contracts/input-error';
import { describe, expect, it } from 'vitest';
import { SchemaChecks } from '../openapi/testing/schema-checks.js';
import { testDocument } from '../openapi/testing/test-document.js';
import { calculations } from './calculations.js';
import type { Calculation } from './define-calculation.js';

const checks = new SchemaChecks(await testDocument());

/** What somebody may send in place of anything, all of it JSON. */
const hostile: readonly unknown[] = [
  ...[null, true, '', ' ', 'x'.repeat(50_000), '1e999', '__proto__', 'constructor', '\u202e'],
  ...[0, -1, 1e308, -1e308, 5e-324, 1.5, 2 ** 53, [], {}, [[]], Array.from({ length: 5000 }, () => 1)],
  { value: 1e308, unit: 'm' },
  { value: 0, unit: 'm' },
  { value: -1, unit: 'toString' },
  JSON.parse('{"__proto__":{"value":1}}'),
];

/** The request with something else in one place, for each of its places. */
function* spoilt(request: unknown): Generator<unknown> {
  yield* hostile;
  if (typeof request !== 'object' || request === null) return;
  for (const [key, inner] of Object.entries(request)) {
    for (const other of spoilt(inner)) {
      yield Array.isArray(request)
        ? request.map((item: unknown, index) => (String(index) === key ? other : item))
        : { ...request, [key]: other };
    }
  }
}

async function troubleWith({ name, calculate }: Calculation, request: unknown): Promise<string | null> {
  try {
    const answer: unknown = JSON.parse(JSON.stringify(await calculate(request)));
    const place = [
      'paths',
      `/calculations/${name}`,
      'post',
      'responses',
      '200',
      'content',
      'application/json',
    ];
    return checks.trouble('answers', [...place, 'schema'], answer);
  } catch (error) {
    if (error instanceof InputError) return error.message === '' ? 'The problem says nothing.' : null;
    return String(error);
  }
}

describe('whatever is sent', () => {
  it.each(calculations.map((each) => [each.name, each] as const))(
    '%s answers as it says, or refuses it by a field',
    async (_name, calculation) => {
      const found = new Set<string>();
      for (const request of spoilt(calculation.example)) {
        const trouble = await troubleWith(calculation, request);
        if (trouble !== null) found.add(`${trouble} ${JSON.stringify(request).slice(0, 400)}`);
      }
      expect([...found].slice(0, 5)).toEqual([]);
    },
    60_000,
  );
});
