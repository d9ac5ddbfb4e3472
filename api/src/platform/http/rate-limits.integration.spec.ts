import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestApp, type TestApp } from '../../testing/test-app.js';
import { signedInClient, TestClient } from '../../testing/test-client.js';
import { openWorkshop } from '../../testing/workshop.js';

let app: TestApp;

beforeAll(async () => {
  app = await startTestApp({ requestsPerMinute: 40 });
  await openWorkshop(app.services);
});
afterAll(() => app.close());

describe('rate limits', () => {
  it('stop guessing the password of one account after ten failures, the right one then too', async () => {
    const client = new TestClient(app.address);
    for (let attempt = 1; attempt <= 10; attempt++) {
      expect((await client.signIn('nell@lowmill.example', `a wrong password ${attempt}`)).status).toBe(401);
    }
    const answer = await client.signIn('nell@lowmill.example');
    expect(answer.status).toBe(429);
    expect(answer.type).toBe('application/problem+json');
    expect(Number(answer.headers['retry-after'])).toBeGreaterThan(0);
    // The address in another spelling is the same account; another account is not stopped.
    expect((await client.signIn(' NELL@lowmill.example')).status).toBe(429);
    expect((await client.signIn('imogen@lowmill.example')).status).toBe(200);
  });

  it('stop a runaway by account', async () => {
    const tomasz = await signedInClient(app.address, 'tomasz@lowmill.example');
    const answers = await Promise.all(Array.from({ length: 50 }, () => tomasz.get('/people')));
    expect(answers.filter(({ status }) => status === 200)).toHaveLength(40);
    expect(answers.filter(({ status }) => status === 429)).toHaveLength(10);
    const imogen = await signedInClient(app.address, 'imogen@lowmill.example');
    expect((await imogen.get('/people')).status).toBe(200);
  });
});
