import type { MeasurementPlace, MeasurementSpec, SpecDocument } from '../../contracts/spec.js';
import { typed } from '../fastening/figures.js';
import { writeRows } from '../rows.js';
import type { WorkingCase } from '../working.js';
import { roundColumns } from './fields.js';

interface NamedCase {
  readonly name: string;
  readonly typed: WorkingCase;
}

/** The limits of a measurement, as typed. */
export function limitsTyped({ limits }: MeasurementSpec): WorkingCase {
  const { low, high } = limits.value;
  return { ...(low && { low: typed(low) }), ...(high && { high: typed(high) }) };
}

/** A case for every measurement of a spec that has limits and is wanted. */
export function casesOfMeasurements(
  document: SpecDocument,
  isWanted: (measurement: MeasurementSpec) => boolean,
  more: (measurement: MeasurementSpec) => WorkingCase = () => ({}),
): readonly NamedCase[] {
  return document.measurements
    .filter((measurement) => isWanted(measurement))
    .map((measurement) => ({
      name: measurement.name,
      typed: { ...limitsTyped(measurement), ...more(measurement) },
    }));
}

const roundPlaces: Partial<Record<MeasurementPlace, 'bore' | 'journal'>> = {
  bores: 'bore',
  tunnels: 'bore',
  journals: 'journal',
};

/** A case for every bore, tunnel and journal of a spec: its limits, and its rows without readings. */
export function casesOfRounds(document: SpecDocument): readonly NamedCase[] {
  return document.measurements.flatMap((measurement) => {
    const kind = roundPlaces[measurement.place];
    if (kind === undefined) return [];
    return [...placesByPart(measurement.at)].map(([part, places]) => ({
      name: `${measurement.name}: ${part}`,
      typed: {
        part: kind,
        ...limitsTyped(measurement),
        readings: writeRows(places, roundColumns),
      },
    }));
  });
}

/** `Cylinder 1, top, across` and `Main 1, across`, by the part they are of. */
function placesByPart(at: readonly string[]): ReadonlyMap<string, readonly WorkingCase[]> {
  const parts = new Map<string, WorkingCase[]>();
  for (const place of at) {
    const [part = place, ...rest] = place.split(', ');
    const axis = rest.at(-1) ?? 'one way';
    const height = rest.length > 1 ? rest.slice(0, -1).join(', ') : 'middle';
    parts.set(part, [...(parts.get(part) ?? []), { height, axis }]);
  }
  return parts;
}
