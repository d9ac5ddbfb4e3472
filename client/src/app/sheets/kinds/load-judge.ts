import type { StepKind } from '@second-spanner/shared/contracts/steps';
import { judgeOf, type Judge } from '@second-spanner/shared/sheet/judge-of';

/** The same judges that the api has, one for each kind of step; only the kind at hand is downloaded. */
export const loadJudge: Readonly<Record<StepKind, () => Promise<Judge>>> = {
  check: async () => judgeOf('check', (await import('@second-spanner/shared/sheet/judge-check')).judgeCheck),
  measurement: async () =>
    judgeOf('measurement', (await import('@second-spanner/shared/sheet/judge-measurement')).judgeMeasurement),
  tightening: async () =>
    judgeOf('tightening', (await import('@second-spanner/shared/sheet/judge-tightening')).judgeTightening),
  wiring: async () =>
    judgeOf('wiring', (await import('@second-spanner/shared/sheet/judge-wiring')).judgeWiring),
  'valve-timing': async () =>
    judgeOf('valve-timing', (await import('@second-spanner/shared/sheet/judge-tdc')).judgeTdc),
  photo: async () => judgeOf('photo', (await import('@second-spanner/shared/sheet/judge-photo')).judgePhoto),
};
