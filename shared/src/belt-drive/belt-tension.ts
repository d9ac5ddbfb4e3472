import type { BeltTension, BeltTensionRequest } from '../contracts/belt-drive.js';
import { InputError } from '../contracts/input-error.js';
import type { Quantity } from '../contracts/quantity.js';
import type { Judgement } from '../contracts/verdict.js';
import { fromSi, toSi } from '../quantities/convert.js';
import { requireNumber, requireQuantity, requireRecord } from '../quantities/require.js';
import { freeSpan } from './free-span.js';
import { requireOpenBelt } from './open-belt.js';
import { printLength } from './print-length.js';

const usualDeflection = 1 / 64;
const usualTolerance = 0.1;
/** Lengths closer than this are equal, m. */
const noise = 1e-12;

interface Wanted {
  readonly low: number;
  readonly high: number;
  readonly middle: number;
}

/**
 * How far a belt should give at the middle of its free span, and whether it does. Lengths of any unit.
 * Free span √(C² − ((D − d)/2)²); deflection = free span × `deflectionPerSpan` (1/64), allowed ± `tolerance` (0.1)
 * of it; or `limits`, the maker's own figures, whose middle is then the deflection. Answers are in the unit of
 * `measured`, else of the limits, else of the centres. Without `measured` `not-judged`.
 *
 * @throws InputError on the request's fields; on `limits.low` where it is above the high one
 * Source: 1/64 in per inch of span and the span's formula, a belt maker's technical section (`BT2` of the
 * reference values); ± 10 % common practice, no source.
 * Example: 8 and 4 in, 16 in apart: 15.87 in of span, 0.248 in of deflection.
 */
export function beltTension(request: BeltTensionRequest): BeltTension {
  const given = requireRecord(request, 'request');
  const span = freeSpan(requireOpenBelt(given));
  const measured = lengthIf(given['measured'], 'measured');
  const wanted = readWanted(given, span);
  const unit = measured?.unit ?? wanted.unit ?? unitOf(given['centres']);
  return {
    ...judge(measured, wanted, unit),
    freeSpan: fromSi(span, unitOf(given['centres'])),
    deflection: fromSi(wanted.middle, unit),
    assumed: assumedOf(given),
  };
}

function readWanted(
  given: Readonly<Record<string, unknown>>,
  span: number,
): Wanted & { unit?: Quantity['unit'] } {
  const perSpan = numberIf(given['deflectionPerSpan'], 'deflectionPerSpan', 0.5) ?? usualDeflection;
  const tolerance = numberIf(given['tolerance'], 'tolerance', 1) ?? usualTolerance;
  if (given['limits'] !== undefined) {
    const limits = requireRecord(given['limits'], 'limits');
    const low = requireQuantity(limits['low'], 'length', 'limits.low');
    const high = requireQuantity(limits['high'], 'length', 'limits.high', { zero: false });
    const [least, most] = [toSi(low), toSi(high)];
    if (least > most) throw new InputError('limits.low', 'The least must not be more than the most.');
    return { low: least, high: most, middle: (least + most) / 2, unit: low.unit };
  }
  const middle = span * perSpan;
  return { low: middle * (1 - tolerance), high: middle * (1 + tolerance), middle };
}

function judge(measured: Quantity | undefined, { low, high }: Wanted, unit: Quantity['unit']): Judgement {
  const wanted = `${printLength(low, unit)} to ${printLength(high, unit)}`;
  if (measured === undefined) {
    return { verdict: 'not-judged', reason: `It should give ${wanted}; measure it to have it judged.` };
  }
  const found = toSi(measured);
  const gives = `The belt gives ${printLength(found, unit)}, and should give ${wanted}`;
  if (found < low - noise) return { verdict: 'fail', reason: `${gives}: it is too tight.` };
  if (found > high + noise) return { verdict: 'fail', reason: `${gives}: it is too slack.` };
  return { verdict: 'pass', reason: `${gives}.` };
}

function assumedOf(given: Readonly<Record<string, unknown>>): readonly string[] {
  const usual =
    given['limits'] !== undefined
      ? []
      : [
          ...(given['deflectionPerSpan'] === undefined
            ? ['1/64 of the free span, a belt maker’s figure, with the force that the belt’s maker states.']
            : []),
          ...(given['tolerance'] === undefined ? ['± 10 % of the deflection, common practice.'] : []),
        ];
  return [...usual, 'The longest free run, pressed square at its middle; diameters and centres as they run.'];
}

function lengthIf(input: unknown, field: string): Quantity | undefined {
  return input === undefined ? undefined : requireQuantity(input, 'length', field);
}

function numberIf(input: unknown, field: string, max: number): number | undefined {
  return input === undefined ? undefined : requireNumber(input, field, { min: 0, max });
}

function unitOf(centres: unknown): Quantity['unit'] {
  return requireQuantity(centres, 'length', 'centres').unit;
}
