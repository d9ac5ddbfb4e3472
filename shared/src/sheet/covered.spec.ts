import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { secondCheckKinds } from '../contracts/steps.js';
import { isCovered } from './covered.js';

const recorded = {
  critical: true,
  secondCheck: 'measured-again',
  countersigned: false,
  recorders: ['builder'],
  secondReaders: [],
} as const;

describe('the first reading', () => {
  it('is covered for everybody but the one who recorded it', () => {
    expect(isCovered(recorded, 'builder')).toBe(false);
    expect(isCovered(recorded, 'second person')).toBe(true);
    expect(isCovered(recorded, 'foreman')).toBe(true);
  });

  it('is shown to the second person when theirs is in, and to all once it is countersigned', () => {
    expect(isCovered({ ...recorded, secondReaders: ['second person'] }, 'second person')).toBe(false);
    expect(isCovered({ ...recorded, secondReaders: ['second person'] }, 'foreman')).toBe(true);
    expect(isCovered({ ...recorded, countersigned: true }, 'foreman')).toBe(false);
  });

  it('is never shown to anyone who could still give a second reading', () => {
    const people = fc.constantFrom('a', 'b', 'c', 'd');
    const cases = fc.record({
      critical: fc.constant(true),
      secondCheck: fc.constantFrom(...secondCheckKinds.filter((kind) => kind !== 'inspected')),
      countersigned: fc.constant(false),
      recorders: fc.uniqueArray(people, { minLength: 1 }),
      secondReaders: fc.uniqueArray(people),
    });
    fc.assert(
      fc.property(cases, people, (each, person) => {
        const couldStillRead = !each.recorders.includes(person) && !each.secondReaders.includes(person);
        expect(isCovered(each, person)).toBe(couldStillRead);
      }),
    );
  });
});
