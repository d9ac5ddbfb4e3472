import { InputError } from '../contracts/input-error.js';
import type { PositiveStop, PositiveStopRequest } from '../contracts/valve-figures.js';
import { around } from '../quantities/around.js';
import { requireNumber, requireRecord } from '../quantities/require.js';

/** A stop that catches the piston farther down than this was read the wrong way round, crank degrees. */
const mostHalf = 90;

/**
 * True TDC from the two places where a positive stop catches the piston: half way between them. `forward` is the
 * degree wheel where the crank, turned the normal way, comes to the stop before TDC, and `back` where it comes to
 * it turned back; both 0 to 360, counted the normal way.
 *
 * @throws InputError on `forward` or `back`, and on `back` where the two are alike or would put the stop more than
 * 90° from TDC
 * Source: symmetry of the piston's travel about TDC; common practice with a degree wheel.
 * Example: 350° and 14°: TDC at 2°, the pointer 2° out.
 */
export function positiveStop(request: PositiveStopRequest): PositiveStop {
  const given = requireRecord(request, 'request');
  const forward = requireNumber(given['forward'], 'forward', { min: 0, max: 360 });
  const back = requireNumber(given['back'], 'back', { min: 0, max: 360 });
  const half = around(back - forward) / 2;
  if (half === 0) {
    throw new InputError(
      'back',
      'The two readings must differ: the stop catches the piston either side of TDC.',
    );
  }
  if (half > mostHalf) {
    throw new InputError(
      'back',
      'These readings put the stop more than 90° from TDC. Exchange the two, or count the wheel the way the crank turns.',
    );
  }
  const tdc = around(forward + half);
  return { tdc, correction: tdc < 180 ? 0 - tdc : 360 - tdc, half };
}
