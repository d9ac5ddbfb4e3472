import type { Dialect } from '@second-spanner/shared/contracts/people';
import { tradeText } from '@second-spanner/shared/contracts/trade-words';
import type { Mail } from './mailer.js';

export interface Call {
  readonly to: Mail['to'];
  readonly from: string;
  readonly shopName: string;
  readonly dialect: Dialect;
  readonly sheetId: string;
  readonly sheetCode: string;
  readonly carName: string;
  readonly stepCode: string;
  readonly stepTitle: string;
  readonly publicUrl: URL;
}

/** The mail that calls the second person to a step. It holds no figure: theirs is to be their own. */
export function callMail(call: Call): Mail {
  const { to, from, shopName, sheetCode, carName, stepCode } = call;
  const title = oneLine(tradeText(call.stepTitle, call.dialect));
  const path = `/sheets/${call.sheetId}/steps/${encodeURIComponent(stepCode)}`;
  const firstName = to.name.split(' ')[0] ?? to.name;
  return {
    to,
    subject: oneLine(`Step ${stepCode} of ${carName} waits for you`),
    text: [
      `${firstName}, step ${stepCode} of ${sheetCode}, ${carName}, waits for you: ${title}.`,
      `${from} calls you to read it again with your own eyes and your own tool.`,
      new URL(path, call.publicUrl).href,
      shopName,
    ].join('\n\n'),
  };
}

/** A line end in a subject would begin another header. */
const oneLine = (text: string): string => text.replace(/\s+/g, ' ').trim();
