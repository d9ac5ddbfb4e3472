import type { TdcAnswer, WhichTdc, WhichTdcRequest } from '../contracts/calculations.js';
import { degrees, sentence } from '../ignition/words.js';
import { requireNumber, requireOneOf, requireRecord } from '../quantities/require.js';
import { aroundTop } from './around-top.js';
import { firingAngles, firingOf } from './firing-angles.js';
import { whatConfirms, whatTells, whereTheTopIs, type Known, type Tdc } from './next-to-look-for.js';
import { marksSeen, requirePositions, requireSeen, type Engine, type Seen } from './seen.js';
import { requireValveTiming } from './valve-timing.js';
import { contradicting, whereItStood } from './where-it-stood.js';
import { asPairs, cycle, holds, nowhere, type Windows } from './windows.js';
import { nameOf, rangesOf } from './words.js';

const defaultTolerance = 10;
const mostTolerance = 90;

interface Question {
  readonly engine: Engine;
  readonly seen: readonly Seen[];
  readonly about: number;
  readonly last: number;
}

/**
 * Which TDC a cylinder of a four-stroke was at, told from what was seen while the crank was turned the normal
 * way: valves of any cylinder, pistons, pressure at a plug hole, timing marks. Angles in crank degrees;
 * `windows` are phases of the cylinder asked about, 0 its compression TDC. Marks that stand together do so at
 * the position asked about.
 *
 * @throws InputError on the request's fields, such as `sightings[1][0].inlet`
 * Source: the valve timing's own definition; worked out by exact sets of angles.
 * Example: No. 1 at the top, both its valves shut, then its exhaust valve opening: it was compression TDC.
 */
export function whichTdc(request: WhichTdcRequest): WhichTdc {
  const question = requireQuestion(requireRecord(request, 'request'));
  const { seen, about, last } = question;
  const windows = whereItStood(seen, about);
  if (windows.length === 0) return contradiction(question);

  const known: Known = { ...question, now: whereItStood(seen, last) };
  const atCompression = holds(windows, 0);
  const atExhaust = holds(windows, cycle / 2);
  if (atCompression && !atExhaust) return told('compression', known, windows);
  if (atExhaust && !atCompression) return told('exhaust', known, windows);
  const next = atCompression ? whatTells(known) : whereTheTopIs(known);
  const reason = atCompression ? bothFit(question, windows) : neitherFits(question, windows);
  return answered('cannot-tell', reason, next, windows);
}

function requireQuestion(given: Readonly<Record<string, unknown>>): Question {
  const firings = firingAngles(given['firingOrder'], given['intervals']);
  const timing = requireValveTiming(given['valveTiming']);
  const asked = firingOf(firings, given['cylinder'], 'cylinder');
  const tolerance =
    given['tolerance'] === undefined
      ? defaultTolerance
      : requireNumber(given['tolerance'], 'tolerance', { min: 0, max: mostTolerance });
  const marks =
    given['marksTogether'] === undefined
      ? undefined
      : requireOneOf(given['marksTogether'], ['compression', 'exhaust'], 'marksTogether');

  const engine = { firings, timing, asked, tolerance };
  const positions = requirePositions(given['sightings']);
  const last = positions.length - 1;
  const about =
    given['about'] === undefined
      ? last
      : requireNumber(given['about'], 'about', { min: 0, max: last, integer: true });
  const bySight = requireSeen(positions, engine, marks && about);
  const seen = marks ? inOrder([...bySight, marksSeen(marks, engine, about)]) : bySight;
  return { engine, seen, about, last };
}

function inOrder(seen: readonly Seen[]): readonly Seen[] {
  return [...seen].sort((a, b) => a.position - b.position);
}

function told(tdc: Tdc, known: Known, windows: Windows): WhichTdc {
  const { engine, seen, about, last } = known;
  const [here, other, otherTdc] =
    tdc === 'compression' ? [0, 'exhaust', cycle / 2] : [cycle / 2, 'compression', 0];
  const proof = seen.find((one) => !holds(whereItStood([one], about), otherTdc));
  const by = proof ? `${proof.words}${placeOf(proof, last)}` : 'all that was seen, taken together';
  const around = aroundTop(asPairs(windows), here === 0 ? 0 : 360) ?? `${rangesOf(windows)} of its cycle`;
  const reason =
    `${atPosition(about, last)}${nameOf(engine.asked.cylinder)} ${about < last ? 'was' : 'is'} ` +
    `at ${tdc} TDC (${degrees(here)}). Its ${other} TDC (${degrees(otherTdc)}) is ruled out by ${by}: ` +
    `what was seen leaves it ${around}, to within ${degrees(engine.tolerance)}.`;
  return answered(`${tdc}-tdc`, reason, whatConfirms(known, tdc), windows);
}

function bothFit({ engine, seen, about, last }: Question, windows: Windows): string {
  const name = nameOf(engine.asked.cylinder);
  const overlap = engine.timing.ivo + engine.timing.evc;
  const isShut = (valve: 'inlet' | 'exhaust'): boolean =>
    seen.some(
      (one) =>
        one.position === about &&
        one.cylinder === engine.asked.cylinder &&
        one.aspect === valve &&
        one.state === 'shut',
    );
  const bothShut = isShut('inlet') && isShut('exhaust');
  const why = bothShut
    ? ` Both valves shut proves nothing here: with ${degrees(overlap)} of overlap they are shut, ` +
      `or within ${degrees(engine.tolerance)} of it, at either TDC.`
    : '';
  return (
    `${atPosition(about, last)}${name} may be at compression TDC (0°) or at exhaust TDC (360°): ` +
    `what was seen leaves it at ${rangesOf(windows)} of its cycle, to within ${degrees(engine.tolerance)}.${why}`
  );
}

function neitherFits({ engine, seen, about, last }: Question, windows: Windows): string {
  const earlier = lastTopBefore(seen, about, engine);
  return (
    `${atPosition(about, last)}${nameOf(engine.asked.cylinder)} is at neither TDC: ` +
    `what was seen puts it at ${rangesOf(windows)} of its cycle, and its TDCs are at 0° and 360°.${earlier}`
  );
}

/** Where the piston was seen at its top before, which TDC that was, if it can be told. */
function lastTopBefore(seen: readonly Seen[], about: number, { asked }: Engine): string {
  const top = seen
    .filter(
      ({ position, cylinder, state }) => position < about && cylinder === asked.cylinder && state === 'top',
    )
    .at(-1);
  if (!top) return '';
  const windows = whereItStood(seen, top.position);
  const isCompression = holds(windows, 0);
  if (isCompression === holds(windows, cycle / 2)) return '';
  return ` At position ${top.position + 1} it was at ${isCompression ? 'compression' : 'exhaust'} TDC.`;
}

function contradiction({ engine, seen, last }: Question): WhichTdc {
  const misfits = contradicting(seen);
  const [first, second, ...others] = misfits.map((one) => `${one.words}${placeOf(one, last)}`);
  if (second === undefined) {
    const { ivo, evc } = engine.timing;
    const reason = `${first} does not fit the valve timing, which has an overlap of ${degrees(ivo + evc)}.`;
    return answered('contradiction', reason, 'Look again, or check the valve timing.', nowhere);
  }
  const besides = others.length === 0 ? '' : `, with ${others.join(' and ')}`;
  const moved = misfits.some((one) => one.position !== misfits[0]?.position);
  const turning = moved
    ? ', the crank turned forwards by less than one turn from each position to the next'
    : '';
  const reason = `${first} and ${second} cannot both be right${besides}, to within ${degrees(engine.tolerance)}${turning}.`;
  return answered('contradiction', reason, `Look again at ${first} and at ${second}.`, nowhere);
}

function answered(answer: TdcAnswer, reason: string, next: string | undefined, windows: Windows): WhichTdc {
  return { answer, reason: sentence(reason), ...(next !== undefined && { next }), windows: asPairs(windows) };
}

function atPosition(about: number, last: number): string {
  return last === 0 ? '' : `At position ${about + 1} of ${last + 1}, `;
}

function placeOf({ position }: Seen, last: number): string {
  return last === 0 ? '' : ` at position ${position + 1}`;
}
