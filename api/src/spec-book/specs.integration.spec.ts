import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { canonicalHash } from '../platform/hashing/canonical.js';
import { seedDemo, type SeededShop } from '../demo/seed-demo.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import { signedInClient, type TestClient } from '../testing/test-client.js';

let app: TestApp;
let shops: SeededShop[];
let nell: TestClient;

beforeAll(async () => {
  app = await startTestApp();
  shops = await seedDemo(app.services);
  nell = await signedInClient(app.address, 'nell@lowmill.example');
});
afterAll(() => app.close());

interface Listed {
  readonly id: string;
  readonly code: string;
  readonly editions: readonly {
    readonly edition: number;
    readonly state: string;
    readonly valueCount: number;
  }[];
}
const listed = async (client: TestClient): Promise<Listed[]> => (await client.get('/specs')).body.items;

describe('the demo', () => {
  it('has its people, cars and tools', async () => {
    expect((await nell.get('/people')).body).toHaveLength(4);
    expect((await nell.get('/cars')).body.items.map(({ name }: { name: string }) => name)).toContain(
      'Aldwyn Tern 1.8',
    );
    expect((await nell.get('/tools')).body.length).toBeGreaterThan(10);
    const ravi = await signedInClient(app.address, 'ravi@lowmill.example');
    expect((await ravi.get('/cars')).body.items.length).toBeGreaterThan(0);
    await signedInClient(app.address, 'hana@harbourlane.example');
  });

  it('has three engines, at least 120 values each', async () => {
    const specs = await listed(nell);
    expect(specs.map(({ code }) => code)).toEqual(['AT18', 'BX26', 'CV34']);
    for (const { editions } of specs) {
      for (const { valueCount } of editions) expect(valueCount).toBeGreaterThanOrEqual(120);
    }
  });

  it('has one approved edition of each, the one before it superseded, and a draft', async () => {
    const [tern] = await listed(nell);
    expect(tern?.editions.map(({ edition, state }) => [edition, state])).toEqual([
      [3, 'draft'],
      [2, 'approved'],
      [1, 'superseded'],
    ]);
  });
});

describe('an edition', () => {
  it('comes whole, and its hash is that of its canonical JSON', async () => {
    const [tern] = await listed(nell);
    const { status, body } = await nell.get(`/specs/${tern?.id}/editions/2`);
    expect(status).toBe(200);
    expect(body).toMatchObject({ edition: 2, code: 'AT18', specId: tern?.id, approvedBy: 'Nell Okafor' });
    expect(body.id).toBe(shops[0]?.editions.get('AT18/2'));
    expect(body.document.format).toBe(1);
    expect(canonicalHash(body.document)).toBe(body.hash);
  });

  it('of one number is not that of another', async () => {
    const [tern] = await listed(nell);
    const [first, second] = await Promise.all(
      [1, 2].map(async (edition) => (await nell.get(`/specs/${tern?.id}/editions/${edition}`)).body),
    );
    expect(first.hash).not.toBe(second.hash);
  });

  it.each(['9', '0', '-1', '1.5', 'two', '99999999999'])('number %s is not there', async (number) => {
    const [tern] = await listed(nell);
    expect((await nell.get(`/specs/${tern?.id}/editions/${number}`)).status).toBe(404);
  });

  it('is not there for another shop, nor for a car owner', async () => {
    const [tern] = await listed(nell);
    const hana = await signedInClient(app.address, 'hana@harbourlane.example');
    expect((await hana.get(`/specs/${tern?.id}/editions/2`)).status).toBe(404);
    expect((await hana.get(`/specs/${randomUUID()}/editions/1`)).status).toBe(404);
    const ravi = await signedInClient(app.address, 'ravi@lowmill.example');
    expect((await ravi.get('/specs')).status).toBe(403);
    expect((await ravi.get(`/specs/${tern?.id}/editions/2`)).status).toBe(403);
  });
});
