import type { SpecRow } from '@second-spanner/shared/spec/spec-rows';
import { expect, it } from 'vitest';
import { valueLines } from './lines';

const row = (label: string): SpecRow => ({
  key: label,
  section: 'tightening',
  label,
  printed: '',
  source: undefined,
  sourceText: 'No source',
});

it('sets a row under the one it belongs to, by the rest of its name', () => {
  const labels = ['Head nuts', 'Head nuts, thread', 'Head nuts, grade', 'Head nuts outside', 'Sump, thread'];
  expect(valueLines(labels.map(row)).map(({ label, belongs }) => [label, belongs])).toEqual([
    ['Head nuts', false],
    ['thread', true],
    ['grade', true],
    ['Head nuts outside', false],
    ['Sump, thread', false],
  ]);
});
