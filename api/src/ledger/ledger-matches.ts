import { canonicalJson } from '../platform/hashing/canonical.js';
import { readBody, type LedgerLine } from './ledger-chain.js';

/** A record that the ledger must tell of: under its id, with the same content. */
export interface ToldRecord {
  readonly id: string;
  readonly content: unknown;
}

/** Whether records and ledger say the same, both ways. Null when they do; otherwise a sentence. */
export function recordsTrouble(
  kind: 'entry' | 'second-reading',
  records: readonly ToldRecord[],
  lines: readonly LedgerLine[],
): string | null {
  const told = new Map(
    lines
      .map(readBody)
      .filter((body) => body !== null)
      .flatMap((body) => (body.kind === kind ? [[body.id, canonicalJson(body.content)] as const] : [])),
  );
  const name = kind === 'entry' ? 'An entry' : 'A second reading';
  for (const { id, content } of records) {
    if (told.get(id) !== canonicalJson(content)) return `${name} of the sheet does not stand in its ledger.`;
  }
  return told.size === records.length ? null : `${name} of the ledger is missing from the sheet.`;
}
