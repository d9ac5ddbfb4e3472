import type { ReadingMethod } from '../../contracts/spec.js';

/** How a tool is read well, in a sentence or two. Common practice, no source. */
export const howToRead: Readonly<Record<ReadingMethod, string>> = {
  micrometer: 'Try the micrometer on its setting piece first, then read each place at the ratchet.',
  'bore-gauge': 'Set the bore gauge with a micrometer and rock it to its least reading at each place.',
  feeler: 'Clean, flat blades: the right one drags, the next one up will not enter.',
  'dial-gauge':
    'Stand the dial gauge in line with the movement, take up all the slack one way, zero it and read.',
  'plastic-gauge':
    'Lay a strip along the dry journal at 90° to the split, pull the cap to its full torque, take it off without turning anything, read the strip at its widest. Keep the strip for the second person.',
  'depth-gauge': 'Hold the foot of the gauge flat, feel for the bottom and read.',
  'spring-balance': 'Pull steadily and in line, and read while it moves.',
  'straight-edge': 'Lay the straight edge on its edge and find the thickest blade that goes under.',
  burette: 'Grease the plate, fill to the hole without a bubble and read at the bottom of the meniscus.',
  other: '',
};
