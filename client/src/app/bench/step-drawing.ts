import type { Dialect } from '@second-spanner/shared/contracts/people';
import type { EntryView, StepDetail } from '@second-spanner/shared/contracts/sheets';
import type {
  EntryContent,
  MeasurementStep,
  StepDefinition,
  TighteningStepDefinition,
  ValveTimingStep,
  WiringStep,
} from '@second-spanner/shared/contracts/steps';
import { drawCap } from '@second-spanner/shared/drawing/cap';
import type { Drawing } from '@second-spanner/shared/drawing/shapes';
import {
  drawTightening,
  fastenerPositions,
  type FastenerState,
} from '@second-spanner/shared/drawing/tightening';
import { drawToleranceBand } from '@second-spanner/shared/drawing/tolerance-band';
import { drawValveClock } from '@second-spanner/shared/drawing/valve-clock';
import type { DrawingOptions } from '@second-spanner/shared/drawing/words';
import { capMap } from '@second-spanner/shared/ignition/cap-map';
import { convert } from '@second-spanner/shared/quantities/convert';
import { diagnoseWiring } from '@second-spanner/shared/sheet/judge-wiring';
import { planOf } from '@second-spanner/shared/sheet/plan-of';
import { firingAngles } from '@second-spanner/shared/valve-train/firing-angles';
import { valveClock } from '@second-spanner/shared/valve-train/valve-clock';

type Content<K extends EntryContent['kind']> = Extract<EntryContent, { kind: K }>;
type Recorded<K extends EntryContent['kind']> = EntryView & { readonly content: Content<K> };

/** A step's drawing as it stands, out of what the person may see of it; null for what has no shape. */
export function stepDrawing({ definition, entries, covered }: StepDetail, dialect: Dialect): Drawing | null {
  const options = { dialect };
  const current = entries.filter((entry) => entry.current);
  return definition.kind === 'tightening'
    ? tightening(definition, covered ? null : ofKind(current, 'tightening'), options)
    : drawn(definition, current, options);
}

function drawn(
  definition: Exclude<StepDefinition, TighteningStepDefinition>,
  current: readonly EntryView[],
  options: DrawingOptions,
): Drawing | null {
  switch (definition.kind) {
    case 'measurement':
      return band(definition, ofKind(current, 'measurement'), options);
    case 'wiring':
      return cap(definition, ofKind(current, 'wiring'), options);
    case 'valve-timing':
      return clock(definition, options);
    case 'check':
    case 'photo':
      return null;
  }
}

function ofKind<K extends EntryContent['kind']>(
  entries: readonly EntryView[],
  kind: K,
): readonly Recorded<K>[] {
  return entries.filter((entry): entry is Recorded<K> => entry.content.kind === kind);
}

/** The pass that was begun last: what is done of it, and which is next; the order alone while it is covered. */
function tightening(
  definition: TighteningStepDefinition,
  pulls: readonly Recorded<'tightening'>[] | null,
  options: DrawingOptions,
): Drawing {
  const plan = planOf(definition);
  const { title, group } = definition;
  const positions = fastenerPositions(definition.plan.fasteners);
  const states = pulls === null ? undefined : fastenerStates(plan.sequence, pulls);
  return drawTightening({ plan, positions, outline: group.outline, numbers: 'name', states, title }, options);
}

function fastenerStates(
  sequence: readonly string[],
  pulls: readonly Recorded<'tightening'>[],
): Readonly<Record<string, FastenerState>> {
  const pass = Math.max(1, ...pulls.map(({ content }) => content.pass));
  const done = new Set(
    pulls
      .filter(({ content, verdict }) => content.pass === pass && verdict === 'pass')
      .map(({ content }) => content.fastener),
  );
  const next = sequence.find((fastener) => !done.has(fastener));
  const states = sequence.map((fastener): [string, FastenerState] => {
    if (done.has(fastener)) return [fastener, 'done'];
    return [fastener, fastener === next && done.size > 0 ? 'next' : 'to-come'];
  });
  return Object.fromEntries(states);
}

/** The last reading on its limits. */
function band(
  { limits, unit }: MeasurementStep,
  readings: readonly Recorded<'measurement'>[],
  options: DrawingOptions,
): Drawing | null {
  const inUnit = (quantity: Parameters<typeof convert>[0]): number =>
    Number(convert(quantity, unit).value.toPrecision(12));
  const { low, high } = limits;
  if (low === undefined && high === undefined) return null;
  const last = readings.at(-1);
  return drawToleranceBand(
    {
      low: low && inUnit(low),
      high: high && inUnit(high),
      unit,
      readings:
        last === undefined
          ? []
          : [
              {
                value: inUnit(last.content.value),
                uncertainty: 0,
                role: 'first',
                label: last.content.at,
                failed: last.verdict === 'fail',
              },
            ],
    },
    options,
  );
}

/** The cap as fitted; nothing of how it ought to be before somebody has entered that. */
function cap(definition: WiringStep, looks: readonly Recorded<'wiring'>[], options: DrawingOptions): Drawing {
  const map = capMap(definition.cap);
  const fitted = looks.at(-1)?.content.fitted;
  if (fitted === undefined) return drawCap({ map, request: definition.cap, showRequired: false }, options);
  const diagnosis = diagnoseWiring(definition, fitted);
  return drawCap(
    { map, request: definition.cap, fitted, fittedBy: 'outlet', diagnosis, showRequired: true },
    options,
  );
}

/** The clock at the TDC that the step wants. */
function clock(
  { firingOrder, valveTiming, cylinder, wanted }: ValveTimingStep,
  options: DrawingOptions,
): Drawing {
  const firesAt =
    firingAngles(firingOrder, undefined).find((each) => each.cylinder === cylinder)?.firesAt ?? 0;
  const crank = (firesAt + (wanted === 'exhaust-tdc' ? 360 : 0)) % 720;
  return drawValveClock(
    { request: { valveTiming, crank }, clock: valveClock({ firingOrder, valveTiming, crank }) },
    options,
  );
}
