import type { SpecDocument } from '../../contracts/spec.js';
import { check, inspection, readAt, reading, type Draft } from './draft.js';
import { groupsAt, tighten, tightening } from './tightening.js';
import { turning } from './turning.js';

/** Crankshaft, main bearings, end float. */
export function stage03(document: SpecDocument): readonly Draft[] {
  const endFloat = readAt(document, 'end-float');
  return [
    ...shellsIn(document),
    ...endFloat
      .filter(({ critical }) => !critical)
      .map((spec) =>
        reading(spec, { words: 'Sum the thrust washers and shims that belong together and write the sum.' }),
      ),
    check({
      id: 'crank-laid',
      after: ['read:mains', 'shell-oil-holes', 'rear-seal'],
      title: 'Crankshaft laid in',
      instruction:
        'Assembly oil on every shell and journal, lower it level into all bearings at once, thrust washers with their grooves to the crank.',
    }),
    ...mainCaps(document),
    ...tightening(document, 'rear-seal', {
      after: ['rear-seal', 'tight:main-caps'],
      words: 'Centre the housing on the crank before the first pull.',
    }),
    ...endFloat
      .filter(({ critical }) => critical)
      .map((spec) =>
        reading(spec, {
          after: ['tight:main-caps'],
          words: 'Lever the crank fully one way, then the other.',
        }),
      ),
  ];
}

function shellsIn(document: SpecDocument): readonly Draft[] {
  return [
    check({
      id: 'shells-dry',
      title: 'Shell backs and housings dry',
      instruction:
        'Wipe every housing and the back of every shell with a clean rag and solvent; tangs in their notches.',
    }),
    inspection({
      id: 'shell-oil-holes',
      after: ['shells-dry'],
      title: 'Main shell oil holes line up',
      instruction:
        'The shell with the hole lies in the block; look and probe through each hole into its gallery.',
      lookFor: [
        "Every block shell's hole stands over the gallery, none half covered",
        'Shell backs and housings dry, tangs home',
        'Thrust washers to hand, grooves will face the crank',
      ],
    }),
    check({
      id: 'rear-seal',
      title: 'Rear seal fitted',
      instruction:
        'Lip towards the oil and oiled, or the rope rolled in and trimmed as the maker says; scroll or sleeve without a score.',
    }),
    ...readAt(document, 'mains').map((spec) =>
      reading(spec, {
        after: ['shell-oil-holes'],
        words: 'Judged at 90° to the split with the caps torqued: shells are relieved at the split.',
      }),
    ),
  ];
}

/** Each cap is pulled and the crank turned before the next, so that a tight one is known. */
function mainCaps(document: SpecDocument): readonly Draft[] {
  return groupsAt(document, 'main-caps').flatMap((group) =>
    (group.repeats ?? [undefined]).flatMap((repeat) => {
      const drafted = tighten(
        group,
        { after: ['crank-laid', 'read:mains'], words: 'Number and arrow as photographed.' },
        repeat,
      );
      const of = repeat === undefined ? 'the main caps' : `main ${repeat.toLowerCase()}`;
      return [drafted, turning(document, 'turning-mains', { of, after: [drafted.id] })];
    }),
  );
}
