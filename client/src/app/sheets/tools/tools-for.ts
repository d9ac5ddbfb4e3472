import type { Unit } from '@second-spanner/shared/contracts/quantity';
import type { Tool, ToolKind } from '@second-spanner/shared/contracts/registers';
import type { ReadingMethod } from '@second-spanner/shared/contracts/spec';
import { kindOf } from '@second-spanner/shared/quantities/convert';

const madeFor: Partial<Record<ReadingMethod, ToolKind>> = {
  micrometer: 'micrometer',
  'bore-gauge': 'bore-gauge',
  feeler: 'feeler-set',
  'dial-gauge': 'dial-gauge',
  'plastic-gauge': 'plastic-gauge',
  'depth-gauge': 'depth-gauge',
  'spring-balance': 'spring-balance',
  'straight-edge': 'straight-edge',
  burette: 'burette',
};

const wrenches: readonly ToolKind[] = ['click-wrench', 'digital-wrench', 'dial-wrench'];

/** The tools that read a unit's kind of figure, those made for the method first. */
export function toolsForReading(tools: readonly Tool[], unit: Unit, method: ReadingMethod): readonly Tool[] {
  const able = tools.filter(({ low }) => kindOf(low.unit) === kindOf(unit));
  const kind = madeFor[method];
  return [...able.filter((tool) => tool.kind === kind), ...able.filter((tool) => tool.kind !== kind)];
}

/** The torque wrenches. */
export const wrenchesOf = (tools: readonly Tool[]): readonly Tool[] =>
  tools.filter(({ kind }) => wrenches.includes(kind));
