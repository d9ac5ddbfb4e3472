import { InputError } from '../contracts/input-error.js';
import type { EntryContent, MeasurementStep } from '../contracts/steps.js';
import type { Judgement } from '../contracts/verdict.js';
import { limitDecision } from '../measuring/limit-decision.js';
import { kindOf } from '../quantities/convert.js';
import { requireQuantity } from '../quantities/require.js';
import type { JudgingContext } from './judging-context.js';
import { requireSameKind, toolJudgement, toolOf, uncertaintyAt } from './tools.js';

type Content = Extract<EntryContent, { kind: 'measurement' }>;

/** A reading against the step's limits, with the tool's uncertainty. */
export function judgeMeasurement(
  definition: MeasurementStep,
  content: Content,
  context: JudgingContext,
): Judgement {
  if (!definition.at.includes(content.at)) {
    throw new InputError('content.at', `This step is read at: ${definition.at.join(', ')}.`);
  }
  const value = requireQuantity(content.value, kindOf(definition.unit), 'content.value', { negative: true });
  const tool = toolOf(context.tools, content.toolId, 'content.toolId');
  requireSameKind(tool, value, 'content.toolId');
  const decision = limitDecision({ value, ...definition.limits, uncertainty: uncertaintyAt(tool, value) });
  const ofTool = toolJudgement(tool, value, context.on);
  // What the tool can't show at all was read or typed wrongly, whatever the limits say.
  if (ofTool && (ofTool.verdict === 'fail' || decision.verdict !== 'fail')) return ofTool;
  return decision.verdict === 'not-judged'
    ? { verdict: 'pass', reason: 'Written down; the spec gives no limit for it.' }
    : decision;
}
