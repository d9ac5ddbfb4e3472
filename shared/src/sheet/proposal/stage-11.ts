import type { SpecDocument } from '../../contracts/spec.js';
import { check, readAt, reading, type Draft } from './draft.js';
import { capRequestOf, cylinderNames, firstCylinder, valveTimingOf } from './from-spec.js';
import { tightening } from './tightening.js';

/** TDC, distributor, ignition, wiring. */
export function stage11(document: SpecDocument): readonly Draft[] {
  return [
    whichTdc(document),
    ...distributor(document),
    ...sparkMaking(document),
    ...plugsAndLeads(document),
    wiring(document),
  ];
}

function whichTdc(document: SpecDocument): Draft {
  const cylinder = firstCylinder(document);
  return {
    id: 'which-tdc',
    after: [],
    body: {
      kind: 'valve-timing',
      title: `Cylinder ${cylinder} at compression TDC`,
      instruction: `Turn the crank the way it runs to the TDC mark and watch the valves of cylinder ${cylinder} and of its companion on the way. Enter what was seen; both valves shut alone proves nothing.`,
      ...(document.valveTrain.timing.source && { source: document.valveTrain.timing.source }),
      critical: true,
      secondCheck: 'read-again',
      firingOrder: document.engine.firingOrder.value,
      valveTiming: valveTimingOf(document),
      cylinder,
      wanted: 'compression-tdc',
    },
  };
}

function distributor(document: SpecDocument): readonly Draft[] {
  const { staticTiming, firstPost, posts } = document.ignition;
  const angle = posts.value.find(({ post }) => post === firstPost.value)?.angle;
  return [
    check({
      id: 'distributor-drive',
      after: ['which-tdc'],
      title: 'Distributor drive meshed',
      instruction:
        'Drive gear or dog in at this TDC with its offset to the side the maker draws; oil pump drive engaged.',
    }),
    ...readAt(document, 'distributor').map((spec) => reading(spec, { after: ['distributor-drive'] })),
    check({
      id: 'rotor',
      after: ['which-tdc', 'distributor-drive'],
      title: 'Rotor at the static timing mark',
      instruction: `Crank at ${staticTiming.value}° before the compression TDC: the rotor points to the post at ${angle}° as the points just open. At TDC itself it is already past by half the advance.`,
      source: staticTiming.source,
    }),
    ...tightening(document, 'distributor-clamp', { after: ['rotor'] }),
  ];
}

function sparkMaking(document: SpecDocument): readonly Draft[] {
  const { pointsGap, coilPolarity, trace } = document.ignition;
  const earth = coilPolarity.value === 'positive-earth' ? 'Positive' : 'Negative';
  return [
    reading(
      {
        key: 'points-gap',
        place: 'ignition',
        name: 'Points gap',
        method: 'feeler',
        limits: pointsGap,
        at: ['Widest opening'],
        critical: false,
      },
      { after: ['rotor'], words: 'Heel on the top of a cam lobe, faces clean and square.' },
    ),
    ...readAt(document, 'ignition').map((spec) => reading(spec, { words: 'Unplugged on both sides.' })),
    check({
      id: 'polarity',
      title: 'Coil polarity',
      instruction: `${earth} {earth}: the coil is joined so that the spark leaves the plug's centre; the marks on an old coil may be for the other polarity.`,
      source: coilPolarity.source,
    }),
    ...(trace
      ? [
          check({
            id: 'cap-traced',
            title: 'Cap traced, post to {outlet}',
            instruction:
              "The {outlets} do not show their posts. Put a meter between each post inside and each {outlet} outside, and compare with the spec's trace.",
            source: trace.source,
          }),
        ]
      : []),
  ];
}

function plugsAndLeads(document: SpecDocument): readonly Draft[] {
  const { plugGap, leadResistance, leadKind } = document.ignition;
  const at = cylinderNames(document);
  const place = 'ignition';
  return [
    reading(
      { key: 'plug-gap', place, name: 'Plug gaps', method: 'feeler', limits: plugGap, at, critical: false },
      { words: 'Bend only the side electrode; the insulator without a crack.' },
    ),
    ...tightening(document, 'spark-plugs', { after: ['read:ignition:plug-gap'] }),
    reading(
      {
        key: 'leads',
        place,
        name: '{HT lead} tests',
        method: 'other',
        limits: leadResistance,
        at,
        critical: false,
      },
      {
        words: `${leadKind.value === 'resistive' ? 'Resistive {leads}: near nothing is wrong here.' : 'Wire-core {leads}: near nothing is right.'} Flex each while it is read; a {lead} pierced or clamped again is tested again. An ohmmeter says nothing of the insulation.`,
      },
    ),
  ];
}

function wiring(document: SpecDocument): Draft {
  const { ignition, engine } = document;
  return {
    id: 'wiring',
    after: ['which-tdc', 'rotor', 'cap-traced', 'tight:spark-plugs', 'read:ignition:leads'],
    body: {
      kind: 'wiring',
      title: 'Wiring map, as fitted',
      instruction:
        'Follow each {lead} by hand from its plug to the cap and enter the cylinder at each {outlet}, as it is and not as it should be. The map is shown when all are in.',
      ...(engine.firingOrder.source && { source: engine.firingOrder.source }),
      critical: true,
      secondCheck: 'read-again',
      cap: capRequestOf(document),
      outletsAt: ignition.outletsAt.value,
      valveTiming: valveTimingOf(document),
      advance: ignition.staticTiming.value,
    },
  };
}
