import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { createLog } from '../log.js';
import { Database } from '../database/database.js';
import { createTestDatabase, type TestDatabase } from '../testing/test-database.js';
import { notifySheetChanged } from './notify-sheet-changed.js';
import { SheetEvents, type SheetListener } from './sheet-events.js';

let db: TestDatabase;
let here: SheetEvents;
let elsewhere: SheetEvents;
let database: Database;

beforeAll(async () => {
  db = await createTestDatabase();
  here = new SheetEvents(db.url, createLog('silent'));
  elsewhere = new SheetEvents(db.url, createLog('silent'));
  await Promise.all([here.start(), elsewhere.start()]);
  database = new Database(db.dataSource, (changes) => {
    here.publish(changes);
  });
});
afterAll(async () => {
  await Promise.all([here.stop(), elsewhere.stop()]);
  await db.drop();
});

const listener = () => ({
  changed: vi.fn<SheetListener['changed']>(),
  interrupted: vi.fn<SheetListener['interrupted']>(),
});
const shop = randomUUID();

describe('a change of a sheet', () => {
  it('reaches those who look at it, in every api process, once it is committed', async () => {
    const [sheetId, other] = [randomUUID(), randomUUID()];
    const [near, far, elsewise] = [listener(), listener(), listener()];
    here.subscribe(sheetId, near);
    elsewhere.subscribe(sheetId, far);
    elsewhere.subscribe(other, elsewise);
    await database.withShop(shop, (scope) => {
      notifySheetChanged(scope, sheetId, 7);
      expect(near.changed).not.toHaveBeenCalled();
      return Promise.resolve();
    });
    await vi.waitFor(() => {
      expect(far.changed).toHaveBeenCalledExactlyOnceWith({ sheetId, version: 7 });
      expect(near.changed).toHaveBeenCalledExactlyOnceWith({ sheetId, version: 7 });
    });
    expect(elsewise.changed).not.toHaveBeenCalled();
  });

  it('that was taken back is not told', async () => {
    const [sheetId, marker] = [randomUUID(), randomUUID()];
    const [never, last] = [listener(), listener()];
    here.subscribe(sheetId, never);
    here.subscribe(marker, last);
    const failing = database.withShop(shop, (scope) => {
      notifySheetChanged(scope, sheetId, 1);
      return Promise.reject(new Error('taken back'));
    });
    await expect(failing).rejects.toThrow('taken back');
    here.publish([{ sheetId: marker, version: 1 }]);
    await vi.waitFor(() => {
      expect(last.changed).toHaveBeenCalled();
    });
    expect(never.changed).not.toHaveBeenCalled();
  });

  it('is not told to who has gone', async () => {
    const sheetId = randomUUID();
    const [gone, stays] = [listener(), listener()];
    here.subscribe(sheetId, gone)();
    here.subscribe(sheetId, stays);
    here.publish([{ sheetId, version: 2 }]);
    await vi.waitFor(() => {
      expect(stays.changed).toHaveBeenCalled();
    });
    expect(gone.changed).not.toHaveBeenCalled();
  });

  it('is told again after the connection was lost, and who looked is told to read again', async () => {
    const sheetId = randomUUID();
    const seen = listener();
    elsewhere.subscribe(sheetId, seen);
    await db.sql(
      null,
      `SELECT pg_terminate_backend(pid) FROM pg_stat_activity WHERE application_name = 'second-spanner-events'
         AND datname = current_database()`,
    );
    await vi.waitFor(
      () => {
        expect(seen.interrupted).toHaveBeenCalled();
        here.publish([{ sheetId, version: 3 }]);
        expect(seen.changed).toHaveBeenCalledWith({ sheetId, version: 3 });
      },
      { timeout: 10_000, interval: 100 },
    );
  });
});
