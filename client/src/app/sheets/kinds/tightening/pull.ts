import type { TighteningStep } from '@second-spanner/shared/contracts/calculations';
import { InputError } from '@second-spanner/shared/contracts/input-error';
import type { Quantity, Unit } from '@second-spanner/shared/contracts/quantity';
import type { Tool } from '@second-spanner/shared/contracts/registers';
import type { Adapter, TighteningStepDefinition } from '@second-spanner/shared/contracts/steps';
import type { FastenerState } from '@second-spanner/shared/drawing/tightening';
import { convert } from '@second-spanner/shared/quantities/convert';
import { lastPass, planStep } from '@second-spanner/shared/sheet/plan-of';
import { requiredSetting } from '@second-spanner/shared/sheet/judge-tightening';
import type { FilledSlot } from '../../next-slot';

/** A slot of a tightening, read back from its key. */
export function pullOf(definition: TighteningStepDefinition, slotKey: string): TighteningStep | null {
  const [, pass, ...fastener] = slotKey.split('/');
  return planStep(definition, Number(pass), fastener.join('/')) ?? null;
}

/** The slots of one pass, in the order of pulling. */
export function slotsOfPass(slots: readonly FilledSlot[], pass: number): readonly FilledSlot[] {
  return slots.filter(({ key }) => key.startsWith(`pull/${pass}/`));
}

/** How each fastener stands in a pass, for the drawing. */
export function fastenerStates(
  definition: TighteningStepDefinition,
  slots: readonly FilledSlot[],
  pass: number,
  atHand: string | null,
  following: string | null,
): Readonly<Record<string, FastenerState>> {
  const states = slotsOfPass(slots, pass).map(({ key, isGood }): [string, FastenerState] => {
    const fastener = pullOf(definition, key)?.fastener ?? '';
    if (key === atHand) return [fastener, 'in-hand'];
    if (isGood) return [fastener, 'done'];
    return [fastener, key === following ? 'next' : 'to-come'];
  });
  return Object.fromEntries(states);
}

/** The pass that the drawing shows: the one at hand, else the last. */
export function passShown(definition: TighteningStepDefinition, atHand: TighteningStep | null): number {
  return atHand?.pass ?? lastPass(definition);
}

export interface SettingFound {
  readonly setting: Quantity | null;
  readonly error: InputError | null;
}

/** What the wrench must be set to, or show, for a target at the fastener, in a unit of choice. */
export function settingFor(
  target: Quantity | undefined,
  tool: Tool | undefined,
  adapter: Adapter | undefined,
  unit: Unit,
): SettingFound {
  if (target === undefined || tool === undefined) return { setting: null, error: null };
  try {
    return { setting: convert(requiredSetting(target, tool, adapter), unit), error: null };
  } catch (error) {
    if (error instanceof InputError) return { setting: null, error };
    throw error;
  }
}

/** What reaches the fastener when the wrench shows a figure. */
export function atFastener(shown: Quantity, tool: Tool, adapter: Adapter | undefined): Quantity {
  const factor = requiredSetting({ value: 1, unit: shown.unit }, tool, adapter).value;
  return { value: shown.value / factor, unit: shown.unit };
}

/** How many fasteners are still to be pulled in a pass, the one at hand among them. */
export function toGo(slots: readonly FilledSlot[], pass: number): number {
  return slotsOfPass(slots, pass).filter(({ isGood }) => !isGood).length;
}
