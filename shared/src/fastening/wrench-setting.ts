import type { WrenchSetting, WrenchSettingRequest } from '../contracts/calculations.js';
import { InputError } from '../contracts/input-error.js';
import { toSi } from '../quantities/convert.js';
import { requireNumber, requireQuantity, requireRecord } from '../quantities/require.js';

/** Less of the wrench's length than this share is none but for rounding. */
const noise = 1e-9;

/**
 * What a torque wrench must be set to so that the fastener gets `torque` through an adapter or crow-foot:
 * T·L/(L + E·cos θ). L from the hand to the wrench's square, E from there to the fastener, θ between adapter
 * and wrench axis in degrees, 0 in line and away from the hand, 180 back towards it. The setting is in the
 * torque's own unit.
 *
 * @throws InputError on the request's fields; on `adapterLength` where the adapter reaches back to the hand or
 * past it, so that no setting gives the torque
 * Source: effective length of a straight and angled extension, TM 9-254 pp. 91–92.
 * Example: 135 lbf·in, 10 in, 1.5 in in line: 117.39 lbf·in.
 */
export function wrenchSetting(request: WrenchSettingRequest): WrenchSetting {
  const given = requireRecord(request, 'request');
  const torque = requireQuantity(given['torque'], 'torque', 'torque', { zero: false });
  const wrench = toSi(requireQuantity(given['wrenchLength'], 'length', 'wrenchLength', { zero: false }));
  const adapter = toSi(requireQuantity(given['adapterLength'], 'length', 'adapterLength'));
  const angle = requireNumber(given['adapterAngle'], 'adapterAngle', { min: -360, max: 360 });

  const effective = wrench + adapter * Math.cos((angle * Math.PI) / 180);
  if (effective <= wrench * noise) {
    throw new InputError(
      'adapterLength',
      'At this angle the adapter reaches back to the hand: it must be shorter than the wrench.',
    );
  }
  return { setting: { value: torque.value * (wrench / effective), unit: torque.unit } };
}
