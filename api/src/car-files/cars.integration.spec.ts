import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import { signedInClient, type TestClient } from '../testing/test-client.js';
import { openWorkshop, type Workshop } from '../testing/workshop.js';

let app: TestApp;
let workshop: Workshop;
let nell: TestClient;
let ravi: TestClient;

beforeAll(async () => {
  app = await startTestApp();
  workshop = await openWorkshop(app.services);
  nell = await signedInClient(app.address, 'nell@lowmill.example');
  ravi = await signedInClient(app.address, 'ravi@lowmill.example');
});
afterAll(() => app.close());

const codes = (items: { code: string }[]): string[] => items.map(({ code }) => code);

describe('car files', () => {
  it('are those of the shop', async () => {
    const { status, body } = await nell.get('/cars');
    expect(status).toBe(200);
    expect(codes(body.items)).toEqual(['LM-C01', 'LM-C02']);
    expect(body.next).toBeNull();
    expect(body.items[0]).toMatchObject({ ownerName: 'Ravi Lindqvist', sheetCount: 0 });
  });

  it('come in pages', async () => {
    const first = await nell.get('/cars?limit=1');
    expect(codes(first.body.items)).toEqual(['LM-C01']);
    const second = await nell.get(`/cars?limit=1&cursor=${first.body.next}`);
    expect(codes(second.body.items)).toEqual(['LM-C02']);
    expect(second.body.next).toBeNull();
  });

  it.each(['limit=0', 'limit=201', 'limit=ten', 'cursor=bm90', 'cursor=WzFd', 'cursor=a&cursor=b'])(
    'refuse ?%s',
    async (query) => {
      const { status, body } = await nell.get(`/cars?${query}`);
      expect(status).toBe(400);
      expect(body.errors[0].field).toBe(query.split('=')[0]);
    },
  );

  it('show one car whole', async () => {
    const { status, body } = await nell.get(`/cars/${workshop.cars.ravis}`);
    expect(status).toBe(200);
    expect(body).toMatchObject({ code: 'LM-C01', chassisNumber: 'AT-61-0093', sheets: [] });
  });

  it.each([
    ['another shop’s car', () => workshop.cars.otherShops],
    ['a car that is not there', () => randomUUID()],
    ['what is no id', () => 'LM-C01'],
  ])('answer 404 for %s', async (_case, id) => {
    expect((await nell.get(`/cars/${id()}`)).status).toBe(404);
  });

  it('show an owner their own car, and no other', async () => {
    expect(codes((await ravi.get('/cars')).body.items)).toEqual(['LM-C01']);
    expect((await ravi.get(`/cars/${workshop.cars.ravis}`)).status).toBe(200);
    expect((await ravi.get(`/cars/${workshop.cars.oonas}`)).status).toBe(404);
  });
});

describe('people', () => {
  const names = (people: { name: string }[]): string[] => people.map(({ name }) => name);

  it('are those of the shop, without their addresses', async () => {
    const { body } = await nell.get('/people');
    expect(names(body)).toEqual([
      'Imogen Vale',
      'Nell Okafor',
      'Oona Marsh',
      'Ravi Lindqvist',
      'Tomasz Brandt',
    ]);
    expect(Object.keys(body[0])).toEqual(['id', 'name', 'role']);
  });

  it('are, for an owner, those who work there', async () => {
    const { body } = await ravi.get('/people');
    expect(names(body)).toEqual(['Imogen Vale', 'Nell Okafor', 'Ravi Lindqvist', 'Tomasz Brandt']);
  });
});

describe('tools', () => {
  it('are those of the shop, for those who work there', async () => {
    const { status, body } = await nell.get('/tools');
    expect(status).toBe(200);
    expect(body).toEqual([
      {
        id: workshop.tool,
        code: 'T-01',
        name: 'Outside micrometer 0–25 mm',
        kind: 'micrometer',
        low: { value: 0, unit: 'mm' },
        high: { value: 25, unit: 'mm' },
        resolution: { value: 0.01, unit: 'mm' },
        uncertainty: { value: 0.004, unit: 'mm' },
        calibrationDue: '2027-03-31',
      },
    ]);
    expect((await ravi.get('/tools')).status).toBe(403);
    const hana = await signedInClient(app.address, 'hana@harbourlane.example');
    expect((await hana.get('/tools')).body).toEqual([]);
  });
});
