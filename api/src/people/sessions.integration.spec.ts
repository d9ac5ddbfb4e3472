import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type supertest from 'supertest';
import { browser } from '../testing/documented.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import { cookieIn, setCookies, signedInClient, TestClient } from '../testing/test-client.js';
import { demoPassword, openWorkshop, type Workshop } from '../testing/workshop.js';

let app: TestApp;
let workshop: Workshop;

beforeAll(async () => {
  app = await startTestApp();
  workshop = await openWorkshop(app.services);
});
afterAll(() => app.close());

const renewal = 'second_spanner_renewal';

describe('signing in', () => {
  it('answers who it is and in which shop', async () => {
    const answer = await new TestClient(app.address).signIn('nell@lowmill.example');
    expect(answer.status).toBe(200);
    expect(answer.body).toEqual({
      person: {
        id: workshop.people.nell,
        name: 'Nell Okafor',
        email: 'nell@lowmill.example',
        role: 'foreman',
        dialect: null,
      },
      shop: { id: workshop.shop, name: 'Low Mill Motor Works', dialect: 'british', demo: true },
    });
  });

  it('keeps the tokens from scripts and other sites', async () => {
    const answer = await new TestClient(app.address).signIn('nell@lowmill.example');
    const [access, renew, xsrf] = setCookies(answer);
    expect(access).toMatch(/^second_spanner_access=.*Path=\/;.*HttpOnly.*SameSite=Strict/);
    expect(renew).toMatch(/^second_spanner_renewal=.*Path=\/api\/session;.*HttpOnly.*SameSite=Strict/);
    expect(xsrf).toMatch(/^XSRF-TOKEN=.*Path=\/;.*SameSite=Strict/);
    expect(xsrf).not.toContain('HttpOnly');
  });

  it('takes the e-mail address in any case', async () => {
    const answer = await new TestClient(app.address).signIn(' Nell@LowMill.example ');
    expect(answer.status).toBe(200);
  });

  it.each([
    ['an unknown account', 'nobody@lowmill.example', demoPassword],
    ['a wrong password', 'nell@lowmill.example', 'parallel-spanners-62'],
  ])('refuses %s in the same words', async (_case, email, password) => {
    const answer = await new TestClient(app.address).signIn(email, password);
    expect(answer.status).toBe(401);
    expect(answer.type).toBe('application/problem+json');
    expect(answer.body.detail).toBe('E-mail address and password do not belong together.');
    expect(setCookies(answer)).toEqual([]);
  });

  it('names the fields that are missing or not known', async () => {
    const answer = await browser(app.address)
      .post('/api/session')
      .send({ email: 'nell@lowmill.example', role: 'foreman' });
    expect(answer.status).toBe(400);
    expect(answer.body.errors).toEqual([
      { field: 'role', message: 'This field is not known here.' },
      { field: 'password', message: 'Enter your password.' },
    ]);
  });

  it.each(['nell@lowmill.example\0', 'nell\ud800@lowmill.example'])('refuses %j as a text', async (email) => {
    const answer = await new TestClient(app.address).signIn(email);
    expect(answer.status).toBe(400);
    expect(answer.body.errors[0].field).toBe('email');
  });

  it('refuses a person who is locked out, and their running session at the next request', async () => {
    const tomasz = await signedInClient(app.address, 'tomasz@lowmill.example');
    const setLock = (value: string): Promise<object[]> =>
      app.db.sql(workshop.shop, `UPDATE people SET locked_at = ${value} WHERE id = $1`, [
        workshop.people.tomasz,
      ]);
    await setLock('now()');
    expect((await tomasz.get('/people')).status).toBe(401);
    expect((await new TestClient(app.address).signIn('tomasz@lowmill.example')).status).toBe(401);
    await setLock('NULL');
    expect((await tomasz.get('/people')).status).toBe(200);
  });

  it('counts a change of role from the next request', async () => {
    const imogen = await signedInClient(app.address, 'imogen@lowmill.example');
    const setRole = (role: string): Promise<object[]> =>
      app.db.sql(workshop.shop, 'UPDATE people SET role = $1 WHERE id = $2', [role, workshop.people.imogen]);
    expect((await imogen.get('/tools')).status).toBe(200);
    await setRole('car-owner');
    expect((await imogen.get('/tools')).status).toBe(403);
    await setRole('countersigner');
    expect((await imogen.get('/tools')).status).toBe(200);
  });
});

describe('the session', () => {
  it('is nobody’s before signing in, and the answer brings an XSRF token', async () => {
    const answer = await new TestClient(app.address).get('/session');
    expect(answer.status).toBe(401);
    expect(cookieIn(answer, 'XSRF-TOKEN')).toBeDefined();
  });

  it('is over after signing out, for the access token too', async () => {
    const nell = await signedInClient(app.address, 'nell@lowmill.example');
    expect((await nell.get('/session')).status).toBe(200);
    const copied = await tokensOf('nell@lowmill.example');
    expect((await nell.delete('/session')).status).toBe(204);
    expect((await nell.get('/session')).status).toBe(401);
    // Another device of the same person stays signed in.
    expect((await withCookies(copied.all).get('/api/session')).status).toBe(200);
    await withCookies(copied.all).delete('/api/session').set('X-XSRF-TOKEN', copied.xsrf);
    expect((await withCookies(copied.all).get('/api/session')).status).toBe(401);
  });

  it('is renewed by its token, once', async () => {
    const first = await tokensOf('nell@lowmill.example');
    const renewed = await renew(first);
    expect(renewed.status).toBe(200);
    expect(renewed.body.person.name).toBe('Nell Okafor');
    const next = cookieIn(renewed, renewal);
    expect(next).toBeDefined();
    expect(next).not.toBe(first.renewal);
  });

  it('ends as a whole when a token is used a second time', async () => {
    const first = await tokensOf('nell@lowmill.example');
    const renewed = await renew(first);
    const second = { ...first, renewal: cookieIn(renewed, renewal) ?? '' };
    expect((await renew(first)).status).toBe(401);
    expect((await renew(second)).status).toBe(401);
    expect((await withCookies(first.all).get('/api/session')).status).toBe(401);
  });

  it('is not renewed twice by a race for one token', async () => {
    const first = await tokensOf('nell@lowmill.example');
    const answers = await Promise.all([renew(first), renew(first), renew(first)]);
    expect(answers.filter(({ status }) => status === 200).length).toBeLessThanOrEqual(1);
  });

  it.each(['', 'x', 'a.b.c', `${'0'.repeat(8)}-0000-0000-0000-000000000000.x.y`])(
    'is not renewed by %j',
    async (token) => {
      const { xsrf } = await tokensOf('nell@lowmill.example');
      expect((await renew({ renewal: token, xsrf })).status).toBe(401);
    },
  );
});

describe('XSRF', () => {
  it.each([
    ['no token', undefined],
    ['another token', 'another'],
  ])('refuses a change with %s', async (_case, token) => {
    const { all } = await tokensOf('nell@lowmill.example');
    const change = withCookies(all).put('/api/preferences');
    if (token !== undefined) void change.set('X-XSRF-TOKEN', token);
    const answer = await change.send({ dialect: 'american' });
    expect(answer.status).toBe(403);
    expect(answer.body.detail).toContain('XSRF');
  });
});

describe('preferences', () => {
  it('keep the person’s own trade words', async () => {
    const nell = await signedInClient(app.address, 'nell@lowmill.example');
    const answer = await nell.put('/preferences', { dialect: 'american' });
    expect(answer.status).toBe(200);
    expect(answer.body.person.dialect).toBe('american');
    expect((await nell.get('/session')).body.person.dialect).toBe('american');
    expect((await nell.put('/preferences', { dialect: null })).body.person.dialect).toBeNull();
  });

  it.each([{}, { dialect: 'scottish' }, { dialect: null, role: 'foreman' }])('refuse %j', async (body) => {
    const nell = await signedInClient(app.address, 'nell@lowmill.example');
    expect((await nell.put('/preferences', body)).status).toBe(400);
  });
});

interface Tokens {
  readonly renewal: string;
  readonly xsrf: string;
}

async function tokensOf(email: string): Promise<Tokens & { all: string }> {
  const answer = await new TestClient(app.address).signIn(email);
  const value = (name: string): string => cookieIn(answer, name) ?? '';
  const pairs = ['second_spanner_access', renewal, 'XSRF-TOKEN'].map((name) => `${name}=${value(name)}`);
  return { renewal: value(renewal), xsrf: value('XSRF-TOKEN'), all: pairs.join('; ') };
}

function withCookies(cookies: string): ReturnType<typeof supertest.agent> {
  return browser(app.address).set('Cookie', cookies);
}

function renew({ renewal: token, xsrf }: Tokens): supertest.Test {
  return withCookies(`${renewal}=${token}; XSRF-TOKEN=${xsrf}`)
    .post('/api/session/renewal')
    .set('X-XSRF-TOKEN', xsrf);
}
