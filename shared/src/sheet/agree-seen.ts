import { InputError } from '../contracts/input-error.js';
import type { Cylinder } from '../contracts/calculations.js';
import type { Agreement } from '../contracts/sheets.js';
import type { ValveTimingStep, WiringStep } from '../contracts/steps.js';
import { judgeTdc, tellTdc, type Sightings } from './judge-tdc.js';
import { diagnoseWiring } from './judge-wiring.js';
import type { SecondCheckCase } from './second-check-case.js';

const tdcWords = {
  'compression-tdc': 'compression TDC',
  'exhaust-tdc': 'exhaust TDC',
  'cannot-tell': 'cannot tell yet',
  contradiction: 'what was seen contradicts itself',
} as const;

/** The leads read again, outlet by outlet, against what the first person read. */
export function agreeWiring(
  step: SecondCheckCase & { readonly definition: WiringStep },
  fitted: Readonly<Record<string, Cylinder>>,
): Agreement {
  const first = step.entries.find(({ content }) => content.kind === 'wiring')?.content;
  if (first?.kind !== 'wiring') throw new InputError('content', 'The leads have no first reading yet.');
  const diagnosis = diagnoseWiring(step.definition, fitted);
  const rows = Object.keys(first.fitted).map((outlet) => ({
    label: `{Outlet} ${outlet}`,
    first: String(first.fitted[outlet] ?? ''),
    second: String(fitted[outlet] ?? ''),
    en: null,
    agrees: String(first.fitted[outlet]) === String(fitted[outlet]),
  }));
  const same = rows.every(({ agrees }) => agrees);
  return {
    verdict: same && diagnosis.verdict === 'pass' ? 'pass' : 'fail',
    reason: same
      ? `Both of you read the same {leads} at the same {outlets}. ${diagnosis.reason}`
      : `You read other {leads} than the first person at ${rows
          .filter(({ agrees }) => !agrees)
          .map(({ label }) => label)
          .join(' and ')}.`,
    rows,
  };
}

/** The valves looked at again: both must tell the TDC that the step wants. */
export function agreeTdc(
  step: SecondCheckCase & { readonly definition: ValveTimingStep },
  seen: Sightings,
): Agreement {
  const first = step.entries.find(({ content }) => content.kind === 'valve-timing')?.content;
  if (first?.kind !== 'valve-timing')
    throw new InputError('content', 'The valves have no first sighting yet.');
  const judged = judgeTdc(step.definition, seen);
  const agrees = judged.verdict === 'pass';
  return {
    verdict: agrees ? 'pass' : 'fail',
    reason: judged.reason,
    rows: [
      {
        label: `No. ${step.definition.cylinder} at the top`,
        first: tdcWords[tellTdc(step.definition, first).answer],
        second: tdcWords[tellTdc(step.definition, seen).answer],
        en: null,
        agrees,
      },
    ],
  };
}
