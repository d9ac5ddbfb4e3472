// A mailbox on this machine in place of the mail service: takes every message by SMTP on the loopback address,
// keeps it as a file, and shows what came on a page. Nothing is sent on.
import { once } from 'node:events';
import { readFile, readdir, rename, writeFile } from 'node:fs/promises';
import { createServer } from 'node:http';
import { join } from 'node:path';
import { SMTPServer } from 'smtp-server';
import { onClose } from './closing.js';
import { message, messageList } from './mailbox-page.js';

const host = '127.0.0.1';
const fileName = /^[\w-]+\.eml$/;

/** @param {import('node:stream').Readable} stream */
const readAll = async (stream) => {
  const chunks = [];
  for await (const chunk of stream) chunks.push(chunk);
  return Buffer.concat(chunks);
};

/** @param {string} folder */
const receiverInto = (folder) => {
  let count = 0;
  return new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS', 'AUTH'],
    size: 20_000_000,
    onData: (stream, _session, done) => {
      count += 1;
      const moment = new Date().toISOString().replace(/\D/g, '');
      const path = join(folder, `${moment}-${String(count).padStart(4, '0')}.eml`);
      // Written beside and renamed, so that a reader never sees half a message.
      readAll(stream)
        .then((bytes) => writeFile(`${path}.part`, bytes, { mode: 0o600 }))
        .then(() => rename(`${path}.part`, path))
        .then(() => done(), done);
    },
  });
};

/** @param {string} folder */
const messagesIn = async (folder) => {
  const names = (await readdir(folder)).filter((name) => fileName.test(name)).sort();
  return Promise.all(
    names.reverse().map(async (name) => ({ name, source: await readFile(join(folder, name), 'utf8') })),
  );
};

/** @param {string} folder @param {string} name of a message, or nothing for the list @returns {Promise<string>} */
const pageFor = async (folder, name) => {
  if (name === '') return messageList(await messagesIn(folder));
  if (!fileName.test(name)) throw new Error('There is no such message.');
  return message(await readFile(join(folder, name), 'utf8'));
};

/** @param {string} folder */
const pagesOf = (folder) =>
  createServer((request, response) => {
    // Any other name for this machine is a page elsewhere that tries to read the mail.
    const isOurs = request.headers.host?.startsWith(`${host}:`);
    const name = isOurs ? (request.url ?? '/').slice(1) : 'nothing';
    pageFor(folder, name).then(
      (html) => {
        response.writeHead(200, {
          'Content-Type': 'text/html; charset=utf-8',
          'Content-Security-Policy': "default-src 'none'; style-src 'unsafe-inline'",
        });
        response.end(html);
      },
      () => {
        response.writeHead(404, { 'Content-Type': 'text/plain; charset=utf-8' });
        response.end('There is no such message.');
      },
    );
  });

/** @param {{ address: () => unknown }} server */
const portOf = (server) => {
  const address = server.address();
  return typeof address === 'object' && address && 'port' in address ? Number(address.port) : 0;
};

/** Starts the mailbox. Where mail goes to, and where it is read. @param {string} folder for the messages */
export const startMailbox = async (folder) => {
  const receiver = receiverInto(folder);
  // A sender that breaks off is its own trouble, not ours.
  receiver.on('error', () => undefined);
  const pages = pagesOf(folder);
  onClose(() => {
    pages.closeAllConnections();
    pages.close();
    receiver.close();
  });
  await Promise.all([once(receiver.listen(0, host), 'listening'), once(pages.listen(0, host), 'listening')]);
  return {
    smtpUrl: `smtp://${host}:${portOf(receiver.server)}`,
    address: `http://${host}:${portOf(pages)}`,
  };
};
