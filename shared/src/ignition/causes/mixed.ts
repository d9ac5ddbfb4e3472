import { cylindersNamed, orderNamed, sentence } from '../words.js';
import { misplaced, sequenceOf } from '../wiring.js';
import type { Cause } from './cause.js';

/** More than one mistake, or none that has a name. */
export const mixed: Cause = {
  title: 'Mixed',
  fits: (wiring) => misplaced(wiring).length > 0,
  explain: (wiring) => {
    const wrong = misplaced(wiring).map(({ cylinder }) => cylinder);
    return (
      `No single mistake explains these leads. ${sentence(cylindersNamed(wrong))} are on other posts than ` +
      `their own: the engine would fire ${orderNamed(sequenceOf(wiring))} ` +
      `in place of ${orderNamed(wiring.cap.order)}.`
    );
  },
};
