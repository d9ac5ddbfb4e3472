import type { LeadSwap } from '../contracts/calculations.js';
import { counted, named } from './words.js';

const pair = ({ outlets: [one, other] }: LeadSwap): string => `${named(one)} with ${named(other)}`;

/** The swaps as an instruction in outlet names: what is seen on the outside of the cap. */
export function cureInWords(swaps: readonly LeadSwap[]): string {
  const [first] = swaps;
  if (first === undefined) return '';
  if (swaps.length === 1) {
    return `One swap puts it right: exchange the leads at outlets ${first.outlets.map(named).join(' and ')}.`;
  }
  return (
    `${counted(swaps.length, 'swap')} put it right, in this order, ` +
    `exchanging the leads at the outlets: ${swaps.map(pair).join(', then ')}.`
  );
}
