import { lateness, shown } from '../words.js';
import { misplaced, type FittedLead } from '../wiring.js';
import type { Cause } from './cause.js';

/** Two leads are on each other's posts and all others right. */
export const twoLeadsSwapped: Cause = {
  title: 'Two leads swapped',
  fits: (wiring) => misplaced(wiring).length === 2,
  explain: (wiring) => {
    const [one, other] = misplaced(wiring);
    if (one === undefined || other === undefined) return 'Two leads are on each other’s posts.';
    return (
      `The leads of cylinders ${shown(one.cylinder)} and ${shown(other.cylinder)} are on each other’s posts, ` +
      `${shown(other.own.post)} and ${shown(one.own.post)}; all others are right. ` +
      `In degrees of crank, ${sparkOf(one)} and ${sparkOf(other)}.`
    );
  },
};

const sparkOf = ({ cylinder, late }: FittedLead): string =>
  `cylinder ${shown(cylinder)} gets its spark ${lateness(late)}`;
