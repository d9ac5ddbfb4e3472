/**
 * A working without a sheet, kept with a car: what was typed, to be worked out again. It records nothing of
 * the engine, and once kept it stays as it is.
 */
export interface KeptWorking {
  readonly id: string;
  readonly carId: string;
  /** The key of the working: `convert`. */
  readonly working: string;
  /** What the person called it. */
  readonly title: string;
  /** What was typed, by field: a `WorkingCase`. */
  readonly typed: Readonly<Record<string, string>>;
  /** The name of the person who kept it. */
  readonly keptBy: string;
  /** ISO time. */
  readonly keptAt: string;
}

/** Body of `POST /api/cars/:carId/workings`, answered with the `KeptWorking`. */
export interface KeepWorkingRequest {
  readonly working: string;
  readonly title: string;
  readonly typed: Readonly<Record<string, string>>;
}
