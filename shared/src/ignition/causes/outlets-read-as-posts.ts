import { cylindersNamed, listed } from '../words.js';
import { misplaced } from '../wiring.js';
import type { Cause } from './cause.js';

/**
 * The leads would be right if each outlet were joined to the post that it stands beside, which is the one of
 * the same name. A cap whose outlets share no names with its posts is not judged for this.
 */
export const outletsReadAsPosts: Cause = {
  title: 'Outlets read as posts',
  fits: (wiring) => {
    const { leads } = wiring;
    return misplaced(wiring).length > 0 && leads.every(({ own, on }) => on.outlet === own.post);
  },
  explain: (wiring) => {
    const wrong = misplaced(wiring);
    const outlets = listed(wrong.map(({ on }) => on.outlet));
    const cylinders = cylindersNamed(wrong.map(({ cylinder }) => cylinder));
    const inside =
      wrong.length === 2
        ? `outlets ${outlets} cross over, so ${cylinders} get each other’s spark`
        : `outlets ${outlets} lead to other posts than the ones beside them, so ${cylinders} get one another’s sparks`;
    return `The leads are in firing order round the outside of the cap. Inside it, ${inside}.`;
  },
};
