import type { CapMapRequest } from '../contracts/calculations.js';
import type { StaticTiming } from '../contracts/ignition-checks.js';
import { InputError } from '../contracts/input-error.js';
import type { SpecDocument } from '../contracts/spec.js';
import { drawCap } from '../drawing/cap.js';
import { capMap } from '../ignition/cap-map.js';
import { rotorCheck } from '../ignition/rotor-check.js';
import { defineWorking } from './define-working.js';
import { cylinderOf, engineErrors, firingCase, firingOf } from './engine/engine-fields.js';
import { assumedEven, printAngle, sentencesOf } from './engine/engine-words.js';
import type { CaseReader } from './read-case.js';
import { rotorSections } from './rotor-check-fields.js';
import { readAngles } from './wiring-map/read-texts.js';
import { spoken } from './wiring-map/spoken.js';

/** Whether the rotor points where it should with the crank at the timing mark. */
export const rotorCheckWorking = defineWorking({
  key: 'rotor-check',
  group: 'wiring',
  title: 'Rotor check',
  asks: 'Does the rotor point at the right post with the crank at the timing mark?',
  sections: rotorSections,
  example: {
    typed: {
      order: '1-3-4-2',
      turns: 'clockwise',
      posts: '45, 135, 225, 315',
      rotor: '50',
      crankAt: 'tdc',
      advance: '10',
    },
    from: 'geometry of the cap: at TDC the rotor is past its post by half of 10°; no printed source',
  },
  fromSpec: (document) => [{ name: 'The engine', typed: fromDocument(document) }],
  basis: [
    'The rotor stands at its post at the static timing mark, and at TDC past it by half the advance: the distributor turns at half crank speed (four-stroke).',
    'Piston travel to degrees by the slider-crank, without offset: any text on engine kinematics.',
  ],
  fieldOf: [
    ...engineErrors,
    [/^cap\.(rotationSeenFrom)/, 'from'],
    [/^cap\.rotation/, 'turns'],
    [/^cap\.firstPost/, 'first'],
    [/^cap/, 'posts'],
    [/^rotorAngle/, 'rotor'],
    [/^rotorSeenFrom/, 'rotorFrom'],
    [/^timing\.pistonBeforeTdc/, 'piston'],
    [/^timing\.stroke/, 'stroke'],
    [/^timing\.rodLength/, 'rod'],
    [/^timing/, 'advance'],
    [/^rotationOf/, 'readOn'],
    [/^gearedRotor/, 'geared'],
  ],
  answer: (read, options) => {
    const cap = capOf(read);
    const rotorAngle = read.number('rotor');
    const rotorSeenFrom = read.choice<'cap' | 'drive'>('rotorFrom');
    const typedCylinder = read.textIf('cylinder');
    const tolerance = read.numberIf('tolerance');
    const of = read.choice<'rotor' | 'armature'>('readOn');
    const check = rotorCheck({
      cap,
      rotorAngle,
      rotorSeenFrom,
      timing: timingOf(read),
      crankAt: read.choice<'static-mark' | 'tdc'>('crankAt'),
      rotationOf: of,
      ...(of === 'armature' ? { gearedRotor: read.choice<'same-way' | 'other-way'>('geared') } : {}),
      ...(typedCylinder === undefined ? {} : { cylinder: cylinderOf(typedCylinder, cap) }),
      ...(tolerance === undefined ? {} : { tolerance }),
    });
    const turned: CapMapRequest = { ...cap, rotation: check.rotorTurns, rotationSeenFrom: 'cap' };
    const drawing = drawCap(
      {
        map: capMap(turned),
        request: turned,
        rotorAngle: rotorSeenFrom === 'cap' ? rotorAngle : -rotorAngle,
        showRequired: true,
      },
      options,
    );
    return {
      parts: [
        { kind: 'judgement', verdict: check.verdict, reason: spoken(check.reason) },
        ...(check.howToTell === undefined
          ? []
          : [
              {
                kind: 'steps' as const,
                heading: 'How to tell which',
                steps: sentencesOf(spoken(check.howToTell)),
              },
            ]),
        { kind: 'drawing', caption: 'The rotor as seen, on the outside of the cap', drawing },
        {
          kind: 'facts',
          facts: [
            { name: 'Points at', value: `post ${check.nearestPost}°, cylinder ${check.nearestCylinder}` },
            { name: 'Should point at', value: `post ${check.wantedPost}°` },
            {
              name: 'Past it, the way the rotor turns',
              value: printAngle(check.error),
              note: `${printAngle(check.crankError)} of crank`,
            },
            {
              name: 'The rotor turns',
              value: check.rotorTurns === 'clockwise' ? 'clockwise' : '{anticlockwise}',
              note: 'seen on the cap',
            },
          ],
        },
      ],
      assumed: [
        ...check.assumed.map(spoken),
        ...assumedEven(cap.intervals),
        ...(read.textIf('posts') === undefined ? ['The posts are evenly spaced.'] : []),
      ],
      cautions: ['Switch the ignition off and take the coil’s {lead} off before turning the engine by hand.'],
    };
  },
});

function capOf(read: CaseReader): CapMapRequest {
  const firing = firingOf(read);
  const typed = read.textIf('posts');
  const first = read.textIf('first')?.replace(/°$/, '');
  const angles =
    typed === undefined ? firing.firingOrder.map((_, i, all) => (i * 360) / all.length) : readAngles(typed);
  if (angles === null) throw new InputError('posts', 'Write the angles in degrees: 45, 135, 225, 315.');
  return {
    ...firing,
    rotation: read.choice<'clockwise' | 'anticlockwise'>('turns'),
    rotationSeenFrom: read.choice<'cap' | 'drive'>('from'),
    posts: angles.map((angle) => ({ post: String(Math.round(angle * 10) / 10), angle })),
    ...(first === undefined ? {} : { firstPost: first }),
  };
}

function timingOf(read: CaseReader): StaticTiming {
  if (read.choice('timing') === 'degrees') return { advance: read.number('advance') };
  return {
    pistonBeforeTdc: read.quantity('piston'),
    stroke: read.quantity('stroke'),
    rodLength: read.quantity('rod'),
  };
}

function fromDocument(document: SpecDocument): Record<string, string> {
  const { rotation, rotationSeenFrom, posts, firstPost, staticTiming } = document.ignition;
  const first = posts.value.find(({ post }) => post === firstPost.value);
  return {
    ...firingCase(document),
    turns: rotation.value,
    from: rotationSeenFrom.value,
    posts: posts.value.map(({ angle }) => String(angle)).join(', '),
    first: first === undefined ? '' : String(first.angle),
    advance: String(staticTiming.value),
  };
}
