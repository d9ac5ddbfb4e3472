import type { Database } from '../platform/database/database.js';
import type { ToolsService } from '../registers/tools.service.js';
import type { SpecsService } from '../spec-book/specs.service.js';
import { EntriesService } from './entries.service.js';
import { LayOutService } from './lay-out.service.js';
import { SheetReading } from './sheet-reading.service.js';
import { SheetWork, type Now } from './sheet-work.service.js';
import { StartService } from './start.service.js';

export interface SheetServices {
  readonly reading: SheetReading;
  readonly layOut: LayOutService;
  readonly start: StartService;
  readonly entries: EntriesService;
}

interface Needs {
  readonly database: Database;
  readonly specs: SpecsService;
  readonly tools: ToolsService;
  /** What everything recorded is dated by. */
  readonly now: Now;
}

/** Everything that can be done with sheets, one service a deed. */
export function createSheetServices({ database, specs, tools, now }: Needs): SheetServices {
  const work = new SheetWork(database, now);
  return {
    reading: new SheetReading(database),
    layOut: new LayOutService(database, specs, now),
    start: new StartService(work),
    entries: new EntriesService(work, tools),
  };
}
