import type { Quantity } from '@second-spanner/shared/contracts/quantity';
import type { Tool } from '@second-spanner/shared/contracts/registers';
import { printQuantity } from '@second-spanner/shared/quantities/print';

/** How good a tool is: `±0.010 mm` or `±2 %` of the reading. */
export function goodTo({ uncertainty, uncertaintyShare }: Tool): string {
  if (uncertainty !== undefined) return `±${printQuantity(uncertainty)}`;
  return uncertaintyShare === undefined ? '' : `±${Number((uncertaintyShare * 100).toPrecision(3))} %`;
}

/** The tool as one chooses it: `Dial gauge T-12, ±0.010 mm`. */
export function toolWords(tool: Tool): string {
  const good = goodTo(tool);
  return `${tool.name} ${tool.code}${good === '' ? '' : `, ${good}`}`;
}

/** Whether a tool's calibration has run out on an ISO date. */
export const isPastDue = ({ calibrationDue }: Tool, on: string): boolean => on > calibrationDue;

/** An uncertainty in few digits. */
export const printUncertainty = (uncertainty: Quantity): string =>
  `±${printQuantity({ ...uncertainty, value: Number(uncertainty.value.toPrecision(3)) })}`;
