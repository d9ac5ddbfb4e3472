import type { Quantity, Unit } from '@second-spanner/shared/contracts/quantity';
import type { Tool } from '@second-spanner/shared/contracts/registers';
import type { MeasurementStep } from '@second-spanner/shared/contracts/steps';
import { convert, kindOf, toSi } from '@second-spanner/shared/quantities/convert';
import type { DemoWork } from './demo-sheet-file.js';

const imperial: readonly Unit[] = ['in', 'thou', 'ft', 'lbf·ft', 'lbf·in', 'lbf', 'psi', 'in2', 'in3', 'lb'];
const isImperial = (unit: Unit): boolean => imperial.includes(unit);

/**
 * A figure as a tool shows it: in the step's unit where the tool speaks its system, to the tool's resolution.
 * @param parts between two marks a careful reader tells halves: 2
 */
export function asShown(tool: Tool, figure: Quantity, unit: Unit, parts = 1): Quantity {
  const own = isImperial(unit) === isImperial(tool.resolution.unit) ? unit : tool.resolution.unit;
  const step = convert(tool.resolution, own).value / parts;
  const value = Math.round(convert(figure, own).value / step) * step;
  return { value: Number(value.toFixed(5)), unit: own };
}

const reaches = (tool: Tool, figure: Quantity): boolean =>
  kindOf(tool.low.unit) === kindOf(figure.unit) &&
  toSi(figure) >= toSi(tool.low) &&
  toSi(figure) <= toSi(tool.high);

/** The tools of a shop, as the demo's file says who reads what with which. */
export class DemoTools {
  constructor(
    private readonly tools: readonly Tool[],
    private readonly work: Pick<DemoWork, 'readWith' | 'pullWith'>,
  ) {}

  /** The first and the second person's tool for a step: the one that speaks the step's units first. */
  readers({ method, unit }: MeasurementStep): readonly [Tool, Tool] {
    const codes = this.work.readWith[method] ?? this.work.readWith[kindOf(unit)] ?? [];
    const pair = codes.map((code) => this.byCode(code));
    const own = pair.find((tool) => isImperial(tool.resolution.unit) === isImperial(unit)) ?? pair[0];
    const other = pair.find((tool) => tool !== own) ?? own;
    if (!own || !other) throw new Error(`The demo names no tool to read ${method} in ${unit} with.`);
    return [own, other];
  }

  /** The first of the wrenches that reaches a torque. */
  wrench(torque: Quantity, hasTolerance: boolean): Tool {
    const { withTolerance, withoutTolerance } = this.work.pullWith;
    const codes = hasTolerance ? withTolerance : withoutTolerance;
    const found = codes.map((code) => this.byCode(code)).find((tool) => reaches(tool, torque));
    if (!found) throw new Error(`The demo names no wrench for ${torque.value} ${torque.unit}.`);
    return found;
  }

  private byCode(code: string): Tool {
    const found = this.tools.find((tool) => tool.code === code);
    if (!found) throw new Error(`The demo names the tool ${code}, which is not in its shop.`);
    return found;
  }
}
