// @ts-check
// Ports on the loopback address.
import { createServer } from 'node:net';
import { Trouble } from './say.js';

const host = '127.0.0.1';

/** @param {number} port @returns {Promise<number | undefined>} the port once it was bound, undefined when it could not be */
const bind = (port) =>
  new Promise((resolve) => {
    const server = createServer();
    server.once('error', () => resolve(undefined));
    server.listen({ port, host, exclusive: true }, () => {
      const address = server.address();
      const bound = typeof address === 'object' ? address?.port : undefined;
      server.close(() => resolve(bound));
    });
  });

/** A port that nobody uses now: the one preferred if it is free. @param {number} [preferred] */
export const freePort = async (preferred) => {
  const port = (preferred && (await bind(preferred))) || (await bind(0));
  if (!port) throw new Trouble('No free port could be found on 127.0.0.1.');
  return port;
};

/** The port to serve at: PORT or 4300, refused when it is no port or taken. */
export const portToServe = async () => {
  const wanted = process.env['PORT'] || '4300';
  const port = Number(wanted);
  if (!Number.isInteger(port) || port < 1 || port > 65535) {
    throw new Trouble(`PORT is "${wanted}"; it must be a whole number from 1 to 65535.`);
  }
  if (!(await bind(port))) {
    throw new Trouble(
      `Port ${port} on ${host} is taken by another program (or not allowed to this user). ` +
        `End that one, or choose another port: PORT=${port + 1} npm start`,
    );
  }
  return port;
};
