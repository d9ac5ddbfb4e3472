import { InputError } from '../contracts/input-error.js';
import type { Quantity } from '../contracts/quantity.js';
import type { Tool } from '../contracts/registers.js';
import type { Agreement } from '../contracts/sheets.js';
import type { MeasurementStep, SecondReadingContent } from '../contracts/steps.js';
import type { Limits } from '../contracts/spec.js';
import { agreementPossible } from '../measuring/agreement-possible.js';
import { limitDecision } from '../measuring/limit-decision.js';
import { twoReadings } from '../measuring/two-readings.js';
import { kindOf } from '../quantities/convert.js';
import { printQuantity } from '../quantities/print.js';
import { requireQuantity } from '../quantities/require.js';
import type { SecondCheckCase } from './second-check-case.js';
import { requireSameKind, toolJudgement, toolOf, uncertaintyAt } from './tools.js';

type Second = Extract<SecondReadingContent, { kind: 'measured-again' | 'strip-read-again' }>;
type Case = SecondCheckCase & { readonly definition: MeasurementStep };

/** Two readings of each place, with the uncertainty of both tools. */
export function agreeMeasured(step: Case, second: Second): Agreement {
  const { definition, tools } = step;
  const tool = toolOf(tools, second.toolId, 'content.toolId');
  const rows = definition.at.map((at, index) => {
    const reading = second.readings.find((each) => each.at === at);
    if (!reading) throw new InputError(`content.readings[${index}]`, `${at} has no reading yet.`);
    const value = requireQuantity(
      reading.value,
      kindOf(definition.unit),
      `content.readings[${index}].value`,
      { negative: true },
    );
    requireSameKind(tool, value, 'content.toolId');
    requireFineEnough(tool, value, definition.limits, 'content.toolId');
    return compareAt(step, at, value, tool, second.kind === 'measured-again');
  });
  const apart = rows.filter((row) => !row.agrees);
  return {
    verdict: apart.length === 0 ? 'pass' : 'fail',
    reason:
      apart.length === 0
        ? rows.length === 1
          ? (rows[0]?.sentence ?? '')
          : `All ${rows.length} pairs of readings agree.`
        : apart.map((row) => (rows.length === 1 ? row.sentence : `${row.label}: ${row.sentence}`)).join(' '),
    rows: rows.map(({ label, first, second: again, en, agrees }) => ({
      label,
      first,
      second: again,
      en,
      agrees,
    })),
  };
}

function requireFineEnough(tool: Tool, value: Quantity, limits: Limits, field: string): void {
  const { low, high } = limits;
  if (!low || !high) return;
  const uncertainty = uncertaintyAt(tool, value);
  if (agreementPossible(uncertainty, low, high)) return;
  throw new InputError(
    field,
    `${tool.code} is good to ±${printQuantity(uncertainty)}, more than a quarter of what lies between the limits. Use a finer tool.`,
  );
}

function compareAt(step: Case, at: string, value: Quantity, tool: Tool, ownTool: boolean) {
  const entry = step.entries.find(({ content }) => content.kind === 'measurement' && content.at === at);
  const first = entry?.content;
  if (first?.kind !== 'measurement') throw new InputError('content', `${at} has no first reading yet.`);
  if (ownTool && first.toolId === tool.id) {
    throw new InputError(
      'content.toolId',
      `${tool.code} is not independent: the first reading was made with it. Use a tool of your own.`,
    );
  }
  const firstTool = toolOf(step.tools, first.toolId, 'content.toolId');
  const pair = twoReadings({
    first: { value: first.value, uncertainty: uncertaintyAt(firstTool, first.value) },
    second: { value, uncertainty: uncertaintyAt(tool, value) },
  });
  const limits = limitDecision({ value, ...step.definition.limits, uncertainty: uncertaintyAt(tool, value) });
  const ofTool = toolJudgement(tool, value, step.on);
  // A first reading that does not pass stands only because the foreman accepted it: then agreement is all.
  const within = !ofTool && (limits.verdict !== 'fail' || entry?.verdict !== 'pass');
  return {
    label: at,
    first: printQuantity(first.value),
    second: printQuantity(value),
    en: pair.en,
    agrees: pair.verdict === 'pass' && within,
    sentence: within ? pair.reason : (ofTool ?? limits).reason,
  };
}
