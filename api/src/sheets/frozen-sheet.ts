import type { PersonName } from '@second-spanner/shared/contracts/people';
import type { SignatureMeaning } from '@second-spanner/shared/contracts/sheets';
import { signatureMeanings } from '@second-spanner/shared/contracts/sheets';
import { signatureWords } from '@second-spanner/shared/sheet/words';
import { ledgerTrouble, readBody, type LedgerLine } from '../ledger/ledger-chain.js';
import { canonicalHash, canonicalJson } from '../platform/hashing/canonical.js';
import { contentHash, type SheetContent } from './sheet-content.js';

/** A signature as it is kept. */
export interface FrozenSignature {
  readonly meaning: SignatureMeaning;
  readonly person: PersonName;
  /** ISO time. */
  readonly at: string;
  readonly contentHash: string;
  readonly binding: string;
}

/** A released sheet, whole. */
export interface FrozenSheet {
  readonly content: SheetContent;
  readonly signatures: readonly FrozenSignature[];
  readonly ledger: readonly LedgerLine[];
}

/** Binds a signature to its sheet, signer, meaning, time and content: a copy under another sheet binds nothing. */
export const bindingOf = (
  sheetId: string,
  { meaning, person, at, contentHash: hash }: Omit<FrozenSignature, 'binding'>,
): string => canonicalHash({ sheetId, signer: person.id, meaning, at, contentHash: hash });

/**
 * Hashes a frozen sheet again and checks every signature and every ledger line. Null when all holds; otherwise a
 * sentence that says what does not.
 * @param hash the content hash that stands beside the frozen sheet, and that its code was made from
 */
export function frozenTrouble({ content, signatures, ledger }: FrozenSheet, hash: string): string | null {
  const inLedger = ledgerTrouble(ledger);
  if (inLedger !== null) return inLedger;
  const meanings = signatures.map(({ meaning }) => meaning).join();
  if (meanings !== signatureMeanings.join())
    return 'A released sheet has three signatures, and this one has not.';
  for (const signature of signatures) {
    const trouble = signatureTrouble(content, signature, ledger);
    if (trouble !== null) return trouble;
  }
  const [built, countersigned, released] = signatures;
  if (built?.person.id === countersigned?.person.id) return 'Builder and countersigner are one person.';
  if (released?.contentHash !== hash) return 'The hash of the sheet is not the one that was released.';
  const last = ledger.at(-1);
  const lastBody = last && readBody(last);
  return lastBody?.kind === 'signed' && lastBody.meaning === 'released'
    ? null
    : 'The ledger does not end with the release.';
}

/** Whether one signature still stands for this content; `ledger` must be whole. Null when it does. */
export function signatureTrouble(
  content: SheetContent,
  signature: FrozenSignature,
  ledger: readonly LedgerLine[],
): string | null {
  const name = `The signature “${signatureWords[signature.meaning]}”`;
  if (signature.binding !== bindingOf(content.id, signature)) {
    return `${name} is not bound to this sheet, person and time.`;
  }
  const line = ledger.find((each) => {
    const body = readBody(each);
    return body?.kind === 'signed' && body.binding === signature.binding;
  });
  const body = line && readBody(line);
  if (!line || canonicalJson(body?.by) !== canonicalJson(signature.person)) {
    return `${name} does not stand in the ledger.`;
  }
  return signature.contentHash === contentHash(content, line.prevHash)
    ? null
    : `${name} was given for another content than the sheet has.`;
}
