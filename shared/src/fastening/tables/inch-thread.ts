/** A size of an inch thread as it is named, its nominal diameter in inches, and its threads an inch. */
export interface InchThread {
  readonly size: string;
  readonly diameter: number;
  readonly perInch: number;
}
