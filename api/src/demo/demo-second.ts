import { convert } from '@second-spanner/shared/quantities/convert';
import type {
  EntryContent,
  SecondReadingContent,
  StepDefinition,
} from '@second-spanner/shared/contracts/steps';
import { finalPass, planOf } from '@second-spanner/shared/sheet/plan-of';
import { finalTarget, leads } from './demo-contents.js';
import type { DemoSightings, Values } from './demo-sheet-file.js';
import { asShown, type DemoTools } from './demo-tools.js';

/** What the second person reads on a step: the same as the first, each with their own tool, unless it is written. */
export function secondReading(
  step: StepDefinition,
  first: readonly EntryContent[],
  tools: DemoTools,
  sightings: DemoSightings,
  written: Values = {},
): SecondReadingContent {
  if (step.secondCheck === 'inspected' || step.secondCheck === undefined) {
    return { kind: 'inspected', outcome: 'pass', seen: step.lookFor ?? [] };
  }
  switch (step.kind) {
    case 'measurement': {
      const [own, other] = tools.readers(step);
      const kind = step.secondCheck === 'strip-read-again' ? 'strip-read-again' : 'measured-again';
      const tool = kind === 'strip-read-again' ? own : other;
      const readings = first.flatMap((content) => {
        if (content.kind !== 'measurement') return [];
        const { at, value } = content;
        const figure = written[at];
        const again = figure === undefined ? value : { value: figure, unit: value.unit };
        return [{ at, value: asShown(tool, convert(again, step.unit), step.unit, 2) }];
      });
      return { kind, toolId: tool.id, readings };
    }
    case 'tightening': {
      const tool = tools.wrench(finalTarget(step), step.plan.tolerance !== undefined);
      const target = finalTarget(step);
      const setting = tool.kind === 'click-wrench' ? asShown(tool, target, tool.resolution.unit) : target;
      return { kind: 'setting-and-pull-witnessed', toolId: tool.id, setting };
    }
    case 'wiring':
      return { kind: 'read-again', fitted: leads(step) };
    case 'valve-timing':
      return { kind: 'read-again', ...sightings[step.wanted] };
    case 'check':
    case 'photo':
      return { kind: 'inspected', outcome: 'pass', seen: step.lookFor ?? [] };
  }
}

/** The fasteners whose pulls the second person watches; none on other steps. */
export function watched(step: StepDefinition): string[] {
  if (step.kind !== 'tightening') return [];
  const pass = finalPass(step);
  return planOf(step)
    .steps.filter((each) => each.pass === pass)
    .map(({ fastener }) => fastener);
}
