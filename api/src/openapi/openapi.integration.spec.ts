import { createHash } from 'node:crypto';
import { Validator } from '@seriousme/openapi-schema-validator';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { browser } from '../testing/documented.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import type { MediaType, OpenApiDocument } from './document-types.js';
import { SchemaChecks } from './testing/schema-checks.js';

let app: TestApp;
let document: OpenApiDocument;
let page: string;
let policy: string;
beforeAll(async () => {
  app = await startTestApp();
  document = (await browser(app.address).get('/api/openapi.json').expect(200)).body;
  const answer = await browser(app.address).get('/api/docs').expect(200);
  page = answer.text;
  policy = answer.headers['content-security-policy'] ?? '';
});
afterAll(() => app.close());

const operations = () =>
  Object.entries(document.paths).flatMap(([path, item]) =>
    Object.entries(item).map(([method, operation]) => ({ path, method, operation })),
  );

describe('the document of the api', () => {
  it('is an OpenAPI 3.1 document', async () => {
    const result = await new Validator().validate(structuredClone(document) as never);
    expect(result.errors).toBeUndefined();
    expect(result.valid).toBe(true);
  });

  it('has every route of the application, and no other', () => {
    const documented = operations().map(({ method, path }) => `${method.toUpperCase()} /api${path}`);
    const served = app.routes.filter((route) => route.includes('/api/'));
    expect(documented.sort()).toEqual(served.sort());
  });

  it('names every operation once', () => {
    const ids = operations().map(({ operation }) => operation.operationId);
    expect(new Set(ids).size).toBe(ids.length);
  });

  it('has an example of everything but pictures, pages and whole editions, each right by its schema', () => {
    const checks = new SchemaChecks(document);
    const without: string[] = [];
    const look = (
      of: 'requests' | 'answers',
      at: string[],
      content: Readonly<Record<string, MediaType>> = {},
    ): void => {
      for (const [media, { example }] of Object.entries(content)) {
        if (example === undefined) without.push(at[1] ?? '');
        else
          expect(checks.trouble(of, [...at, 'content', media, 'schema'], example), at.join(' ')).toBeNull();
      }
    };
    for (const { path, method, operation } of operations()) {
      const at = ['paths', path, method];
      look('requests', [...at, 'requestBody'], operation.requestBody?.content);
      for (const [status, { content }] of Object.entries(operation.responses)) {
        look('answers', [...at, 'responses', status], content);
      }
    }
    expect(without.sort()).toEqual([
      '/cars/{carId}/workings/{id}/pdf',
      '/docs',
      '/files',
      '/files/{id}',
      '/openapi.json',
      '/sheets/{id}/build-sheet.pdf',
      '/specs/{id}/editions/{number}',
      '/workings/{key}/pdf',
    ]);
  });
});

describe('the page of the document', () => {
  it('has an entry for every route and type, and leads nowhere that is not there', () => {
    const ids = [...page.matchAll(/ id="([^"]+)"/g)].map(([, id]) => id);
    const wanted = [
      ...operations().map(({ operation }) => operation.operationId),
      ...Object.keys(document.components.schemas).map((name) => `type-${name}`),
    ];
    expect(ids).toEqual(expect.arrayContaining(wanted));
    expect(new Set(ids).size).toBe(ids.length);
    const leads = [...page.matchAll(/href="#([^"]+)"/g)].map(([, id]) => id);
    expect(leads.filter((id) => !ids.includes(id))).toEqual([]);
  });

  it('runs no script and has no style but the one that its policy names', () => {
    expect(page).not.toMatch(/<script|<link|<img| style=| on\w+="/);
    const style = /<style>([^]*?)<\/style>/.exec(page)?.[1] ?? '';
    const hash = createHash('sha256').update(style).digest('base64');
    expect(policy).toBe(
      `default-src 'none'; style-src 'sha256-${hash}'; base-uri 'none'; form-action 'none'; frame-ancestors 'none'`,
    );
  });
});
