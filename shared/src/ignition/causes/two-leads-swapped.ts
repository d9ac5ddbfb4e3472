import { lateness, named } from '../words.js';
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
      `Two leads are exchanged, all others are right: the lead of cylinder ${named(one.cylinder)} is on ` +
      `cylinder ${named(other.cylinder)}’s post, ${named(other.own.post)}, and that of cylinder ` +
      `${named(other.cylinder)} on cylinder ${named(one.cylinder)}’s, ${named(one.own.post)}. ` +
      `In degrees of crank, ${sparkOf(one)} and ${sparkOf(other)}.`
    );
  },
};

const sparkOf = ({ cylinder, late }: FittedLead): string =>
  `cylinder ${named(cylinder)} gets its spark ${lateness(late)}`;
