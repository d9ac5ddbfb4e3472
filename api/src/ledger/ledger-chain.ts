import { canonicalJson, sha256 } from '../platform/hashing/canonical.js';
import type { LedgerBody, LedgerEvent } from './ledger-event.js';

/** One line of a ledger: its body as canonical JSON, bound to the line before it. */
export interface LedgerLine {
  readonly seq: number;
  readonly prevHash: string;
  readonly hash: string;
  readonly body: string;
  /** ISO time, the same as in the body. */
  readonly at: string;
}

/** Where a ledger begins: what the first line follows. */
export const ledgerStart = '0'.repeat(64);

/** The line that follows a ledger's last one. */
export function nextLine(
  last: Pick<LedgerLine, 'seq' | 'hash'> | null,
  body: LedgerEvent & Pick<LedgerBody, 'at' | 'by'>,
): LedgerLine {
  const seq = (last?.seq ?? 0) + 1;
  const prevHash = last?.hash ?? ledgerStart;
  const text = canonicalJson({ ...body, seq });
  return { seq, prevHash, body: text, hash: sha256(prevHash + text), at: body.at };
}

/**
 * Follows a ledger from its first line to its last. Null when every line is bound to the one before; otherwise a
 * sentence that names the first line that is not. A tail that was cut off shows only against its last hash.
 * @param lastHash what the last line's hash must be, from a place apart from the ledger
 */
export function ledgerTrouble(lines: readonly LedgerLine[], lastHash?: string): string | null {
  let prevHash = ledgerStart;
  for (const [index, line] of lines.entries()) {
    const trouble = lineTrouble(line, index + 1, prevHash);
    if (trouble !== null) return trouble;
    prevHash = line.hash;
  }
  if (lastHash !== undefined && prevHash !== lastHash) {
    return `The ledger ends at line ${lines.length}, and that is not the line it was closed with.`;
  }
  return null;
}

function lineTrouble(line: LedgerLine, seq: number, prevHash: string): string | null {
  if (line.seq !== seq) return `Line ${seq} of the ledger is missing.`;
  if (line.prevHash !== prevHash) return `Line ${seq} of the ledger does not follow the line before it.`;
  if (line.hash !== sha256(prevHash + line.body)) return `Line ${seq} of the ledger was changed.`;
  const body = readBody(line);
  if (body?.seq !== seq || body.at !== line.at) {
    return `Line ${seq} of the ledger says another number or time than it stands at.`;
  }
  return null;
}

/** The body of a line; null when it is no JSON. */
export function readBody({ body }: Pick<LedgerLine, 'body'>): LedgerBody | null {
  try {
    return JSON.parse(body) as LedgerBody | null;
  } catch {
    return null;
  }
}
