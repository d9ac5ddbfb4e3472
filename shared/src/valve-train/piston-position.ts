import { InputError } from '../contracts/input-error.js';
import type { PistonHeight, PistonHeightRequest } from '../contracts/valve-figures.js';
import { toSi } from '../quantities/convert.js';
import { requireNumber, requireQuantity, requireRecord } from '../quantities/require.js';
import { crankFromTop } from './crank-from-top.js';
import { pistonFromTop, requireCrankThrow, type CrankThrow } from './piston-height.js';

const mostCrank = 1e6;
const mostSpeed = 50_000;

/**
 * Where the piston stands at a crank angle, or the angle at which it has come down so far, and with a crank speed
 * (revolutions a minute) the mean and greatest piston speeds in m/s. Slider-crank without offset: pin height
 * r cos θ + √(l² − r² sin² θ). `crank` is answered as degrees from TDC, 0 to 180, for it is the same either side;
 * lengths are in the stroke's unit, `fromTop` in its own where it was given.
 *
 * @throws InputError on `stroke`, `rodLength` (longer than half the stroke), `crank`, `fromTop` (no more than the
 * stroke), `crankSpeed`; on `crank` where neither or both of `crank` and `fromTop` are given
 * Source: the piston motion equations of any text on engine kinematics; mean speed 2 · stroke · revolutions.
 * Example: stroke 3.307 in, rod 6.024 in, 6000 rev/min: fastest at 75.62°, 27.4 m/s.
 */
export function pistonHeight(request: PistonHeightRequest): PistonHeight {
  const given = requireRecord(request, 'request');
  const crankThrow = requireCrankThrow(given['stroke'], given['rodLength']);
  const { radius, rod, unit } = crankThrow;
  if ((given['crank'] === undefined) === (given['fromTop'] === undefined)) {
    throw new InputError('crank', 'Give one of the two: the crank angle, or how far down the piston is.');
  }
  const crank =
    given['crank'] === undefined
      ? crankFromTop(crankThrow, given['fromTop'], 'fromTop')
      : fromNearestTop(requireNumber(given['crank'], 'crank', { min: -mostCrank, max: mostCrank }));
  const down = pistonFromTop(crankThrow, crank);
  const fromTop =
    given['fromTop'] === undefined ? down : requireQuantity(given['fromTop'], 'length', 'fromTop');
  const speeds = given['crankSpeed'] === undefined ? {} : speedsOf(crankThrow, given['crankSpeed']);
  return {
    crank,
    fromTop,
    pinHeight: { value: radius + rod - down.value, unit },
    ...speeds,
    greatestSpeedAt: fastestAt(crankThrow),
  };
}

function speedsOf(crank: CrankThrow, input: unknown): { meanSpeed: number; greatestSpeed: number } {
  const speed = requireNumber(input, 'crankSpeed', { min: 0, max: mostSpeed });
  if (speed === 0) throw new InputError('crankSpeed', 'The crank speed must be more than zero.');
  const radius = toSi({ value: crank.radius, unit: crank.unit });
  const revolutions = speed / 60;
  return {
    meanSpeed: 4 * radius * revolutions,
    greatestSpeed: 2 * Math.PI * revolutions * radius * relativeSpeed(crank, fastestAt(crank)),
  };
}

/** Piston speed over the crank pin's own. */
function relativeSpeed({ radius, rod }: CrankThrow, degrees: number): number {
  const angle = (degrees * Math.PI) / 180;
  const ratio = radius / rod;
  const lean = Math.sqrt(1 - (ratio * Math.sin(angle)) ** 2);
  return Math.sin(angle) + (ratio * Math.sin(angle) * Math.cos(angle)) / lean;
}

/** The root of the piston's acceleration between TDC and 90°, by halving, to the last figure of a double. */
function fastestAt({ radius, rod }: CrankThrow): number {
  const ratio = radius / rod;
  const speedsUp = (angle: number): boolean => {
    const sine = Math.sin(angle);
    const lean = 1 - (ratio * sine) ** 2;
    const second = ratio * (Math.cos(2 * angle) + ratio ** 2 * sine ** 4);
    return Math.cos(angle) * lean ** 1.5 + second > 0;
  };
  let [low, high] = [0, Math.PI / 2];
  for (let i = 0; i < 60; i += 1) {
    const middle = (low + high) / 2;
    if (speedsUp(middle)) low = middle;
    else high = middle;
  }
  return ((low + high) / 2) * (180 / Math.PI);
}

function fromNearestTop(crank: number): number {
  const round = Math.abs(crank % 360);
  return Math.min(round, 360 - round);
}
