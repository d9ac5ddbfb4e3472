import type { Verification } from '@second-spanner/shared/contracts/sheets';
import type { Judgement } from '@second-spanner/shared/contracts/verdict';
import type { FrozenSheet } from '../sheets/frozen-sheet.js';

interface Released {
  readonly contentHash: string;
  readonly verificationCode: string;
  readonly releasedAt: Date;
  readonly frozen: FrozenSheet;
}

/** What anyone with the code may see: the sheet's head and its signatures, and nothing that was read. */
export function toVerification(sheet: Released, { verdict, reason }: Judgement): Verification {
  const { content, signatures } = sheet.frozen;
  const { carName, engineNumber, specTitle, specEdition } = content;
  return {
    sheetCode: content.code,
    verificationCode: sheet.verificationCode,
    ...{ carName, engineNumber, specTitle, specEdition },
    releasedAt: sheet.releasedAt.toISOString(),
    contentHash: sheet.contentHash,
    signatures: signatures.map(({ meaning, person, at }) => ({ meaning, name: person.name, at })),
    ...{ verdict, reason },
  };
}
