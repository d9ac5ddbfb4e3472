import { refusedByRules } from '../platform/errors/http-problem.js';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import type { SheetWork } from './sheet-work.service.js';

/** Puts planned engines on the stand. */
export class StartService {
  constructor(private readonly work: SheetWork) {}

  async start(who: SignedIn, sheetId: string): Promise<void> {
    await this.work.onSheet(who, sheetId, ({ sheet }) => {
      if (sheet.state !== 'planned') throw refusedByRules('The engine is on the stand already, or was.');
      return Promise.resolve({ events: [{ kind: 'started' }], change: { state: 'on-the-stand' } });
    });
  }
}
