import type { Verification } from '@second-spanner/shared/contracts/sheets';
import type { Judgement } from '@second-spanner/shared/contracts/verdict';
import { wholeLedger } from '../ledger/ledger.service.js';
import type { LedgerLine } from '../ledger/ledger-chain.js';
import type { Database } from '../platform/database/database.js';
import { notFound } from '../platform/errors/http-problem.js';
import { canonicalJson } from '../platform/hashing/canonical.js';
import { frozenTrouble } from '../sheets/frozen-sheet.js';
import { codesOf, readCode } from '../sheets/verification-code.js';
import { toVerification } from './verification.mapper.js';
import { findByCode, type ReleasedSheet } from './verification.repository.js';

/** Checks released sheets by the code on their paper. */
export class VerificationService {
  constructor(private readonly database: Database) {}

  /** Hashes the frozen sheet again, and follows its signatures and its ledger. */
  async verify(typed: string): Promise<Verification> {
    const code = readCode(typed);
    if (code === null) throw notFound('build sheet with this code');
    const sheet = await this.database.through('verification', code, (manager) => findByCode(manager, code));
    if (!sheet) throw notFound('build sheet with this code');
    const ledger = await this.database.readShop(sheet.shopId, (scope) => wholeLedger(scope, sheet.id));
    return toVerification(sheet, judge(sheet, ledger));
  }
}

function judge(sheet: ReleasedSheet, ledger: readonly LedgerLine[]): Judgement {
  const trouble = troubleWith(sheet, ledger);
  return trouble === null
    ? {
        verdict: 'pass',
        reason:
          'The record was hashed again just now: it is the one that was released, and every signature stands for it.',
      }
    : { verdict: 'fail', reason: `This record is not as it was released. ${trouble}` };
}

function troubleWith(sheet: ReleasedSheet, ledger: readonly LedgerLine[]): string | null {
  const { frozen, contentHash, verificationCode } = sheet;
  const inFrozen = frozenTrouble(frozen, contentHash);
  if (inFrozen !== null) return inFrozen;
  if (frozen.content.id !== sheet.id || frozen.content.code !== sheet.code) {
    return 'It is the record of another sheet.';
  }
  if (!codesOf(contentHash).includes(verificationCode)) return 'The code was not made from this record.';
  return canonicalJson(ledger) === canonicalJson(frozen.ledger)
    ? null
    : 'The ledger is not the one that the sheet was released with.';
}
