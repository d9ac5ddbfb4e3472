import { randomUUID } from 'node:crypto';
import { may } from '@second-spanner/shared/contracts/permissions';
import type { CallAnswer } from '@second-spanner/shared/contracts/sheets';
import { callMail } from '../mail/call-mail.js';
import type { Mail, SendMail } from '../mail/mailer.js';
import { conflict, refusedByRules } from '../platform/errors/http-problem.js';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import { CallsRepository, type Callable } from './calls.repository.js';
import { RecordsRepository } from './records.repository.js';
import type { OpenSheet, SheetWork } from './sheet-work.service.js';
import type { StepAtHand } from './step-at-hand.js';
import { whyNotCall } from './step-rules.js';

/** The same step does not call twice within this time: one mail is enough to come. */
const pauseMs = 60_000;

/** Calls the second person to a step, and writes to them. */
export class CallsService {
  constructor(
    private readonly work: SheetWork,
    private readonly send: SendMail,
    private readonly publicUrl: URL,
  ) {}

  /** The call is kept first, and stands whatever becomes of the mail. */
  async call(who: SignedIn, sheetId: string, code: string): Promise<CallAnswer> {
    let mail: Mail | null = null;
    const { detail } = await this.work.onStep(who, sheetId, code, async (open, step) => {
      const { scope, sheet, by, at } = open;
      const why = whyNotCall(step);
      if (why !== null) throw refusedByRules(why);
      refuseRepeated(step, at);
      const to = await chosen(open, step);
      const of = { sheetId, stepId: step.row.id };
      const kept = { id: randomUUID(), byId: by.id, toId: to.id, at: at.toISOString() };
      await new RecordsRepository(scope).addCall(of, kept);
      mail = callMail({
        ...{ to: { name: to.name, address: to.email }, from: by.name, publicUrl: this.publicUrl },
        ...{ shopName: who.shop.name, dialect: who.shop.dialect },
        ...{ sheetId, sheetCode: sheet.code, carName: sheet.carName },
        ...{ stepCode: code, stepTitle: step.row.title },
      });
      const { id, name, role } = to;
      const call = { to: { id, name, role }, at: at.toISOString() };
      const records = { ...step.records, calls: [...step.records.calls, call] };
      return { events: [{ kind: 'called', step: code, to: call.to }], step: { ...step, records } };
    });
    return { ...detail, mailed: mail !== null && (await this.send(mail)) };
  }
}

function refuseRepeated({ records: { calls } }: StepAtHand, at: Date): void {
  const last = calls.at(-1);
  if (last && at.getTime() - new Date(last.at).getTime() < pauseMs) {
    throw conflict(`${last.to.name} was called a moment ago.`);
  }
}

/** The sheet's second person; where they recorded on the step themselves, the builder or a foreman. */
async function chosen({ scope, sheet, by }: OpenSheet, { row }: StepAtHand): Promise<Callable> {
  const { countersigner, builder } = sheet;
  const people = await new CallsRepository(scope).people([countersigner.id, builder.id], 'foreman');
  const first = [countersigner.id, builder.id];
  const rank = ({ id }: Callable): number => (first.includes(id) ? first.indexOf(id) : first.length);
  const found = people
    .filter(
      ({ id, role }) => id !== by.id && !row.recorderIds.includes(id) && may(role, 'second-checks.make'),
    )
    .sort((a, b) => rank(a) - rank(b))[0];
  if (!found) throw refusedByRules('There is nobody else in the shop who may check this step.');
  return found;
}
