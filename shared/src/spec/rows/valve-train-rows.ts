import type { ValveTiming } from '../../contracts/calculations.js';
import type { ValveTrainSection } from '../../contracts/spec.js';
import { printQuantity } from '../../quantities/print.js';
import { RowList, type SpecRow } from '../spec-row.js';

const events: readonly {
  key: keyof ValveTiming;
  label: string;
  sides: readonly [positive: string, negative: string];
}[] = [
  { key: 'ivo', label: '{Inlet} opens', sides: ['before TDC', 'after TDC'] },
  { key: 'ivc', label: '{Inlet} shuts', sides: ['after BDC', 'before BDC'] },
  { key: 'evo', label: 'Exhaust opens', sides: ['before BDC', 'after BDC'] },
  { key: 'evc', label: 'Exhaust shuts', sides: ['after TDC', 'before TDC'] },
];

/** An event's angle in words: `16° before TDC`; a negative figure lies on the other side. */
const angle = (degrees: number, [positive, negative]: readonly [string, string]): string =>
  `${Math.abs(degrees)}° ${degrees < 0 ? negative : positive}`;

export function valveTrainRows(valveTrain: ValveTrainSection): readonly SpecRow[] {
  const list = new RowList('valve-train', 'valveTrain');
  for (const { key, label, sides } of events) {
    list.add({
      key: `timing.${key}`,
      label,
      sourced: valveTrain.timing,
      print: (timing) => angle(timing[key], sides),
    });
  }
  list.add({
    key: 'timingQuotedAt',
    label: 'Timing is quoted at',
    sourced: valveTrain.timingQuotedAt,
    print: ({ lift, lash }) =>
      [
        lash && `${printQuantity(lash)} {clearance}`,
        lift && `${printQuantity(lift)} lift`,
        !lash && !lift && 'not stated',
      ]
        .filter(Boolean)
        .join(', '),
  });
  for (const valve of ['inlet', 'exhaust'] as const) {
    list.add({
      key: `lash.${valve}`,
      label: valve === 'inlet' ? '{Inlet} valve {clearance}' : 'Exhaust valve {clearance}',
      sourced: valveTrain.lash,
      print: (lash) => `${printQuantity(lash[valve])}, engine ${lash.engine}`,
    });
  }
  return list
    .add({
      key: 'valveLayout',
      label: 'Valves, front to back',
      sourced: valveTrain.valveLayout,
      print: (valves) => valves.map((valve) => (valve === 'inlet' ? '{inlet}' : valve)).join(', '),
    })
    .add({
      key: 'marksTogether',
      label: 'Timing marks together mean No. 1 at',
      sourced: valveTrain.marksTogether,
      print: (tdc) => `${tdc} TDC`,
    }).rows;
}
