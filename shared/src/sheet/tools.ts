import type { Quantity } from '../contracts/quantity.js';
import type { Tool } from '../contracts/registers.js';
import type { Judgement } from '../contracts/verdict.js';
import { InputError } from '../contracts/input-error.js';
import { convert, kindOf, toSi } from '../quantities/convert.js';
import { printQuantity } from '../quantities/print.js';

/** Expanded uncertainty of a tool at a reading, in the reading's unit. */
export function uncertaintyAt(tool: Tool, reading: Quantity): Quantity {
  const value = tool.uncertainty
    ? convert(tool.uncertainty, reading.unit).value
    : Math.abs(reading.value) * (tool.uncertaintyShare ?? 0);
  // Without the last digits, which only floating point made, so that a sentence does not print them.
  return { value: Number(value.toPrecision(12)), unit: reading.unit };
}

/** The tool of an entry, from the tools of the shop. */
export function toolOf(tools: readonly Tool[], id: string, field: string): Tool {
  const tool = tools.find((candidate) => candidate.id === id);
  if (!tool) throw new InputError(field, 'Choose a tool from the register.');
  return tool;
}

/** Refuses a tool that measures another kind of thing than the reading. */
export function requireSameKind(tool: Tool, reading: Quantity, field: string): void {
  if (kindOf(tool.low.unit) !== kindOf(reading.unit)) {
    throw new InputError(field, `${tool.name} ${tool.code} does not read ${reading.unit}.`);
  }
}

/**
 * What a tool itself does to a judgement: a reading outside its range fails, one past its calibration is doubtful.
 * @param on ISO date of the reading
 */
export function toolJudgement(tool: Tool, reading: Quantity, on: string): Judgement | null {
  const si = toSi(reading);
  if (si < toSi(tool.low) || si > toSi(tool.high)) {
    const low = printQuantity(convert(tool.low, reading.unit));
    const high = printQuantity(convert(tool.high, reading.unit));
    return {
      verdict: 'fail',
      reason: `${printQuantity(reading)} is outside the range of ${tool.code}, ${low} to ${high}. Is a point missing?`,
    };
  }
  if (on > tool.calibrationDue) {
    return {
      verdict: 'doubtful',
      reason: `${tool.code} was due for calibration on ${tool.calibrationDue}. Read it with a tool that is in date.`,
    };
  }
  return null;
}
