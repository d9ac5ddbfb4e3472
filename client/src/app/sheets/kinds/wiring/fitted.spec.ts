import { describe, expect, it } from 'vitest';
import { diagnoseWiring } from '@second-spanner/shared/sheet/judge-wiring';
import { wiring } from '../../testing/steps';
import { sparkWords, swapLines, thenWords } from '@second-spanner/shared/workings/wiring-map/diagnosis-words';
import { cylindersByOutlet, cylindersOf, isFittedDraft, outletsOf } from './fitted';

describe('what is fitted', () => {
  it('asks by outlet and offers cylinders in an order that gives nothing away', () => {
    expect(outletsOf(wiring)).toEqual(['A', 'B', 'C', 'D']);
    expect(cylindersOf(wiring)).toEqual([1, 2, 3, 4]);
  });

  it('is sent with the engine’s own cylinders, and only what is chosen', () => {
    expect(cylindersByOutlet(wiring, { A: '3', B: '', C: '2' })).toEqual({ A: 3, C: 2 });
    expect(cylindersByOutlet(wiring, { A: '9' })).toEqual({});
  });

  it('refuses a draft of another shape', () => {
    expect(isFittedDraft({ A: '1' })).toBe(true);
    expect(isFittedDraft({ A: 1 })).toBe(false);
    expect(isFittedDraft(null)).toBe(false);
  });
});

describe('the words of a diagnosis', () => {
  // The traced side-outlet cap of the demo's four, its conductors of A and B crossing inside: wired right, lead 3 is
  // at A and lead 1 at B. Common practice, no source.
  const fitted = { A: 1, B: 3, C: 2, D: 4 };
  const found = diagnoseWiring(wiring, fitted);

  it('say which lead goes where, so that doing as they say puts it right', () => {
    const lines = swapLines(fitted, found.swaps);
    expect(lines).toHaveLength(1);
    expect(lines[0]?.toLowerCase()).toContain('{lead} 1 to {outlet} b');
    expect(lines[0]?.toLowerCase()).toContain('{lead} 3 to {outlet} a');
  });

  it('follow a lead through several swaps', () => {
    const lines = swapLines({ A: 1, B: 2, C: 3 }, [
      { between: ['a', 'b'], outlets: ['A', 'B'] },
      { between: ['b', 'c'], outlets: ['B', 'C'] },
    ]);
    expect(lines[1]).toBe('{Lead} 1 to {outlet} C, {lead} 3 to {outlet} B');
  });

  it('say of each cylinder when its spark comes and what it does', () => {
    const of = (cylinder: number) => found.cylinders.find((spark) => spark.cylinder === cylinder);
    const [one, four] = [of(1), of(4)];
    expect(one && [sparkWords(one), thenWords(one)]).toEqual([
      '180° late, power stroke',
      'exhaust open: bangs',
    ]);
    expect(four && [sparkWords(four), thenWords(four)]).toEqual(['on compression', 'right']);
  });
});
