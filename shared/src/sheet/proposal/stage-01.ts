import { printQuantity } from '../../quantities/print.js';
import { listed } from '../../spec/words.js';
import type { SpecDocument } from '../../contracts/spec.js';
import { check, inspection, photo, readAt, reading, type Draft } from './draft.js';
import { cylinderNames } from './from-spec.js';
import { groupsAt, tightening } from './tightening.js';

/** Clean, identify, measure. */
export function stage01(document: SpecDocument): readonly Draft[] {
  return [...identified(document), ...cleaned(document), ...measured(document)];
}

function identified(document: SpecDocument): readonly Draft[] {
  const caps = groupsAt(document, 'main-caps').flatMap(({ repeats }) => [...(repeats ?? [])].sort());
  const cylinders = cylinderNames(document);
  return [
    check({
      id: 'stand',
      title: 'Engine on its stand',
      instruction:
        "Read the stand's plate against the engine's weight, bolt the block on by four good bolts and lock the head of the stand.",
    }),
    photo({
      id: 'stampings',
      title: 'Stampings and casting marks',
      instruction: 'Clean each mark and photograph it square on, so that every letter can be read.',
      shows: ['Engine number', 'Block casting mark', 'Head casting mark', 'Crankshaft mark'],
    }),
    photo({
      id: 'main-caps-seen',
      title: 'Main caps: numbers and which way round',
      instruction:
        'Photograph each cap with its number and the face that looks forward, before anything is cleaned off.',
      shows: caps.length > 0 ? caps : ['All main caps'],
    }),
    photo({
      id: 'rod-pairs',
      title: 'Rods and their caps',
      instruction:
        'Lay each rod with its own cap, numbers together, and photograph both numbers in one picture.',
      shows: cylinders.map((cylinder) => cylinder.replace('Cylinder', 'Rod')),
    }),
    photo({
      id: 'piston-fronts',
      title: 'Piston fronts',
      instruction:
        'Photograph the front mark on each crown, with the rod in sight so that its side can be told.',
      shows: cylinders.map((cylinder) => cylinder.replace('Cylinder', 'Piston')),
    }),
    photo({
      id: 'matched',
      title: 'What matched what',
      instruction:
        'Lay out in order what ran together: {followers} with their lobes, push rods, valves, shells. They go back where they were or are all replaced.',
      shows: ['Valve gear in its order', 'Valves in their order', 'Shells as they came out'],
    }),
  ];
}

function cleaned(document: SpecDocument): readonly Draft[] {
  return [
    check({
      id: 'galleries',
      title: 'Oil galleries brushed and blown',
      instruction:
        'Every gallery plug out, a brush through every hole from both ends, then blown dry until a white rag stays white.',
    }),
    ...tightening(document, 'core-plugs', {
      after: ['galleries'],
      words: 'Plugs go back only in galleries that were seen clean.',
    }),
    check({
      id: 'threads',
      title: 'Threads chased',
      instruction:
        'Run the right tap or chaser through every thread that holds a torque; renew any that is drawn.',
    }),
    check({
      id: 'blind-holes',
      title: 'Blind holes dry and clean',
      instruction:
        'Blow out every blind hole and feel its bottom with a rod: oil or water in it cracks the casting.',
      after: ['threads'],
    }),
  ];
}

function measured(document: SpecDocument): readonly Draft[] {
  const { undersizes, oversizes } = document.engine;
  const sizes = (list: typeof undersizes.value) =>
    list.length === 0 ? 'none made' : listed(list.map((size) => printQuantity(size)));
  return [
    ...readAt(document, 'bores').map((spec) =>
      reading(spec, {
        after: ['galleries'],
        words: 'Each bore at each height and along both axes; the spread tells ovality and taper.',
      }),
    ),
    ...readAt(document, 'tunnels').map((spec) =>
      reading(spec, {
        after: ['galleries'],
        words: 'No shells or bearings in; caps, where there are any, torqued on their own seats.',
      }),
    ),
    ...readAt(document, 'journals').map((spec) =>
      reading(spec, { words: 'Crankshaft washed, every journal across two axes.' }),
    ),
    inspection({
      id: 'sizes-agreed',
      after: ['main-caps-seen', 'rod-pairs', 'piston-fronts', 'matched', 'galleries', 'blind-holes', 'read'],
      title: 'Undersizes and oversizes written in',
      instruction: `Write down which undersize the shells are and which oversize the pistons are, and compare both with the readings. Undersizes: ${sizes(undersizes.value)}. Oversizes: ${sizes(oversizes.value)}.`,
      lookFor: [
        'Shell and piston boxes say the size that was written down',
        'That size suits the readings of journals and bores',
        'Caps and rods are numbered and lie with their own',
        'Galleries are clean and their plugs are in',
      ],
    }),
  ];
}
