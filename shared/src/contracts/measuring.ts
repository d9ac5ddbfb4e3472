import type { Cylinder } from './calculations.js';
import type { Quantity, Unit } from './quantity.js';
import type { Judgement, Verdict } from './verdict.js';

export interface RoundReading {
  /** Where along it: `top`, `middle`, `bottom`, `front`. */
  readonly height: string;
  /** Across which way: `along`, `across`, `at the split`. */
  readonly axis: string;
  readonly value: Quantity;
}

export interface RoundReadingsRequest {
  readonly of: 'bore' | 'journal' | 'shell';
  readonly readings: readonly RoundReading[];
  /** The axis at a shell's split, which is relieved there and is not judged. */
  readonly splitAxis?: string;
  /** The axis at 90° to a shell's split, the only one that is then judged. */
  readonly judgedAxis?: string;
  readonly limits?: { readonly low?: Quantity; readonly high?: Quantity };
  readonly ovalityLimit?: Quantity;
  readonly taperLimit?: Quantity;
  readonly uncertainty?: Quantity;
  /** A shell was measured with its cap torqued. */
  readonly capTorqued?: boolean;
}

export interface RoundReadings extends Judgement {
  readonly mean: Quantity;
  readonly least: Quantity;
  readonly most: Quantity;
  /** Greatest difference between axes at one height; null where no height has two. */
  readonly ovality: Quantity | null;
  /** Greatest difference between heights on one axis; null where no axis has two. */
  readonly taper: Quantity | null;
  readonly worstHeight: string;
  readonly worstAxis: string;
  readonly parts: readonly {
    readonly of: 'size' | 'ovality' | 'taper';
    readonly verdict: Verdict;
    readonly reason: string;
  }[];
  readonly cautions: readonly string[];
}

export interface RunningClearanceRequest {
  readonly hole: readonly RoundReading[];
  readonly shaft: readonly RoundReading[];
  readonly splitAxis?: string;
  readonly limits?: { readonly low?: Quantity; readonly high?: Quantity };
  /** Of one reading; the clearance takes both. */
  readonly uncertainty?: Quantity;
}

export interface RunningClearance extends Judgement {
  /** Smallest hole less largest shaft. */
  readonly least: Quantity;
  readonly mean: Quantity;
  readonly most: Quantity;
  readonly cautions: readonly string[];
}

export interface RingGapRequest {
  readonly bore: Quantity;
  readonly gap: Quantity;
  /** Gap for each unit of bore, as the ring's maker states it, such as 0.0045; instead of limits. */
  readonly perBore?: { readonly low: number; readonly high?: number };
  readonly limits?: { readonly low?: Quantity; readonly high?: Quantity };
  /** How much hotter than the bore the ring may run, a difference. */
  readonly ringHotterBy?: Quantity;
  /** Of the ring, 10⁻⁶ per kelvin. */
  readonly coefficient?: number;
  readonly uncertainty?: Quantity;
}

export interface RingGap extends Judgement {
  readonly wanted: { readonly low?: Quantity; readonly high?: Quantity };
  /** What the gap closes by when hot; null without a temperature difference. */
  readonly closesBy: Quantity | null;
  readonly assumed: readonly string[];
}

export interface PlasticStripRequest {
  /** Of the round strip before it was crushed. */
  readonly diameter: Quantity;
  readonly width: Quantity;
}
export interface PlasticStrip {
  /** By volume, the strip's length unchanged: a check of the printed scale, which always wins. */
  readonly clearance: Quantity;
}

export interface FormulaRequest {
  /** Arithmetic on named readings: `bore_min - journal_max`. */
  readonly formula: string;
  readonly readings: Readonly<Record<string, Quantity>>;
  /** The unit of the answer. */
  readonly unit: Unit;
  readonly limits?: { readonly low?: Quantity; readonly high?: Quantity };
  readonly uncertainty?: Quantity;
}
export interface FormulaAnswer extends Judgement {
  readonly value: Quantity;
  readonly uses: readonly string[];
}

export interface SweptVolumeRequest {
  readonly bore: Quantity;
  readonly stroke: Quantity;
  readonly cylinders: number;
  readonly clearanceVolume?: Quantity;
}
export interface SweptVolume {
  readonly each: Quantity;
  readonly total: Quantity;
  readonly compressionRatio?: number;
}

export interface CompressionRatioRequest {
  readonly bore: Quantity;
  readonly stroke: Quantity;
  readonly chamber: Quantity;
  readonly gasket: { readonly bore: Quantity; readonly thickness: Quantity };
  /** Piston below the deck at TDC; negative where it stands above. */
  readonly deck: Quantity;
  /** Volume of the crown's dish; negative for a dome. */
  readonly dish?: Quantity;
  /** The ratio wanted, for what the chamber must then hold. */
  readonly wanted?: number;
}
export interface CompressionRatio {
  readonly swept: Quantity;
  readonly clearanceVolume: Quantity;
  readonly compressionRatio: number;
  /** Gasket's thickness and deck together: piston's edge to head. */
  readonly squish: Quantity;
  /** What the chamber must hold for the ratio wanted. */
  readonly chamberFor?: Quantity;
  readonly cautions: readonly string[];
}

export interface CylinderReading {
  readonly cylinder: Cylinder;
  readonly dry: Quantity | number;
  /** With a spoonful of oil in the cylinder. */
  readonly wet?: Quantity | number;
  /** Only cylinders of one bank are neighbours. */
  readonly bank?: string;
}

/** Compression in pressures, leak-down in percent lost. */
export interface CylinderTestRequest {
  readonly test: 'compression' | 'leak-down';
  /** In the order they stand, so that neighbours are known. */
  readonly readings: readonly CylinderReading[];
  /** Lowest over highest, compression (0.75). */
  readonly leastShare?: number;
  /** Percent lost, leak-down. */
  readonly mostLeak?: number;
  /** Newly rebuilt: the rings are not bedded, so that only the trend counts. */
  readonly rebuilt?: boolean;
  /** Leak-down: the tester's orifice and supply pressure. */
  readonly orifice?: Quantity;
  readonly supply?: Quantity;
  /** What `mostLeak` was set with; it holds for no other. */
  readonly mostLeakAt?: { readonly orifice: Quantity; readonly supply: Quantity };
}

export interface CylinderTest extends Judgement {
  /** By the figure: for leak-down the tightest and the leakiest. */
  readonly lowest: Cylinder;
  readonly highest: Cylinder;
  /** Lowest over highest; null for leak-down. */
  readonly share: number | null;
  readonly findings: readonly {
    readonly cylinders: readonly Cylinder[];
    readonly finding: 'low' | 'neighbours-low' | 'rises-wet' | 'stays-low-wet';
    readonly reason: string;
  }[];
  readonly cautions: readonly string[];
}
