import type { Config } from './config.js';
import { PeopleService } from './people/people.service.js';
import { Passwords } from './people/passwords.js';
import { sessionReader } from './people/read-sessions.js';
import { SessionsService } from './people/sessions.service.js';
import type { Database } from './platform/database/database.js';
import type { ReadSession } from './platform/signing-in/authentication.js';

export interface Services {
  readonly readSession: ReadSession;
  readonly sessions: SessionsService;
  readonly people: PeopleService;
}

type ServiceConfig = Pick<Config, 'secret' | 'passwordCost'>;

/** All services, each made once and given what it needs. */
export function createServices({ secret, passwordCost }: ServiceConfig, database: Database): Services {
  const passwords = new Passwords(passwordCost);
  const readSession = sessionReader(database);
  return {
    readSession,
    sessions: new SessionsService(database, passwords, secret, readSession),
    people: new PeopleService(database, passwords),
  };
}
