import { BenchService } from './bench/bench.service.js';
import { BuildSheetsService } from './build-sheets/build-sheets.service.js';
import { CarsService } from './car-files/cars.service.js';
import type { Config } from './config.js';
import { DiskFileStore } from './files/file-store.js';
import { FilesService } from './files/files.service.js';
import { hashingHere, type Hashing } from './people/hashing.js';
import type { SendMail } from './mail/mailer.js';
import { PeopleService } from './people/people.service.js';
import { Passwords } from './people/passwords.js';
import { sessionReader } from './people/read-sessions.js';
import { SessionsService } from './people/sessions.service.js';
import type { Database } from './platform/database/database.js';
import { AccessTokens } from './platform/signing-in/access-token.js';
import type { ReadSession } from './platform/signing-in/authentication.js';
import type { Print } from './printing/print-task.js';
import { print as printHere } from './printing/print.js';
import { ToolsService } from './registers/tools.service.js';
import { createSheetServices, type SheetServices } from './sheets/sheet-services.js';
import { SpecsService } from './spec-book/specs.service.js';
import { VerificationService } from './verification/verification.service.js';
import { KeptWorkingsService } from './workings/kept-workings.service.js';
import { WorkingPrints } from './workings/working-prints.service.js';

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
  readonly bench: BenchService;
  readonly verification: VerificationService;
  readonly keptWorkings: KeptWorkingsService;
  readonly workingPrints: WorkingPrints;
}

type ServiceConfig = Pick<Config, 'secret' | 'passwordCost' | 'dataDir' | 'publicUrl'> & {
  /** Where passwords are hashed; by default on the thread at hand. */
  readonly hashing?: Hashing;
  /** Where PDFs are made; by default on the thread at hand. */
  readonly print?: Print;
};

/** What comes from outside, and what stands for it where nothing is given. */
export interface Outside {
  /** The clock that everything recorded on sheets is dated by. */
  readonly now?: () => Date;
  readonly sendMail?: SendMail;
}

/** All services, each made once and given what it needs. */
export function createServices(
  { secret, passwordCost, dataDir, publicUrl, ...places }: ServiceConfig,
  database: Database,
  { now = () => new Date(), sendMail = () => Promise.resolve(false) }: Outside = {},
): Services {
  const { hashing = hashingHere, print = printHere } = places;
  const passwords = new Passwords(passwordCost, hashing);
  const tokens = new AccessTokens(secret);
  const readSession = sessionReader(database);
  const specs = new SpecsService(database);
  const tools = new ToolsService(database);
  const people = new PeopleService(database, passwords);
  const sheets = createSheetServices({ database, specs, tools, people, now, sendMail, publicUrl });
  const cars = new CarsService(database, sheets.reading.ofCar);
  const keptWorkings = new KeptWorkingsService(database, cars, now);
  return {
    tokens,
    readSession,
    sessions: new SessionsService(database, passwords, tokens, readSession),
    ...{ people, cars, specs, tools, sheets, keptWorkings },
    workingPrints: new WorkingPrints(keptWorkings, publicUrl, print, now),
    buildSheets: new BuildSheetsService(sheets.reading, publicUrl, print),
    bench: new BenchService(database, sheets.reading),
    verification: new VerificationService(database),
    files: new FilesService(database, new DiskFileStore(dataDir), now),
  };
}
