import type { LeadSwap } from '../contracts/calculations.js';
import type { LeadHere } from './cap-input.js';
import { badgeRadius, type CapLayout, type PlacedLead } from './cap-layout.js';
import { apart, arc, arrowHead, bearing, fold, polar } from './geometry.js';
import { centredText, line, path, text, type Shape } from './shapes.js';
import { shortened } from './words.js';

const oxideWord = { ink: 'oxide', weight: 600, halo: true } as const;

/**
 * How wrong leads are put right. Swaps of neighbours, if they are all of that kind, are pairs of arrows;
 * otherwise each wrong lead says where it goes.
 */
export function swapMarks(
  layout: CapLayout,
  swaps: readonly LeadSwap[],
  leads: readonly LeadHere[],
): readonly Shape[] {
  const pairs = swaps.map((swap) => pairOf(layout, swap));
  const outlets = swaps.flatMap((swap) => swap.outlets);
  const apartFromEachOther = new Set(outlets).size === outlets.length;
  if (apartFromEachOther && pairs.every((pair) => pair !== undefined)) {
    return pairs.flatMap(([a, b]) => (a.way === 'out' ? arrowsRound(layout, a, b) : arrowsBeside(a, b)));
  }
  return leads.flatMap((placed) => destination(layout, placed));
}

function pairOf(layout: CapLayout, { outlets }: LeadSwap): readonly [PlacedLead, PlacedLead] | undefined {
  const [a, b] = outlets.map((name) => layout.leads.find((placed) => placed.row.outlet === name));
  if (a === undefined || b === undefined || a.way !== b.way) {
    return undefined;
  }
  return (a.way === 'out' ? neighboursRound(layout, a, b) : neighboursBeside(layout, a, b))
    ? [a, b]
    : undefined;
}

function neighboursBeside({ leads }: CapLayout, a: PlacedLead, b: PlacedLead): boolean {
  const [low, high] = [Math.min(a.end.y, b.end.y), Math.max(a.end.y, b.end.y)];
  const room = high - low >= 60;
  return room && leads.every(({ way, end }) => way !== a.way || end.y <= low || end.y >= high);
}

function neighboursRound({ leads }: CapLayout, a: PlacedLead, b: PlacedLead): boolean {
  const gap = apart(a.direction, b.direction);
  const between = leads.some(
    (placed) =>
      placed !== a &&
      placed !== b &&
      apart(placed.direction, a.direction) < gap &&
      apart(placed.direction, b.direction) < gap,
  );
  return !between && gap >= 28 && gap <= 125;
}

function arrowsBeside(a: PlacedLead, b: PlacedLead): readonly Shape[] {
  const x = a.end.x;
  const top = Math.min(a.end.y, b.end.y) + badgeRadius + 3;
  const bottom = Math.max(a.end.y, b.end.y) - badgeRadius - 3;
  const left = a.way === 'left';
  return [
    line(x - 5, top + 1, x - 5, bottom - 3, 'oxide', 'swap'),
    arrowHead({ x: x - 5, y: bottom }, 180, 'oxide', 11, 4),
    line(x + 5, top + 3, x + 5, bottom - 1, 'oxide', 'swap'),
    arrowHead({ x: x + 5, y: top }, 0, 'oxide', 11, 4),
    text(x + (left ? 13 : -13), (top + bottom) / 2 + 4, 'swap', {
      ...oxideWord,
      anchor: left ? 'start' : 'end',
    }),
  ];
}

function arrowsRound({ centre }: CapLayout, a: PlacedLead, b: PlacedLead): readonly Shape[] {
  const turn = fold(b.direction - a.direction);
  const [from, span] = turn <= 180 ? [a.direction, turn] : [b.direction, 360 - turn];
  const inset = ((badgeRadius + 5) / 148) * (180 / Math.PI);
  const head = (9 / 148) * (180 / Math.PI);
  const [start, end] = [from + inset, from + span - inset];
  const word = polar(centre, 122, from + span / 2);
  const outer = polar(centre, 153, end);
  const inner = polar(centre, 143, start);
  return [
    path(arc(centre, 153, start, end - head), { pen: 'oxide', part: 'swap' }),
    arrowHead(outer, end - head / 2 + 90, 'oxide', 11, 4),
    path(arc(centre, 143, end, start + head), { pen: 'oxide', part: 'swap' }),
    arrowHead(inner, start + head / 2 - 90, 'oxide', 11, 4),
    centredText(word.x, word.y, 'swap', oxideWord),
  ];
}

function destination(layout: CapLayout, placed: LeadHere): readonly Shape[] {
  if (placed.moveTo === undefined) {
    return [];
  }
  const words = `to ${shortened(placed.moveTo, 6)}`;
  if (placed.way !== 'out') {
    const left = placed.way === 'left';
    const x = placed.end.x + (left ? 17 : -17);
    return [text(x, placed.end.y - 12, words, { ...oxideWord, anchor: left ? 'start' : 'end' })];
  }
  if (layout.leads.length > 8) {
    return [];
  }
  const at = polar(layout.centre, 126, bearing(layout.centre, placed.end) + 16);
  const right = at.x > layout.centre.x;
  return [centredText(at.x + (right ? 4 : -4), at.y, words, oxideWord)];
}
