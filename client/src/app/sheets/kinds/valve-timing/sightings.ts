import {
  valveStates,
  type Cylinder,
  type Sighting,
  type ValveState,
} from '@second-spanner/shared/contracts/calculations';

/** What was seen of one cylinder, as it is chosen on the page; an empty text is not looked at. */
export interface SightingDraft {
  readonly cylinder: string;
  readonly inlet: string;
  readonly exhaust: string;
  readonly piston: string;
  readonly rocking: boolean;
  readonly pressure: boolean;
}

export interface SightingsDraft {
  /** One list a crank position, in the order of turning. */
  readonly positions: readonly (readonly SightingDraft[])[];
  /** Which position is asked about, from 0; −1 is the last. */
  readonly about: number;
}

export function nothingSeen(cylinder: string): SightingDraft {
  return { cylinder, inlet: '', exhaust: '', piston: '', rocking: false, pressure: false };
}

/** The page begins with the cylinder that the step asks about, and what was seen of it left open. */
export const emptySightings = (cylinder: Cylinder): SightingsDraft => ({
  positions: [[nothingSeen(String(cylinder))]],
  about: -1,
});

export function isSightingsDraft(value: unknown): value is SightingsDraft {
  if (typeof value !== 'object' || value === null) return false;
  return (
    'positions' in value &&
    Array.isArray(value.positions) &&
    'about' in value &&
    typeof value.about === 'number'
  );
}

/** Changes one row of one position. */
export function withRow(
  draft: SightingsDraft,
  position: number,
  row: number,
  change: Partial<SightingDraft>,
): SightingsDraft {
  const positions = draft.positions.map((rows, p) =>
    p === position ? rows.map((each, r) => (r === row ? { ...each, ...change } : each)) : rows,
  );
  return { ...draft, positions };
}

/** Adds a row for the next cylinder that the position has not yet. */
export function withNewRow(
  draft: SightingsDraft,
  position: number,
  cylinders: readonly Cylinder[],
): SightingsDraft {
  const seen = draft.positions[position]?.map(({ cylinder }) => cylinder) ?? [];
  const next =
    cylinders.map(String).find((cylinder) => !seen.includes(cylinder)) ?? String(cylinders[0] ?? '');
  const positions = draft.positions.map((rows, p) => (p === position ? [...rows, nothingSeen(next)] : rows));
  return { ...draft, positions };
}

/** Takes a row out, and its position with the last row of it, but never the last of all. */
export function withoutRow(draft: SightingsDraft, position: number, row: number): SightingsDraft {
  const positions = draft.positions
    .map((rows, p) => (p === position ? rows.filter((_, r) => r !== row) : rows))
    .filter((rows) => rows.length > 0);
  if (positions.length === 0) return draft;
  return { positions, about: draft.about >= positions.length ? -1 : draft.about };
}

export function withNewPosition(draft: SightingsDraft, cylinder: Cylinder): SightingsDraft {
  return { ...draft, positions: [...draft.positions, [nothingSeen(String(cylinder))]] };
}

const isValveState = (text: string): text is ValveState => (valveStates as readonly string[]).includes(text);

/**
 * The draft as it is judged and sent; null while a position has nothing seen at it. Rows without anything seen fall
 * away.
 */
export function readSightings(
  { positions, about }: SightingsDraft,
  cylinders: readonly Cylinder[],
): { readonly sightings: readonly (readonly Sighting[])[]; readonly about?: number } | null {
  const byName = new Map(cylinders.map((cylinder) => [String(cylinder), cylinder]));
  const sightings = positions.map((rows) =>
    rows.flatMap((row): Sighting[] => {
      const cylinder = byName.get(row.cylinder);
      const seen = seenIn(row);
      return cylinder === undefined || Object.keys(seen).length === 0 ? [] : [{ cylinder, ...seen }];
    }),
  );
  if (sightings.some((rows) => rows.length === 0)) return null;
  return about < 0 || about >= sightings.length ? { sightings } : { sightings, about };
}

function seenIn({ inlet, exhaust, piston, rocking, pressure }: SightingDraft): Omit<Sighting, 'cylinder'> {
  return {
    ...(isValveState(inlet) && { inlet }),
    ...(isValveState(exhaust) && { exhaust }),
    ...((piston === 'top' || piston === 'bottom') && { piston }),
    ...(rocking && { rocking: true as const }),
    ...(pressure && { pressure: true as const }),
  };
}
