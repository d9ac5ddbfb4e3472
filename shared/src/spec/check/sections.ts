import { engineLayouts, type EngineSection, type IgnitionSection } from '../../contracts/spec.js';
import type { KeySpec, ValveTrainSection } from '../../contracts/spec.js';
import {
  key,
  limits,
  list,
  named,
  number,
  object,
  oneOf,
  optional,
  quantity,
  sourced,
  text,
} from './shapes.js';

const rotations = ['clockwise', 'anticlockwise'] as const;
const cylinder = number({ min: 1, max: 16, integer: true });
const degrees = number({ min: -180, max: 180 });
const length = quantity('length');

export const engine = object<EngineSection>({
  name: sourced(text),
  layout: sourced(oneOf(engineLayouts)),
  cylinders: sourced(cylinder),
  banks: sourced(list(list(cylinder, { min: 1, max: 16 }), { min: 1, max: 4 })),
  numberedFrom: sourced(text),
  crankTurns: sourced(oneOf(rotations)),
  crankSeenFrom: sourced(oneOf(['front', 'flywheel'])),
  firingOrder: sourced(list(cylinder, { min: 1, max: 16 })),
  bore: sourced(length),
  stroke: sourced(length),
  rodLength: sourced(length),
  compressionRatio: sourced(number({ min: 1, max: 30 })),
  undersizes: sourced(list(length, { max: 12 })),
  oversizes: sourced(list(length, { max: 12 })),
  followers: sourced(oneOf(['flat', 'mushroom', 'hydraulic'])),
});

export const ignition = object<IgnitionSection>({
  rotation: sourced(oneOf(rotations)),
  rotationSeenFrom: sourced(oneOf(['cap', 'drive'])),
  posts: sourced(list(object({ post: text, angle: number({ min: 0, max: 360 }) }), { min: 1, max: 16 })),
  firstPost: sourced(text),
  trace: optional(sourced(named(text))),
  outletsAt: sourced(oneOf(['top', 'side'])),
  staticTiming: sourced(number({ min: -30, max: 60 })),
  pointsGap: sourced(limits('length')),
  plugGap: sourced(limits('length')),
  leadResistance: sourced(limits('resistance')),
  leadKind: sourced(oneOf(['wire-core', 'resistive'])),
  coilPolarity: sourced(oneOf(['positive-earth', 'negative-earth'])),
});

export const valveTrain = object<ValveTrainSection>({
  timing: sourced(object({ ivo: degrees, ivc: degrees, evo: degrees, evc: degrees })),
  timingQuotedAt: sourced(object({ lift: optional(length), lash: optional(length) })),
  lash: sourced(object({ inlet: length, exhaust: length, engine: oneOf(['cold', 'hot']) })),
  valveLayout: sourced(list(oneOf(['inlet', 'exhaust']), { min: 2, max: 64 })),
  marksTogether: sourced(oneOf(['compression', 'exhaust'])),
});

export const keySpec = object<KeySpec>({
  key,
  name: text,
  keyWidth: sourced(limits('length')),
  keyHeight: sourced(limits('length')),
  shaftKeywayWidth: sourced(limits('length')),
  shaftKeywayDepth: sourced(limits('length')),
  hubKeywayWidth: sourced(limits('length')),
  hubKeywayDepth: sourced(limits('length')),
  shaftDiameter: sourced(limits('length')),
  hubBore: sourced(limits('length')),
});
