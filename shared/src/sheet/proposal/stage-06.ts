import type { SpecDocument } from '../../contracts/spec.js';
import { check, readAt, reading, type Draft } from './draft.js';
import { sizesOfKey } from './sizes-of-key.js';
import { tightening } from './tightening.js';
import { turning } from './turning.js';

/** Oil pump, seals, front cover, crank pulley, key, sump. */
export function stage06(document: SpecDocument): readonly Draft[] {
  return [...pump(document), ...cover(document), ...pulley(document), ...sump(document)];
}

function pump(document: SpecDocument): readonly Draft[] {
  return [
    ...readAt(document, 'oil-pump').map((spec) =>
      reading(spec, spec.critical ? { words: 'Pump clean and dry, end plate off.' } : {}),
    ),
    check({
      id: 'relief-valve',
      title: 'Relief valve moves',
      instruction: 'Plunger clean and free in its bore, seat unmarked, spring in, plug on a new washer.',
    }),
    ...tightening(document, 'oil-pump', {
      after: ['read:oil-pump', 'relief-valve'],
      words: 'Packed with oil, drive engaged, gasket holes compared.',
    }),
    check({
      id: 'pick-up',
      after: ['tight:oil-pump'],
      title: 'Pick-up and strainer',
      instruction:
        'Pipe tight and sealed so that it can draw no air, strainer whole, its height over the floor of the {sump} measured.',
    }),
  ];
}

function cover(document: SpecDocument): readonly Draft[] {
  return [
    check({
      id: 'cover-seal',
      title: 'Front seal in the cover',
      instruction: 'Lip to the oil, pressed square, lip oiled; the sleeve it runs on without a groove.',
    }),
    check({
      id: 'cover-gasket',
      title: 'Front cover gasket: side up, holes compared',
      instruction:
        'Lay the gasket on the block and then on the cover: every oil and water hole open, none left out.',
    }),
    ...tightening(document, 'front-cover', {
      after: ['cover-seal', 'cover-gasket'],
      words: 'Centre the cover on the crank with the pulley or a sleeve.',
    }),
    turning(document, 'turning-cover', { of: 'the front cover', after: ['tight:front-cover'] }),
  ];
}

function pulley(document: SpecDocument): readonly Draft[] {
  return [
    ...document.keys.filter(({ key }) => key.startsWith('crank')).flatMap(sizesOfKey),
    ...tightening(document, 'crank-pulley', {
      after: ['key', 'tight:front-cover'],
      words: 'Crank held so that it cannot turn.',
    }),
    ...readAt(document, 'pulley').map((spec) => reading(spec, { after: ['tight:crank-pulley'] })),
    ...tightening(document, 'flywheel', {
      words: 'Flange and flywheel faces bare and clean, dowels home.',
    }),
  ];
}

function sump(document: SpecDocument): readonly Draft[] {
  return [
    check({
      id: 'last-look',
      after: ['pick-up'],
      title: 'Last look before the {sump} goes on',
      instruction:
        'Nothing left inside, every lock seen again, crank turned once more, oil over the bearings.',
    }),
    ...tightening(document, 'sump', {
      after: ['last-look', 'tight:front-cover'],
      words: 'Flange flat, gasket and end seals in place, a dab of sealant at each corner.',
    }),
    ...tightening(document, 'drain-plug', { after: ['tight:sump'] }),
  ];
}
