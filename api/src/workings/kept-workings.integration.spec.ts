import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { pagesOf } from '../paper/testing/pages-of.js';
import { startTestApp, type TestApp } from '../testing/test-app.js';
import { signedInClient, type TestClient } from '../testing/test-client.js';
import { openWorkshop, type Workshop } from '../testing/workshop.js';

type Name = 'nell' | 'tomasz' | 'imogen' | 'ravi' | 'oona' | 'hana';
let app: TestApp;
let workshop: Workshop;
let clients: Readonly<Record<Name, TestClient>>;
let path: string;
let keptId: string;

const figure = {
  working: 'convert',
  title: 'Main caps, from the American sheet',
  typed: { figure: '27 lbf·ft' },
};

beforeAll(async () => {
  app = await startTestApp();
  workshop = await openWorkshop(app.services);
  const client = (name: Name): Promise<TestClient> =>
    signedInClient(app.address, `${name}@${name === 'hana' ? 'harbourlane' : 'lowmill'}.example`);
  clients = {
    ...{ nell: await client('nell'), tomasz: await client('tomasz'), imogen: await client('imogen') },
    ...{ ravi: await client('ravi'), oona: await client('oona'), hana: await client('hana') },
  };
  path = `/cars/${workshop.cars.ravis}/workings`;
  keptId = (await clients.tomasz.post(path, figure).expect(201)).body.id;
});
afterAll(() => app.close());

describe('a kept working', () => {
  it('comes back as it was typed, with who kept it and when', async () => {
    const { body } = await clients.imogen.get(`${path}/${keptId}`).expect(200);
    const kept = { ...figure, id: keptId, carId: workshop.cars.ravis, keptBy: 'Tomasz Brandt' };
    expect(body).toEqual({ ...kept, keptAt: expect.stringMatching(/^\d{4}-\d\d-\d\dT/) });
  });

  it('keeps what it was begun from, and is named by it on paper', async () => {
    const begun = { ...figure, typed: { ...figure.typed, of: 'AT18, edition 2: head nuts' } };
    const { body } = await clients.tomasz.post(path, begun).expect(201);
    expect(body.typed).toEqual(begun.typed);
    const { headers } = await clients.ravi.get(`${path}/${body.id}/pdf`).expect(200);
    expect(headers['content-disposition']).toBe('inline; filename="convert-at18-head-nuts-LM-C01.pdf"');
  });

  it('stands in the list of its car, the newest first, a page at a time', async () => {
    const list = `/cars/${workshop.cars.oonas}/workings`;
    for (const title of ['one', 'two', 'three']) {
      await clients.imogen.post(list, { ...figure, title }).expect(201);
    }
    const first = (await clients.oona.get(`${list}?limit=2`).expect(200)).body;
    const rest = (await clients.oona.get(`${list}?limit=2&cursor=${first.next}`).expect(200)).body;
    const titles = [...first.items, ...rest.items].map(({ title }: { title: string }) => title);
    expect(titles).toEqual(['three', 'two', 'one']);
    expect(rest.next).toBeNull();
  });

  it.each<[Name, number, number]>([
    ['nell', 200, 201],
    ['tomasz', 200, 201],
    ['imogen', 200, 201],
    ['ravi', 200, 403],
    ['oona', 404, 403],
    ['hana', 404, 404],
  ])('answers %s with %i, and keeping with %i', async (name, reads, keeps) => {
    const client = clients[name];
    expect((await client.get(path)).status).toBe(reads);
    expect((await client.get(`${path}/${keptId}`)).status).toBe(reads);
    expect((await client.get(`${path}/${keptId}/pdf`)).status).toBe(reads);
    expect((await client.post(path, figure)).status).toBe(keeps);
  });

  it('is not found with another car', async () => {
    await clients.nell.get(`/cars/${workshop.cars.oonas}/workings/${keptId}`).expect(404);
  });

  const many = Object.fromEntries(Array.from({ length: 101 }, (_, i) => [`f${i}`, '']));
  it.each<[string, object, string]>([
    ['an unknown working', { ...figure, working: 'gearbox' }, 'working'],
    ['what is no key', { ...figure, working: '../convert' }, 'working'],
    ['no title', { ...figure, title: ' ' }, 'title'],
    ['a case with an error', { ...figure, typed: { figure: '27 furlongs' } }, 'typed.figure'],
    ['a case with something missing', { ...figure, typed: {} }, 'typed'],
    ['a name that the working does not know', { ...figure, typed: { ...figure.typed, x: '1' } }, 'typed.x'],
    ['a number for a text', { ...figure, typed: { figure: 27 } }, 'typed.figure'],
    ['too many names', { ...figure, typed: many }, 'typed'],
    ['too much', { ...figure, typed: { figure: `27 lbf·ft${' '.repeat(20_000)}` } }, 'typed'],
    [
      'too long a thing to begin from',
      { ...figure, typed: { ...figure.typed, of: 'x'.repeat(121) } },
      'typed.of',
    ],
    ['two lines to begin from', { ...figure, typed: { ...figure.typed, of: 'AT18\nhead nuts' } }, 'typed.of'],
    ['a field more', { ...figure, keptBy: 'Nell' }, 'keptBy'],
  ])('is not made of %s', async (_case, body, field) => {
    const answer = await clients.tomasz.post(path, body).expect(400);
    expect(answer.body.errors[0].field).toBe(field);
  });

  it.each([['{"cursor":1}'], [Buffer.from('["yesterday","me"]').toString('base64url')]])(
    'has no page at the cursor %s',
    async (cursor) => {
      const answer = await clients.nell.get(`${path}?cursor=${encodeURIComponent(cursor)}`).expect(400);
      expect(answer.body.errors[0].field).toBe('cursor');
    },
  );
});

describe('the table of kept workings', () => {
  const sql = (statement: string): Promise<object[]> => app.db.sql(workshop.shop, statement);

  it.each([
    `UPDATE kept_workings SET title = 'other'`,
    'DELETE FROM kept_workings',
    'TRUNCATE kept_workings',
  ])('refuses %s', async (statement) => {
    await expect(sql(statement)).rejects.toThrow(/never changed or taken away/);
  });

  const insert = (typed: string): string =>
    `INSERT INTO kept_workings (id, shop_id, car_id, working, title, typed, kept_by)
     SELECT gen_random_uuid(), shop_id, car_id, working, title, ${typed}, kept_by FROM kept_workings LIMIT 1`;
  it.each([
    ['typed_is_a_case', `'["27 lbf·ft"]'`],
    ['typed_names', `(SELECT jsonb_object_agg(n, '') FROM generate_series(1, 101) AS n)`],
    ['typed_size', `jsonb_build_object('figure', repeat('x', 20480))`],
  ])('asks %s itself', async (constraint, typed) => {
    await expect(sql(insert(typed))).rejects.toThrow(constraint);
  });

  it('shows no rows to another shop', async () => {
    expect(await app.db.sql(workshop.otherShop, 'SELECT FROM kept_workings')).toEqual([]);
    expect(await sql('SELECT FROM kept_workings')).not.toEqual([]);
  });
});

describe('a working on paper', () => {
  const address = '/workings/convert/pdf?figure=27%20lbf%C2%B7ft';

  it.each(['', '&paper=letter'])('is a PDF that any signed-in person may have%s', async (paper) => {
    const answer = await clients.ravi.get(address + paper).expect(200);
    expect(answer.type).toBe('application/pdf');
    expect(answer.headers['content-disposition']).toBe('inline; filename="convert.pdf"');
    expect(answer.body.subarray(0, 5).toString()).toBe('%PDF-');
    const again = await clients.ravi.get(address + paper).expect(200);
    expect(again.body.equals(answer.body)).toBe(true);
  });

  it('says what it was begun from and who worked it out, in its words and its name', async () => {
    const answer = await clients.ravi.get(`${address}&of=AT18,%20edition%202:%20head%20nuts`).expect(200);
    expect(answer.headers['content-disposition']).toBe('inline; filename="convert-at18-head-nuts.pdf"');
    const [page] = await pagesOf(answer.body);
    expect(page).toContain('AT18, edition 2: head nuts');
    expect(page).toContain('Worked out by Ravi Lindqvist');
  });

  it.each([
    [`${address}&of=${'x'.repeat(121)}`, 400, 'of'],
    [`${address}&of=%00`, 400, 'of'],
    ['/workings/gearbox/pdf', 404, undefined],
    ['/workings/convert/pdf', 400, ''],
    ['/workings/convert/pdf?figure=27', 400, 'figure'],
    [`${address}&figure=2%20mm`, 400, 'figure'],
    [`${address}&colour=red`, 400, 'colour'],
    [`${address}&paper=a5`, 400, 'paper'],
  ])('answers %s with %i', async (path, status, field) => {
    const answer = await clients.ravi.get(path).expect(status);
    expect(answer.body.errors?.[0].field).toBe(field);
  });
});
