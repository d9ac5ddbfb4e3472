import { BuildSheetsService } from './build-sheets/build-sheets.service.js';
import { CarsService } from './car-files/cars.service.js';
import type { Config } from './config.js';
import { DiskFileStore } from './files/file-store.js';
import { FilesService } from './files/files.service.js';
import { PeopleService } from './people/people.service.js';
import { Passwords } from './people/passwords.js';
import { sessionReader } from './people/read-sessions.js';
import { SessionsService } from './people/sessions.service.js';
import type { Database } from './platform/database/database.js';
import { AccessTokens } from './platform/signing-in/access-token.js';
import type { ReadSession } from './platform/signing-in/authentication.js';
import { ToolsService } from './registers/tools.service.js';
import { createSheetServices, type SheetServices } from './sheets/sheet-services.js';
import { SpecsService } from './spec-book/specs.service.js';

export interface Services {
  readonly tokens: AccessTokens;
  readonly readSession: ReadSession;
  readonly sessions: SessionsService;
  readonly people: PeopleService;
  readonly cars: CarsService;
  readonly specs: SpecsService;
  readonly tools: ToolsService;
  readonly sheets: SheetServices;
  readonly buildSheets: BuildSheetsService;
  readonly files: FilesService;
}

type ServiceConfig = Pick<Config, 'secret' | 'passwordCost' | 'dataDir' | 'publicUrl'>;

/**
 * All services, each made once and given what it needs.
 * @param now the clock that everything recorded on sheets is dated by
 */
export function createServices(
  { secret, passwordCost, dataDir, publicUrl }: ServiceConfig,
  database: Database,
  now = (): Date => new Date(),
): Services {
  const passwords = new Passwords(passwordCost);
  const tokens = new AccessTokens(secret);
  const readSession = sessionReader(database);
  const specs = new SpecsService(database);
  const tools = new ToolsService(database);
  const people = new PeopleService(database, passwords);
  const sheets = createSheetServices({ database, specs, tools, people, now });
  return {
    tokens,
    readSession,
    sessions: new SessionsService(database, passwords, tokens, readSession),
    cars: new CarsService(database, sheets.reading.ofCar),
    ...{ people, specs, tools, sheets },
    buildSheets: new BuildSheetsService(sheets.reading, tools, publicUrl),
    files: new FilesService(database, new DiskFileStore(dataDir), now),
  };
}
