import type { Cylinder } from '../contracts/calculations.js';
import { degrees } from '../ignition/words.js';
import { companionOf } from './firing-angles.js';
import { valveEvents } from './phase.js';
import type { Aspect, Engine, Seen } from './seen.js';
import { tellingValve } from './telling-valve.js';
import { cycle, holds, wrapped, type Windows } from './windows.js';
import { nameOf } from './words.js';

export type Tdc = 'compression' | 'exhaust';

/** What was seen, and where the cylinder asked about may stand now, at the last position. */
export interface Known {
  readonly engine: Engine;
  readonly seen: readonly Seen[];
  readonly about: number;
  readonly last: number;
  readonly now: Windows;
}

/** What to look for where both TDCs still fit. */
export function whatTells(known: Known): string {
  const { engine } = known;
  const name = nameOf(engine.asked.cylinder);
  const bring = known.about < known.last ? [`Bring ${name} to the top again.`] : [];
  const looks = [rockingTells(known), valveTells(known)].filter((look) => look !== undefined);
  const opens = degrees(valveEvents(engine.timing).exhaust.opens);
  const watch =
    `${looks.length === 0 ? 'Turn' : 'Or turn'} the crank on, the normal way, and watch ${name}'s valves: ` +
    `if the exhaust valve is the next to open, about ${opens} on, it was compression TDC; ` +
    `if the inlet valve opens instead, it was exhaust TDC.`;
  return [...bring, ...looks, watch].join(' ');
}

/** What to do once it is told: how to check it at the same position, or how to come back to it. */
export function whatConfirms(known: Known, answer: Tdc): string | undefined {
  if (known.about < known.last) return comeRoundAgain(known, answer);
  return answer === 'compression' ? crossCheck(known) : turnToCompression(known.engine);
}

/** What to do where the cylinder is at neither TDC. */
export function whereTheTopIs({ engine, seen, about, now }: Known): string {
  const name = nameOf(engine.asked.cylinder);
  const movedOn = exhaustOpening(engine, seen, about)
    ? `${name}'s exhaust valve opening means that the crank has moved on some ` +
      `${degrees(valveEvents(engine.timing).exhaust.opens)} past compression TDC: bring it round again. `
    : '';
  const tops = new Set(now.map(nextTop));
  const [top] = tops.size === 1 ? tops : [];
  const turn = `Turn the crank on, the normal way, until ${name} comes to the top`;
  if (top === undefined) return `${movedOn}${turn}, and look again.`;
  const then =
    top === 'exhaust' ? `; one whole turn further is its compression TDC, and ${signOf(engine)}` : '';
  return `${movedOn}${turn}: that is its ${top} TDC${then}.`;
}

/** The TDC that the cylinder comes to next from anywhere in a window, if it is the same one. */
function nextTop({ from, to }: Windows[number]): Tdc | undefined {
  if (to <= cycle / 2) return 'exhaust';
  return from > cycle / 2 && to <= cycle ? 'compression' : undefined;
}

const hasOverlap = ({ timing }: Engine): boolean => timing.ivo + timing.evc > 0;

function rockingTells(known: Known): string | undefined {
  const { engine } = known;
  if (!hasOverlap(engine)) return undefined;
  const name = nameOf(engine.asked.cylinder);
  const companion = companionOf(engine.firings, engine.asked);
  if (companion === undefined) {
    if (wasSeen(known, engine.asked.cylinder, ['inlet', 'exhaust'])) return undefined;
    return (
      `Look at ${name}'s own valves: if they rock (inlet opening while the exhaust closes), ` +
      `it is at exhaust TDC; if both are shut for ${degrees(engine.tolerance)} either side, at compression TDC.`
    );
  }
  if (wasSeen(known, companion, ['inlet', 'exhaust'])) return undefined;
  return (
    `Look at ${nameOf(companion)}'s valves: if they rock (inlet opening while the exhaust closes), ` +
    `${name} is at compression TDC; if ${name}'s own valves rock, it is at exhaust TDC.`
  );
}

function valveTells(known: Known): string | undefined {
  const { engine } = known;
  const hasCompanion = companionOf(engine.firings, engine.asked) !== undefined;
  if (hasCompanion && engine.timing.ivo + engine.timing.evc > 2 * engine.tolerance) return undefined;
  const telling = tellingValve(engine);
  if (!telling || wasSeen(known, telling.cylinder, [telling.valve])) return undefined;
  const other = telling.openAt === 'compression' ? 'exhaust' : 'compression';
  return (
    `Look at ${nameOf(telling.cylinder)}'s ${telling.valve} valve: if it is open, ` +
    `${nameOf(engine.asked.cylinder)} is at ${telling.openAt} TDC; if it is shut, at ${other} TDC.`
  );
}

function crossCheck(known: Known): string | undefined {
  const { engine } = known;
  const companion = companionOf(engine.firings, engine.asked);
  if (companion !== undefined && hasOverlap(engine)) {
    if (!wasSeen(known, companion, ['rocking', 'inlet', 'exhaust'])) {
      return `As a cross-check, look at ${nameOf(companion)}: its valves rock at this TDC, inlet opening while the exhaust closes.`;
    }
    if (wasSeen(known, engine.asked.cylinder, ['inlet', 'exhaust'])) return undefined;
    return `As a cross-check, look at ${nameOf(engine.asked.cylinder)}'s own valves: both are shut at this TDC.`;
  }
  const telling = tellingValve(engine);
  if (!telling || wasSeen(known, telling.cylinder, [telling.valve])) return undefined;
  const state = telling.openAt === 'compression' ? 'open' : 'shut';
  return (
    `As a cross-check, look at ${nameOf(telling.cylinder)}'s ${telling.valve} valve: ` +
    `it is ${state} at this TDC, and not at the other.`
  );
}

function wasSeen({ seen, about }: Known, cylinder: Cylinder, aspects: readonly Aspect[]): boolean {
  return seen.some(
    (one) => one.position === about && one.cylinder === cylinder && aspects.includes(one.aspect),
  );
}

function turnToCompression(engine: Engine): string {
  return `For its compression TDC turn the crank one whole turn on, the normal way: ${signOf(engine)}.`;
}

/** How compression TDC is known when the crank comes to it. */
function signOf(engine: Engine): string {
  const companion = companionOf(engine.firings, engine.asked);
  const rocks = companion !== undefined && hasOverlap(engine);
  if (rocks) return `${nameOf(companion)}'s valves rock there`;
  return `${nameOf(engine.asked.cylinder)}'s valves both stay shut as it comes up to it`;
}

function comeRoundAgain(known: Known, answer: Tdc): string {
  const { engine, seen, about, last, now } = known;
  const name = nameOf(engine.asked.cylinder);
  const later = seen.filter(({ position }) => position > about);
  const why = later.some((one) => exhaustOpening(engine, [one], one.position))
    ? `${name}'s exhaust valve was seen opening after that, so the`
    : 'The';
  const some = last === about + 1 ? movedOn(known, answer) : '';
  const moved = holds(now, tdcOf(answer))
    ? 'may have moved on from that TDC'
    : `has moved on${some} from that TDC`;
  const sign =
    answer === 'compression' ? signOf(engine) : `${name}'s own valves pass from exhaust to inlet there`;
  return `${why} crank ${moved}. Bring it round again: turn it on, the normal way, to ${name}'s next ${answer} TDC; ${sign}.`;
}

function exhaustOpening({ asked }: Engine, seen: readonly Seen[], at: number): boolean {
  return seen.some(
    ({ position, cylinder, aspect, state }) =>
      position === at && cylinder === asked.cylinder && aspect === 'exhaust' && state === 'opening',
  );
}

const tdcOf = (tdc: Tdc): number => (tdc === 'compression' ? 0 : cycle / 2);

/** The least that the crank has been turned since that TDC, the tolerance taken off again. */
function movedOn({ engine, now }: Known, answer: Tdc): string {
  const starts = now.map(({ from }) => wrapped(from - tdcOf(answer)));
  const least = Math.min(...starts) + engine.tolerance;
  return least > engine.tolerance && least < cycle / 2 ? ` some ${degrees(Math.round(least))}` : '';
}
