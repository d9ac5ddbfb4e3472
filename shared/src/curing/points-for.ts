import { printNumber } from '../quantities/print.js';
import type { Joint, SheetPoint } from './read-sheet.js';
import { byTemperature } from './times-at.js';

/** The lines that hold for a joint, upwards in temperature, or why there are none. */
export type Chosen = { readonly points: readonly SheetPoint[] } | { readonly cannot: string };

const alike = (a: string, b: string): boolean => a.toLowerCase() === b.toLowerCase();
const noise = 1e-9;

/**
 * The lines of a data sheet for a joint: its substrate, with or without activator, the next lower humidity
 * listed and the next larger gap listed, since a drier or wider joint takes longer.
 */
export function pointsFor(sheet: readonly SheetPoint[], joint: Joint): Chosen {
  let points = sheet;
  for (const choose of [bySubstrate, byActivator, byHumidity, byGap]) {
    const chosen = choose(points, joint);
    if ('cannot' in chosen) return chosen;
    points = chosen.points;
  }
  return { points: byTemperature(points) };
}

/** What is known of the joint and the data sheet says nothing of, in a sentence each. */
export function notInSheet(sheet: readonly SheetPoint[], joint: Joint): readonly string[] {
  const words = { gap: 'gaps', substrate: 'materials', humidity: 'humidity' } as const;
  return (['gap', 'substrate', 'humidity'] as const)
    .filter((name) => joint[name] !== undefined && sheet.every((point) => point[name] === undefined))
    .map(
      (name) =>
        `The data sheet's figures say nothing of ${words[name]}: they are taken to hold for this joint.`,
    );
}

type Choose = (points: readonly SheetPoint[], joint: Joint) => Chosen;

const bySubstrate: Choose = (points, { substrate }) => {
  const named = [...new Set(points.flatMap((point) => point.substrate ?? []))];
  if (named.length === 0) return { points };
  if (substrate === undefined) {
    const general = points.filter((point) => point.substrate === undefined);
    if (general.length > 0) return { points: general };
    return {
      cannot: `The data sheet tells materials apart (${named.join(', ')}), and this joint's was not given.`,
    };
  }
  const same = points.filter((point) => point.substrate !== undefined && alike(point.substrate, substrate));
  if (same.length > 0) return { points: same };
  return { cannot: `The data sheet has no figures for ${substrate}; it has ${named.join(', ')}.` };
};

const byActivator: Choose = (points, { activator = false }) => {
  const same = points.filter((point) => (point.activator ?? false) === activator);
  if (same.length > 0) return { points: same };
  return { cannot: `The data sheet has no figures ${activator ? 'with' : 'without'} activator.` };
};

const byHumidity: Choose = (points, { humidity }) => {
  const listed = points.flatMap((point) => point.humidity ?? []);
  if (listed.length === 0) return { points };
  const general = points.filter((point) => point.humidity === undefined);
  if (humidity === undefined) {
    return general.length > 0
      ? { points: general }
      : { cannot: 'It cures by moisture: the humidity of the air is needed, and was not given.' };
  }
  const lower = listed.filter((one) => one <= humidity + noise);
  if (lower.length > 0) return { points: points.filter((point) => point.humidity === Math.max(...lower)) };
  return {
    cannot: `The air holds ${printNumber(humidity, 0)} %, less than the driest of the data sheet, ${printNumber(Math.min(...listed), 0)} %.`,
  };
};

const byGap: Choose = (points, { gap }) => {
  const listed = points.flatMap((point) => point.gap ?? []);
  if (listed.length === 0) return { points };
  const general = points.filter((point) => point.gap === undefined);
  if (gap === undefined) {
    return general.length > 0
      ? { points: general }
      : { cannot: 'The data sheet goes by the gap, and no gap was given.' };
  }
  const larger = listed.filter((one) => one >= gap * (1 - noise));
  if (larger.length > 0) {
    const next = Math.min(...larger);
    return { points: points.filter((point) => point.gap === next) };
  }
  return {
    cannot: `The gap of ${inMm(gap)} is larger than any of the data sheet, ${inMm(Math.max(...listed))}.`,
  };
};

const inMm = (metres: number): string => `${printNumber(1000 * metres, 3).replace(/\.?0+$/, '')}\u2009mm`;
