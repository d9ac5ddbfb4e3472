import type { ValveTiming } from '../contracts/calculations.js';
import type { TimingFigures, TimingFiguresRequest } from '../contracts/valve-figures.js';
import { requireNumber, requireRecord, requireYesOrNo } from '../quantities/require.js';
import { durationsOf } from './durations.js';
import { isQuotedAlike, requireQuotedAt, type Quoted } from './quoted-at.js';
import { judgeTiming, notAlike, notCompared, type Late } from './timing-words.js';
import { requireValveTiming } from './valve-timing.js';

/** Crank degrees that each event may differ from the spec, where none are given: common practice, no source. */
const usualTolerance = 2;

/**
 * The figures of a valve timing, and how it stands against a spec's. Durations, overlap, lobe centres and `advance`
 * in crank degrees (`advance` is how far the camshaft stands before straight up, where both lobe centres are
 * equally far from TDC), lobe separation in cam degrees; `late` measured less spec, crank degrees, positive is late.
 * Figures quoted at different lifts or lashes are not compared. Without a spec `not-judged`.
 *
 * @throws InputError on `timing`, `quotedAt` (one of lift, more than zero, and lash), `spec.timing`, `spec.quotedAt`,
 * `tolerance` (0 to 30), `symmetrical`
 * Source: by definition of the four figures, see `durationsOf`; the usual 2° is common practice, no source.
 * Example: 7/39 and 51/3: lobe centres 106° and 114°, separation 110°, the camshaft 4° advanced.
 */
export function timingFigures(request: TimingFiguresRequest): TimingFigures {
  const given = requireRecord(request, 'request');
  const timing = requireValveTiming(given['timing'], 'timing');
  const quotedAt = requireQuotedAt(given['quotedAt'], 'quotedAt');
  const spec = readSpec(given['spec']);
  const tolerance = requireNumber(given['tolerance'] ?? usualTolerance, 'tolerance', { min: 0, max: 30 });
  const symmetrical = requireYesOrNo(given['symmetrical'] ?? true, 'symmetrical');

  const figures = durationsOf(timing);
  const late = spec && isQuotedAlike(spec.quotedAt, quotedAt) ? lateness(timing, spec.timing) : undefined;
  const judgement =
    spec === undefined
      ? notCompared
      : late === undefined
        ? notAlike(quotedAt, spec.quotedAt)
        : judgeTiming(late, tolerance);
  return {
    ...judgement,
    ...figures,
    advance: figures.lobeSeparation - figures.lobeCentre.inlet,
    ...(late === undefined ? {} : { late }),
    assumed: [
      symmetrical
        ? 'The lobes are symmetrical, so that the middle of each duration is its lobe centre.'
        : 'The lobes are not symmetrical: what is called lobe centre here is the middle of the duration and not the greatest lift, and separation and advance follow from that.',
      ...(late !== undefined && given['tolerance'] === undefined
        ? [`Each event may differ by ${tolerance}° of crank: common practice.`]
        : []),
    ],
  };
}

function readSpec(input: unknown): { timing: ValveTiming; quotedAt: Quoted } | undefined {
  if (input === undefined) return undefined;
  const given = requireRecord(input, 'spec');
  return {
    timing: requireValveTiming(given['timing'], 'spec.timing'),
    quotedAt: requireQuotedAt(given['quotedAt'], 'spec.quotedAt'),
  };
}

/** Opening figures count before a dead centre, so more of them is earlier; closing figures count after one. */
function lateness(measured: ValveTiming, spec: ValveTiming): Late {
  return {
    ivo: spec.ivo - measured.ivo,
    ivc: measured.ivc - spec.ivc,
    evo: spec.evo - measured.evo,
    evc: measured.evc - spec.evc,
  };
}
