import type { SpecDocument } from '../../contracts/spec.js';
import { check, inspection, type Draft } from './draft.js';
import { tightening } from './tightening.js';

/** Primed and ready. */
export function stage12(document: SpecDocument): readonly Draft[] {
  return [...oiled(document), ...filled(), ...seen(), ready()];
}

function oiled(document: SpecDocument): readonly Draft[] {
  const oil = document.consumables.find(({ value }) => value.toLowerCase().includes('engine oil'));
  return [
    check({
      id: 'counted',
      title: 'Rags and tools counted',
      instruction: 'Every rag, plug and tool that went near an open engine is on the bench again.',
    }),
    check({
      id: 'oil-in',
      title: 'Oil and filter in',
      instruction: `Filter filled and on, its seal oiled. ${oil ? `${oil.value}.` : 'The oil and the amount that the spec says.'}`,
      source: oil?.source,
    }),
    inspection({
      id: 'primed',
      after: ['oil-in', 'counted'],
      title: 'Oil primed to every rocker',
      instruction:
        'Turn the pump by its drive until oil runs at every rocker; turn the crank a quarter by hand, plugs out, and prime again.',
      lookFor: [
        'Oil runs at every rocker, the last one too',
        'The gauge shows pressure',
        'No leak at plugs, filter and seals',
      ],
    }),
    ...tightening(document, 'rocker-cover', {
      after: ['primed'],
      words: 'Gasket stuck to the cover, not to the head.',
    }),
  ];
}

function filled(): readonly Draft[] {
  return [
    check({
      id: 'coolant',
      title: 'Coolant in, no leaks',
      instruction:
        'Filled slowly with the heater open and the air let out; dry round every joint after half an hour.',
    }),
    check({
      id: 'fuel-lines',
      title: 'Fuel lines and clips',
      instruction:
        'New hose of the right kind, clips square and tight, clear of exhaust and fan; no weep under pressure.',
    }),
    check({
      id: 'earth-strap',
      title: '{Earth} strap, engine to body',
      instruction:
        'Bright metal at both ends, bolts tight. Without it the starter finds its way through a cable or the choke.',
    }),
  ];
}

function seen(): readonly Draft[] {
  return [
    inspection({
      id: 'locks-seen',
      title: 'Locking tabs, wire, {split pins} and paint marks seen',
      instruction: 'Go round the engine with a lamp and touch every lock that can still be seen.',
      lookFor: [
        'Every tab bent against its flat',
        'Wire pulls its bolts tight, pins spread',
        'A paint mark across every fastener that has a torque and can be seen',
      ],
    }),
    check({
      id: 'guards',
      title: 'Guards on, fan clear',
      instruction:
        'Turn the engine by hand two turns: the fan clears radiator and cowl, belts clear the hoses, guards are on.',
    }),
    check({
      id: 'extinguisher',
      title: 'Fire extinguisher at hand',
      instruction: 'In date, for fuel fires, and where it can be reached without passing the engine.',
    }),
  ];
}

function ready(): Draft {
  return inspection({
    id: 'ready',
    after: [
      'counted',
      'primed',
      'tight:rocker-cover',
      'coolant',
      'fuel-lines',
      'earth-strap',
      'locks-seen',
      'guards',
      'extinguisher',
    ],
    title: 'Ready to start',
    instruction: 'Both people walk round the engine together before the battery is joined.',
    lookFor: [
      'Nothing loose on or under the engine',
      'Fuel and oil dry on the outside',
      'Exhaust led outside, doors open',
      'Extinguisher at hand, and somebody to hold it',
    ],
  });
}
