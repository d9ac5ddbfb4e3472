import type { ValveState } from '../contracts/calculations.js';
import type { LashOrder, LashOrderRequest } from '../contracts/valve-figures.js';
import { firingAngles } from '../valve-train/firing-angles.js';
import { phaseOf, valveEvents, valveStateAt } from '../valve-train/phase.js';
import { arrowHead } from './geometry.js';
import { lashBadge, lashLegend, sideView, type LashState } from './lash-plan-parts.js';
import { line, text, type Drawing, type Shape } from './shapes.js';
import { decimalsOf, inWords, wording, type DrawingOptions, type Wording } from './words.js';

export interface LashPlanInput {
  readonly request: LashOrderRequest;
  readonly plan: LashOrder;
}

const width = 340;
const edge = 10;
const mostInLine = 12;
/** Beyond this many valves their side views are left out, and the table alone says which are open. */
const mostInSideView = 24;
const headHeight = 30;
const legendHeight = 44;

interface ValveHere {
  readonly name: string;
  readonly shown: string;
  readonly inlet: boolean;
  readonly state: LashState;
  readonly opening: ValveState;
}

/**
 * The plan for setting valve clearances: a row of all valves for each stop, front to back, with those that are set
 * there, those set before, and from the side how far each is open. The lifts drawn are not to scale.
 */
export function drawLashPlan(input: LashPlanInput, options?: DrawingOptions): Drawing {
  const words = wording(options);
  const { stops } = input.plan;
  const rows = stops.map((_, stop) => valvesAt(input, stop));
  const count = input.request.valves.length;
  const lines = Math.ceil(count / mostInLine);
  const perLine = Math.ceil(count / lines);
  const pitch = Math.min(34, (width - 2 * edge) / perLine);
  const inSideView = count <= mostInSideView;
  const lineHeight = inSideView ? 84 : 30;
  const stopHeight = headHeight + lines * lineHeight;
  const height = 26 + stops.length * stopHeight + legendHeight;
  return {
    title: words.say('Order of setting the {clearances}'),
    description: describe(input, rows, words),
    width,
    height,
    shapes: [
      ...frontArrow(),
      ...rows.flatMap((row, stop) => [
        ...heading(input, stop, 26 + stop * stopHeight, words),
        ...row.flatMap((valve, i) => {
          const at = {
            x: edge + ((i % perLine) + 0.5) * pitch,
            y: 26 + stop * stopHeight + headHeight + Math.floor(i / perLine) * lineHeight + 13,
          };
          const radius = Math.min(12, pitch / 2 - 2.2);
          return [
            ...lashBadge(at, radius, valve.state, valve.shown, `stop:${stop + 1}:${valve.name}`),
            ...(inSideView ? sideView(at, pitch, valve.inlet, valve.opening) : []),
          ];
        }),
      ]),
      ...lashLegend(width, height - legendHeight + 14, inSideView, words),
    ],
    table: {
      columns: ['Stop', 'Crank', 'Set', 'Fully open'].map(words.say),
      rows: stops.map(({ crank, set }, stop) => [
        String(stop + 1),
        degrees(crank, words),
        set.join(', '),
        fullyOpen(rows[stop] ?? []).join(', ') || 'none',
      ]),
    },
  };
}

function valvesAt({ request, plan }: LashPlanInput, stop: number): readonly ValveHere[] {
  const firings = firingAngles(request.firingOrder, request.intervals);
  const events = valveEvents(request.valveTiming);
  const crank = plan.stops[stop]?.crank ?? 0;
  const byName = request.valves.every(({ valve }) => valve.length <= 2);
  return request.valves.map(({ valve, cylinder, type }, i) => {
    const firesAt = firings.find((firing) => firing.cylinder === cylinder)?.firesAt ?? 0;
    const setAt = plan.stops.findIndex(({ set }) => set.includes(valve));
    return {
      name: valve,
      shown: byName ? valve : String(i + 1),
      inlet: type === 'inlet',
      state: setAt === stop ? 'now' : setAt < stop ? 'before' : 'later',
      opening: valveStateAt(events[type], phaseOf(crank, firesAt)),
    };
  });
}

const fullyOpen = (row: readonly ValveHere[]): readonly string[] =>
  row.filter(({ opening }) => opening === 'full').map(({ name }) => name);

function degrees(angle: number, { figure }: Wording): string {
  return `${figure(angle, decimalsOf(angle, 1))}°`;
}

function frontArrow(): readonly Shape[] {
  return [
    line(34, 15, 16, 15, 'dimension'),
    arrowHead({ x: 10, y: 15 }, 270, 'line'),
    text(38, 19, 'front', { ink: 'ink-2' }),
  ];
}

function heading(
  { request, plan }: LashPlanInput,
  stop: number,
  y: number,
  words: Wording,
): readonly Shape[] {
  const crank = plan.stops[stop]?.crank ?? 0;
  const before = plan.stops[stop - 1]?.crank;
  const first = String(request.firingOrder[0] ?? '');
  const from =
    before === undefined
      ? first.length <= 8
        ? `after the firing TDC of ${first}`
        : 'after the first’s firing TDC'
      : `turned on by ${degrees(crank - before, words)}`;
  return [
    line(edge, y + 2, width - edge, y + 2, 'thin'),
    text(edge, y + 20, `Stop ${stop + 1}`, { weight: 600 }),
    text(edge + 58, y + 20, degrees(crank, words), { face: 'figures', weight: 600 }),
    text(width - edge, y + 20, from, { anchor: 'end', ink: 'ink-2' }),
  ];
}

function describe({ plan }: LashPlanInput, rows: readonly (readonly ValveHere[])[], words: Wording): string {
  const each = plan.stops.map(({ crank, set }, stop) => {
    const open = fullyOpen(rows[stop] ?? []);
    const then =
      open.length === 0 ? '' : `, while ${inWords(open)} ${open.length === 1 ? 'is' : 'are'} fully open`;
    return `At ${degrees(crank, words)} of crank set ${set.length === 1 ? 'valve' : 'valves'} ${inWords(set)}${then}.`;
  });
  return `Valves from front to back, once for each stop. ${each.join(' ')}`;
}
