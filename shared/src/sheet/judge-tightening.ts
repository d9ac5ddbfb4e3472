import { InputError } from '../contracts/input-error.js';
import type { TighteningStep } from '../contracts/calculations.js';
import type { Quantity } from '../contracts/quantity.js';
import type { Tool, ToolKind } from '../contracts/registers.js';
import type { Adapter, EntryContent, TighteningStepDefinition } from '../contracts/steps.js';
import type { Judgement } from '../contracts/verdict.js';
import { wrenchSetting } from '../fastening/wrench-setting.js';
import { limitDecision } from '../measuring/limit-decision.js';
import { convert, toSi } from '../quantities/convert.js';
import { printQuantity } from '../quantities/print.js';
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
  return clicks(tool)
    ? judgeSetting(step, step.target, tool, content, context)
    : judgeReading(step, step.target, tool, content, context);
}

function judgeAngle(wanted: number, content: Content): Judgement {
  const turned = requireNumber(content.angle, 'content.angle', { min: 0, max: 720 });
  const off = Math.abs(turned - wanted);
  return off <= angleDeviation
    ? { verdict: 'pass', reason: `Turned ${turned}°, wanted ${wanted}° within ${angleDeviation}°.` }
    : { verdict: 'fail', reason: `Turned ${turned}°, which is ${off}° from the ${wanted}° wanted.` };
}

/** A click wrench proves its setting, not a reading: setting, range, class and date are judged. */
function judgeSetting(
  step: TighteningStep,
  target: Quantity,
  tool: Tool,
  content: Content,
  context: JudgingContext,
): Judgement {
  const setting = requireQuantity(content.setting, 'torque', 'content.setting', { zero: false });
  const required = convert(requiredSetting(target, tool, content.adapter), setting.unit);
  const ofTool = toolJudgement(tool, setting, context.on);
  if (ofTool) return ofTool;
  const resolution = convert(tool.resolution, setting.unit).value;
  if (Math.abs(setting.value - required.value) > resolution / 2 + 1e-9) {
    return {
      verdict: 'fail',
      reason: `${tool.code} stands at ${printQuantity(setting)} and must be set to ${printQuantity(required)}.`,
    };
  }
  return judgeAtFastener(
    step,
    tool,
    content,
    setting,
    `Set to ${printQuantity(setting)}, pulled once to the click.`,
  );
}

function judgeReading(
  step: TighteningStep,
  target: Quantity,
  tool: Tool,
  content: Content,
  context: JudgingContext,
): Judgement {
  const reading = requireQuantity(content.reading, 'torque', 'content.reading', { zero: false });
  const ofTool = toolJudgement(tool, reading, context.on);
  if (ofTool) return ofTool;
  if (step.low || step.high) return judgeAtFastener(step, tool, content, reading);
  const aim = convert(requiredSetting(target, tool, content.adapter), reading.unit);
  const allowed = aim.value * Math.max(permissibleShare, toSi(uncertaintyAt(tool, aim)) / toSi(aim));
  const within = Math.abs(reading.value - aim.value) <= allowed;
  const band = printQuantity({ value: allowed, unit: reading.unit });
  return {
    verdict: within ? 'pass' : 'fail',
    reason: `${printQuantity(reading)} is ${within ? 'within' : 'not within'} ${band} of ${printQuantity(aim)}, the wrench's own allowance; this pass has no limits of its own.`,
  };
}

/** Carries what the wrench shows through the adapter to the fastener, and judges it there. */
function judgeAtFastener(
  step: TighteningStep,
  tool: Tool,
  content: Content,
  shown: Quantity,
  passing?: string,
): Judgement {
  if (!step.low && !step.high) return { verdict: 'pass', reason: passing ?? '' };
  const unit: Quantity = { value: 1, unit: shown.unit };
  const factor = requiredSetting(unit, tool, content.adapter).value;
  const value: Quantity = { value: shown.value / factor, unit: shown.unit };
  const decision = limitDecision({
    value,
    ...(step.low && { low: step.low }),
    ...(step.high && { high: step.high }),
    uncertainty: uncertaintyAt(tool, value),
  });
  return passing && decision.verdict === 'pass'
    ? { verdict: 'pass', reason: `${passing} ${decision.reason}` }
    : decision;
}
