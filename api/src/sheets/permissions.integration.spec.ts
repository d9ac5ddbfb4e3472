import { randomUUID } from 'node:crypto';
import type supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  openStage,
  recordClearances,
  storePhoto,
  type Hands,
  type SheetStage,
} from '../testing/sheet-stage.js';
import { signedInClient, type TestClient } from '../testing/test-client.js';

let stage: SheetStage;
let hands: Hands;
let photo: string;
let nobody: TestClient;
beforeAll(async () => {
  stage = await openStage();
  hands = await stage.newSheet();
  await recordClearances(hands, stage.small);
  photo = await storePhoto(stage);
  nobody = await signedOut();
});
afterAll(() => stage.close());

/** Who asks: by role; `ravi` owns the car, `oona` another one, `hana` runs another shop. */
const askers = ['nell', 'tomasz', 'imogen', 'ravi', 'oona', 'hana', 'nobody'] as const;
type Asker = (typeof askers)[number];
type Row = Readonly<Record<Asker, number>>;

/** What each asker gets: 400 and 422 are answered after the permission was looked at. */
const row = (...statuses: readonly number[]): Row =>
  Object.fromEntries(askers.map((asker, index) => [asker, statuses[index] ?? 0])) as Row;

// Statuses in the order foreman, builder, countersigner, owner, other owner, other shop's foreman, nobody.
const matrix: readonly (readonly [method: 'get' | 'post' | 'put', path: string, expected: Row])[] = [
  ['get', '/bench', row(200, 200, 200, 200, 200, 200, 401)],
  ['get', '/sheets', row(200, 200, 200, 200, 200, 200, 401)],
  ['post', '/sheets', row(400, 400, 403, 403, 403, 400, 401)],
  ['get', '/sheets/:id', row(200, 200, 200, 200, 404, 404, 401)],
  ['get', '/sheets/:id/history', row(200, 200, 200, 200, 404, 404, 401)],
  ['get', '/sheets/:id/snags', row(200, 200, 200, 200, 404, 404, 401)],
  ['get', '/sheets/:id/steps/1.2', row(200, 200, 200, 200, 404, 404, 401)],
  ['get', '/sheets/:id/steps/9.9', row(404, 404, 404, 404, 404, 404, 401)],
  ['get', '/sheets/:id/build-sheet.pdf', row(200, 200, 200, 200, 404, 404, 401)],
  ['post', '/sheets/:id/start', row(422, 422, 403, 403, 403, 404, 401)],
  ['post', '/sheets/:id/steps/1.2/entries', row(409, 409, 403, 403, 403, 404, 401)],
  ['post', '/sheets/:id/steps/1.2/second-readings', row(400, 422, 400, 403, 403, 404, 401)],
  ['post', '/sheets/:id/steps/1.2/countersignatures', row(422, 422, 422, 403, 403, 404, 401)],
  ['post', '/sheets/:id/steps/1.2/snags', row(400, 400, 400, 403, 403, 400, 401)],
  ['post', '/sheets/:id/snags/:none/settlements', row(404, 404, 403, 403, 403, 404, 401)],
  ['put', '/sheets/:id/steps/1.2/unmarking', row(422, 403, 403, 403, 403, 404, 401)],
  ['post', '/sheets/:id/steps/1.1/calls', row(422, 422, 403, 403, 403, 404, 401)],
  ['post', '/sheets/:id/signatures', row(422, 422, 403, 403, 403, 404, 401)],
  ['post', '/sheets/:id/send-back', row(422, 403, 422, 403, 403, 404, 401)],
  ['get', '/files/:photo', row(200, 200, 200, 404, 404, 404, 401)],
  ['post', '/files', row(415, 415, 415, 403, 403, 415, 401)],
];

/** Bodies that are right as far as they go, so that only the permission and the rules speak. */
const bodies = (path: string): object => {
  if (path.endsWith('/entries')) {
    const value = { value: 0.05, unit: 'mm' };
    return { content: { kind: 'measurement', at: 'Main 1', value, toolId: stage.small.tools['T-02'] } };
  }
  if (path.endsWith('/second-readings')) {
    return { content: { kind: 'measured-again', toolId: stage.small.tools['T-03'], readings: [] } };
  }
  if (path.endsWith('/countersignatures')) return { outcome: 'agree' };
  if (path.endsWith('/settlements')) return { how: 'redone', reason: 'Done again.' };
  if (path.endsWith('/unmarking') || path.endsWith('/send-back')) return { reason: 'A reason.' };
  if (path.endsWith('/signatures')) return { meaning: 'built', password: 'parallel-spanners-61' };
  return {};
};

function send(client: TestClient, method: 'get' | 'post' | 'put', path: string): supertest.Test {
  if (method === 'get') return client.get(path);
  const request = method === 'put' ? client.put(path, bodies(path)) : client.post(path, bodies(path));
  return request.set('Idempotency-Key', randomUUID());
}

describe('permissions', () => {
  it.each(matrix)('%s %s', async (method, path, expected) => {
    const place = path
      .replace(':id', hands.id)
      .replace(':photo', photo)
      .replace(':none', '00000000-0000-4000-8000-000000000000');
    const statuses: Partial<Record<Asker, number>> = {};
    for (const asker of askers) {
      const client = asker === 'nobody' ? nobody : stage.clients[asker];
      statuses[asker] = (await send(client, method, place)).status;
    }
    expect(statuses).toEqual(expected);
  });

  it('lets each signature to its role', async () => {
    const sign = async (name: 'nell' | 'tomasz' | 'imogen', meaning: string): Promise<number> => {
      const body = { meaning, password: 'parallel-spanners-61' };
      return (await stage.clients[name].post(`/sheets/${hands.id}/signatures`, body)).status;
    };
    expect(await sign('imogen', 'built')).toBe(403);
    expect(await sign('tomasz', 'released')).toBe(403);
    expect(await sign('imogen', 'released')).toBe(403);
    expect(await sign('nell', 'released')).toBe(422);
    expect(await sign('imogen', 'countersigned')).toBe(422);
  });

  it('do not take another person’s sheet for unchanged', async () => {
    const tag = (await hands.tomasz.sheet()).headers['etag'] ?? '';
    expect((await hands.tomasz.sheet().set('If-None-Match', tag)).status).toBe(304);
    expect((await hands.imogen.sheet().set('If-None-Match', tag)).status).toBe(200);
  });

  it('count from the next request when a role changes', async () => {
    const change = (role: string): Promise<object[]> =>
      stage.app.db.sql(stage.workshop.shop, `UPDATE people SET role = $1 WHERE id = $2`, [
        role,
        stage.ids.bea,
      ]);
    const path = `/sheets/${hands.id}/steps/1.2/snags`;
    expect((await stage.clients.bea.post(path, {})).status).toBe(400);
    await change('car-owner');
    expect((await stage.clients.bea.post(path, {})).status).toBe(403);
    await change('builder');
    expect((await stage.clients.bea.post(path, {})).status).toBe(400);
  });
});

/** A browser that signed out again: it has an XSRF token, and no session. */
async function signedOut(): Promise<TestClient> {
  const client = await signedInClient(stage.app.address, 'bea@lowmill.example');
  await client.delete('/session').expect(204);
  return client;
}
