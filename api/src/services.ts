import { CarsService, type SheetsOfCar } from './car-files/cars.service.js';
import type { Config } from './config.js';
import { PeopleService } from './people/people.service.js';
import { Passwords } from './people/passwords.js';
import { sessionReader } from './people/read-sessions.js';
import { SessionsService } from './people/sessions.service.js';
import type { Database } from './platform/database/database.js';
import type { ReadSession } from './platform/signing-in/authentication.js';
import { ToolsService } from './registers/tools.service.js';
import { SpecsService } from './spec-book/specs.service.js';

export interface Services {
  readonly readSession: ReadSession;
  readonly sessions: SessionsService;
  readonly people: PeopleService;
  readonly cars: CarsService;
  readonly specs: SpecsService;
  readonly tools: ToolsService;
}

type ServiceConfig = Pick<Config, 'secret' | 'passwordCost'>;

const noSheets: SheetsOfCar = () => Promise.resolve([]);

/** All services, each made once and given what it needs. */
export function createServices({ secret, passwordCost }: ServiceConfig, database: Database): Services {
  const passwords = new Passwords(passwordCost);
  const readSession = sessionReader(database);
  return {
    readSession,
    sessions: new SessionsService(database, passwords, secret, readSession),
    people: new PeopleService(database, passwords),
    cars: new CarsService(database, noSheets),
    specs: new SpecsService(database),
    tools: new ToolsService(database),
  };
}
