import type { Quantity } from './quantity.js';
import type { Judgement, Verdict } from './verdict.js';

export interface SizeLimits {
  readonly low: Quantity;
  readonly high: Quantity;
}
/** Measured or toleranced limits, or a nominal size with its ISO 286 class. */
export type FitPart = SizeLimits | { readonly size: Quantity; readonly class: string };

export interface FitRequest {
  readonly hole: FitPart;
  readonly shaft: FitPart;
}

export interface Fit {
  readonly kind: 'clearance' | 'transition' | 'interference';
  /** Positive is clearance. */
  readonly least: Quantity;
  readonly most: Quantity;
}

export const keyForms = ['parallel', 'taper', 'woodruff'] as const;
export type KeyForm = (typeof keyForms)[number];

export interface KeyFitRequest {
  readonly key: { readonly width: Quantity; readonly height: Quantity };
  readonly shaftKeyway: { readonly width: Quantity; readonly depth: Quantity };
  readonly hubKeyway: { readonly width: Quantity; readonly depth: Quantity };
  readonly form?: KeyForm;
  /** Where the shaft's depth was measured: at the slot's centre line, or at its edge, which needs `shaftDiameter`. */
  readonly depthFrom?: 'centre' | 'edge';
  readonly shaftDiameter?: Quantity;
}

export interface KeyFit extends Judgement {
  /** Whole differences; negative is tight. */
  readonly play: { readonly shaft: Quantity; readonly hub: Quantity; readonly top: Quantity };
}

export const expandingMaterials = [
  'steel',
  'grey-iron',
  'ductile-iron',
  'aluminium',
  'bronze',
  'brass',
] as const;
export type ExpandingMaterial = (typeof expandingMaterials)[number];
/** A material of the table, or a coefficient of linear expansion in 10⁻⁶ per kelvin. */
export type Expanding = ExpandingMaterial | { readonly coefficient: number };

export interface HeatToAssembleRequest {
  /** Of the joint. */
  readonly diameter: Quantity;
  /** The most that the shaft is larger than the hole. */
  readonly interference: Quantity;
  /** Clearance wanted while it goes together. */
  readonly clearance: Quantity;
  readonly hub: Expanding;
  readonly shaft: Expanding;
  readonly room: Quantity;
  /** Which part changes its temperature; with `both`, the shaft is cooled to `coldest` first. */
  readonly by: 'heating-hub' | 'cooling-shaft' | 'both';
  /** The temperature that the shaft is cooled to, with `both`. */
  readonly coldest?: Quantity;
  /** What the parts and their neighbours (seals, temper, other fits) stand. */
  readonly hottestAllowed?: Quantity;
  readonly coldestAllowed?: Quantity;
}

export interface HeatToAssemble extends Judgement {
  /** A difference, in kelvin: never to be converted as a temperature. Zero where the part stays as it is. */
  readonly hubRise: Quantity;
  readonly shaftDrop: Quantity;
  readonly hubTemperature: Quantity;
  readonly shaftTemperature: Quantity;
  /** At the temperature it must be put together at: hole less shaft. */
  readonly clearanceThen: Quantity;
  readonly cautions: readonly string[];
  readonly assumed: readonly string[];
}

export interface ComparePartsRequest {
  /** The part it replaces, and the other maker's; each dimension by its name. */
  readonly original: { readonly name: string; readonly dimensions: Readonly<Record<string, SizeLimits>> };
  readonly other: { readonly name: string; readonly dimensions: Readonly<Record<string, SizeLimits>> };
  /** What each dimension fits with, and the play it must leave: hole less shaft. */
  readonly mates?: Readonly<
    Record<string, { readonly is: 'hole' | 'shaft'; readonly mate: SizeLimits; readonly play: SizeLimits }>
  >;
}

export interface ComparedDimension {
  readonly dimension: string;
  readonly original: SizeLimits | null;
  readonly other: SizeLimits | null;
  /** Middle of the other's less middle of the original's. */
  readonly difference: Quantity | null;
  readonly verdict: Verdict;
  readonly reason: string;
}

export interface CompareParts extends Judgement {
  readonly dimensions: readonly ComparedDimension[];
}
