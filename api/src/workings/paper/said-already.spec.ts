import { describe, expect, it } from 'vitest';
import type { AnswerPart } from '@second-spanner/shared/workings/working';
import { saidAlready } from './said-already.js';

const tableOf = (...rows: string[][]) => ({ columns: ['Order', 'Fastener'], rows });
const factOf = (value: string): AnswerPart => ({ kind: 'facts', facts: [{ name: 'Tighten', value }] });
const leads: AnswerPart = {
  ...{ kind: 'table', heading: 'Leads', columns: [{ name: 'Post' }, { name: 'Lead' }, { name: 'Spark' }] },
  rows: [
    ['315°', '1', 'in place'],
    ['45°', '2', 'in place'],
  ],
};

describe('the table of a drawing', () => {
  const order = tableOf(['1', 'A'], ['2', 'C'], ['3', 'B']);
  it.each(['A C B', 'A – C – B', 'A, C, B'])('is said already by the list %s', (list) => {
    expect(saidAlready(order, [factOf(list)])).toBe(true);
  });

  it('is not by a list in another order, nor by nothing', () => {
    expect(saidAlready(order, [factOf('A – B – C')])).toBe(false);
    expect(saidAlready(order, [])).toBe(false);
  });

  it('is by a table whose rows hold its own', () => {
    expect(saidAlready(tableOf(['315°', '1'], ['45°', '2']), [leads])).toBe(true);
    expect(saidAlready(tableOf(['315°', '1'], ['45°', '3']), [leads])).toBe(false);
  });
});
