import { keyForms, type KeyFit, type KeyFitRequest, type KeyForm } from '../contracts/fits.js';
import { InputError } from '../contracts/input-error.js';
import { fromSi, toSi } from '../quantities/convert.js';
import { requireOneOf, requireQuantity, requireRecord } from '../quantities/require.js';
import { fitNoise, settled } from './fit-noise.js';
import { judgeKey } from './judge-key.js';
import { sagitta } from './sagitta.js';

/** The widest key that the tolerance bands reach, m. */
const widestKey = 0.25;

/**
 * A key in the slots of its shaft and its hub: play in width in each, and over the key. Lengths of any unit;
 * the plays are in the key width's.
 *
 * Play is the slot's width less the key's; over the key it is both depths less its height. Depths count at the
 * centre line: a shaft's depth measured at the slot's edge is deeper there by the shaft's curve
 * R − √(R² − (b/2)²). The hub's depth is taken from the top of its bore.
 * Width: to 0.045 mm tighter than the key `pass`, to 0.08 mm `doubtful`, beyond it `fail`; looser than a free
 * fit at its most (key h9 in H9 in the shaft, in D10 in the hub; a taper key in D10 in both) `fail`.
 * Height: a parallel or Woodruff key that touches at the top or stays below the shaft fails, and a taper key
 * that does not bear on its top.
 *
 * @throws InputError on the request's fields; on `shaftDiameter` where the depth is from the edge and it is not
 * there, or smaller than the slot is wide
 * Source: DIN 6885-1, 6886 and 6888 for the classes (from memory), ISO 286-1 for their width; the tight limits
 * from P9 at its tightest (T5-043: 42 µm over 3 to 6 mm) and common practice.
 * Example: key 4.76 mm, shaft slot 4.78 mm, hub slot 4.83 mm: plays 0.02 and 0.07 mm, it passes.
 */
export function keyFit(request: KeyFitRequest): KeyFit {
  const given = requireRecord(request, 'request');
  const width = lengthOf(given['key'], 'key', 'width');
  if (toSi(width) > widestKey) {
    throw new InputError('key.width.value', 'This must be at most 250 mm: no wider key has a tolerance.');
  }
  const height = lengthOf(given['key'], 'key', 'height');
  const shaft = slotOf(given['shaftKeyway'], 'shaftKeyway');
  const hub = slotOf(given['hubKeyway'], 'hubKeyway');
  const form: KeyForm =
    given['form'] === undefined ? 'parallel' : requireOneOf(given['form'], keyForms, 'form');

  const shaftDepth = shaft.depth + curve(given, shaft.width);
  const play = {
    shaft: settled(shaft.width - toSi(width)),
    hub: settled(hub.width - toSi(width)),
    top: settled(shaftDepth + hub.depth - toSi(height)),
  };
  const judged = judgeKey({
    form,
    width: toSi(width),
    play,
    standsOut: settled(toSi(height) - shaftDepth),
    unit: width.unit,
  });
  return {
    ...judged,
    play: {
      shaft: fromSi(play.shaft, width.unit),
      hub: fromSi(play.hub, width.unit),
      top: fromSi(play.top, width.unit),
    },
  };
}

function lengthOf(input: unknown, field: string, name: string): ReturnType<typeof requireQuantity> {
  return requireQuantity(requireRecord(input, field)[name], 'length', `${field}.${name}`, { zero: false });
}

function slotOf(input: unknown, field: string): { width: number; depth: number } {
  return { width: toSi(lengthOf(input, field, 'width')), depth: toSi(lengthOf(input, field, 'depth')) };
}

/** What a depth from the slot's edge is short of the depth at the centre line. */
function curve(given: Readonly<Record<string, unknown>>, slot: number): number {
  const from = given['depthFrom'];
  const isEdge = from !== undefined && requireOneOf(from, ['centre', 'edge'], 'depthFrom') === 'edge';
  const input = given['shaftDiameter'];
  if (input === undefined) {
    if (!isEdge) return 0;
    throw new InputError(
      'shaftDiameter',
      'A depth from the slot’s edge needs the shaft’s diameter too: its curve lies between edge and centre.',
    );
  }
  const diameter = toSi(requireQuantity(input, 'length', 'shaftDiameter', { zero: false }));
  if (diameter - slot <= fitNoise) {
    throw new InputError('shaftDiameter', 'The shaft must be thicker than its slot is wide.');
  }
  return isEdge ? sagitta(diameter, slot) : 0;
}
