import type { FastenerPlace, KeySpec, MeasurementSpec, SpecDocument } from '../../contracts/spec.js';
import { printQuantity } from '../../quantities/print.js';
import { listed } from '../../spec/words.js';
import { check, readAt, reading, type Draft } from './draft.js';
import { sizesOfKey } from './sizes-of-key.js';
import { tightening } from './tightening.js';

/** Manifolds, water pump, belt. */
export function stage10(document: SpecDocument): readonly Draft[] {
  return [
    ...compared(document),
    ...manifolds(document),
    ...waterPump(document),
    ...pumpPulley(document),
    ...belt(document),
    ...cures(document),
  ];
}

/** Parts that a note of the spec sets apart, such as another maker's. */
function compared({ parts }: SpecDocument): readonly Draft[] {
  return parts
    .filter(({ note }) => note !== undefined)
    .map(({ name, note }) =>
      check({
        id: `compared:${name}`,
        title: `${name} compared with the old one`,
        instruction: `Size by size beside the old part before it goes on: holes, depths, threads, shaft, height. The spec says: ${note}.`,
      }),
    );
}

function manifolds(document: SpecDocument): readonly Draft[] {
  const after = ['compared', 'manifold-gaskets'];
  return [
    check({
      id: 'manifold-gaskets',
      title: 'Manifold gaskets and sealant',
      instruction:
        'Faces flat, gasket ports no smaller than the head, the right side out; sealant only where the spec has it.',
    }),
    ...tightening(document, 'valley-cover', { after }),
    ...tightening(document, 'inlet-manifold', { after: [...after, 'tight:valley-cover', 'valley-faces'] }),
    ...tightening(document, 'exhaust-manifold', { after }),
  ];
}

const others: readonly FastenerPlace[] = ['thermostat-housing', 'fuel-pump', 'dynamo-bracket'];

function waterPump(document: SpecDocument): readonly Draft[] {
  return [
    check({
      id: 'pump-gasket',
      title: 'Water pump gasket and sealant',
      instruction:
        'Holes compared with pump and block, a thin film of sealant, studs that enter the water sealed too.',
    }),
    ...tightening(document, 'water-pump', { after: ['compared', 'pump-gasket'] }),
    check({
      id: 'pump-turns',
      after: ['tight:water-pump'],
      title: 'Water pump turns with its fasteners tight',
      instruction:
        'Turn the shaft by hand: free all the way round, no rub of the impeller. One that stops now was held off by its gasket.',
    }),
    ...others.flatMap((place) => tightening(document, place)),
  ];
}

function pumpPulley(document: SpecDocument): readonly Draft[] {
  const keys = document.keys.filter(({ key }) => !key.startsWith('crank'));
  return [
    ...keys.flatMap((spec) => [...sizesOfKey(spec), throughTheNut(spec)]),
    ...tightening(document, 'fan-pulley', { after: ['pump-turns', ...keys.map(({ key }) => `key:${key}`)] }),
  ];
}

const throughTheNut = ({ key, name }: KeySpec): Draft =>
  check({
    id: `thread:${key}`,
    after: [`key:${key}`],
    title: `${name}: thread through the nut`,
    instruction:
      'Nut tight: at least one and a half threads stand out, and the nut is not bound on the end of its thread.',
  });

function belt(document: SpecDocument): readonly Draft[] {
  const { offset, deflection } = document.belt;
  const spec = (rest: Omit<MeasurementSpec, 'place'>): MeasurementSpec => ({
    place: 'belt',
    ...rest,
  });
  return [
    ...readAt(document, 'belt').map((each) =>
      reading(each, {
        after: ['tight:fan-pulley'],
        words: 'What stands behind the pulley, all the way round.',
      }),
    ),
    reading(
      spec({
        key: 'belt-line',
        name: 'Belt line, groove to groove',
        method: 'straight-edge',
        limits: offset,
        critical: true,
        at: ['Driven pulley', 'Driven pulley, a quarter turn on'],
      }),
      {
        after: ['tight:fan-pulley', 'tight:crank-pulley', 'pump-turns'],
        words:
          'Straight edge across both pulleys, then again a quarter turn on, to tell a bent pulley from one that is out of line.',
      },
    ),
    reading(
      spec({
        key: 'belt-tension',
        name: 'Belt tension',
        method: 'depth-gauge',
        limits: deflection,
        critical: false,
        at: ['Middle of the longest run'],
      }),
      {
        after: ['read:belt:belt-line'],
        words: 'Pressed by a thumb, from a straight edge along the run down to the belt.',
      },
    ),
  ];
}

function cures({ compounds }: SpecDocument): readonly Draft[] {
  return compounds.map(({ key, name, use, curePoints }) =>
    check({
      id: `cure:${key}`,
      title: `${name} cured before load`,
      instruction: `Used on: ${use}. Wait until the data sheet's time to load has run out at the shop's temperature: ${listed(
        curePoints.value.map(
          ({ temperature, gap, toLoad }) =>
            `${printQuantity(toLoad)} at ${printQuantity(temperature)}${gap ? ` in a gap of ${printQuantity(gap)}` : ''}`,
        ),
      )}.`,
      source: curePoints.source,
    }),
  );
}
