import type { PulleyLine } from '../contracts/belt-drive.js';
import { fromSi } from '../quantities/convert.js';
import type { LimitTaken } from './belt-limit.js';
import type { Driven } from './driven-pulley.js';
import { withinLimit } from './judge-line.js';
import type { Misalignment } from './misalignment.js';
import { printLength } from './print-length.js';

/** Lengths closer than this are equal, m. */
const noise = 1e-9;

/**
 * What brings a driven pulley into line, in figures and words, and whether there is room for it. Lengths in
 * metres, the move in the pulley's unit, positive forward (towards the straight edge).
 */
export function cureLine(
  pulley: Driven,
  found: Misalignment,
  limit: LimitTaken,
): Pick<PulleyLine, 'cure' | 'clears'> {
  const { offset } = found;
  const room = offset > 0 ? pulley.roomInFront : pulley.roomBehind;
  const clears = room === undefined ? null : Math.abs(offset) <= room + noise;
  const shims = pulley.shim === undefined ? undefined : Math.round(Math.abs(offset) / pulley.shim);
  return {
    cure: {
      move: fromSi(offset, pulley.unit),
      ...(shims === undefined ? {} : { shims }),
      words: [
        moveWords(pulley, found, limit, shims),
        turnWords(pulley, found, limit),
        withinLimit(found, pulley.span, limit).isInPlane ? '' : roomWords(pulley, offset, room),
      ]
        .filter((words) => words !== '')
        .join(' '),
    },
    clears,
  };
}

function moveWords(
  { name, shim, span, unit, sets }: Driven,
  { offset, angle }: Misalignment,
  limit: LimitTaken,
  shims: number | undefined,
): string {
  const { isInPlane, isStraight } = withinLimit({ offset, angle }, span, limit);
  if (isInPlane) return isStraight ? `The ${name} may stay as it is.` : '';
  // Of an edge that does not lie flat on the driver, towards and away mean nothing: the driver's plane decides.
  const isFlat = sets.every(({ driver }) => Math.abs(driver.slope) < noise);
  const way = `${offset > 0 ? 'forward' : 'back'}${isFlat ? (offset > 0 ? ', towards the straight edge' : ', away from the straight edge') : ''}`;
  const move = `Move the ${name} ${printLength(Math.abs(offset), unit)} ${way}`;
  if (shims === undefined || shim === undefined || shims === 0) return `${move}.`;
  const count = shims === 1 ? 'one shim' : `${shims} shims`;
  const left = Math.abs(Math.abs(offset) - shims * shim);
  const rest = left > noise ? `, which leaves ${printLength(left, unit)}` : '';
  return `${move}: ${offset > 0 ? 'put' : 'take'} ${count} of ${printLength(shim, unit)} ${offset > 0 ? 'behind it' : 'out from behind it'}${rest}.`;
}

function turnWords({ name, diameter, span, unit }: Driven, found: Misalignment, limit: LimitTaken): string {
  const { angle } = found;
  if (withinLimit(found, span, limit).isStraight) return '';
  const swing = diameter * Math.tan((Math.abs(angle) * Math.PI) / 180);
  const way = angle > 0 ? 'back' : 'forward';
  return `Swing the ${name} on its mounting until its far rim has come ${printLength(swing, unit)} ${way} against its near one.`;
}

function roomWords({ unit }: Driven, offset: number, room: number | undefined): string {
  if (room === undefined || Math.abs(offset) <= room + noise) return '';
  return `There is only ${printLength(room, unit)} of room ${offset > 0 ? 'in front of' : 'behind'} it: it would foul, so part of it must be found at the other pulley.`;
}
