import { describe, expect, it } from 'vitest';
import { blankForm, type WiringForm } from './wiring-form.js';
import { workOut } from './work-out.js';

const four: WiringForm = {
  ...blankForm,
  order: '1-3-4-2',
  turns: 'anticlockwise',
  firstAngle: '45',
  first: '315',
};
const traced: WiringForm = {
  ...four,
  outlets: 'traced',
  trace: { '45': 'C', '135': 'D', '225': 'A', '315': 'B' },
};

describe('what is missing before there is a map', () => {
  it.each<[string, Partial<WiringForm>, RegExp]>([
    ['the order', { order: '' }, /firing order/],
    ['the direction', { turns: '' }, /which way the rotor turns/],
    ['the posts', { spacing: 'typed', angles: '' }, /angles/],
    ['the trace', { outlets: 'traced', trace: { '45': 'C' } }, /which {outlet} it leads to/],
  ])('is said: %s', (_, changes, sentence) => {
    const { map, missing, errors } = workOut({ ...four, ...changes });
    expect(map).toBeNull();
    expect(missing).toMatch(sentence);
    expect(errors).toEqual({});
  });
});

describe('what is wrong is said at its field', () => {
  it.each<[keyof WiringForm, Partial<WiringForm>]>([
    ['cylinders', { cylinders: '17' }],
    ['order', { order: '1-3-4' }],
    ['order', { order: '1-3-4-4' }],
    ['order', { order: '1-3-4-5' }],
    ['firstAngle', { firstAngle: 'left' }],
    ['angles', { spacing: 'typed', angles: '45, 135, 315' }],
    ['angles', { spacing: 'typed', angles: '45, 45, 225, 315', first: '45' }],
    ['first', { firstAngle: '50' }],
    ['intervals', { intervals: '90-150-90' }],
    ['intervals', { intervals: '90-150-90-150' }],
    ['trace', { outlets: 'traced', trace: { '45': 'C', '135': 'C', '225': 'A', '315': 'B' } }],
  ])('%s', (field, changes) => {
    const { map, errors } = workOut({ ...four, ...changes });
    expect(map).toBeNull();
    expect(Object.keys(errors)).toEqual([field]);
  });

  it('keeps the map where only the timing is wrong', () => {
    const { map, errors } = workOut({ ...four, ivo: '16' });
    expect(map).not.toBeNull();
    expect(Object.keys(errors)).toEqual(['ivc']);
  });
});

describe('the map', () => {
  // Geometry: anticlockwise from 315° the rotor meets 225°, 135° and 45°.
  it('follows the rotor from the first cylinder’s post', () => {
    const { map } = workOut(four);
    expect(map?.rows.map(({ angle, cylinder }) => [angle, cylinder])).toEqual([
      [315, 1],
      [225, 3],
      [135, 4],
      [45, 2],
    ]);
  });

  it('turns the other way when the direction was seen from the drive', () => {
    const { map } = workOut({ ...four, seenFrom: 'drive' });
    expect(map?.rows.map(({ angle }) => angle)).toEqual([315, 45, 135, 225]);
  });

  it('names posts by angle, never by the outlets beside them', () => {
    expect(workOut(traced).map?.reason).toContain('posts 315°, 225°, 135° and 45°');
  });
});

describe('leads as fitted', () => {
  it('are not judged until every one is entered', () => {
    const { diagnosis, entered, places } = workOut({ ...traced, fitted: { A: '1', B: '3', C: '2' } });
    expect(diagnosis).toBeNull();
    expect([entered, places.length]).toEqual([3, 4]);
  });

  // calculations.md, the worked side-outlet cap: in firing order round the outside, A and B cross over inside.
  it('are told to follow the outlets as if they were posts', () => {
    const { diagnosis } = workOut({ ...traced, fitted: { A: '1', B: '3', C: '2', D: '4' } });
    expect(diagnosis?.cause).toBe('outlets-read-as-posts');
    expect(diagnosis?.alsoFits).toContain('two-leads-swapped');
    expect(diagnosis?.swaps.map(({ outlets }) => [...outlets].sort())).toEqual([['A', 'B']]);
  });

  it('are right by the map', () => {
    const { diagnosis } = workOut({ ...traced, fitted: { A: '3', B: '1', C: '2', D: '4' } });
    expect(diagnosis?.cause).toBe('right');
    expect(diagnosis?.verdict).toBe('pass');
  });

  it('speak of posts by angle', () => {
    const fitted = { A: '3', B: '1', C: '4', D: '2' };
    const { diagnosis } = workOut({ ...traced, fitted });
    expect(diagnosis?.cause).toBe('two-leads-swapped');
    expect(diagnosis?.reason).toContain('135°');
  });

  it('have a cylinder once only', () => {
    const { diagnosis, errors } = workOut({
      ...four,
      fitted: { '45': '1', '135': '1', '225': '3', '315': '2' },
    });
    expect(diagnosis).toBeNull();
    expect(errors.fitted).toMatch(/one lead/);
  });
});
