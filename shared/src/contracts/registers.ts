import type { Quantity } from './quantity.js';

export const toolKinds = [
  'click-wrench',
  'digital-wrench',
  'dial-wrench',
  'micrometer',
  'bore-gauge',
  'feeler-set',
  'dial-gauge',
  'plastic-gauge',
  'depth-gauge',
  'spring-balance',
  'straight-edge',
  'burette',
  'multimeter',
  'pressure-gauge',
] as const;
export type ToolKind = (typeof toolKinds)[number];

export interface Tool {
  readonly id: string;
  /** `T-07` */
  readonly code: string;
  readonly name: string;
  readonly kind: ToolKind;
  readonly low: Quantity;
  readonly high: Quantity;
  readonly resolution: Quantity;
  /** Expanded uncertainty (k = 2): absolute, or a share of the reading. One of the two. */
  readonly uncertainty?: Quantity;
  readonly uncertaintyShare?: number;
  /** Wrench: from the drive's centre to the middle of the grip. */
  readonly length?: Quantity;
  /** ISO date. */
  readonly calibrationDue: string;
}
