import { randomUUID } from 'node:crypto';
import { may } from '@second-spanner/shared/contracts/permissions';
import type { SendBackRequest, SignatureMeaning, SignRequest } from '@second-spanner/shared/contracts/sheets';
import { maySendBack, signing } from '@second-spanner/shared/sheet/sheet-states';
import { ledgerTrouble } from '../ledger/ledger-chain.js';
import { recordsTrouble } from '../ledger/ledger-matches.js';
import { appendToLedger, wholeLedger } from '../ledger/ledger.service.js';
import { badInput, forbidden, refusedByRules } from '../platform/errors/http-problem.js';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import type { PeopleService } from '../people/people.service.js';
import { bindingOf, signatureTrouble, type FrozenSheet, type FrozenSignature } from './frozen-sheet.js';
import { contentHash, type SheetContent } from './sheet-content.js';
import type { SheetReading } from './sheet-reading.service.js';
import type { Done, OpenSheet, SheetWork } from './sheet-work.service.js';
import type { WholeSheetRow } from './sheet.entity.js';
import { signingPermission } from './sheet.mapper.js';
import { SignaturesRepository } from './signatures.repository.js';
import { whyNotSign } from './signing-rules.js';
import { codesOf } from './verification-code.js';

/** Signs sheets, sends them back to the stand, and releases them. */
export class SigningService {
  constructor(
    private readonly work: SheetWork,
    private readonly reading: SheetReading,
    private readonly people: PeopleService,
  ) {}

  /** The person's password is asked again, so that nobody signs at a desk that was left open. */
  async sign(who: SignedIn, sheetId: string, { meaning, password }: SignRequest): Promise<void> {
    if (!may(who.person.role, signingPermission[meaning])) {
      throw forbidden('This signature is not for your role in the shop.');
    }
    if (!(await this.people.knowsPassword(who, password))) {
      throw badInput({ field: 'password', message: 'This is not your password.' });
    }
    await this.signKnown(who, sheetId, meaning);
  }

  /** Signs for a person whose password was checked. */
  async signKnown(who: SignedIn, sheetId: string, meaning: SignatureMeaning): Promise<void> {
    await this.work.onSheet(who, sheetId, async (open) => {
      const { row, steps, content } = await this.reading.wholeIn(open.scope, who, sheetId);
      const why = whyNotSign(meaning, row, steps, who.person);
      if (why !== null) throw refusedByRules(why);
      const ledger = await wholeLedger(open.scope, sheetId);
      const trouble = row.signatures
        .map((signature) => signatureTrouble(content, dated(signature), ledger))
        .find((each) => each !== null);
      const broken =
        ledgerTrouble(ledger) ??
        recordsTrouble(
          'entry',
          content.steps.flatMap(({ entries }) => entries),
          ledger,
        ) ??
        recordsTrouble(
          'second-reading',
          content.steps.flatMap(({ secondReadings }) => secondReadings),
          ledger,
        );
      if (broken !== null) throw refusedByRules(`${broken} Nobody can sign it as it stands.`);
      if (trouble !== undefined) {
        throw refusedByRules(`${trouble} Send the sheet back to the stand and sign it again.`);
      }
      return this.bind(open, row, content, meaning, ledger.at(-1)?.hash ?? '');
    });
  }

  async sendBack(who: SignedIn, sheetId: string, { reason }: SendBackRequest): Promise<void> {
    await this.work.onSheet(who, sheetId, ({ sheet }) => {
      if (!maySendBack(sheet.state)) {
        throw refusedByRules('Only a sheet that is signed and not yet released is sent back to the stand.');
      }
      return Promise.resolve({
        events: [{ kind: 'sent-back', reason }],
        change: { state: 'on-the-stand', signRound: sheet.signRound + 1, contentHash: null },
      });
    });
  }

  private async bind(
    open: OpenSheet,
    row: WholeSheetRow,
    content: SheetContent,
    meaning: SignatureMeaning,
    ledgerHead: string,
  ): Promise<Done> {
    const { scope, sheet, by, at } = open;
    const hash = contentHash(content, ledgerHead);
    const unbound = { meaning, person: by, at: at.toISOString(), contentHash: hash };
    const signature = { ...unbound, binding: bindingOf(sheet.id, unbound) };
    await new SignaturesRepository(scope).insert(randomUUID(), sheet.id, sheet.signRound, signature);
    const { binding } = signature;
    const event = { kind: 'signed', meaning, contentHash: hash, binding } as const;
    await appendToLedger(scope, sheet.id, by, [{ at, event }]);
    const change = { state: signing[meaning].to, contentHash: hash };
    if (meaning !== 'released') return { events: [], change };
    const signatures = [...row.signatures.map(dated), signature];
    const frozen: FrozenSheet = { content, signatures, ledger: await wholeLedger(scope, sheet.id) };
    const verificationCode = await freeCode(new SignaturesRepository(scope), hash);
    return { events: [], change: { ...change, frozen, releasedAt: at, verificationCode } };
  }
}

const dated = (signature: FrozenSignature): FrozenSignature => ({
  ...signature,
  at: new Date(signature.at).toISOString(),
});

/** The first code of the hash that no other sheet has. */
async function freeCode(signatures: SignaturesRepository, hash: string): Promise<string> {
  for (const code of codesOf(hash)) {
    if (!(await signatures.isTaken(code))) return code;
  }
  throw new Error('Every code of this hash is taken.');
}
