import type { SpecEdition } from '../../contracts/spec.js';
import { describe, expect, it } from 'vitest';
import { workOut } from './work-out.js';
import { formOfSpec } from './form-of-spec.js';
import { isSameEngine } from './wiring-form.js';

// The demo's side-outlet four; only what a wiring map is made of.
const edition = (posts: readonly (readonly [string, number])[]): SpecEdition =>
  ({
    code: 'AT18',
    edition: 2,
    document: {
      engine: { cylinders: { value: 4 }, firingOrder: { value: [1, 3, 4, 2] } },
      ignition: {
        rotation: { value: 'anticlockwise' },
        rotationSeenFrom: { value: 'cap' },
        posts: { value: posts.map(([post, angle]) => ({ post, angle })) },
        firstPost: { value: posts[3]?.[0] ?? '' },
        trace: { value: { A: 'B', B: 'A', C: 'C', D: 'D' } },
        staticTiming: { value: 10 },
      },
      valveTrain: { timing: { value: { ivo: 16, ivc: 56, evo: 51, evc: 21 } } },
    },
  }) as unknown as SpecEdition;

describe('the engine of a spec', () => {
  const form = formOfSpec(
    edition([
      ['C', 45],
      ['D', 135],
      ['B', 225],
      ['A', 315],
    ]),
  );

  it('has its map and no leads', () => {
    const { map } = workOut(form);
    expect(map?.rows.map(({ angle, outlet, cylinder }) => [angle, outlet, cylinder])).toEqual([
      [315, 'B', 1],
      [225, 'A', 3],
      [135, 'D', 4],
      [45, 'C', 2],
    ]);
    expect(form.fitted).toEqual({});
  });

  it('keeps which outlet stands beside which post where the letters go another way', () => {
    const other = formOfSpec(
      edition([
        ['A', 45],
        ['B', 135],
        ['C', 225],
        ['D', 315],
      ]),
    );
    expect(other.beside).toEqual({ '45': 'A', '135': 'B', '225': 'C', '315': 'D' });
    expect(form.beside).toEqual({});
  });

  it('is another engine once a figure was changed, and the same with leads entered', () => {
    expect(isSameEngine(form, { ...form, order: '1-2-4-3' })).toBe(false);
    expect(isSameEngine(form, { ...form, fitted: { A: '1' } })).toBe(true);
  });
});
