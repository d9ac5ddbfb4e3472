import type { ValveTiming } from '../contracts/calculations.js';
import { requireNumber, requireRecord } from '../quantities/require.js';

/** Nothing that runs opens a valve earlier, or shuts it later, than this. */
const mostLead = 170;
const leastLead = -80;

/**
 * The four figures of a valve timing, crank degrees: inlet opens before TDC and closes after BDC, exhaust
 * opens before BDC and closes after TDC. Any may be negative.
 *
 * @throws InputError on `valveTiming` or one of its figures: from −80° to 170°
 */
export function requireValveTiming(input: unknown, field = 'valveTiming'): ValveTiming {
  const record = requireRecord(input, field);
  const figure = (name: keyof ValveTiming): number =>
    requireNumber(record[name], `${field}.${name}`, { min: leastLead, max: mostLead });
  return { ivo: figure('ivo'), ivc: figure('ivc'), evo: figure('evo'), evc: figure('evc') };
}
