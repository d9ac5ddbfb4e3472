import { counted, cylindersNamed, orderNamed } from '../words.js';
import { misplaced, sequenceOf } from '../wiring.js';
import type { Cause } from './cause.js';

/** Every lead is on its own post. */
export const right: Cause = {
  title: 'Right',
  fits: (wiring) => misplaced(wiring).length === 0,
  explain: (wiring) => {
    const { cap } = wiring;
    if (cap.order.length === 1) return `The lead of ${cylindersNamed(cap.order)} is on its own post.`;
    return (
      `All ${counted(cap.order.length, 'lead')} are on their own posts: the rotor, turning ` +
      `${cap.rotation} seen on the cap, fires ${orderNamed(sequenceOf(wiring))}, each cylinder at its own time.`
    );
  },
};
