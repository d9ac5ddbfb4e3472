import type { SendMail } from '../mail/mailer.js';
import type { Database } from '../platform/database/database.js';
import type { PeopleService } from '../people/people.service.js';
import type { ToolsService } from '../registers/tools.service.js';
import type { SpecsService } from '../spec-book/specs.service.js';
import { CallsService } from './calls.service.js';
import { CountersigningService } from './countersigning.service.js';
import { EntriesService } from './entries.service.js';
import { HistoryService } from './history.service.js';
import { LayOutService } from './lay-out.service.js';
import { SecondReadingsService } from './second-readings.service.js';
import { SheetReading } from './sheet-reading.service.js';
import { SheetWork, type Now } from './sheet-work.service.js';
import { SigningService } from './signing.service.js';
import { SnagsService } from './snags.service.js';
import { StartService } from './start.service.js';
import { UnmarkingService } from './unmarking.service.js';

export interface SheetServices {
  readonly reading: SheetReading;
  readonly history: HistoryService;
  readonly layOut: LayOutService;
  readonly start: StartService;
  readonly entries: EntriesService;
  readonly secondReadings: SecondReadingsService;
  readonly countersigning: CountersigningService;
  readonly snags: SnagsService;
  readonly unmarking: UnmarkingService;
  readonly signing: SigningService;
  readonly calls: CallsService;
}

interface Needs {
  readonly database: Database;
  readonly specs: SpecsService;
  readonly tools: ToolsService;
  readonly people: PeopleService;
  /** What everything recorded is dated by. */
  readonly now: Now;
  readonly sendMail: SendMail;
  readonly publicUrl: URL;
}

/** Everything that can be done with sheets, one service a deed. */
export function createSheetServices(needs: Needs): SheetServices {
  const { database, specs, tools, people, now, sendMail, publicUrl } = needs;
  const work = new SheetWork(database, now);
  const reading = new SheetReading(database, tools);
  const secondReadings = new SecondReadingsService(work, tools);
  return {
    reading,
    history: new HistoryService(database),
    layOut: new LayOutService(database, specs, now),
    start: new StartService(work),
    entries: new EntriesService(work, tools, now),
    secondReadings,
    countersigning: new CountersigningService(work, secondReadings),
    snags: new SnagsService(work),
    unmarking: new UnmarkingService(work),
    signing: new SigningService(work, reading, people),
    calls: new CallsService(work, sendMail, publicUrl),
  };
}
