import type { CapMap, CapMapRow } from '../contracts/calculations.js';
import { apart, polar, round } from './geometry.js';
import type { Point } from './shapes.js';

/** Where an outlet's lead is drawn: to the left or right, or straight out from its post. */
export type Way = 'left' | 'right' | 'out';

export interface PlacedLead {
  readonly row: CapMapRow;
  readonly way: Way;
  /** Degrees clockwise from the mark at which the lead leaves the cap; for `out` its post's angle. */
  readonly direction: number;
  /** The middle of the circle that carries the cylinder's number. */
  readonly end: Point;
  /** Where the conductor inside the cap meets the rim. */
  readonly mouth: Point;
}

export interface CapLayout {
  readonly width: number;
  readonly height: number;
  readonly centre: Point;
  /** The cap's rim, and the circle on which the posts stand. */
  readonly rim: number;
  readonly ring: number;
  readonly sideOutlets: boolean;
  /** Ears are drawn at top and bottom unless a lead leaves there. */
  readonly ears: { readonly top: boolean; readonly bottom: boolean };
  readonly leads: readonly PlacedLead[];
}

/** Which outlets lie on which side of a side-outlet cap, from the top. */
export interface CapSides {
  readonly left: readonly string[];
  readonly right: readonly string[];
}

const width = 340;
export const badgeRadius = 15.5;
const earHeight = 12;
/** How far from the middle of the cap the arrows between neighbours' leads reach. */
const arrowReach = 162;

/** True if the outlets carry names of their own, so that a trace has been made. */
export function traced(rows: readonly CapMapRow[]): boolean {
  return rows.some((row) => row.outlet !== row.post);
}

/**
 * Places posts and leads. A traced cap of up to eight has side outlets: the names in order, half down the
 * left and half down the right, unless `sides` says how they lie. Any other cap has its leads all round. Room is kept for swaps' arrows.
 */
export function layOutCap(map: Pick<CapMap, 'rows'>, swaps: boolean, sides?: CapSides): CapLayout {
  const lists = sides ?? sidesByName(map.rows);
  const fits = Math.max(lists.left.length, lists.right.length) <= 4;
  return traced(map.rows) && fits ? withSideOutlets(map.rows, lists) : withLeadsAllRound(map.rows, swaps);
}

function sidesByName(rows: readonly CapMapRow[]): CapSides {
  const names = rows.map((row) => row.outlet).sort((a, b) => a.localeCompare(b, 'en', { numeric: true }));
  const half = Math.ceil(names.length / 2);
  return { left: names.slice(0, half), right: names.slice(half) };
}

function withSideOutlets(rows: readonly CapMapRow[], sides: CapSides): CapLayout {
  const most = Math.max(sides.left.length, sides.right.length);
  const pitch = most <= 2 ? 80 : most === 3 ? 52 : 42;
  const rim = Math.max(84, ((most - 1) * pitch) / 2 + 21);
  const centre = { x: width / 2, y: rim + 36 };
  const leads = rows.map((row): PlacedLead => {
    const way: Way = sides.left.includes(row.outlet) ? 'left' : 'right';
    const list = sides[way];
    const y = centre.y + (list.indexOf(row.outlet) - (list.length - 1) / 2) * pitch;
    const outward = way === 'left' ? -1 : 1;
    const reach = Math.sqrt((rim - 6) ** 2 - (y - centre.y) ** 2);
    return {
      row,
      way,
      direction: outward * 90,
      end: { x: outward < 0 ? 21 : width - 21, y },
      mouth: { x: round(centre.x + outward * reach), y },
    };
  });
  const ears = { top: true, bottom: true };
  return { width, height: 2 * centre.y - 4, centre, rim, ring: rim - 33, sideOutlets: true, ears, leads };
}

function withLeadsAllRound(rows: readonly CapMapRow[], swaps: boolean): CapLayout {
  const rim = 104;
  const reach = 148;
  const angles = rows.map((row) => row.angle);
  const clear = (direction: number, room: number): boolean =>
    angles.every((angle) => apart(angle, direction) >= room);
  const ears = { top: clear(0, 33), bottom: clear(180, 16) };
  const ends = angles.map((angle) => polar({ x: width / 2, y: 0 }, reach, angle));
  const top = Math.min(
    -rim - (ears.top ? earHeight + 8 : 4),
    ...ends.map((p) => p.y - badgeRadius - 4),
    swaps ? -arrowReach : 0,
  );
  const bottom = Math.max(
    rim + earHeight + 4,
    ...ends.map((p) => p.y + badgeRadius + 4),
    swaps ? arrowReach : 0,
  );
  const y = Math.ceil(ears.top ? -top : Math.max(-top, rim + 24));
  const centre = { x: width / 2, y };
  const leads = rows.map((row): PlacedLead => ({
    row,
    way: 'out',
    direction: row.angle,
    end: polar(centre, reach, row.angle),
    mouth: polar(centre, rim, row.angle),
  }));
  return { width, height: Math.ceil(y + bottom), centre, rim, ring: 49, sideOutlets: false, ears, leads };
}
