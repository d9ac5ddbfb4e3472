import { InputError } from '../contracts/input-error.js';
import type { CompressionRatio, CompressionRatioRequest } from '../contracts/measuring.js';
import type { Quantity } from '../contracts/quantity.js';
import { convert, fromSi, toSi } from '../quantities/convert.js';
import { printQuantity } from '../quantities/print.js';
import { requireNumber, requireQuantity, requireRecord } from '../quantities/require.js';
import { columnVolume } from './cylinder-volume.js';

/** Piston to head, cold, below which they may touch when the rod stretches: m. Common practice, no source. */
const closestSquish = 0.0008;

/**
 * The compression ratio from measured volumes: (swept + clearance)/clearance, where the clearance is chamber +
 * gasket's bore + what is left above the piston at TDC (`deck`, negative where it stands proud) + dish
 * (negative for a dome). Volumes in the unit of the chamber; the squish, gasket's thickness + deck, in the
 * deck's. With a ratio wanted also what the chamber must hold for it, swept/(wanted − 1) less the rest.
 *
 * @throws InputError on the request's fields; on `dish` where no volume is left, on `wanted` where no chamber
 * gives that ratio
 * Source: definition. The crevice above the top ring is left out. Example: 86 × 86 mm, chamber 40 cm³, gasket
 * 88 × 1.2 mm, deck 0.5 mm, dish 4 cm³: 10.22.
 */
export function compressionRatio(request: CompressionRatioRequest): CompressionRatio {
  const given = requireRecord(request, 'request');
  const length = (input: unknown, field: string): Quantity =>
    requireQuantity(input, 'length', field, { zero: false });
  const bore = length(given['bore'], 'bore');
  const swept = columnVolume(bore, length(given['stroke'], 'stroke'));
  const chamber = requireQuantity(given['chamber'], 'volume', 'chamber');
  const gasket = requireRecord(given['gasket'], 'gasket');
  const gasketBore = length(gasket['bore'], 'gasket.bore');
  const thickness = requireQuantity(gasket['thickness'], 'length', 'gasket.thickness');
  const deck = requireQuantity(given['deck'], 'length', 'deck', { negative: true });
  const dish =
    given['dish'] === undefined
      ? 0
      : toSi(requireQuantity(given['dish'], 'volume', 'dish', { negative: true }));

  const rest = columnVolume(gasketBore, thickness) + columnVolume(bore, deck) + dish;
  const clearance = toSi(chamber) + rest;
  if (clearance <= 0) {
    throw new InputError('dish', 'With these figures no volume is left above the piston at TDC.');
  }
  const squish: Quantity = {
    value: convert(thickness, deck.unit).value + deck.value,
    unit: deck.unit,
  };
  return {
    swept: fromSi(swept, chamber.unit),
    clearanceVolume: fromSi(clearance, chamber.unit),
    compressionRatio: (swept + clearance) / clearance,
    squish,
    ...chamberWanted(given['wanted'], swept, rest, chamber),
    cautions: cautionsOf(squish, toSi(gasketBore) < toSi(bore)),
  };
}

function chamberWanted(
  input: unknown,
  swept: number,
  rest: number,
  { unit }: Quantity,
): Pick<CompressionRatio, 'chamberFor'> {
  if (input === undefined) return {};
  const wanted = requireNumber(input, 'wanted', { min: 1.5, max: 50 });
  const chamber = swept / (wanted - 1) - rest;
  if (chamber > 0) return { chamberFor: fromSi(chamber, unit) };
  throw new InputError(
    'wanted',
    'Gasket, deck and dish alone hold more than this ratio leaves: no chamber gives it.',
  );
}

function cautionsOf(squish: Quantity, isGasketSmall: boolean): readonly string[] {
  const height = toSi(squish);
  const close =
    height <= 0
      ? `Piston and head would meet with ${printQuantity({ ...squish, value: Math.abs(squish.value) })} too little room.`
      : `${printQuantity(squish)} between piston and head is little: rods stretch and pistons rock. Follow the maker.`;
  return [
    ...(height < closestSquish ? [close] : []),
    ...(isGasketSmall
      ? ["The gasket's bore is smaller than the cylinder's: it would stand in the flame."]
      : []),
  ];
}
