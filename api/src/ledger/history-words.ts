import type { Settlement } from '@second-spanner/shared/contracts/sheets';
import type { EntryContent } from '@second-spanner/shared/contracts/steps';
import { printQuantity } from '@second-spanner/shared/quantities/print';
import type { LedgerBody } from './ledger-event.js';

const settlementWords: Record<Settlement, string> = {
  redone: 'redone',
  replaced: 'replaced',
  'accepted-as-it-is': 'accepted as it is',
};

const signatureWords = {
  built: 'Signed as built.',
  countersigned: 'Signed as the second person.',
  released: 'Released the sheet.',
} as const;

/** What happened, as a sentence without the person's name, which stands beside it. Trade-word tokens allowed. */
export function sentenceOf(body: LedgerBody): string {
  switch (body.kind) {
    case 'laid-out':
      return `Laid the sheet out with ${body.steps} steps.`;
    case 'started':
      return 'Put the engine on the stand.';
    case 'entry':
      return body.replaces === null
        ? `Recorded ${whatOf(body.content)}. ${body.reason}`
        : `Corrected to ${whatOf(body.content)}, because: ${body.replaceReason ?? ''} ${body.reason}`;
    case 'second-reading':
      return `Gave the second reading. ${body.agreement.reason}`;
    case 'countersignature':
      return body.outcome === 'agree'
        ? `Countersigned the step.${pulls(body)}`
        : `Disputed the step: ${body.reason ?? ''}`;
    case 'snag':
      return `Raised a {snag}: ${body.words}`;
    case 'settlement':
      return `Settled a {snag}, ${settlementWords[body.how]}: ${body.reason}`;
    case 'unmarked':
      return `Unmarked the step as critical: ${body.reason}`;
    case 'called':
      return `Called ${body.to.name} to the step.`;
    case 'signed':
      return signatureWords[body.meaning];
    case 'sent-back':
      return `Sent the sheet back to the stand: ${body.reason}`;
  }
}

/** The same for somebody from whom the step's figures are kept; null where nothing has to be kept. */
export function coveredSentenceOf(body: LedgerBody): string | null {
  switch (body.kind) {
    case 'entry':
      return body.replaces === null
        ? 'Recorded on the step; covered until your own reading is in.'
        : 'Corrected an entry; covered until your own reading is in.';
    case 'second-reading':
      return 'Gave the second reading; covered until your own is in.';
    case 'countersignature':
      return body.outcome === 'agree' ? null : 'Disputed the step; covered until your own reading is in.';
    case 'snag':
      return body.cause === 'raised' ? null : 'A {snag} was raised; covered until your own reading is in.';
    case 'settlement':
      return body.cause === 'raised' ? null : 'A {snag} was settled; covered until your own reading is in.';
    default:
      return null;
  }
}

function pulls({ pullsWitnessed }: Extract<LedgerBody, { kind: 'countersignature' }>): string {
  return pullsWitnessed.length === 0 ? '' : ` Watched the pulls on ${pullsWitnessed.join(', ')}.`;
}

function whatOf(content: EntryContent): string {
  switch (content.kind) {
    case 'check':
      return content.outcome === 'pass' ? 'a check as right' : 'a check as wrong';
    case 'measurement':
      return `${content.at}: ${printQuantity(content.value)}`;
    case 'tightening':
      return `pass ${content.pass}, ${content.fastener}: ${figureOf(content)}`;
    case 'wiring':
      return 'what is fitted at the {outlets}';
    case 'valve-timing':
      return 'what the valves were seen to do';
    case 'photo':
      return `a photo of ${content.shows}`;
  }
}

function figureOf({ reading, setting, angle }: Extract<EntryContent, { kind: 'tightening' }>): string {
  if (reading) return printQuantity(reading);
  if (setting) return `set to ${printQuantity(setting)}`;
  return angle === undefined ? 'pulled' : `turned ${angle}°`;
}
