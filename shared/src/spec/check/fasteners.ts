import { InputError } from '../../contracts/input-error.js';
import type { FastenerLayout, TighteningPass } from '../../contracts/calculations.js';
import { fastenerPlaces, type FastenerGroup } from '../../contracts/spec.js';
import { requireRecord } from '../../quantities/require.js';
import {
  key,
  list,
  number,
  object,
  oneOf,
  optional,
  quantity,
  sourced,
  text,
  trueOrFalse,
  type Shape,
} from './shapes.js';

const count = number({ min: 1, max: 64, integer: true });
const torque = quantity('torque');

type Pattern = 'grid' | 'circle' | 'line';
const patterns: Readonly<Record<Pattern | 'positions', Shape<FastenerLayout>>> = {
  grid: object<Extract<FastenerLayout, { pattern: 'grid' }>>({
    pattern: oneOf(['grid']),
    rows: count,
    columns: count,
  }),
  circle: object<Extract<FastenerLayout, { pattern: 'circle' }>>({ pattern: oneOf(['circle']), count }),
  line: object<Extract<FastenerLayout, { pattern: 'line' }>>({ pattern: oneOf(['line']), count }),
  positions: object<Extract<FastenerLayout, { positions: unknown }>>({
    positions: list(object({ fastener: text, x: number(), y: number() }), { min: 1, max: 64 }),
  }),
};

const layout: Shape<FastenerLayout> = (input, path) => {
  const { pattern } = requireRecord(input, path);
  const shape =
    pattern === undefined ? 'positions' : oneOf(['grid', 'circle', 'line'])(pattern, `${path}.pattern`);
  return patterns[shape](input, path);
};

const passes: readonly { readonly name: string; readonly shape: Shape<TighteningPass> }[] = [
  { name: 'fraction', shape: object({ fraction: number({ min: 0.01, max: 1 }) }) },
  { name: 'torque', shape: object({ torque }) },
  { name: 'angle', shape: object({ angle: number({ min: 1, max: 720 }) }) },
  {
    name: 'check',
    shape: (input, path) => {
      object({ check: trueOrFalse })(input, path);
      return { check: true };
    },
  },
];

const pass: Shape<TighteningPass> = (input, path) => {
  const record = requireRecord(input, path);
  const found = passes.find(({ name }) => name in record);
  if (!found) throw new InputError(path, 'A pass is a fraction, a torque, an angle or a check.');
  return found.shape(input, path);
};

export const fastenerGroup = object<FastenerGroup>({
  key,
  place: oneOf(fastenerPlaces),
  name: text,
  noun: text,
  layout,
  outline: oneOf(['head', 'plain', 'circle']),
  repeats: optional(list(text, { min: 1, max: 32 })),
  thread: sourced(text),
  grade: sourced(text),
  condition: sourced(oneOf(['dry', 'oiled', 'moly', 'sealant', 'thread-lock'])),
  torque: sourced(torque),
  alsoPrinted: optional(sourced(torque)),
  tolerance: optional(sourced(object({ low: torque, high: torque }))),
  passes: sourced(list(pass, { min: 1, max: 20 })),
  sequence: optional(sourced(list(text, { min: 1, max: 64 }))),
  singleUse: optional(sourced(trueOrFalse)),
  locking: optional(sourced(text)),
});
