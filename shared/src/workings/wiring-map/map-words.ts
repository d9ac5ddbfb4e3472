import type { CapMap, CapMapRow, CylinderSpark, CapDiagnosis } from '../../contracts/calculations.js';
import { degrees } from '../../drawing/cap-input.js';
import { sparkWords } from './diagnosis-words.js';

/** One row of the lead table, as words. All may hold trade-word tokens. */
export interface LeadRow {
  readonly post: string;
  readonly outlet: string;
  readonly cylinder: string;
  /** Crank degrees after the first cylinder. */
  readonly firesAt: string;
  /** Null until every lead is entered. */
  readonly fitted: {
    readonly cylinder: string;
    readonly right: boolean;
    readonly spark: string;
    readonly valves: string;
  } | null;
}

/** Which pistons rise together, as a sentence; null where no two do. */
export function companionWords({ companions }: CapMap): string | null {
  if (companions.length === 0) return null;
  return companions.map(([one, other]) => `${one} and ${other}`).join(', ');
}

/** How far apart the sparks are. */
export function intervalWords({ crankInterval, distributorInterval, rows }: CapMap): string {
  if (crankInterval !== null && distributorInterval !== null) {
    return `${figure(crankInterval)}° of crank, ${figure(distributorInterval)}° of distributor`;
  }
  const each = rows.map(({ firesAt }, i) => (rows[i + 1]?.firesAt ?? 720) - firesAt);
  return `uneven: ${each.map((angle) => `${figure(angle)}°`).join(', ')} of crank`;
}

/** What a valve does at a spark. */
export function valveWords({ inletOpen, exhaustOpen }: CylinderSpark): string {
  if (inletOpen === null || exhaustOpen === null) return 'not known';
  if (inletOpen && exhaustOpen) return 'both open';
  if (inletOpen) return '{inlet} open';
  return exhaustOpen ? 'exhaust open' : 'both shut';
}

/** The lead table, in the order in which the rotor meets the posts. */
export function leadRows(map: CapMap, diagnosis: CapDiagnosis | null): readonly LeadRow[] {
  return map.rows.map((row) => ({
    post: `${degrees(row.angle)}°`,
    outlet: row.outlet,
    cylinder: String(row.cylinder),
    firesAt: `${figure(row.firesAt)}°`,
    fitted: diagnosis === null ? null : fittedAt(row, diagnosis),
  }));
}

function fittedAt(row: CapMapRow, diagnosis: CapDiagnosis): LeadRow['fitted'] {
  const spark = diagnosis.cylinders.find(({ post }) => post === row.post);
  if (spark === undefined) return null;
  const right = spark.late === 0 && spark.cylinder === row.cylinder;
  return {
    cylinder: String(spark.cylinder),
    right,
    spark: `${spark.cylinder}: ${sparkWords(spark)}`,
    valves: valveWords(spark),
  };
}

/** An angle to a tenth. */
function figure(angle: number): string {
  return String(Math.round(angle * 10) / 10);
}
