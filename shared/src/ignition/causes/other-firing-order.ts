import { knownOrders, type KnownOrder } from '../known-orders.js';
import { orderNamed } from '../words.js';
import { misplaced, sequenceOf, type Wiring } from '../wiring.js';
import type { Cause } from './cause.js';

/** The leads follow another known order with as many cylinders, begun at the first cylinder's own post. */
export const otherFiringOrder: Cause = {
  title: 'Another firing order',
  fits: (wiring) => orderFollowed(wiring) !== undefined,
  explain: (wiring) => {
    const known = orderFollowed(wiring);
    const whose = known === undefined ? '' : `, which is known from the ${known.engine}`;
    return (
      `The leads follow the firing order ${orderNamed(sequenceOf(wiring))}${whose}; ` +
      `this engine fires ${orderNamed(wiring.cap.order)}. They were probably set out from another engine’s order.`
    );
  },
};

function orderFollowed(wiring: Wiring): KnownOrder | undefined {
  if (wiring.belongs[0] !== 0 || misplaced(wiring).length === 0) return undefined;
  const fires = sequenceOf(wiring);
  return knownOrders[fires.length]?.find(({ order }) => {
    const start = order.findIndex((cylinder) => cylinder === fires[0]);
    return fires.every((cylinder, i) => cylinder === order[(start + i) % order.length]);
  });
}
