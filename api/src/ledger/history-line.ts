import type { HistoryLine } from '@second-spanner/shared/contracts/sheets';
import type { Verdict } from '@second-spanner/shared/contracts/verdict';
import { readBody, type LedgerLine } from './ledger-chain.js';
import { coveredSentenceOf, sentenceOf } from './history-words.js';
import type { LedgerBody } from './ledger-event.js';

/** The step that a ledger line is about; null when it is about the whole sheet. */
export function stepOf(line: LedgerLine): string | null {
  const body = readBody(line);
  return body && 'step' in body ? body.step : null;
}

/**
 * A ledger line as a sentence.
 * @param covered the figures of its step are kept from the person who reads
 */
export function toHistoryLine(line: LedgerLine, covered: boolean): HistoryLine {
  const body = readBody(line);
  if (!body) throw new Error(`Line ${line.seq} of a ledger is no JSON.`);
  const hidden = covered ? coveredSentenceOf(body) : null;
  return {
    seq: line.seq,
    at: line.at,
    by: body.by,
    stepCode: stepOf(line),
    sentence: hidden ?? sentenceOf(body),
    verdict: hidden === null ? verdictOf(body) : null,
  };
}

function verdictOf(body: LedgerBody): Verdict | null {
  if (body.kind === 'entry') return body.verdict;
  if (body.kind === 'second-reading') return body.agreement.verdict;
  if (body.kind === 'countersignature') return body.outcome === 'agree' ? 'pass' : 'fail';
  return null;
}
