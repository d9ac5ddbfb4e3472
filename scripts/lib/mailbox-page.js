// @ts-check
// Reads stored messages as far as a person needs to, and writes the mailbox's pages.

/** @param {string} text */
const escape = (text) => text.replace(/[&<>"']/g, (character) => `&#${character.charCodeAt(0)};`);

/** @param {string} text @param {string} charset @param {string} encoding */
const decodeBytes = (text, charset, encoding) => {
  const bytes =
    encoding.toUpperCase() === 'B'
      ? Buffer.from(text, 'base64')
      : Buffer.from(
          text.replace(/=([0-9A-F]{2})/gi, (_, hex) => String.fromCharCode(parseInt(hex, 16))),
          'latin1',
        );
  return /^utf-?8$/i.test(charset) ? bytes.toString('utf8') : bytes.toString('latin1');
};

/** Words such as =?UTF-8?Q?caf=C3=A9?= (RFC 2047). @param {string} value */
const decodeWords = (value) =>
  value
    .replace(/\?=\s+=\?/g, '?==?')
    .replace(/=\?([^?]+)\?([BQ])\?([^?]*)\?=/gi, (_, charset, encoding, text) =>
      decodeBytes(encoding.toUpperCase() === 'Q' ? text.replace(/_/g, ' ') : text, charset, encoding),
    );

/** @param {string} part a message, or a part of one: head, an empty line, body */
const splitHead = (part) => {
  const [head = '', ...rest] = part.split(/\r?\n\r?\n/);
  const unfolded = head.replace(/\r?\n[ \t]+/g, ' ');
  const header = (/** @type {string} */ name) =>
    decodeWords(new RegExp(`^${name}:[ \\t]*(.*)$`, 'im').exec(unfolded)?.[1] ?? '');
  return { header, body: rest.join('\n\n') };
};

/** The readable text of a message: its first plain part. @param {string} source @returns {string} */
const textOf = (source) => {
  const { header, body } = splitHead(source);
  const boundary = /boundary="?([^";]+)"?/i.exec(header('Content-Type'))?.[1];
  if (boundary) {
    const parts = body
      .split(`--${boundary}`)
      .slice(1, -1)
      .map((part) => part.replace(/^\r?\n/, ''));
    const plain = parts.find((part) =>
      /^(text\/plain|multipart\/)/i.test(splitHead(part).header('Content-Type')),
    );
    return textOf(plain ?? parts[0] ?? '');
  }
  const encoding = header('Content-Transfer-Encoding');
  if (/base64/i.test(encoding)) return decodeBytes(body, 'utf-8', 'B');
  if (/quoted-printable/i.test(encoding)) return decodeBytes(body.replace(/=\r?\n/g, ''), 'utf-8', 'Q');
  return body;
};

/** @param {string} title @param {string} body */
const page = (title, body) => `<!doctype html>
<html lang="en">
<meta charset="utf-8" />
<meta name="viewport" content="width=device-width" />
<title>${title}</title>
<style>
  body { font: 16px/1.5 system-ui, sans-serif; max-width: 50rem; margin: 2rem auto; padding: 0 1rem; }
  li { margin: 0.75rem 0; }
  pre { white-space: pre-wrap; overflow-wrap: anywhere; }
</style>
<h1>${title}</h1>
${body}
</html>
`;

/** @param {{ name: string, source: string }[]} messages the newest first */
export const messageList = (messages) => {
  const entries = messages.map(({ name, source }) => {
    const { header } = splitHead(source);
    const about = `${escape(header('To'))} · ${escape(header('Date'))}`;
    return `<li><a href="/${name}">${escape(header('Subject') || '(no subject)')}</a><br />${about}</li>`;
  });
  const list = entries.length > 0 ? `<ul>${entries.join('\n')}</ul>` : '<p>No mail has come yet.</p>';
  return page('Mail on this machine', list);
};

/** Addresses in a text as links, everything else as text. @param {string} text */
const withLinks = (text) =>
  escape(text).replace(/https?:\/\/[^\s<>&]+(?:&#38;[^\s<>&]+)*/g, (url) => `<a href="${url}">${url}</a>`);

/** @param {string} source one message */
export const message = (source) => {
  const { header } = splitHead(source);
  const head = ['From', 'To', 'Date'].map((name) => `${name}: ${escape(header(name))}`).join('<br />');
  const title = escape(header('Subject') || '(no subject)');
  return page(title, `<p><a href="/">All mail</a></p><p>${head}</p><pre>${withLinks(textOf(source))}</pre>`);
};
