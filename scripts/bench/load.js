// @ts-check
// Load by autocannon, and what came of it.
import { createRequire } from 'node:module';
import { Trouble } from '../lib/say.js';
import { percentile } from './figures.js';

/** @typedef {Record<string, string>} Headers */

/**
 * @typedef {object} Load
 * @property {string} url
 * @property {Headers} [headers]
 * @property {'GET' | 'POST'} [method]
 * @property {unknown} [body] sent as JSON
 * @property {number} [connections] 20 unless told otherwise
 * @property {number} [seconds]
 * @property {number} [amount] of requests, in place of seconds
 * @property {number} [rate] requests a second, all connections together; as fast as they are answered without it
 * @property {(connection: number) => () => Request} [next] makes for a connection what it asks next
 */

/** @typedef {{ path: string, body: unknown, headers: Headers }} Request */

/**
 * @typedef {object} Outcome
 * @property {number} perSecond
 * @property {number} count
 * @property {number} p95 milliseconds
 * @property {number} p99 milliseconds
 */

/** @param {{ path: string, body: unknown, headers: Headers }} request */
const toPost = ({ path, body, headers }) => ({
  method: 'POST',
  path,
  headers: { 'content-type': 'application/json', ...headers },
  body: JSON.stringify(body),
});

/** @param {NonNullable<Load['next']>} next */
const clientsBy = (next) => {
  let connections = 0;
  return (/** @type {{ setRequests: (requests: object[]) => void }} */ client) => {
    const nextOf = next(connections);
    connections += 1;
    client.setRequests([
      { setupRequest: (/** @type {object} */ request) => ({ ...request, ...toPost(nextOf()) }) },
    ]);
  };
};

/** @param {Load} load */
const optionsOf = ({ url, headers, method, body, connections = 20, seconds, amount, rate, next }) => ({
  url,
  connections,
  timeout: 30,
  ...(amount === undefined ? { duration: seconds } : { amount }),
  ...(rate !== undefined && { overallRate: rate }),
  ...(next && { setupClient: clientsBy(next) }),
  ...(method === 'POST' && { method, body: JSON.stringify(body) }),
  headers: { ...headers, ...(method === 'POST' && { 'content-type': 'application/json' }) },
});

/** Puts a load on an address. Whoever is refused an answer spoils the figures, and is told. @param {Load} load @returns {Promise<Outcome>} */
export const run = (load) =>
  new Promise((resolve, reject) => {
    // A package, and there only once npm has installed it.
    const autocannon = createRequire(import.meta.url)('autocannon');
    /** @type {number[]} */
    const times = [];
    /** @type {Map<number, number>} */
    const refused = new Map();
    const instance = autocannon(
      optionsOf(load),
      (/** @type {Error | null} */ error, /** @type {{ duration: number, errors: number }} */ result) => {
        if (error) reject(error);
        else if (refused.size > 0 || result.errors > 0 || times.length === 0) {
          const statuses = [...refused].map(([status, count]) => `${count} times status ${status}`);
          const broken = result.errors > 0 ? [`${result.errors} broken off`] : [];
          reject(new Trouble(`${load.url}: ${[...statuses, ...broken].join(', ') || 'no answer'}`));
        } else {
          const [p95, p99] = [percentile(times, 0.95), percentile(times, 0.99)];
          resolve({ perSecond: times.length / result.duration, count: times.length, p95, p99 });
        }
      },
    );
    instance.on(
      'response',
      (
        /** @type {unknown} */ _client,
        /** @type {number} */ status,
        /** @type {number} */ _bytes,
        /** @type {number} */ time,
      ) => {
        if (status >= 300) refused.set(status, (refused.get(status) ?? 0) + 1);
        else times.push(time);
      },
    );
  });
