import type { CompoundSpec, PartSpec, SpecDocument } from '../../contracts/spec.js';
import { printQuantity } from '../../quantities/print.js';
import { RowList, type SpecRow } from '../spec-row.js';

export function compoundRows(
  compounds: readonly CompoundSpec[],
  consumables: SpecDocument['consumables'],
): readonly SpecRow[] {
  const list = new RowList('compounds', '');
  for (const compound of compounds) addCompound(list, compound);
  for (const [index, consumable] of consumables.entries()) {
    list.add({ key: `consumables.${index + 1}`, label: 'Consumable', sourced: consumable, print: String });
  }
  return list.rows;
}

function addCompound(list: RowList, { key, name, curePoints, openTime }: CompoundSpec): void {
  list.add({
    key: `compounds.${key}.openTime`,
    label: `${name}, time to close the joint`,
    sourced: openTime,
    print: (time) => printQuantity(time),
  });
  for (const [index, { temperature, gap, toHandle, toLoad, full }] of curePoints.value.entries()) {
    const at = gap ? `${printQuantity(temperature)}, gap ${printQuantity(gap)}` : printQuantity(temperature);
    const times = [toHandle && `${printQuantity(toHandle)} to handle`, `${printQuantity(toLoad)} to load`];
    list.add({
      key: `compounds.${key}.curePoints.${index + 1}`,
      label: `${name} at ${at}`,
      sourced: curePoints,
      print: () => [...times.filter(Boolean), `${printQuantity(full)} full`].join(', '),
    });
  }
}

export function partRows(parts: readonly PartSpec[], cautions: SpecDocument['cautions']): readonly SpecRow[] {
  const list = new RowList('parts', '');
  for (const [index, { name, maker, note }] of parts.entries()) {
    const text = maker.note ?? note;
    list.add({
      key: `parts.${index + 1}`,
      label: name,
      sourced: text === undefined ? maker : { ...maker, note: text },
      print: String,
    });
  }
  for (const [index, { stage, text }] of cautions.entries()) {
    list.add({
      key: `cautions.${index + 1}`,
      label: `Take care, stage ${stage}`,
      sourced: text,
      print: String,
    });
  }
  return list.rows;
}
