import type { BeltSpec, KeySpec, MeasurementSpec } from '../../contracts/spec.js';
import { printQuantity } from '../../quantities/print.js';
import { printLimits } from '../print-limits.js';
import { RowList, type SpecRow } from '../spec-row.js';

export function measurementRows(measurements: readonly MeasurementSpec[]): readonly SpecRow[] {
  const list = new RowList('clearances', 'measurements');
  for (const { key, name, limits } of measurements) {
    list.add({ key, label: name, sourced: limits, print: printLimits });
  }
  return list.rows;
}

const keySizes: readonly { key: Exclude<keyof KeySpec, 'key' | 'name'>; label: string }[] = [
  { key: 'keyWidth', label: 'width' },
  { key: 'keyHeight', label: 'height' },
  { key: 'shaftKeywayWidth', label: 'keyway in the shaft, width' },
  { key: 'shaftKeywayDepth', label: 'keyway in the shaft, depth' },
  { key: 'hubKeywayWidth', label: 'keyway in the hub, width' },
  { key: 'hubKeywayDepth', label: 'keyway in the hub, depth' },
  { key: 'shaftDiameter', label: 'shaft diameter' },
  { key: 'hubBore', label: 'hub bore' },
];

export function keyRows(keys: readonly KeySpec[]): readonly SpecRow[] {
  return keys.flatMap((spec) => {
    const list = new RowList('keys', `keys.${spec.key}`);
    for (const { key, label } of keySizes) {
      list.add({ key, label: `${spec.name}, ${label}`, sourced: spec[key], print: printLimits });
    }
    return list.rows;
  });
}

export function beltRows(belt: BeltSpec): readonly SpecRow[] {
  const one = (quantity: Parameters<typeof printQuantity>[0]) => printQuantity(quantity);
  return new RowList('belt', 'belt')
    .add({ key: 'span', label: 'Between shaft centres', sourced: belt.span, print: one })
    .add({ key: 'driverDiameter', label: 'Driving pulley', sourced: belt.driverDiameter, print: one })
    .add({ key: 'drivenDiameter', label: 'Driven pulley', sourced: belt.drivenDiameter, print: one })
    .add({ key: 'deflection', label: 'Deflection', sourced: belt.deflection, print: printLimits })
    .add({ key: 'offset', label: 'Groove out of line', sourced: belt.offset, print: printLimits }).rows;
}
