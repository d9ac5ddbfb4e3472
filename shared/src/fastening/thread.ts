import type { ThreadFigures } from '../contracts/fastening.js';

/** A thread of the tables in SI: metres and square metres. */
export interface Thread {
  /** `M10x1.5`, `3/8-16 UNC`. */
  readonly name: string;
  readonly series: ThreadFigures['series'];
  readonly diameter: number;
  readonly pitch: number;
  readonly pitchDiameter: number;
  /** Of the bolt, at the root of its thread. */
  readonly minorDiameter: number;
  readonly stressArea: number;
  /** Nominal diameter as the tables print it, in their unit. */
  readonly nominal: { readonly value: number; readonly unit: 'mm' | 'in' };
  /** Of inch threads. */
  readonly perInch?: number;
}

export const inch = 0.0254;

/** Height of the sharp 60° triangle that the form is cut from, in pitches. */
const height = Math.sqrt(3) / 2;

/**
 * By form: how far pitch and minor diameter lie below the nominal, and how far the diameter of the stress area
 * does, in pitches.
 *
 * Sources: ISO 724 (d2 = d − 0.649519P), ISO 898-1:2013, 9.1.6.1 (d3 = d − 1.226869P, As from the mean of d2 and
 * d3); ASME B1.1-2003 (the same form, As = 0.7854(D − 0.9743/n)²); BS 84 (D − 0.640327/n and D − 1.280654/n, the
 * area from their mean). All from memory, all compared with the reference values EE-MA, EE-UN and BSW.
 */
const forms = {
  metric: { pitch: (3 / 4) * height, minor: (17 / 12) * height, area: (13 / 12) * height },
  unified: { pitch: (3 / 4) * height, minor: (17 / 12) * height, area: 0.9743 },
  whitworth: { pitch: 0.640327, minor: 1.280654, area: 0.9604905 },
} as const;

const formOf: Readonly<Record<ThreadFigures['series'], keyof typeof forms>> = {
  'metric-coarse': 'metric',
  'metric-fine': 'metric',
  UNC: 'unified',
  UNF: 'unified',
  BSW: 'whitworth',
  BSF: 'whitworth',
};

/** The figures that follow from the form of a thread; `diameter` and `pitch` in metres. */
export function threadOf(
  given: Pick<Thread, 'name' | 'series' | 'diameter' | 'pitch' | 'nominal' | 'perInch'>,
): Thread {
  const { diameter, pitch } = given;
  const form = forms[formOf[given.series]];
  return {
    ...given,
    pitchDiameter: diameter - form.pitch * pitch,
    minorDiameter: diameter - form.minor * pitch,
    stressArea: (Math.PI / 4) * (diameter - form.area * pitch) ** 2,
  };
}
