import { printQuantity } from '../../quantities/print.js';
import { listed } from '../../spec/words.js';
import type { SpecDocument } from '../../contracts/spec.js';
import { check, readAt, reading, type Draft } from './draft.js';
import { isHot } from './stage-09.js';

/** After the run. */
export function stage14(document: SpecDocument): readonly Draft[] {
  return [
    ...hotClearances(document),
    retorque(document),
    ...readAt(document, 'pressures')
      .filter(({ key }) => key.startsWith('compression'))
      .map((spec) =>
        reading(spec, { words: 'All plugs out, throttle open, the same number of strokes each.' }),
      ),
    check({
      id: 'leak-down',
      title: 'Leak-down, a first figure',
      instruction:
        'Each cylinder at compression TDC with the crank held; write the figures as a trend to come back to: new rings are not bedded yet.',
    }),
    check({
      id: 'first-oil',
      title: 'First oil and filter change',
      instruction: 'Old filter cut open and the magnet looked at; what was found is written down.',
    }),
    check({
      id: 'run-in-log',
      title: 'Run-in log begun',
      instruction: 'Distance, oil used, what was heard and what was set, with dates.',
    }),
  ];
}

function hotClearances(document: SpecDocument): readonly Draft[] {
  const { engine, valveTrain } = document;
  if (engine.followers.value === 'hydraulic') return [];
  const hot = readAt(document, 'rockers').filter(isHot);
  if (hot.length > 0)
    return hot.map((spec) => reading(spec, { words: 'Engine at running heat, set quickly.' }));
  const { inlet, exhaust } = valveTrain.lash.value;
  return [
    check({
      id: 'clearances-again',
      title: 'Valve {clearances} again after the run',
      instruction: `Engine ${valveTrain.lash.value.engine}: {inlet} ${printQuantity(inlet)}, exhaust ${printQuantity(exhaust)}. Write any that moved.`,
      source: valveTrain.lash.source,
    }),
  ];
}

function retorque({ fastenerGroups }: SpecDocument): Draft {
  const set = fastenerGroups
    .filter(({ condition }) => condition.value === 'sealant' || condition.value === 'thread-lock')
    .map(({ name }) => name);
  const never = set.length === 0 ? '' : ` Never over what has set: ${listed(set)}.`;
  return check({
    id: 're-torque',
    title: 'Re-torque where the maker says so',
    instruction: `Engine cold, one at a time in the tightening order, only where the maker asks for it.${never}`,
  });
}
