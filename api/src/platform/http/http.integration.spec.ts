import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { browser } from '../../testing/documented.js';
import { startTestApp, type TestApp } from '../../testing/test-app.js';
import { setCookies, signedInClient, TestClient } from '../../testing/test-client.js';
import { openWorkshop } from '../../testing/workshop.js';

let app: TestApp;
const clientDir = mkdtempSync(join(tmpdir(), 'client-'));

beforeAll(async () => {
  writeFileSync(join(clientDir, 'index.html'), '<!doctype html><title>The page</title>');
  writeFileSync(join(clientDir, 'main-ABCD1234.js'), 'export {};');
  app = await startTestApp({ clientDir });
  await openWorkshop(app.services);
});
afterAll(async () => {
  await app.close();
  rmSync(clientDir, { recursive: true });
});

describe('health', () => {
  it('answers without a sign-in', async () => {
    const answer = await browser(app.address).get('/api/health');
    expect(answer.status).toBe(200);
    expect(answer.body).toEqual({ status: 'ok' });
  });
});

describe('problems', () => {
  it('answer an unknown address with 404, as Problem Details', async () => {
    const answer = await browser(app.address).get('/api/nothing');
    expect(answer.status).toBe(404);
    expect(answer.type).toBe('application/problem+json');
    expect(answer.body).toEqual({
      type: 'about:blank',
      title: 'Not Found',
      status: 404,
      detail: 'There is no such address.',
    });
  });

  it('answer an address that cannot be decoded with 400', async () => {
    const nell = await signedInClient(app.address, 'nell@lowmill.example');
    expect((await nell.get('/cars/%E0%A4%A')).status).toBe(400);
  });

  it('answer a body over 100 kB with 413', async () => {
    const nell = await signedInClient(app.address, 'nell@lowmill.example');
    const answer = await nell.post('/calculations/convert', { to: 'x'.repeat(100 * 1024) });
    expect(answer.status).toBe(413);
  });

  it.each([
    ['broken JSON', 'application/json', '{"email":', 400],
    ['a form', 'application/x-www-form-urlencoded', 'email=a', 415],
    ['a list', 'application/json', '[]', 400],
    ['a bare text', 'application/json', '"text"', 400],
    ['an unknown charset', 'application/json; charset=utf-17', '{}', 415],
    ['another charset', 'application/json; charset="utf-16le"', '{}', 415],
    ['brackets far inside each other', 'application/json', `${'['.repeat(51)}${']'.repeat(51)}`, 400],
    ['brackets in a text', 'application/json', `{"email":"${'['.repeat(200)}"}`, 400],
  ])('answer %s with its status', async (_case, type, body, status) => {
    const answer = await browser(app.address).post('/api/session').set('Content-Type', type).send(body);
    expect(answer.status).toBe(status);
    expect(answer.type).toBe('application/problem+json');
  });
});

describe('headers', () => {
  it('keep answers of the api from caches, and the page from foreign scripts', async () => {
    const { headers } = await browser(app.address).get('/api/health');
    expect(headers['cache-control']).toBe('no-store');
    expect(headers['content-security-policy']).toContain("script-src 'self'");
    expect(headers['x-content-type-options']).toBe('nosniff');
    expect(headers['x-powered-by']).toBeUndefined();
  });
});

describe('the client', () => {
  it.each(['/', '/sheets/1/steps/8.6'])('has its page at %s', async (path) => {
    const answer = await browser(app.address).get(path);
    expect(answer.status).toBe(200);
    expect(answer.text).toContain('The page');
    expect(answer.headers['cache-control']).toBe('no-cache');
  });

  it('keeps files that carry their hash', async () => {
    const { headers } = await browser(app.address).get('/main-ABCD1234.js');
    expect(headers['cache-control']).toBe('public, max-age=31536000, immutable');
  });

  it.each(['/main-OLD00000.js', '/api', '/../package.json', '/.env'])('does not answer %s', async (path) => {
    expect((await browser(app.address).get(path)).status).toBe(404);
  });
});

describe('over https', () => {
  it('cookies are secure, and named so that no other host can set them', async () => {
    const secure = await startTestApp({ publicUrl: 'https://workshop.example' });
    await openWorkshop(secure.services);
    const answer = await new TestClient(secure.address).signIn('nell@lowmill.example');
    const [access, renewal, xsrf] = setCookies(answer);
    expect(access).toMatch(/^__Host-access=.*Secure/);
    expect(renewal).toMatch(/^__Secure-renewal=.*Secure/);
    expect(xsrf).toContain('Secure');
    expect(answer.headers['strict-transport-security']).toContain('max-age=');
    await secure.close();
  });
});
