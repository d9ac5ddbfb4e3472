import type { SpecDocument } from '../../contracts/spec.js';
import { check, inspection, readAt, reading, type Draft } from './draft.js';
import { isVee } from './from-spec.js';
import { groupsAt, tighten } from './tightening.js';
import { turning } from './turning.js';

/** Pistons, rods, deck. */
export function stage04(document: SpecDocument): readonly Draft[] {
  const bigEnds = readAt(document, 'big-ends');
  const side = bigEnds.filter(({ method }) => method === 'feeler');
  const bearing = bigEnds.filter((spec) => !side.includes(spec));
  return [
    ...rings(document),
    ...pistonsOnRods(document),
    check({
      id: 'rod-shells',
      title: '{Big-end} shells dry, oil holes in line',
      instruction: "Backs and housings dry, tangs home; a shell with a hole lies over the rod's own hole.",
    }),
    ...bearing.map((spec) =>
      reading(spec, {
        after: ['rod-shells'],
        words: 'Judged at 90° to the split with the cap torqued.',
      }),
    ),
    ...rods(document),
    ...side.map((spec) =>
      reading(spec, {
        after: ['tight:big-ends'],
        ...(isVee(document) && { words: 'Two rods share a pin: read what is left between the pair.' }),
      }),
    ),
    ...readAt(document, 'deck').map((spec) =>
      reading(spec, {
        after: ['tight:big-ends'],
        words: 'Each piston at its own TDC, read over the pin so that its rock does not count.',
      }),
    ),
    locked(document),
  ];
}

function rings(document: SpecDocument): readonly Draft[] {
  return readAt(document, 'rings').map((spec) =>
    reading(spec, {
      words: spec.key.includes('gap')
        ? 'Square the ring in its own bore with a piston crown, below the ridge.'
        : 'Ring in its own groove, groove clean.',
    }),
  );
}

function pistonsOnRods(document: SpecDocument): readonly Draft[] {
  const vee = isVee(document);
  return [
    ...readAt(document, 'pistons').map((spec) =>
      reading(spec, { words: 'Each piston in the bore it will run in.' }),
    ),
    check({
      id: 'pins',
      title: '{Gudgeon pins} fitted and held',
      instruction:
        'Pin a push fit in the piston as the maker says, clips home in their grooves with the gap up or down.',
    }),
    inspection({
      id: 'way-round',
      after: ['pins'],
      title: 'Piston front and rod the right way round',
      instruction: vee
        ? 'Front marks forward on both banks, rod numbers as photographed, and on each shared pin the chamfers look outwards to the fillets.'
        : 'Front marks forward, rod numbers and oil spray holes to the side they were photographed on.',
      lookFor: [
        'Front mark of every piston looks forward',
        'Every rod has its own cap, numbers together on one side',
        vee ? 'Rod chamfers outwards on every shared pin' : 'Oil spray holes to the right side',
        'Pin clips home',
      ],
    }),
    check({
      id: 'rings-on',
      after: ['read:rings', 'way-round'],
      title: 'Rings on, top marks up, gaps staggered',
      instruction:
        'Top marks to the crown, gaps spread round the piston and none over the pin or on the thrust side.',
    }),
  ];
}

/** Each rod is pulled and the crank turned before the next, so that a tight one is known. */
function rods(document: SpecDocument): readonly Draft[] {
  return groupsAt(document, 'big-ends').flatMap((group) =>
    (group.repeats ?? [undefined]).flatMap((repeat) => {
      const drafted = tighten(
        group,
        {
          after: ['rings-on', 'way-round', 'read:big-ends', 'read:pistons'],
          words:
            'Sleeves on the bolts, pin at the bottom, piston in by hand pressure through the ring clamp.',
        },
        repeat,
      );
      const of = repeat === undefined ? 'the {big ends}' : repeat.toLowerCase();
      return [drafted, turning(document, 'turning-rods', { of, after: [drafted.id] })];
    }),
  );
}

function locked(document: SpecDocument): Draft {
  const locking = groupsAt(document, 'big-ends').flatMap((group) => group.locking?.value ?? []);
  return inspection({
    id: 'big-ends-locked',
    after: ['tight:big-ends', 'read:big-ends', 'read:deck'],
    title: '{Big ends} locked',
    instruction: `Lock every {big end} and put a paint mark across each when it is seen.${locking.length === 0 ? '' : ` The spec says: ${locking.join('; ')}.`}`,
    lookFor: [
      'Every nut or bolt locked the way the spec says',
      'A paint mark across each',
      'Caps and rods numbered to the same side',
      'Nothing left inside',
    ],
  });
}
