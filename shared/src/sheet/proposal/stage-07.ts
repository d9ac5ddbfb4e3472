import type { SpecDocument } from '../../contracts/spec.js';
import { check, readAt, reading, type Draft } from './draft.js';

/** Cylinder head built. */
export function stage07(document: SpecDocument): readonly Draft[] {
  const valves = readAt(document, 'valves').filter(({ key }) => !key.startsWith('piston-to-valve'));
  return [
    ...valves
      .filter(({ critical }) => critical)
      .map((spec) =>
        reading(spec, { words: 'Guides brushed, each valve in its own, held a little off its seat.' }),
      ),
    check({
      id: 'seats',
      after: ['read:valves'],
      title: 'Valves and seats ground in',
      instruction:
        'An even grey band all round, of the right width and in the middle of the face; blue shows no gap.',
    }),
    ...valves
      .filter(({ critical }) => !critical)
      .map((spec) => reading(spec, { after: ['seats'], ...wordsFor(spec.key) })),
    check({
      id: 'seals',
      after: ['seats'],
      title: 'Valve stem seals on',
      instruction: 'Sleeve over the collet grooves, seal pushed home and straight, stem oiled.',
    }),
    check({
      id: 'valves-in',
      after: ['seals', 'read:valves'],
      title: 'Springs and collets in',
      instruction:
        'Close coils to the head, both collets home; tap each stem once with a soft hammer and look again.',
    }),
    check({
      id: 'leak-check',
      after: ['valves-in'],
      title: 'Leak check of the chambers',
      instruction: 'Plugs in, chambers up and filled with paraffin: no weep at any port after ten minutes.',
    }),
  ];
}

function wordsFor(key: string): { readonly words?: string } {
  if (key.includes('fitted')) return { words: 'From the spring seat to the underside of the cap, shims in.' };
  if (key.includes('bind')) return { words: 'Spring pressed to full lift, the blade between the coils.' };
  return {};
}
