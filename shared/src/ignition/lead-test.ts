import type { LeadTest, LeadTestRequest } from '../contracts/ignition-checks.js';
import type { Quantity } from '../contracts/quantity.js';
import type { Judgement } from '../contracts/verdict.js';
import { limitDecision } from '../measuring/limit-decision.js';
import { toSi } from '../quantities/convert.js';
import { printQuantity } from '../quantities/print.js';
import { requireOneOf, requireQuantity, requireRecord, requireYesOrNo } from '../quantities/require.js';
import { nearZero, roundedLimits, soundLead, type SoundLead } from './sound-lead.js';

type Reading = Quantity | 'open' | 'short';
type LeadKind = LeadTestRequest['kind'];

/**
 * Whether an HT lead measures as a sound one of its kind and length should. An open circuit and a short are
 * readings: open always fails; next to nothing is right for a wire-core lead and wrong for a resistive one. A
 * connection that was pierced or clamped again since is not judged. `limits` in the reading's unit, else in ohms.
 *
 * @throws InputError on `reading`, `kind`, `length`, `nominal.low`, `nominal.high`, `nominal.per`, `whole.low`,
 * `whole.high`, `endFittings`, `uncertainty`, `disturbed`
 * Source: resistance follows length; the figures are the maker's. Wire core at most 10 Ω, and suppressors in end
 * fittings within 20 % of their marking: common practice, no source.
 * Example: 600 mm at 7 to 10 kΩ a foot may read 13.78 to 19.69 kΩ.
 */
export function leadTest(request: LeadTestRequest): LeadTest {
  const given = requireRecord(request, 'request');
  const reading = requireReading(given['reading']);
  const kind = requireOneOf(given['kind'], ['resistive', 'wire-core'] as const, 'kind');
  const lead = soundLead(given, kind, typeof reading === 'string' ? 'Ω' : reading.unit);
  const uncertainty =
    given['uncertainty'] === undefined
      ? undefined
      : requireQuantity(given['uncertainty'], 'resistance', 'uncertainty');
  const disturbed = requireYesOrNo(given['disturbed'] ?? false, 'disturbed');
  return {
    ...(disturbed ? testAgain : judge(reading, kind, lead, uncertainty)),
    limits: lead.limits,
    cautions: [
      'Take the lead off and switch the ignition off before measuring it: high tension can throw you.',
      'An ohmmeter says nothing of the insulation. Look for cracks and burnt tracks, and in the dark, with the engine running and hands away, for sparks along the lead.',
    ],
    assumed: lead.assumed,
  };
}

const testAgain: Judgement = {
  verdict: 'not-judged',
  reason:
    'The connection was pierced or clamped again after this reading, so the reading says nothing of it now: test the lead again.',
};

function requireReading(input: unknown): Reading {
  if (typeof input === 'string') return requireOneOf(input, ['open', 'short'] as const, 'reading');
  return requireQuantity(input, 'resistance', 'reading');
}

function judge(reading: Reading, kind: LeadKind, lead: SoundLead, uncertainty?: Quantity): Judgement {
  if (reading === 'open') {
    const reason =
      'Open circuit: the core is broken or an end is not joined to it. Look at both ends first, then replace the lead.';
    return { verdict: 'fail', reason };
  }
  if (reading === 'short') return judgeShort(kind, lead);
  if (kind === 'resistive' && toSi(reading) < nearZero) {
    const reason = `${printQuantity(reading)} is next to nothing, and a resistive lead has kilohms: it has no resistance left, or it is a wire-core lead.`;
    return { verdict: 'fail', reason };
  }
  if (lead.limits === null) {
    const reason = `${printQuantity(reading)} is a resistance, so the core is whole; without the maker’s figure it cannot be judged further.`;
    return { verdict: 'not-judged', reason };
  }
  return judgeWithin(reading, lead.limits, uncertainty);
}

type Limits = NonNullable<SoundLead['limits']>;

/** Judged by the limits as they are, told with limits rounded inwards to what an ohmmeter shows. */
function judgeWithin(reading: Quantity, limits: Limits, uncertainty?: Quantity): Judgement {
  const exact = decide(reading, limits, uncertainty);
  const told = decide(reading, roundedLimits(limits), uncertainty);
  return told.verdict === exact.verdict ? told : exact;
}

function decide(reading: Quantity, { low, high }: Limits, uncertainty?: Quantity): Judgement {
  return limitDecision({
    value: reading,
    ...(low.value > 0 ? { low } : {}),
    high,
    ...(uncertainty && { uncertainty }),
  });
}

function judgeShort(kind: LeadKind, { fitted }: SoundLead): Judgement {
  if (kind === 'resistive') {
    return {
      verdict: 'fail',
      reason:
        'No resistance at all, and a resistive lead has kilohms: the lead is the wrong kind, or shorted.',
    };
  }
  if (fitted > nearZero) {
    return {
      verdict: 'fail',
      reason:
        'No resistance at all, but the end fittings have some: a fitting is shorted or is not the one named.',
    };
  }
  return {
    verdict: 'pass',
    reason: 'No resistance to speak of, which is right for a wire-core lead: the core is whole.',
  };
}
