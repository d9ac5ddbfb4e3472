import type { WrenchSuits } from '../contracts/fastening.js';
import type { Quantity } from '../contracts/quantity.js';
import { convert } from '../quantities/convert.js';
import { printNumber, printQuantity } from '../quantities/print.js';
import { printFigure } from './print-figure.js';
import type { TorqueLimits } from './torque-limits.js';
import type { wrenchKinds } from './wrench-kinds.js';

export interface WrenchCase {
  readonly torque: Quantity;
  readonly limits: TorqueLimits | undefined;
  readonly kind: (typeof wrenchKinds)[number];
  readonly range: { readonly low: Quantity; readonly high: Quantity };
  readonly resolution: Quantity | undefined;
  /** As a share. */
  readonly deviation: number;
  /** ISO dates. */
  readonly calibration: { readonly due: string; readonly on: string } | undefined;
}

type Check = WrenchSuits['checks'][number];

const noise = 1e-9;
/** Under this share of the top of its range no calibration is asked for: ISO 6789-1:2017, 6.2 (from memory). */
const lowestPoint = 0.2;

/** The torque lies in the range; in the lowest fifth of it the maker alone vouches for the wrench. */
export function checkRange({ torque, range }: WrenchCase): Check {
  const [low, high] = [convert(range.low, torque.unit), convert(range.high, torque.unit)];
  const span = `${printFigure(low)} to ${printFigure(high)}`;
  const isInside = torque.value >= low.value * (1 - noise) && torque.value <= high.value * (1 + noise);
  if (!isInside) {
    return {
      of: 'range',
      verdict: 'fail',
      reason: `${printQuantity(torque)} is outside the range of the wrench, ${span}.`,
    };
  }
  const isLow = torque.value / high.value < lowestPoint * (1 - noise);
  const care = isLow
    ? ', but in the lowest fifth, where ISO 6789-1 asks for no calibration: a smaller wrench is surer'
    : '';
  return {
    of: 'range',
    verdict: 'pass',
    reason: `${printQuantity(torque)} lies in the range of the wrench, ${span}${care}.`,
  };
}

/** What the wrench may deliver stays within the tolerance. */
export function checkDeviation({ torque, limits, deviation }: WrenchCase): Check {
  const off = torque.value * deviation;
  const share = `±${printNumber(deviation * 100, 1).replace(/\.0$/, '')} %`;
  const print = (value: number): string => printFigure({ value, unit: torque.unit });
  const delivers = `With ${share} it may deliver ${print(torque.value - off)} to ${print(torque.value + off)}`;
  const check = (verdict: Check['verdict'], words: string): Check => ({
    of: 'deviation',
    verdict,
    reason: `${delivers}${words}`,
  });
  if (limits === undefined) return check('not-judged', ': no tolerance is given to hold that against.');
  const { below, above } = limits;
  const band = `${printQuantity(limits.low)} to ${printQuantity(limits.high)}`;
  if (below + above < 2 * off * (1 - noise)) {
    return check(
      'doubtful',
      `, more than the whole of ${band}: the wrench is too coarse for this tolerance.`,
    );
  }
  if (Math.min(below, above) < off * (1 - noise)) {
    return check('doubtful', `, past ${band} on one side: aim at the middle of the limits instead.`);
  }
  const ratio =
    off === 0 ? '' : `; the tolerance is ${printNumber((below + above) / (2 * off), 1)} times that`;
  return check('pass', `, inside ${band}${ratio}.`);
}

/** The wrench can be set, or read, finely enough: half a division is no more than what may be missed. */
export function checkResolution({ torque, limits, deviation, resolution, kind }: WrenchCase): Check {
  if (resolution === undefined) {
    return { of: 'resolution', verdict: 'not-judged', reason: 'Its divisions are not given.' };
  }
  const half = convert(resolution, torque.unit).value / 2;
  const allowed = limits === undefined ? torque.value * deviation : Math.min(limits.below, limits.above);
  const isFine = half <= allowed * (1 + noise);
  const act = kind === 'click' ? 'set' : 'read';
  return {
    of: 'resolution',
    verdict: isFine ? 'pass' : 'doubtful',
    reason: isFine
      ? `Divisions of ${printQuantity(resolution)} are fine enough.`
      : `With divisions of ${printQuantity(resolution)} it can't be ${act} finely enough: half a division is more ` +
        `than ${limits === undefined ? 'the wrench itself may be off' : 'the tolerance'}.`,
  };
}

/** The wrench is in calibration on the day. */
export function checkCalibration({ calibration }: WrenchCase): Check {
  if (calibration === undefined) {
    return { of: 'calibration', verdict: 'not-judged', reason: 'When its calibration is due is not given.' };
  }
  const { due, on } = calibration;
  return on > due
    ? {
        of: 'calibration',
        verdict: 'doubtful',
        reason: `Its calibration was due on ${due}, before ${on}: use one that is in date.`,
      }
    : { of: 'calibration', verdict: 'pass', reason: `Its calibration is in date until the end of ${due}.` };
}
