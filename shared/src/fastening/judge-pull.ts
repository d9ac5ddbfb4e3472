import type { Quantity } from '../contracts/quantity.js';
import type { Judgement } from '../contracts/verdict.js';
import { limitDecision } from '../measuring/limit-decision.js';
import { convert } from '../quantities/convert.js';
import { printQuantity } from '../quantities/print.js';

/** One pull on one fastener. Torques may be in any units of torque. */
export interface Pull {
  /** How sentences name the wrench: `T-03`. */
  readonly wrench: string;
  /** A wrench that one sets and that clicks; the others are read. */
  readonly clicks: boolean;
  /** What it was set to, or what it showed. */
  readonly shown: Quantity;
  /** What that should have been, an adapter allowed for. */
  readonly wanted: Quantity;
  /** What the wrench shows over what the fastener gets: 1 without an adapter. */
  readonly lever: number;
  /** Limits of the torque at the fastener. */
  readonly low?: Quantity | undefined;
  readonly high?: Quantity | undefined;
  /** Expanded uncertainty of the wrench at a torque, in that torque's unit. */
  readonly uncertaintyAt: (torque: Quantity) => Quantity;
  /**
   * How far a setting may stand off the one wanted, and how far a reading may where it has no limits. A setting
   * without it is judged by its limits alone.
   */
  readonly allowed?: Quantity | undefined;
}

/** A torque is as wanted where it differs by no more than this: conversion noise. */
const noise = 1e-9;

/**
 * Judges one pull. A wrench that clicks proves its setting, not a reading, so its setting is judged: as wanted, and
 * carried to the fastener within the limits, less the uncertainty of the wrench. A reading is carried to the
 * fastener and judged at the limits in the same way; without limits it is judged by the wrench's own allowance.
 * Limits that the uncertainty leaves no room between make the wrench too coarse: `doubtful`.
 */
export function judgePull(pull: Pull): Judgement {
  return pull.clicks ? judgeSetting(pull) : judgeReading(pull);
}

function judgeSetting(pull: Pull): Judgement {
  const { shown, wrench } = pull;
  const wanted = convert(pull.wanted, shown.unit);
  const allowed = pull.allowed && convert(pull.allowed, shown.unit).value;
  if (allowed !== undefined && Math.abs(shown.value - wanted.value) > allowed + noise) {
    return {
      verdict: 'fail',
      reason: `${wrench} stands at ${printQuantity(shown)} and must be set to ${printQuantity(wanted)}.`,
    };
  }
  const pulled = `Set to ${printQuantity(shown)}, pulled once to the click.`;
  if (!hasLimits(pull)) return { verdict: 'pass', reason: pulled };
  const decision = judgeAtFastener(pull);
  return decision.verdict === 'pass' ? { verdict: 'pass', reason: `${pulled} ${decision.reason}` } : decision;
}

function judgeReading(pull: Pull): Judgement {
  if (hasLimits(pull)) return judgeAtFastener(pull);
  const { shown } = pull;
  const wanted = convert(pull.wanted, shown.unit);
  const allowed = convert(pull.allowed ?? pull.uncertaintyAt(wanted), shown.unit);
  const within = Math.abs(shown.value - wanted.value) <= allowed.value + noise;
  return {
    verdict: within ? 'pass' : 'fail',
    reason:
      `${printQuantity(shown)} is ${within ? 'within' : 'not within'} ${printQuantity(allowed)} of ` +
      `${printQuantity(wanted)}, the wrench's own allowance; this pass has no limits of its own.`,
  };
}

const hasLimits = ({ low, high }: Pull): boolean => low !== undefined || high !== undefined;

/** Carries what the wrench shows through the adapter to the fastener, and judges it there. */
function judgeAtFastener({ shown, lever, low, high, uncertaintyAt }: Pull): Judgement {
  const value: Quantity = { value: shown.value / lever, unit: shown.unit };
  return limitDecision({
    value,
    ...(low && { low }),
    ...(high && { high }),
    uncertainty: uncertaintyAt(value),
  });
}
