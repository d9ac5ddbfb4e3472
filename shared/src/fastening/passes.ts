import type { TighteningPass } from '../contracts/calculations.js';
import { InputError } from '../contracts/input-error.js';
import { requireList, requireNumber, requireQuantity, requireRecord } from '../quantities/require.js';

export const mostPasses = 20;
const names = ['fraction', 'torque', 'angle', 'check'] as const;

/**
 * The passes of a request, each of one kind. An angle is turned on from a torque, so a pass with a torque
 * comes before it.
 *
 * @throws InputError on `passes` or paths such as `passes[2].fraction`
 */
export function requirePasses(input: unknown): readonly TighteningPass[] {
  const passes = requireList(input, 'passes', { min: 1, max: mostPasses }).map(requirePass);
  const angle = passes.findIndex((pass) => 'angle' in pass);
  if (angle === 0) {
    throw new InputError(
      'passes[0].angle',
      'An angle is turned on from a torque: put a pass with a torque first.',
    );
  }
  return passes;
}

function requirePass(input: unknown, i: number): TighteningPass {
  const path = `passes[${i}]`;
  const pass = requireRecord(input, path);
  const given = names.filter((name) => pass[name] !== undefined);
  const [name] = given;
  if (name === undefined || given.length > 1) {
    throw new InputError(path, 'A pass has one of fraction, torque, angle or check.');
  }
  const field = `${path}.${name}`;
  switch (name) {
    case 'fraction':
      return { fraction: moreThanNothing(requireNumber(pass[name], field, { min: 0, max: 1 }), field) };
    case 'torque':
      return { torque: requireQuantity(pass[name], 'torque', field, { zero: false }) };
    case 'angle':
      return { angle: moreThanNothing(requireNumber(pass[name], field, { min: 0, max: 360 }), field) };
    default:
      if (pass[name] !== true) throw new InputError(field, 'This must be true.');
      return { check: true };
  }
}

function moreThanNothing(value: number, field: string): number {
  if (value === 0) throw new InputError(field, 'This must be more than zero.');
  return value;
}
