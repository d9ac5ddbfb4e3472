import { Router, type RequestHandler } from 'express';
import { tighteningPlan } from '@second-spanner/shared/fastening/tightening-plan';
import { wrenchSetting } from '@second-spanner/shared/fastening/wrench-setting';
import { capDiagnosis } from '@second-spanner/shared/ignition/cap-diagnosis';
import { capMap } from '@second-spanner/shared/ignition/cap-map';
import { limitDecision } from '@second-spanner/shared/measuring/limit-decision';
import { twoReadings } from '@second-spanner/shared/measuring/two-readings';
import { convertRequest } from '@second-spanner/shared/quantities/convert-request';
import { valveClock } from '@second-spanner/shared/valve-train/valve-clock';
import { whichTdc } from '@second-spanner/shared/valve-train/which-tdc';
import { allow } from '../platform/signing-in/authentication.js';
import * as fields from './calculation-fields.js';
import { onlyKnown, type FieldsOf } from './only-known.js';

/** `/calculations`: the workings, without a sheet. Each calculation checks its own request. */
export function calculationRoutes(): Router {
  const router = Router();
  router.use(allow('calculate'));
  router.post('/convert', calculation(convertRequest, fields.convertFields));
  router.post('/cap-map', calculation(capMap, fields.capMapFields));
  router.post('/cap-diagnosis', calculation(capDiagnosis, fields.capDiagnosisFields));
  router.post('/valve-clock', calculation(valveClock, fields.valveClockFields));
  router.post('/which-tdc', calculation(whichTdc, fields.whichTdcFields));
  router.post('/tightening-plan', calculation(tighteningPlan, fields.tighteningPlanFields));
  router.post('/wrench-setting', calculation(wrenchSetting, fields.wrenchSettingFields));
  router.post('/limit-decision', calculation(limitDecision, fields.limitDecisionFields));
  router.post('/two-readings', calculation(twoReadings, fields.twoReadingsFields));
  return router;
}

const calculation =
  <Request extends object, Answer>(
    calculate: (request: Request) => Answer,
    known: FieldsOf<Request>,
  ): RequestHandler =>
  (request, response) => {
    response.json(calculate(onlyKnown(request.body, known)));
  };
