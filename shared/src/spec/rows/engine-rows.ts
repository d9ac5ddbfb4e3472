import type { EngineSection } from '../../contracts/spec.js';
import { printNumber, printQuantity } from '../../quantities/print.js';
import { RowList, type SpecRow } from '../spec-row.js';
import { capital, listed } from '../words.js';

const layouts = { 'in-line': 'in line', vee: 'vee', flat: 'flat' } as const;
const followerKinds = {
  flat: 'flat {followers}',
  mushroom: 'mushroom {followers}',
  hydraulic: 'hydraulic {followers}',
} as const;

export function engineRows(engine: EngineSection): readonly SpecRow[] {
  const quantities = (list: readonly Parameters<typeof printQuantity>[0][]) =>
    list.length === 0 ? 'none' : listed(list.map((each) => printQuantity(each)));
  return new RowList('engine', 'engine')
    .add({ key: 'name', label: 'Engine', sourced: engine.name, print: String })
    .add({ key: 'layout', label: 'Layout', sourced: engine.layout, print: (layout) => layouts[layout] })
    .add({ key: 'cylinders', label: 'Cylinders', sourced: engine.cylinders, print: String })
    .add({
      key: 'banks',
      label: 'Cylinders from the front',
      sourced: engine.banks,
      print: (banks) => banks.map((bank) => bank.join('-')).join(' and '),
    })
    .add({ key: 'numberedFrom', label: 'Numbered from', sourced: engine.numberedFrom, print: String })
    .add({
      key: 'crankTurns',
      label: 'Crankshaft turns',
      sourced: engine.crankTurns,
      print: (way) => (way === 'clockwise' ? way : '{anticlockwise}'),
    })
    .add({ key: 'crankSeenFrom', label: 'Seen from the', sourced: engine.crankSeenFrom, print: String })
    .add({
      key: 'firingOrder',
      label: 'Firing order',
      sourced: engine.firingOrder,
      print: (order) => order.join('-'),
    })
    .add({ key: 'bore', label: 'Bore', sourced: engine.bore, print: (bore) => printQuantity(bore) })
    .add({ key: 'stroke', label: 'Stroke', sourced: engine.stroke, print: (stroke) => printQuantity(stroke) })
    .add({
      key: 'rodLength',
      label: 'Rod between centres',
      sourced: engine.rodLength,
      print: (length) => printQuantity(length),
    })
    .add({
      key: 'compressionRatio',
      label: 'Compression ratio',
      sourced: engine.compressionRatio,
      print: (ratio) => `${printNumber(ratio, 1)} to 1`,
    })
    .add({ key: 'undersizes', label: 'Undersizes', sourced: engine.undersizes, print: quantities })
    .add({ key: 'oversizes', label: 'Oversizes', sourced: engine.oversizes, print: quantities })
    .add({
      key: 'followers',
      label: '{Followers}',
      sourced: engine.followers,
      print: (kind) => capital(followerKinds[kind]),
    }).rows;
}
