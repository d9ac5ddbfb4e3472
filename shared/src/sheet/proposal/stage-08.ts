import type { SpecDocument } from '../../contracts/spec.js';
import { check, inspection, readAt, reading, type Draft } from './draft.js';
import { isVee } from './from-spec.js';
import { tightening } from './tightening.js';
import { turning } from './turning.js';

/** Head on. */
export function stage08(document: SpecDocument): readonly Draft[] {
  return [
    ...readAt(document, 'head-face').map((spec) => reading(spec, { words: 'Face scraped clean and dry.' })),
    ...readAt(document, 'valves')
      .filter(({ key }) => key.startsWith('piston-to-valve'))
      .map((spec) =>
        reading(spec, {
          words:
            'Head on an old gasket, light springs in two valves, read from 20° before to 20° after the overlap.',
        }),
      ),
    check({
      id: 'head-holes',
      title: 'Faces clean, bolt holes dry',
      instruction:
        'Both faces wiped with solvent, every stud hole blown out and dry, studs in by hand to their depth.',
    }),
    inspection({
      id: 'head-gasket',
      after: ['head-holes', 'read:head-face'],
      title: 'Head gasket way up, oil-way in line',
      instruction:
        'Compare the gasket with both faces before it is laid: the mark for the top up, the oil-way to the rockers open, dry unless its maker says otherwise.',
      lookFor: [
        'The mark for the top or the front can be read where it should be',
        'Oil-way and every water hole open through the gasket',
        'No fire ring overhangs a bore',
        'Faces clean, holes dry',
      ],
    }),
    check({
      id: 'head-lowered',
      after: ['head-gasket', 'leak-check'],
      title: 'Head lowered on its dowels',
      instruction: 'Lower it level on to its dowels or guide studs; it must sit down by itself all round.',
    }),
    ...tightening(document, 'head', {
      after: ['read:head-face', 'read:valves:piston-to-valve', 'head-holes', 'head-gasket', 'head-lowered'],
      words: isVee(document)
        ? 'Both heads on and loose before either is pulled.'
        : 'Begin only when it can be finished without a break.',
    }),
    turning(document, 'turning-head', { of: 'the head', after: ['tight:head'] }),
    ...(isVee(document)
      ? [
          check({
            id: 'valley-faces',
            after: ['tight:head'],
            title: 'Valley manifold faces meet',
            instruction:
              'Lay the manifold in dry: both faces touch along their length and every bolt starts by hand. A gap that is not even means that a head or deck was cut and the manifold was not.',
          }),
        ]
      : []),
  ];
}
