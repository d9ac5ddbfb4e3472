import type { TighteningPass } from '../../contracts/calculations.js';
import type { Quantity } from '../../contracts/quantity.js';
import type { FastenerGroup } from '../../contracts/spec.js';
import { printQuantity } from '../../quantities/print.js';
import { printLimits } from '../print-limits.js';
import { RowList, type SpecRow } from '../spec-row.js';
import { capital } from '../words.js';

const conditions = {
  dry: 'dry',
  oiled: 'oiled',
  moly: 'moly grease',
  sealant: 'sealant on the thread',
  'thread-lock': 'thread-lock',
} as const;

/** A round figure stays round: 88 − 4 is 84, not 84.000…01. */
const plus = (torque: Quantity, by: number): Quantity => ({
  value: Number((torque.value + by).toPrecision(12)),
  unit: torque.unit,
});

/** How far a reading may lie from the torque, where torque and tolerance are in one unit. */
function torqueLimits({ torque, tolerance }: FastenerGroup): string | undefined {
  if (!tolerance) return undefined;
  const { low, high } = tolerance.value;
  if (low.unit !== torque.value.unit || high.unit !== torque.value.unit) return undefined;
  return printLimits({ low: plus(torque.value, -low.value), high: plus(torque.value, high.value) });
}

function printPass(pass: TighteningPass): string {
  if ('torque' in pass) return printQuantity(pass.torque);
  if ('angle' in pass) return `${pass.angle}° further`;
  if ('check' in pass) return 'full again, as a check';
  return pass.fraction === 1 ? 'full' : `${Math.round(pass.fraction * 100)} %`;
}

export function tighteningRows(groups: readonly FastenerGroup[]): readonly SpecRow[] {
  return groups.flatMap((group) => rowsOf(group));
}

function rowsOf(group: FastenerGroup): readonly SpecRow[] {
  const name = capital(group.name);
  const also = group.alsoPrinted?.value;
  return new RowList('tightening', `fastenerGroups.${group.key}`)
    .add({
      key: 'torque',
      label: name,
      sourced: group.torque,
      print: (torque) => printQuantity(torque),
      limits: torqueLimits(group),
      alsoPrinted: also && printQuantity(also),
    })
    .add({
      key: 'tolerance',
      label: `${name}, tolerance`,
      sourced: group.tolerance,
      print: ({ low, high }) => `${printQuantity(low)} below, ${printQuantity(high)} above`,
    })
    .add({
      key: 'passes',
      label: `${name}, passes`,
      sourced: group.passes,
      print: (passes) => passes.map(printPass).join(', '),
    })
    .add({
      key: 'sequence',
      label: `${name}, order`,
      sourced: group.sequence,
      print: (sequence) => sequence.join(' '),
    })
    .add({ key: 'thread', label: `${name}, thread`, sourced: group.thread, print: String })
    .add({ key: 'grade', label: `${name}, grade`, sourced: group.grade, print: String })
    .add({
      key: 'condition',
      label: `${name}, threads`,
      sourced: group.condition,
      print: (condition) => conditions[condition],
    })
    .add({
      key: 'singleUse',
      label: `${name}, used again`,
      sourced: group.singleUse,
      print: (once) => (once ? 'no, once only' : 'yes, if sound'),
    })
    .add({ key: 'locking', label: `${name}, locking`, sourced: group.locking, print: String }).rows;
}
