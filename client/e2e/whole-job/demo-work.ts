import { readFileSync } from 'node:fs';
import type { Sighting } from '@second-spanner/shared/contracts/calculations';
import type { Quantity } from '@second-spanner/shared/contracts/quantity';
import type { Tool } from '@second-spanner/shared/contracts/registers';
import type { Limits } from '@second-spanner/shared/contracts/spec';
import type {
  EntryContent,
  MeasurementStep,
  StepDefinition,
  TighteningStepDefinition,
  ValveTimingStep,
  WiringStep,
} from '@second-spanner/shared/contracts/steps';
import { capMap } from '@second-spanner/shared/ignition/cap-map';
import { convert, kindOf, toSi } from '@second-spanner/shared/quantities/convert';
import { finalPass, planOf } from '@second-spanner/shared/sheet/plan-of';

interface Seen {
  readonly about: number;
  readonly sightings: readonly (readonly Sighting[])[];
}
interface DemoFile {
  readonly sightings: Readonly<Record<ValveTimingStep['wanted'], Seen>>;
  readonly shops: readonly {
    /** The first person's tool and the second's, by method or kind of figure. */
    readonly readWith: Readonly<Record<string, readonly string[] | undefined>>;
    readonly pullWith: Readonly<Record<'withTolerance' | 'withoutTolerance', readonly string[]>>;
  }[];
}

const demo = JSON.parse(
  readFileSync(new URL('../../../test-data/shops/demo.json', import.meta.url), 'utf8'),
) as DemoFile;
const [shop] = demo.shops;

export function toolNamed(tools: readonly Tool[], code: string | undefined): Tool {
  const tool = tools.find((each) => each.code === code);
  if (tool === undefined) throw new Error(`The demo's shop has no tool ${code ?? 'for this'}.`);
  return tool;
}

/** The first and the second person's tools for a measurement. */
export function readers({ method, unit }: MeasurementStep, tools: readonly Tool[]): readonly Tool[] {
  const codes = shop?.readWith[method] ?? shop?.readWith[kindOf(unit)] ?? [];
  return codes.map((code) => toolNamed(tools, code));
}

/** What a careful builder records on a step, one entry a slot: every figure in the middle of its limits. */
export function goodContents(step: StepDefinition, tools: readonly Tool[]): readonly EntryContent[] {
  switch (step.kind) {
    case 'check':
      return [{ kind: 'check', outcome: 'pass' }];
    case 'measurement': {
      const toolId = readers(step, tools)[0]?.id ?? '';
      const value = middle(step.limits);
      return step.at.map((at) => ({ kind: 'measurement', at, value, toolId }));
    }
    case 'tightening':
      return pulls(step, tools);
    case 'wiring':
      return [{ kind: 'wiring', fitted: leads(step) }];
    case 'valve-timing':
      return [{ kind: 'valve-timing', ...demo.sightings[step.wanted] }];
    case 'photo':
      throw new Error(`Step ${step.code} wants photos: it is worked on its page.`);
  }
}

function middle({ low, high }: Limits): Quantity {
  if (low && high) return { value: (low.value + convert(high, low.unit).value) / 2, unit: low.unit };
  if (high) return { value: high.value * 0.4, unit: high.unit };
  if (low) return { value: low.value * 1.6, unit: low.unit };
  throw new Error('Nothing is read that has no limits.');
}

/** The torque at which the fasteners end, and which the second person watches. */
export function finalTorque(step: TighteningStepDefinition): Quantity {
  const target = planOf(step).steps.find(({ pass }) => pass === finalPass(step))?.target;
  if (target === undefined) throw new Error(`Step ${step.code} has no torque.`);
  return target;
}

/** The fasteners that are pulled at the end, in their order. */
export const watchedFasteners = (step: TighteningStepDefinition): readonly string[] =>
  planOf(step)
    .steps.filter(({ pass }) => pass === finalPass(step))
    .map(({ fastener }) => fastener);

function pulls(step: TighteningStepDefinition, tools: readonly Tool[]): readonly EntryContent[] {
  const codes = shop?.pullWith[step.plan.tolerance ? 'withTolerance' : 'withoutTolerance'] ?? [];
  const wrenches = codes.map((code) => toolNamed(tools, code));
  return planOf(step).steps.map(({ pass, fastener, target = finalTorque(step), angle }) => {
    const wrench = wrenches.find(({ low, high }) => toSi(target) >= toSi(low) && toSi(target) <= toSi(high));
    if (wrench === undefined) throw new Error(`The demo's shop has no wrench for step ${step.code}.`);
    const pull = { kind: 'tightening', pass, fastener, toolId: wrench.id } as const;
    if (angle !== undefined) return { ...pull, angle };
    return wrench.kind === 'click-wrench' ? { ...pull, setting: target } : { ...pull, reading: target };
  });
}

/** Every lead where it belongs, by outlet. */
const leads = ({ cap }: WiringStep) =>
  Object.fromEntries(capMap(cap).leads.map(({ outlet, cylinder }) => [outlet, cylinder]));
