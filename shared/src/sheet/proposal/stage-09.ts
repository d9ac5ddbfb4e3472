import { printQuantity } from '../../quantities/print.js';
import type { MeasurementSpec, SpecDocument } from '../../contracts/spec.js';
import { check, inspection, readAt, reading, type Draft } from './draft.js';
import { tightening } from './tightening.js';

/** What is set at the valves comes last: the rockers' own fits are read before they go on. */
const isSet = ({ key }: MeasurementSpec): boolean => /^(lash|preload|shim)/.test(key);

/** Clearances that are set with the engine hot belong after the run. */
export const isHot = ({ key }: MeasurementSpec): boolean => key.includes('hot');

/** Valve gear and clearances. */
export function stage09(document: SpecDocument): readonly Draft[] {
  const rockers = readAt(document, 'rockers').filter((spec) => !isHot(spec));
  return [
    check({
      id: 'push-rods',
      title: 'Push rods straight and in their cups',
      instruction:
        'Roll each on glass, blow through it if it is hollow, then in its own place with both ends in their cups.',
    }),
    check({
      id: 'rocker-feed',
      title: 'Oil feed to the rockers open',
      instruction:
        'Feed hole in the block, head and pedestal in one line; shaft holes to the side the maker says, plugs in its ends.',
    }),
    ...rockers.filter((spec) => !isSet(spec)).map((spec) => reading(spec)),
    ...tightening(document, 'rocker-gear', {
      after: ['push-rods', 'rocker-feed', 'read:rockers', 'tight:head'],
      words: 'Adjusters backed off, pulled down evenly so that no push rod bends.',
    }),
    ...clearances(document),
  ];
}

function clearances(document: SpecDocument): readonly Draft[] {
  const after = ['tight:rocker-gear', 'push-rods'];
  const readings = readAt(document, 'rockers').filter((spec) => isSet(spec) && !isHot(spec));
  if (readings.length > 0)
    return readings.map((spec) => reading(spec, { after, words: wordsFor(document, spec) }));
  const { inlet, exhaust, engine } = document.valveTrain.lash.value;
  return [
    inspection({
      id: 'lash-set',
      after,
      title: 'Valve {clearances} set',
      instruction: `{Inlet} ${printQuantity(inlet)}, exhaust ${printQuantity(exhaust)}, engine ${engine}; each valve with its mate fully open.`,
      lookFor: ['Every valve tried with the blade', 'Every lock nut tight'],
    }),
  ];
}

function wordsFor({ engine }: SpecDocument, { key }: MeasurementSpec): string {
  if (engine.followers.value === 'hydraulic') {
    return 'Valve shut, {follower} on the base of its lobe: from no play to the seat is the preload.';
  }
  if (key.includes('shim')) {
    return 'New shim is the old one and what was measured, less what is wanted.';
  }
  return 'Turn until the mate of the valve is fully open, set, lock, read again and write each.';
}
