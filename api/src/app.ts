import cookieParser from 'cookie-parser';
import express, { Router, type Express } from 'express';
import type { Logger } from 'pino';
import { benchRoutes } from './bench/bench.routes.js';
import { buildSheetRoutes } from './build-sheets/build-sheets.routes.js';
import { calculationRoutes } from './calculations/calculations.routes.js';
import { carRoutes } from './car-files/cars.routes.js';
import type { Config } from './config.js';
import { fileRoutes } from './files/files.routes.js';
import { peopleRoutes, preferencesRoutes, sessionRoutes } from './people/people.routes.js';
import { ApiDocument } from './openapi/api-document.js';
import { openApiRoutes } from './openapi/openapi.routes.js';
import type { Database } from './platform/database/database.js';
import { errorHandler, unknownRoute } from './platform/errors/error-handler.js';
import { compression, noStore, securityHeaders } from './platform/http/headers.js';
import { healthRoutes } from './platform/http/health.routes.js';
import { jsonBody } from './platform/http/json-body.js';
import { generalLimit } from './platform/http/rate-limits.js';
import { staticClient } from './platform/http/static-client.js';
import type { SheetEvents } from './platform/live-events/sheet-events.js';
import { requestLog } from './platform/log.js';
import { accessClaims, authentication } from './platform/signing-in/authentication.js';
import { SessionCookies } from './platform/signing-in/cookies.js';
import { xsrf } from './platform/signing-in/xsrf.js';
import { toolRoutes } from './registers/tools.routes.js';
import type { Services } from './services.js';
import { sheetEventRoutes } from './sheets/sheet-events.routes.js';
import { sheetRoutes } from './sheets/sheets.routes.js';
import { specRoutes } from './spec-book/specs.routes.js';
import { verificationRoutes } from './verification/verification.routes.js';
import { keptWorkingRoutes } from './workings/kept-workings.routes.js';
import { workingRoutes } from './workings/workings.routes.js';

export interface AppDependencies {
  readonly config: Pick<Config, 'publicUrl' | 'clientDir' | 'trustedProxies' | 'requestsPerMinute'>;
  readonly log: Logger;
  readonly database: Database;
  readonly services: Services;
  readonly events: SheetEvents;
  /** How often a stream of events shows that it lives. */
  readonly heartbeatMs?: number;
}

/** The whole application as one request handler; it listens nowhere by itself. */
export function createApp(deps: AppDependencies): Express {
  const { config, log } = deps;
  const app = express();
  app.disable('x-powered-by');
  app.set('etag', false);
  app.set('trust proxy', config.trustedProxies);
  app.use(requestLog(log), securityHeaders(config.publicUrl.protocol === 'https:'), compression());
  app.use('/api', apiRoutes(deps));
  if (config.clientDir !== null) app.use(staticClient(config.clientDir));
  app.use(unknownRoute, errorHandler(log));
  return app;
}

function apiRoutes({ config, database, services, events, heartbeatMs = 15_000 }: AppDependencies): Router {
  const { sessions, people, cars, specs, tools, sheets, buildSheets } = services;
  const cookies = new SessionCookies(config.publicUrl);
  const api = Router();
  api.use(noStore);
  api.use('/health', healthRoutes(database));
  api.use(
    cookieParser(),
    accessClaims(services.tokens, cookies),
    generalLimit(config.requestsPerMinute),
    xsrf,
  );
  api.use(openApiRoutes(new ApiDocument({ accessCookie: cookies.accessName })));
  api.use(authentication(services.readSession));
  api.use('/files', fileRoutes(services.files));
  api.use(jsonBody);
  api.use('/session', sessionRoutes(sessions, cookies));
  api.use('/people', peopleRoutes(people));
  api.use('/preferences', preferencesRoutes(people));
  api.use('/cars', carRoutes(cars), keptWorkingRoutes(services.keptWorkings, services.workingPrints));
  api.use('/workings', workingRoutes(services.workingPrints));
  api.use('/specs', specRoutes(specs));
  api.use('/tools', toolRoutes(tools));
  const { readSession } = services;
  const live = { events, readSession, reading: sheets.reading, heartbeatMs };
  api.use('/sheets', sheetEventRoutes(live), sheetRoutes(sheets), buildSheetRoutes(buildSheets));
  api.use('/bench', benchRoutes(services.bench));
  api.use('/verifications', verificationRoutes(services.verification));
  api.use('/calculations', calculationRoutes());
  api.use(unknownRoute);
  return api;
}
