import type { StepKind } from '@second-spanner/shared/contracts/steps';
import type { LoadPart } from '../../states/later-part';

/** The work of each kind of step; only the kind that is shown is downloaded. */
export const loadWork: Readonly<Record<StepKind, LoadPart>> = {
  check: async () => (await import('../kinds/check/check-work')).CheckWork,
  measurement: async () => (await import('../kinds/measurement/measurement-work')).MeasurementWork,
  tightening: async () => (await import('../kinds/tightening/tightening-work')).TighteningWork,
  wiring: async () => (await import('../kinds/wiring/wiring-work')).WiringWork,
  'valve-timing': async () => (await import('../kinds/valve-timing/valve-timing-work')).ValveTimingWork,
  photo: async () => (await import('../kinds/photo/photo-work')).PhotoWork,
};
