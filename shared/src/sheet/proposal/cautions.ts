import type { SpecDocument } from '../../contracts/spec.js';

/** The usual cautions of each stage. Common practice, no source. */
const usual: Readonly<Record<number, readonly string[]>> = {
  1: [
    'The stand and the hoist must be rated for the whole engine; keep hands and feet from under it.',
    'Solvent and what compressed air blows out of a gallery go for the eyes: wear goggles, and gloves for solvent.',
  ],
  2: ['Press and hammer work throws chips: goggles on, the block well supported, fingers clear.'],
  3: [
    'A crankshaft is heavy and round: lift it with help or a sling, and never leave it where it can roll.',
    'Once the crank is in, anything that turns it can take a finger: nobody turns it while a hand is inside.',
  ],
  4: [
    'Ring edges cut. A piston that slips through takes fingers with it.',
    'Hot parts and press work for pins: gloves, goggles, and a place ready for the hot part.',
  ],
  5: ['Compressed air or a plug pushed into a cylinder can turn the crank: keep hands out of the drive.'],
  6: [
    "Take the weight of the engine on a hoist before anything is fitted at the stand's end.",
    'Sealants and thread-lock are for the bench, not the skin: gloves and fresh air.',
  ],
  7: ['Valve springs are loaded: keep the face out of line with the compressor and the collets in sight.'],
  8: ['A head is heavy and its studs are sharp: two people, or a sling.'],
  9: ['The crank is turned here with springs loaded: hands out of the gear while it moves.'],
  10: [
    'Retaining compounds and sealants: keep them off the skin, work with ventilation, and heat no part beyond what it and its neighbours can bear.',
  ],
  11: [
    'Battery off until the wiring is countersigned. Coils and capacitors bite after they are switched off.',
  ],
  12: [
    'Battery off until this stage is countersigned.',
    'Fuel vapour travels: no flame, no spark and no lamp that can break anywhere near.',
    'The extinguisher stands where it can be reached without passing the engine.',
  ],
  13: [
    'Fuel, a hot manifold and sparks are together from here on: someone stands by with the extinguisher.',
    'Belts and fans take hair, sleeves and cords. Nobody stands in line with the fan.',
    'Exhaust gas kills indoors: lead it outside and keep the doors open.',
  ],
  14: ['Hot parts, and a cooling system under pressure: let it cool before the cap is loosened.'],
};

/** With which each stage's cautions end. */
export const deferral = "The maker's data, local codes and qualified practice come before these words.";

/** What to take care of in a stage: the engine's own cautions after the usual ones. */
export function cautionsOf(document: SpecDocument, stage: number): readonly string[] {
  const own = document.cautions.filter((caution) => caution.stage === stage).map(({ text }) => text.value);
  return [...(usual[stage] ?? []), ...own, deferral];
}
