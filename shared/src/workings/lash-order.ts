import type { SpecDocument } from '../contracts/spec.js';
import type { LashOrder, ListedValve } from '../contracts/valve-figures.js';
import { drawLashPlan } from '../drawing/lash-plan.js';
import { inWords } from '../drawing/words.js';
import { firingAngles } from '../valve-train/firing-angles.js';
import { nameOf } from '../valve-train/words.js';
import { lashOrder } from '../valve-train/lash-order.js';
import { defineWorking } from './define-working.js';
import {
  engineErrors,
  firingCase,
  firingFields,
  firingOf,
  timingCase,
  timingFields,
  timingOf,
  type TypedFiring,
} from './engine/engine-fields.js';
import { assumedEven, printAngle } from './engine/engine-words.js';
import { readValveRow } from './engine/valve-row.js';

/** In which order the valve clearances are set, and when each may be. */
export const lashOrderWorking = defineWorking({
  key: 'lash-order',
  group: 'valve-timing',
  title: '{Clearance} order',
  asks: 'At which crank positions can all the valve {clearances} be set, with the least turning?',
  sections: [
    {
      heading: 'The valves',
      fields: [
        {
          kind: 'text',
          name: 'valves',
          label: 'Valves from front to back',
          hint: 'E for exhaust and I for {inlet}: E I I E E I I E. A vee bank by bank.',
          figures: true,
        },
        {
          kind: 'text',
          name: 'cylinders',
          label: 'Cylinders from front to back',
          hint: '1 2 3 4; a vee bank by bank: 1 3 5 7 2 4 6 8',
          optional: 'in order of their numbers, with as many valves each',
          figures: true,
        },
        {
          kind: 'number',
          name: 'margin',
          label: 'Keep clear of the ramps by',
          counts: '°',
          optional: '15° of crank, common practice',
        },
      ],
    },
    { heading: 'The engine', fields: [...firingFields, ...timingFields()] },
  ],
  example: {
    typed: { valves: 'E I I E E I I E', order: '1-3-4-2', ivo: '10', ivc: '50', evo: '50', evc: '10' },
    from: 'workshop table “fully open, check and adjust” for an eight-valve four',
  },
  fromSpec: (document) => [{ name: 'The engine', typed: fromDocument(document) }],
  basis: [
    'A valve may be set while it is on its base circle, from its closing to its next opening less the margin: geometry of the cycle.',
    'Its mate is the like valve of the cylinder that fires 360° of crank apart, fully open when this lobe points away.',
    'Fewest stops, then least turning from the first to the last, by trying every end of a base circle.',
  ],
  fieldOf: engineErrors,
  answer: (read, options) => {
    const firing = firingOf(read);
    const valves = readValveRow(read.text('valves'), read.textIf('cylinders'), firing);
    const margin = read.numberIf('margin');
    const request = {
      ...firing,
      valveTiming: timingOf(read),
      valves,
      ...(margin === undefined ? {} : { margin }),
    };
    const plan = lashOrder(request);
    return {
      parts: [
        { kind: 'steps', heading: 'The stops', steps: stepsOf(plan, firing, valves) },
        {
          kind: 'drawing',
          caption: 'Valves from front to back, once for each stop',
          drawing: drawLashPlan({ request, plan }, options),
        },
        ...ruleOf(plan),
        {
          kind: 'table',
          heading: 'Or one by one: set a valve when its mate is fully open',
          columns: [
            { name: 'Set', figures: true },
            { name: 'Kind' },
            { name: 'Cylinder', figures: true },
            { name: 'When this is fully open', figures: true },
          ],
          rows: plan.mates.map(({ set, whenFullyOpen }, i) => [
            set,
            valves[i]?.type === 'inlet' ? '{inlet}' : 'exhaust',
            String(valves[i]?.cylinder ?? ''),
            whenFullyOpen ?? 'none: use the stops',
          ]),
        },
      ],
      assumed: [
        ...(margin === undefined
          ? [
              '15° of crank either side of the base circle clear the ramps: common practice. A cam with long quietening ramps needs more.',
            ]
          : []),
        ...assumedEven(firing.intervals),
        ...(read.textIf('cylinders') === undefined
          ? ['The cylinders lie from front to back in the order of their numbers.']
          : []),
        'The crank is turned the normal way, so that the timing chain’s slack is taken up.',
      ],
      cautions: [
        'Take the plugs out and switch the ignition off before turning the engine by hand.',
        'Whether the figure is for a hot or a cold engine is the maker’s to say.',
      ],
    };
  },
});

function stepsOf(
  { stops }: LashOrder,
  firing: TypedFiring,
  valves: readonly ListedValve[],
): readonly string[] {
  const valveWords = (name: string): string => {
    const valve = valves.find((one) => one.valve === name);
    if (valve === undefined) return name;
    return `${name} (${nameOf(valve.cylinder)} ${valve.type === 'inlet' ? '{inlet}' : 'exhaust'})`;
  };
  return stops.map(({ crank, set }, i) => {
    const before = stops[i - 1]?.crank;
    const turn =
      before === undefined
        ? `Turn the crank the normal way to ${printAngle(crank)} past the firing TDC of ${nameOf(firing.firingOrder[0] ?? '')}`
        : `Turn on by ${printAngle(crank - before)}, to ${printAngle(crank)}`;
    return `${turn}${nearTdc(crank, firing)}. Set ${set.length === 1 ? 'valve' : 'valves'} ${inWords(set.map(valveWords))}.`;
  });
}

/** The stop as seen from the last firing TDC passed, which is found more easily than a large angle. */
function nearTdc(crank: number, { firingOrder, intervals }: TypedFiring): string {
  const at = crank % 720;
  const passed = firingAngles(firingOrder, intervals)
    .filter(({ firesAt }) => firesAt <= at + 1e-9)
    .at(-1);
  if (passed === undefined || passed.cylinder === firingOrder[0]) return '';
  return ` (${printAngle(at - passed.firesAt)} past the firing TDC of ${nameOf(passed.cylinder)})`;
}

const ruleNames: Readonly<Record<number, string>> = { 9: 'nine', 13: 'thirteen', 17: 'seventeen' };

/** The rule of nine, of thirteen and so on, where it holds. */
function ruleOf({ mates }: LashOrder): readonly {
  readonly kind: 'facts';
  readonly facts: readonly { name: string; value: string; note: string }[];
}[] {
  const sums = new Set(mates.map(({ set, whenFullyOpen }) => Number(set) + Number(whenFullyOpen ?? NaN)));
  const [sum] = sums;
  if (sums.size !== 1 || sum === undefined || Number.isNaN(sum)) return [];
  const fact = {
    name: `Rule of ${ruleNames[sum] ?? sum}`,
    value: 'holds',
    note: `the valve to set and the one fully open add up to ${sum}, because the valves are laid out as a mirror`,
  };
  return [{ kind: 'facts', facts: [fact] }];
}

function fromDocument(document: SpecDocument): Record<string, string> {
  const letters = document.valveTrain.valveLayout.value.map((type) => (type === 'inlet' ? 'I' : 'E'));
  return {
    ...firingCase(document),
    ...timingCase(document),
    valves: letters.join(' '),
    cylinders: document.engine.banks.value.flat().join(' '),
  };
}
