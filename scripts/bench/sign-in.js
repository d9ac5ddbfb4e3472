// @ts-check
// Signs the demo's people in.
import { Trouble } from '../lib/say.js';

export const password = 'parallel-spanners-61';

/** The headers of somebody who is signed in. A sign-in lasts ten minutes. @param {string} address @param {'nell' | 'tomasz'} who */
export const signIn = async (address, who) => {
  const response = await fetch(`${address}/api/session`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ email: `${who}@lowmill.example`, password }),
  });
  if (response.status !== 200) throw new Trouble(`${who} could not be signed in: status ${response.status}.`);
  const cookies = response.headers.getSetCookie().map((cookie) => cookie.split(';')[0] ?? '');
  const xsrf = cookies.find((cookie) => cookie.startsWith('XSRF-TOKEN='))?.split('=')[1] ?? '';
  return { cookie: cookies.join('; '), 'x-xsrf-token': decodeURIComponent(xsrf) };
};

/** One request that must succeed. @param {string} url @param {Record<string, string>} headers */
export const get = async (url, headers) => {
  const response = await fetch(url, { headers });
  const body = Buffer.from(await response.arrayBuffer());
  if (response.status !== 200) throw new Trouble(`${url}: status ${response.status}.`);
  return body;
};
