import { reversed } from '../resolve-cap.js';
import { cylindersNamed, orderNamed } from '../words.js';
import { misplaced, sequenceOf } from '../wiring.js';
import type { Cause } from './cause.js';

/** The order is right but set out the wrong way round: mirrored about the first cylinder's own post. */
export const wiredAgainstTheRotor: Cause = {
  title: 'Wired against the rotor',
  fits: (wiring) => {
    const { belongs } = wiring;
    const n = belongs.length;
    return misplaced(wiring).length > 0 && belongs.every((place, i) => place === (n - i) % n);
  },
  explain: (wiring) => {
    const { cap, leads } = wiring;
    const unhurt = leads.filter(({ own, on }) => own === on).map(({ cylinder }) => cylinder);
    return (
      `The order is right, but it runs round the cap against the rotor: the rotor turns ${cap.rotation}, ` +
      `seen on the cap, and the leads were set out ${reversed(cap.rotation)}. ` +
      `The engine would fire ${orderNamed(sequenceOf(wiring))} in place of ${orderNamed(cap.order)}; ` +
      `only ${cylindersNamed(unhurt)} ${unhurt.length === 1 ? 'gets its' : 'get their'} own spark. ` +
      'That comes of reading the rotor’s direction from the wrong side.'
    );
  },
};
