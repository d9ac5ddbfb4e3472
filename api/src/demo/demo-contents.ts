import { capMap } from '@second-spanner/shared/ignition/cap-map';
import type { Cylinder, TighteningStep } from '@second-spanner/shared/contracts/calculations';
import type { Quantity } from '@second-spanner/shared/contracts/quantity';
import type {
  EntryContent,
  MeasurementStep,
  StepDefinition,
  TighteningStepDefinition,
  WiringStep,
} from '@second-spanner/shared/contracts/steps';
import { finalPass, planOf } from '@second-spanner/shared/sheet/plan-of';
import { eventOf, type PlayedStep } from './demo-events.js';
import type { DemoReadings, DemoSightings, Values } from './demo-sheet-file.js';
import { inside, near } from './demo-figures.js';
import { asShown, type DemoTools } from './demo-tools.js';

/** What a shop's steps are filled with. */
export interface DemoFiller {
  readonly tools: DemoTools;
  readonly sightings: DemoSightings;
  /** The id of a stored photo. */
  readonly photo: (index: number) => string;
}

/** What the builder records on a step first, before anything is corrected. */
export function firstContents(
  step: StepDefinition,
  { tools, sightings, photo }: DemoFiller,
  how: PlayedStep,
): EntryContent[] {
  switch (step.kind) {
    case 'check': {
      const note = eventOf(how, 'note')?.note;
      return [{ kind: 'check', outcome: 'pass', ...(note !== undefined && { note }) }];
    }
    case 'measurement': {
      const wrong = eventOf(how, 'left-open') ?? eventOf(how, 'disagreement');
      return wrong
        ? measurements(step, tools, wrong.first, wrong.unit)
        : measurements(step, tools, how.readings?.values, how.readings?.unit);
    }
    case 'tightening':
      return upTo(pulls(step, tools, how.readings), how.lastPull);
    case 'wiring':
      return [{ kind: 'wiring', fitted: leads(step, eventOf(how, 'wired-wrong')?.exchanged) }];
    case 'valve-timing':
      return [{ kind: 'valve-timing', ...sightings[step.wanted] }];
    case 'photo':
      return step.shows.map((shows, index) => ({ kind: 'photo', shows, fileId: photo(index) }));
  }
}

function upTo(all: EntryContent[], last: PlayedStep['lastPull']): EntryContent[] {
  const at = all.findIndex(
    (content) =>
      content.kind === 'tightening' && content.pass === last?.pass && content.fastener === last.fastener,
  );
  return at < 0 ? all : all.slice(0, at + 1);
}

/** What a builder reads at every place of a step, where nothing else is written for it. */
export function measurements(
  step: MeasurementStep,
  tools: DemoTools,
  written: Values = {},
  unit = step.unit,
): EntryContent[] {
  const [tool] = tools.readers(step);
  return step.at.map((at, index) => {
    const figure = written[at];
    const value =
      figure === undefined ? asShown(tool, inside(step.limits, index), step.unit) : { value: figure, unit };
    return { kind: 'measurement', at, value, toolId: tool.id };
  });
}

/** Every pull of a step in its order. */
function pulls(
  step: TighteningStepDefinition,
  tools: DemoTools,
  written: DemoReadings | undefined,
): EntryContent[] {
  return planOf(step).steps.map((each, index) => {
    const { pass, fastener } = each;
    const figure = written?.pulls?.find((pull) => pull.pass === pass && pull.fastener === fastener);
    return pullOf(step, each, tools, figure && written && { value: figure.value, unit: written.unit }, index);
  });
}

function pullOf(
  step: TighteningStepDefinition,
  { pass, fastener, target, angle }: TighteningStep,
  tools: DemoTools,
  written: Quantity | undefined,
  index: number,
): EntryContent {
  const hasTolerance = step.plan.tolerance !== undefined;
  const tool = tools.wrench(target ?? finalTarget(step), hasTolerance);
  const pull = { kind: 'tightening', pass, fastener, toolId: tool.id } as const;
  if (angle !== undefined) return { ...pull, angle };
  if (!target) throw new Error(`Pass ${pass} has neither torque nor angle.`);
  if (tool.kind === 'click-wrench') {
    return { ...pull, setting: asShown(tool, target, tool.resolution.unit) };
  }
  return { ...pull, reading: written ?? tenths(near(target, index)) };
}

/** The torque of the pass that is watched. */
export function finalTarget(step: TighteningStepDefinition): Quantity {
  const target = planOf(step).steps.find(({ pass }) => pass === finalPass(step))?.target;
  if (!target) throw new Error(`Step ${step.code} has no torque.`);
  return target;
}

const tenths = ({ value, unit }: Quantity): Quantity => ({ value: Number(value.toFixed(1)), unit });

/** Every lead where it belongs, by outlet; two cylinders exchanged where they are given. */
export function leads(step: WiringStep, exchanged?: readonly [number, number]): Record<string, Cylinder> {
  const fitted = capMap(step.cap).leads.map(({ outlet, cylinder }): [string, Cylinder] => {
    if (cylinder === exchanged?.[0]) return [outlet, exchanged[1]];
    return cylinder === exchanged?.[1] ? [outlet, exchanged[0]] : [outlet, cylinder];
  });
  return Object.fromEntries(fitted);
}
