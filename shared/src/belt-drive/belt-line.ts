import type { BeltLine, BeltLineRequest, PulleyLine } from '../contracts/belt-drive.js';
import type { Verdict } from '../contracts/verdict.js';
import { fromSi, toSi } from '../quantities/convert.js';
import { requireList, requireQuantity, requireRecord, requireText } from '../quantities/require.js';
import { requireBeltLimit, type LimitTaken } from './belt-limit.js';
import { cureLine } from './cure-line.js';
import { readDriven, type Driven, type Driver } from './driven-pulley.js';
import { judgeLine } from './judge-line.js';
import { misalignment } from './misalignment.js';
import { printNumber } from '../quantities/print.js';

/**
 * One or two driven pulleys against the driver's plane: how far each is out of line, what moves it into line, and
 * whether there is room for that. Lengths of any unit, gaps signed; answers in the unit of the pulley's
 * `gaps.driverNear`, angles in degrees.
 *
 * Offset and angle as `beltAlignment`. With a second set of gaps, both pulleys turned a quarter, offset and angle
 * are means of the two sets and `runOut` half their difference in angle: what turns with a pulley, not with its
 * shaft. Run-out over half the limit of angle makes a pass `doubtful` (common practice, no source). The move is
 * the offset, forward where the pulley lies back; shims are the whole number nearest to it.
 *
 * @throws InputError on the request's fields; on a `faceToGroove` that only one of two pulleys has
 * Source: plane geometry; limits as `beltAlignment`.
 * Example: driven rims 1.2 and 1.6 mm back over 300 mm: move it 1.4 mm forward, three shims of 0.5 mm.
 */
export function beltLine(request: BeltLineRequest): BeltLine {
  const given = requireRecord(request, 'request');
  const driver = readDriver(given['driver']);
  const limit = requireBeltLimit(given['limit']);
  const driven = requireList(given['driven'], 'driven', { min: 1, max: 2 }).map((pulley, i) =>
    readDriven(pulley, `driven[${i}]`, driver),
  );
  const pulleys = driven.map((pulley) => lineOf(pulley, limit));
  return { ...overall(pulleys), pulleys, assumed: assumedOf(driven, limit) };
}

function readDriver(input: unknown): Driver {
  const given = requireRecord(input, 'driver');
  const groove = given['faceToGroove'];
  return {
    name: requireText(given['name'], 'driver.name', { max: 40 }),
    diameter: toSi(requireQuantity(given['diameter'], 'length', 'driver.diameter', { zero: false })),
    groove: groove === undefined ? undefined : toSi(requireQuantity(groove, 'length', 'driver.faceToGroove')),
  };
}

function lineOf(pulley: Driven, limit: LimitTaken): PulleyLine {
  const { name, span, unit, grooves } = pulley;
  const sets = pulley.sets.map((planes) => misalignment(planes, span, grooves));
  const mean = (of: (set: (typeof sets)[number]) => number): number =>
    sets.reduce((sum, set) => sum + of(set), 0) / sets.length;
  const found = { offset: mean((set) => set.offset), angle: mean((set) => set.angle) };
  const [first, second] = sets;
  const runOut = first === undefined || second === undefined ? null : (first.angle - second.angle) / 2;
  const judged = judgeLine(found, span, limit, unit, pulley.isByGroove ? 'grooves' : 'rims');
  const isRunningOut = runOut !== null && Math.abs(runOut) > limit.angle / 2 + noise;
  const verdict: Verdict = judged.verdict === 'pass' && isRunningOut ? 'doubtful' : judged.verdict;
  const runs = isRunningOut
    ? ` A pulley runs out by ${printNumber(Math.abs(runOut), 2)}°: find which and true it before anything is shimmed.`
    : '';
  return {
    name,
    verdict,
    reason: judged.reason + runs,
    offset: fromSi(found.offset, unit),
    angle: found.angle,
    offsetPerSpan: found.offset / span,
    runOut,
    tilt: found.angle,
    ...cureLine(pulley, found, limit),
  };
}

/** Floating point alone moves an angle by less than this, degrees. */
const noise = 1e-9;
const ranks = ['fail', 'doubtful', 'pass'] as const satisfies readonly Verdict[];

function overall(pulleys: readonly PulleyLine[]): { verdict: Verdict; reason: string } {
  const verdict = ranks.find((rank) => pulleys.some((one) => one.verdict === rank)) ?? 'pass';
  const telling = pulleys.filter((one) => one.verdict === verdict);
  return { verdict, reason: telling.map(({ name, reason }) => `${name}: ${reason}`).join(' ') };
}

function assumedOf(driven: readonly Driven[], limit: LimitTaken): readonly string[] {
  const said = [
    limit.isUsual && 'Usual limits for V-belts where none is given: 0.5° and 0.87 mm per 100 mm of span.',
    driven.some((one) => !one.isByGroove) &&
      'The rims are taken for the grooves: where a pulley’s groove does not lie as far behind its rim as the other’s, give both distances.',
    driven.some((one) => one.sets.length < 2) &&
      'One set of gaps tells no run-out of a pulley from the lean of its shaft: turn both a quarter and measure again.',
    driven.some((one) => one.sets.length > 1) &&
      'A quarter turn shows run-out, but leaves part of it in the mean; half a turn would take it all out.',
    'The driver is taken to be right: what is found is put right at the driven pulley.',
  ];
  return said.filter((words) => words !== false);
}
