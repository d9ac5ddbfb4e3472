import type { Cylinder } from '@second-spanner/shared/contracts/calculations';
import type { WiringStep } from '@second-spanner/shared/contracts/steps';
import { capMap } from '@second-spanner/shared/ignition/cap-map';

/** What is chosen for each outlet: a cylinder as text, or an empty text. */
export type FittedDraft = Readonly<Record<string, string>>;

export const nothingFitted: FittedDraft = {};

export function isFittedDraft(value: unknown): value is FittedDraft {
  return (
    typeof value === 'object' &&
    value !== null &&
    Object.values(value).every((each) => typeof each === 'string')
  );
}

/** The cap's outlets by name. Their order says nothing of the map. */
export function outletsOf({ cap }: WiringStep): readonly string[] {
  return capMap(cap)
    .rows.map(({ outlet }) => outlet)
    .sort((a, b) => a.localeCompare(b, 'en', { numeric: true }));
}

/** The cylinders by name or number, in that order: the firing order would give the map away. */
export function cylindersOf({ cap }: WiringStep): readonly Cylinder[] {
  return [...cap.firingOrder].sort((a, b) => String(a).localeCompare(String(b), 'en', { numeric: true }));
}

/** The draft as it is sent: cylinders as the engine's own numbers or names. */
export function cylindersByOutlet(
  definition: WiringStep,
  fitted: FittedDraft,
): Readonly<Record<string, Cylinder>> {
  const cylinders = new Map(definition.cap.firingOrder.map((cylinder) => [String(cylinder), cylinder]));
  return Object.fromEntries(
    outletsOf(definition).flatMap((outlet) => {
      const cylinder = cylinders.get(fitted[outlet] ?? '');
      return cylinder === undefined ? [] : [[outlet, cylinder]];
    }),
  );
}
