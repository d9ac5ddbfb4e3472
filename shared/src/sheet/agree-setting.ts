import { InputError } from '../contracts/input-error.js';
import type { Agreement } from '../contracts/sheets.js';
import type { Adapter, SecondReadingContent, TighteningStepDefinition } from '../contracts/steps.js';
import { convert } from '../quantities/convert.js';
import { printQuantity } from '../quantities/print.js';
import { requireQuantity } from '../quantities/require.js';
import { clicks, requiredSetting } from './judge-tightening.js';
import { finalPass, planOf } from './plan-of.js';
import type { SecondCheckCase } from './second-check-case.js';
import { toolOf, uncertaintyAt } from './tools.js';

type Second = Extract<SecondReadingContent, { kind: 'setting-and-pull-witnessed' }>;
type Case = SecondCheckCase & { readonly definition: TighteningStepDefinition };

/**
 * The setting that the second person reads on the wrench, against what the last torque pass needs and against what
 * was recorded for it. A tightened joint can't be measured twice; its setting can be read twice.
 */
export function agreeSetting(step: Case, second: Second): Agreement {
  const seen = requireQuantity(second.setting, 'torque', 'content.setting', { zero: false });
  const tool = toolOf(step.tools, second.toolId, 'content.toolId');
  const pass = finalPass(step.definition);
  const target = planOf(step.definition).steps.find((each) => each.pass === pass)?.target;
  if (!target) throw new InputError('content.setting', 'This step has no torque to set a wrench to.');
  const pulls = step.entries.map(({ content }) => content).filter((content) => content.kind === 'tightening');
  const atFinal = pulls.filter((content) => content.pass === pass);
  // Before the last pass is pulled, the adapter is the one that the passes before it were pulled with.
  const adapter = (atFinal.find(hasAdapter) ?? pulls.filter(hasAdapter).at(-1))?.adapter;
  const required = convert(requiredSetting(target, tool, adapter), seen.unit);
  const allowed = clicks(tool)
    ? convert(tool.resolution, seen.unit).value / 2
    : uncertaintyAt(tool, required).value;
  const right = Math.abs(seen.value - required.value) <= allowed + 1e-9;
  const recorded = atFinal.map((content) => content.setting).filter((setting) => setting !== undefined);
  const differing = recorded.find(
    (setting) => Math.abs(convert(setting, seen.unit).value - seen.value) > allowed + 1e-9,
  );
  const otherTool = atFinal.find((content) => content.toolId !== tool.id);
  const agrees = right && !differing && !otherTool;
  const first = recorded[0] ? printQuantity(recorded[0]) : `to be ${printQuantity(required)}`;
  return {
    verdict: agrees ? 'pass' : 'fail',
    reason: reasonFor({
      seen: printQuantity(seen),
      required: printQuantity(required),
      tool: tool.code,
      right,
      differing: differing && printQuantity(differing),
      otherTool: otherTool !== undefined,
    }),
    rows: [{ label: `Setting of ${tool.code}`, first, second: printQuantity(seen), en: null, agrees }],
  };
}

const hasAdapter = ({ adapter }: { readonly adapter?: Adapter }): boolean => adapter !== undefined;

interface Reason {
  readonly seen: string;
  readonly required: string;
  readonly tool: string;
  readonly right: boolean;
  readonly differing: string | undefined;
  readonly otherTool: boolean;
}

function reasonFor({ seen, required, tool, right, differing, otherTool }: Reason): string {
  if (otherTool) return `You read ${tool}, but the pulls were recorded with another wrench.`;
  if (!right) return `You read ${seen} on ${tool}; it must be set to ${required}.`;
  if (differing) return `You read ${seen} on ${tool}; ${differing} was recorded.`;
  return `You read ${seen} on ${tool}, which is what it must be set to.`;
}
