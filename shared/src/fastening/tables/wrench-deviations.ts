/**
 * Permissible deviation of hand torque wrenches, as a share of the torque, by the greatest torque of the wrench.
 *
 * Source: ISO 6789-1:2017, 5.1.5, tables 1 and 2, for type II class A (set by hand, it clicks), type I class B
 * (with a dial) and type I class C (electronic); from memory, the figures of the first compared with the tool
 * manual I6789.
 */
export const wrenchDeviations = {
  click: { type: 'type II, class A', small: 0.06, large: 0.04 },
  dial: { type: 'type I, class B', small: 0.06, large: 0.04 },
  digital: { type: 'type I, class C', small: 0.06, large: 0.04 },
} as const;

/** Greatest torque of a wrench that still counts as small, N·m, included. */
export const smallWrench = 10;
