import type supertest from 'supertest';
import { browser } from './documented.js';
import { demoPassword } from './workshop.js';

/** A browser: keeps cookies, holds answers against the document of the api, and sends the XSRF token back as Angular does. */
export class TestClient {
  private readonly agent: ReturnType<typeof supertest.agent>;
  private xsrf = '';

  constructor(address: string) {
    this.agent = browser(address);
  }

  async signIn(email: string, password = demoPassword): Promise<supertest.Response> {
    const answer = await this.agent.post('/api/session').send({ email, password });
    this.xsrf = cookieIn(answer, 'XSRF-TOKEN') ?? this.xsrf;
    return answer;
  }

  get(path: string): supertest.Test {
    return this.agent.get(`/api${path}`);
  }

  post(path: string, body?: object): supertest.Test {
    return this.agent.post(`/api${path}`).set('X-XSRF-TOKEN', this.xsrf).send(body);
  }

  put(path: string, body: object): supertest.Test {
    return this.agent.put(`/api${path}`).set('X-XSRF-TOKEN', this.xsrf).send(body);
  }

  delete(path: string): supertest.Test {
    return this.agent.delete(`/api${path}`).set('X-XSRF-TOKEN', this.xsrf);
  }
}

/** Signs somebody in and answers their browser. */
export async function signedInClient(address: string, email: string): Promise<TestClient> {
  const client = new TestClient(address);
  const answer = await client.signIn(email);
  if (answer.status !== 200) throw new Error(`${email} could not sign in: ${answer.text}`);
  return client;
}

/** The value of a cookie that an answer sets; undefined when it sets none of this name. */
export function cookieIn(answer: supertest.Response, name: string): string | undefined {
  return setCookies(answer)
    .find((line) => line.startsWith(`${name}=`))
    ?.slice(name.length + 1)
    .split(';', 1)[0];
}

/** The cookies that an answer sets, as they are sent. */
export function setCookies(answer: supertest.Response): string[] {
  const lines: unknown = answer.headers['set-cookie'];
  return Array.isArray(lines) ? lines.map(String) : [];
}
