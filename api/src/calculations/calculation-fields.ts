import type {
  CapDiagnosisRequest,
  CapMapRequest,
  ConvertRequest,
  LimitDecisionRequest,
  TighteningPlanRequest,
  TwoReadingsRequest,
  ValveClockRequest,
  WhichTdcRequest,
  WrenchSettingRequest,
} from '@second-spanner/shared/contracts/calculations';
import type { FieldsOf } from './only-known.js';

export const convertFields: FieldsOf<ConvertRequest> = { quantity: true, to: true };

export const capMapFields: FieldsOf<CapMapRequest> = {
  firingOrder: true,
  rotation: true,
  rotationSeenFrom: true,
  posts: true,
  firstPost: true,
  intervals: true,
  strokesPerCycle: true,
  trace: true,
};

export const capDiagnosisFields: FieldsOf<CapDiagnosisRequest> = {
  cap: true,
  fitted: true,
  fittedBy: true,
  valveTiming: true,
  advance: true,
};

export const valveClockFields: FieldsOf<ValveClockRequest> = {
  firingOrder: true,
  intervals: true,
  valveTiming: true,
  crank: true,
  stroke: true,
  rodLength: true,
};

export const whichTdcFields: FieldsOf<WhichTdcRequest> = {
  firingOrder: true,
  intervals: true,
  valveTiming: true,
  cylinder: true,
  sightings: true,
  about: true,
  marksTogether: true,
  tolerance: true,
};

export const tighteningPlanFields: FieldsOf<TighteningPlanRequest> = {
  fasteners: true,
  sequence: true,
  final: true,
  finals: true,
  tolerance: true,
  passes: true,
  unit: true,
};

export const wrenchSettingFields: FieldsOf<WrenchSettingRequest> = {
  torque: true,
  wrenchLength: true,
  adapterLength: true,
  adapterAngle: true,
};

export const limitDecisionFields: FieldsOf<LimitDecisionRequest> = {
  value: true,
  low: true,
  high: true,
  uncertainty: true,
};

export const twoReadingsFields: FieldsOf<TwoReadingsRequest> = { first: true, second: true };
