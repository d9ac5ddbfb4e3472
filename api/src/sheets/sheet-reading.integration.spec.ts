import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { asSignedIn } from '../testing/small-sheet.js';
import { scenes } from '../testing/sheet-scenes.js';
import { openStage, workAll, type SheetStage } from '../testing/sheet-stage.js';

let stage: SheetStage;
beforeAll(async () => {
  stage = await openStage();
});
afterAll(() => stage.close());

describe('a sheet', () => {
  it('is sent again only when it changed', async () => {
    const hands = await stage.newSheet();
    const first = await hands.tomasz.sheet().expect(200);
    const { etag } = first.headers;
    expect(etag).toMatch(new RegExp(`^"${first.body.version}\\b`));
    const same = await hands.tomasz.sheet().set('If-None-Match', String(etag));
    expect([same.status, same.text]).toEqual([304, '']);
    await hands.tomasz.record('1.1', scenes.check()).expect(201);
    const changed = await hands.tomasz.sheet().set('If-None-Match', String(etag));
    expect([changed.status, changed.body.version]).toEqual([200, first.body.version + 1]);
  });

  it('stands in lists by state and car, in pages', async () => {
    const planned = await stage.small.layOut({ planned: true, carId: stage.workshop.cars.oonas });
    const { nell, oona } = stage.clients;
    const ids = async (query: string): Promise<string[]> =>
      (await nell.get(`/sheets?${query}`)).body.items.map(({ id }: { id: string }) => id);
    expect(await ids('state=planned')).toEqual([planned]);
    expect(await ids(`car=${stage.workshop.cars.oonas}`)).toEqual([planned]);
    expect(await ids('state=released')).toEqual([]);
    const first = (await nell.get('/sheets?limit=1')).body;
    const second = (await nell.get(`/sheets?limit=1&cursor=${first.next}`)).body;
    expect([first.items[0].id, second.items.length, second.next]).toEqual([planned, 1, null]);
    expect((await oona.get('/sheets')).body.items).toHaveLength(1);
    const car = (await oona.get(`/cars/${stage.workshop.cars.oonas}`)).body;
    expect(car.sheets.map(({ id }: { id: string }) => id)).toEqual([planned]);
  });
});

describe('a released sheet', () => {
  it('is printed as it was frozen, whatever became of people and cars since', async () => {
    const hands = await stage.newSheet();
    await workAll(hands, stage);
    await hands.tomasz.sign('built').expect(200);
    await hands.imogen.sign('countersigned').expect(200);
    await hands.nell.sign('released').expect(200);
    const { shop } = stage.workshop;
    await stage.app.db.sql(shop, `UPDATE people SET name = 'Somebody Else' WHERE name = 'Tomasz Brandt'`);
    await stage.app.db.sql(shop, `UPDATE cars SET engine_number = 'AT18-00000'`);
    const nell = asSignedIn(stage.workshop, 'nell', 'Nell Okafor', 'foreman');
    const { sheet, steps } = await stage.app.services.sheets.reading.details(nell, hands.id);
    expect([sheet.builder.name, sheet.engineNumber]).toEqual(['Tomasz Brandt', 'AT18-20417']);
    expect(steps[0]?.entries[0]?.by.name).toBe('Tomasz Brandt');
  });

  it('asks for the password again, and after ten wrong ones for patience', async () => {
    const hands = await stage.newSheet();
    const statuses: number[] = [];
    for (let tries = 0; tries < 11; tries += 1) {
      statuses.push((await hands.bea.sign('built', `wrong ${tries}`)).status);
    }
    expect(statuses).toEqual([...Array.from({ length: 10 }, () => 400), 429]);
    // By person: it is nobody else's trouble.
    expect((await hands.nell.sign('built', 'wrong')).status).toBe(400);
  });
});
