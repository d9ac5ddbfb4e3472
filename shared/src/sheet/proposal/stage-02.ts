import type { SpecDocument } from '../../contracts/spec.js';
import { check, inspection, readAt, reading, type Draft } from './draft.js';
import { tightening } from './tightening.js';

/** Plugs, cam bearings, camshaft. */
export function stage02(document: SpecDocument): readonly Draft[] {
  const cam = readAt(document, 'cam');
  const endFloats = cam.filter(({ key }) => key.includes('end-float'));
  const sizes = cam.filter(({ critical }) => !critical);
  const clearances = cam.filter((spec) => spec.critical && !endFloats.includes(spec));
  return [
    check({
      id: 'core-plugs',
      title: 'Core plugs pressed in',
      instruction:
        'Seats bright, sealant round the edge, plug driven square to its depth with a drift that fits.',
    }),
    inspection({
      id: 'cam-oil-holes',
      title: 'Cam bearing oil holes line up',
      instruction:
        'Look through each bearing into its gallery, and pass a drill shank by hand through both holes. A bearing that is turned starves itself and what lies beyond it.',
      lookFor: [
        "Light or a probe passes through every bearing's hole into the block's",
        'Bearings lie flush in their bores, their joint away from the load',
      ],
    }),
    ...sizes.map((spec) => reading(spec)),
    ...clearances.map((spec) =>
      reading(spec, { after: ['cam-oil-holes'], words: 'Bearings in their bores, journals clean.' }),
    ),
    ...followersFirst(document),
    check({
      id: 'cam-in',
      after: ['cam-oil-holes', 'mushroom', ...clearances.map(({ key }) => `read:cam:${key}`)],
      title: 'Camshaft in',
      instruction:
        'Cam lubricant on every lobe, oil on the journals; guide it in with a long bolt so that no lobe touches a bearing.',
    }),
    ...tightening(document, 'cam-thrust', {
      after: ['cam-in'],
      words: 'Thrust plate the right way round, its oil groove to the cam.',
    }),
    ...endFloats.map((spec) => reading(spec, { after: ['cam-in', 'tight:cam-thrust'] })),
    check({
      id: 'cam-turns',
      after: ['tight:cam-thrust', 'cam-in'],
      title: 'Camshaft turns freely',
      instruction:
        'Turn it a full turn by two fingers; a tight spot is a bent shaft or a bearing out of line, and a {snag}.',
    }),
  ];
}

function followersFirst({ engine }: SpecDocument): readonly Draft[] {
  if (engine.followers.value !== 'mushroom') return [];
  return [
    check({
      id: 'mushroom',
      title: 'Mushroom {followers} in before the camshaft',
      instruction:
        'They go in from below and cannot pass the cam: each in its own bore, lubricated, held up clear of the lobes.',
    }),
  ];
}
