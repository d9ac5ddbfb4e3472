import type {
  TighteningPass,
  TighteningPlan,
  TighteningPlanRequest,
  TighteningStep,
} from '../contracts/calculations.js';
import { InputError } from '../contracts/input-error.js';
import { units, type Quantity } from '../contracts/quantity.js';
import { convert } from '../quantities/convert.js';
import { requireRecord, requireText } from '../quantities/require.js';
import { readUnit } from '../quantities/unit-names.js';
import { requireFinals, requireTolerance, type Finals, type Tolerance } from './finals.js';
import { requireSequence } from './given-sequence.js';
import { requireLayout } from './layout.js';
import { requirePasses } from './passes.js';
import { judgePlan } from './plan-verdict.js';
import { generalSequence } from './sequence.js';

/** Two torques are the same where they differ by less than this share: conversion noise. */
const noise = 1e-9;

/**
 * The order in which a group of fasteners is tightened and loosened, and what each is pulled to in each pass.
 * A sequence that is given is taken for the maker's and wins; without one it is general practice: centre
 * outwards, circles opposite and crossing. Targets are in `unit`, or else in the unit that the torque was
 * given in; angles in degrees. `low` and `high` stand on passes to the full torque and on check passes only.
 *
 * @throws InputError on the request's fields, such as `fasteners.rows`, `passes[2].fraction`, `sequence[3]`
 * Source: the order as `generalSequence` says; passes and tolerances are the request's own.
 * Example: a grid of 2 × 5 begins with the two of the middle column; 27 lbf·ft in passes of ⅓, ⅔ and 1 is
 * 9, 18 and 27 lbf·ft.
 */
export function tighteningPlan(request: TighteningPlanRequest): TighteningPlan {
  const given = requireRecord(request, 'request');
  const layout = requireLayout(given['fasteners']);
  const fasteners = layout.positions.map(({ fastener }) => fastener);
  const finals = requireFinals(given['final'], given['finals'], fasteners);
  const tolerance = requireTolerance(given['tolerance'], finals);
  const passes = requirePasses(given['passes']);
  const unit = given['unit'] === undefined ? undefined : requireTorqueUnit(given['unit']);
  refuseWithoutFinal(passes, finals);
  refuseOverFinal(passes, finals);

  const isGiven = given['sequence'] !== undefined;
  const sequence = isGiven ? requireSequence(given['sequence'], fasteners) : generalSequence(layout);
  return {
    ...judgePlan({ layout, sequence, isGiven, passes, finals }),
    basis: isGiven ? 'maker' : 'general-practice',
    sequence,
    loosening: [...sequence].reverse(),
    steps: passes.flatMap((pass, i) =>
      sequence.map((fastener, place): TighteningStep => ({
        pass: i + 1,
        order: place + 1,
        fastener,
        ...aim(pass, finals.get(fastener), tolerance, unit),
      })),
    ),
  };
}

function aim(
  pass: TighteningPass,
  final: Quantity | undefined,
  tolerance: Tolerance | undefined,
  unit: string | undefined,
): Pick<TighteningStep, 'target' | 'angle' | 'low' | 'high'> {
  if ('angle' in pass) return { angle: pass.angle };
  const torque = torqueOf(pass, final);
  const target = unit === undefined ? torque : convert(torque, unit);
  if (!tolerance || !final || !isFull(torque, final)) return { target };
  return {
    target,
    low: { value: target.value - convert(tolerance.low, target.unit).value, unit: target.unit },
    high: { value: target.value + convert(tolerance.high, target.unit).value, unit: target.unit },
  };
}

function torqueOf(pass: Exclude<TighteningPass, { angle: number }>, final: Quantity | undefined): Quantity {
  if ('torque' in pass) return pass.torque;
  if (!final) throw new InputError('final', finalNeeded);
  return 'check' in pass ? final : { value: final.value * pass.fraction, unit: final.unit };
}

function isFull(torque: Quantity, final: Quantity): boolean {
  return convert(torque, final.unit).value >= final.value * (1 - noise);
}

const finalNeeded = 'A pass to a fraction and a check pass need the final torque: give it.';

function refuseWithoutFinal(passes: readonly TighteningPass[], finals: Finals): void {
  const needs = passes.some((pass) => 'fraction' in pass || 'check' in pass);
  if (needs && finals.size === 0) throw new InputError('final', finalNeeded);
}

function refuseOverFinal(passes: readonly TighteningPass[], finals: Finals): void {
  for (const [i, pass] of passes.entries()) {
    if (!('torque' in pass)) continue;
    for (const [fastener, final] of finals) {
      if (convert(pass.torque, final.unit).value <= final.value * (1 + noise)) continue;
      throw new InputError(
        `passes[${i}].torque`,
        `This is more than the final torque of fastener ${fastener}.`,
      );
    }
  }
}

function requireTorqueUnit(input: unknown): string {
  const unit = readUnit(requireText(input, 'unit', { max: 40 }));
  const torques: readonly string[] = units.torque;
  if (unit === undefined || !torques.includes(unit)) {
    throw new InputError('unit', `This must be a unit of torque: ${torques.join(', ')}.`);
  }
  return unit;
}
