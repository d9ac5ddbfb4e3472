import { createTransport } from 'nodemailer';
import type { Logger } from 'pino';

export interface Mail {
  readonly to: { readonly name: string; readonly address: string };
  readonly subject: string;
  readonly text: string;
}

/** Sends a mail and says whether it went off. */
export type SendMail = (mail: Mail) => Promise<boolean>;

const patienceMs = 8_000;

/** A sender by SMTP; null sends nothing and says so. Trouble goes to the log, never to the person's work. */
export function createMailer(smtpUrl: string | null, publicUrl: URL, log: Logger): SendMail {
  if (smtpUrl === null) return () => Promise.resolve(false);
  const transport = createTransport(smtpUrl, {
    from: { name: 'Second Spanner', address: `no-reply@${hostOf(publicUrl)}` },
  });
  return async (mail) => {
    try {
      await inTime(transport.sendMail(mail));
      return true;
    } catch (error) {
      log.warn({ err: error }, 'A mail could not be sent.');
      return false;
    }
  };
}

/** Mail programs refuse a sender at a bare address of this machine. */
const hostOf = ({ hostname }: URL): string =>
  /^[\d.]+$|^\[|^localhost$/.test(hostname) ? 'second-spanner.example' : hostname;

async function inTime<T>(work: Promise<T>): Promise<T> {
  let timer: NodeJS.Timeout | undefined;
  const tooLate = new Promise<never>((_resolve, reject) => {
    timer = setTimeout(() => {
      reject(new Error(`The mail server did not answer within ${patienceMs} ms.`));
    }, patienceMs);
  });
  try {
    return await Promise.race([work, tooLate]);
  } finally {
    clearTimeout(timer);
  }
}
