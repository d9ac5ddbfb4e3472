import { InputError } from '../contracts/input-error.js';
import type { TighteningStep } from '../contracts/calculations.js';
import type { Quantity, Unit } from '../contracts/quantity.js';
import type { Tool, ToolKind } from '../contracts/registers.js';
import type { Adapter, EntryContent, TighteningStepDefinition } from '../contracts/steps.js';
import type { Judgement } from '../contracts/verdict.js';
import { judgePull } from '../fastening/judge-pull.js';
import { wrenchSetting } from '../fastening/wrench-setting.js';
import { convert } from '../quantities/convert.js';
import { requireNumber, requireQuantity } from '../quantities/require.js';
import type { JudgingContext } from './judging-context.js';
import { planStep } from './plan-of.js';
import { toolJudgement, toolOf, uncertaintyAt } from './tools.js';

type Content = Extract<EntryContent, { kind: 'tightening' }>;

const wrenches: readonly ToolKind[] = ['click-wrench', 'digital-wrench', 'dial-wrench'];

/** Permissible deviation of an angle pass, degrees either side: common practice, no source. */
export const angleDeviation = 5;

/**
 * Least share of the target that a reading without printed limits may be off: ISO 6789-1:2017, 5.1.5,
 * permissible deviation ±4 % for class of most wrenches above 10 N·m (from memory).
 */
const permissibleShare = 0.04;

/** Whether the tool is a wrench that one sets and that clicks. */
export const clicks = (tool: Tool): boolean => tool.kind === 'click-wrench';

/** What the wrench must be set to, or show, so that the fastener gets `torque`. */
export function requiredSetting(torque: Quantity, tool: Tool, adapter: Adapter | undefined): Quantity {
  if (!adapter) return torque;
  if (!tool.length) {
    throw new InputError(
      'content.adapter',
      `${tool.code} has no length in the register, so an adapter can't be allowed for.`,
    );
  }
  return wrenchSetting({
    torque,
    wrenchLength: tool.length,
    adapterLength: adapter.length,
    adapterAngle: adapter.angle,
  }).setting;
}

/** One pull on one fastener. */
export function judgeTightening(
  definition: TighteningStepDefinition,
  content: Content,
  context: JudgingContext,
): Judgement {
  const step = planStep(definition, content.pass, content.fastener);
  if (!step) {
    throw new InputError(
      'content.fastener',
      `There is no ${definition.group.noun} ${content.fastener} in pass ${content.pass}.`,
    );
  }
  if (step.angle !== undefined) return judgeAngle(step.angle, content);
  const tool = toolOf(context.tools, content.toolId, 'content.toolId');
  if (!wrenches.includes(tool.kind)) {
    throw new InputError('content.toolId', `${tool.name} ${tool.code} is not a torque wrench.`);
  }
  if (!step.target) throw new InputError('content.pass', `Pass ${content.pass} has no torque.`);
  return judgeWrench(step, step.target, tool, content, context);
}

function judgeAngle(wanted: number, content: Content): Judgement {
  const turned = requireNumber(content.angle, 'content.angle', { min: 0, max: 720 });
  const off = Math.abs(turned - wanted);
  return off <= angleDeviation
    ? { verdict: 'pass', reason: `Turned ${turned}°, wanted ${wanted}° within ${angleDeviation}°.` }
    : { verdict: 'fail', reason: `Turned ${turned}°, which is ${off}° from the ${wanted}° wanted.` };
}

/** A click wrench is judged by its setting to half a division, the others by what they show. */
function judgeWrench(
  { low, high }: TighteningStep,
  target: Quantity,
  tool: Tool,
  content: Content,
  context: JudgingContext,
): Judgement {
  const shown = clicks(tool)
    ? requireQuantity(content.setting, 'torque', 'content.setting', { zero: false })
    : requireQuantity(content.reading, 'torque', 'content.reading', { zero: false });
  const wanted = convert(requiredSetting(target, tool, content.adapter), shown.unit);
  const ofTool = toolJudgement(tool, shown, context.on);
  if (ofTool) return ofTool;
  const one: Quantity = { value: 1, unit: shown.unit };
  return judgePull({
    wrench: tool.code,
    clicks: clicks(tool),
    shown,
    wanted,
    lever: requiredSetting(one, tool, content.adapter).value,
    low,
    high,
    uncertaintyAt: (torque) => uncertaintyAt(tool, torque),
    allowed: clicks(tool) ? halfDivision(tool, shown.unit) : allowanceAt(tool, wanted),
  });
}

function halfDivision(tool: Tool, unit: Unit): Quantity {
  return { value: convert(tool.resolution, unit).value / 2, unit };
}

/** How far a reading without printed limits may be off: what the wrench is good to, or its class if that is more. */
function allowanceAt(tool: Tool, wanted: Quantity): Quantity {
  const ofClass = wanted.value * permissibleShare;
  return { value: Math.max(ofClass, uncertaintyAt(tool, wanted).value), unit: wanted.unit };
}
