import sharp, { type Sharp } from 'sharp';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openStage, type SheetStage } from '../testing/sheet-stage.js';

let stage: SheetStage;
beforeAll(async () => {
  stage = await openStage();
});
afterAll(() => stage.close());

const upload = (bytes: Buffer, name = 'photo.jpg') =>
  stage.clients.tomasz.post('/files').attach('file', bytes, { filename: name, contentType: 'image/jpeg' });

const countFiles = async (): Promise<number> => {
  const statement = 'SELECT count(*)::int AS count FROM files';
  return (await stage.app.db.sql<{ count: number }>(stage.workshop.shop, statement))[0]?.count ?? -1;
};

const picture = (width: number, height: number): Sharp =>
  sharp({ create: { width, height, channels: 3, background: '#335577' } });

describe('photos', () => {
  it('are made anew: a JPEG of at most 2000 px, without where it was taken', async () => {
    const taken = await picture(3000, 1500)
      .withExif({ IFD0: { Make: 'A camera' }, IFD3: { GPSLatitude: '51/1 30/1 0/1', GPSLatitudeRef: 'N' } })
      .jpeg()
      .toBuffer();
    expect((await sharp(taken).metadata()).exif).toBeDefined();
    const { status, body } = await upload(taken);
    expect([status, body.width, body.height]).toEqual([201, 2000, 1000]);
    const kept = await stage.clients.nell.get(`/files/${body.id}`);
    expect([kept.status, kept.headers['content-type']]).toEqual([200, 'image/jpeg']);
    const { format, exif, width } = await sharp(kept.body).metadata();
    expect({ format, exif, width }).toEqual({ format: 'jpeg', exif: undefined, width: 2000 });
    expect((await stage.clients.hana.get(`/files/${body.id}`)).status).toBe(404);
  });

  it.each<readonly [string, number, () => Promise<Buffer> | Buffer]>([
    ['an SVG', 415, () => Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"><script>1</script></svg>')],
    ['a text', 415, () => Buffer.from('not a photo')],
    ['a page with the head of a GIF', 415, () => Buffer.from('GIF89a<script>alert(1)</script>')],
    ['nothing', 415, () => Buffer.alloc(0)],
    ['a JPEG cut off', 400, async () => (await picture(400, 400).jpeg().toBuffer()).subarray(0, 300)],
    ['a bomb: 225 million pixels in a few kilobytes', 400, () => picture(15_000, 15_000).png().toBuffer()],
    ['more than 12 MB', 413, () => Buffer.alloc(12 * 1024 * 1024 + 1)],
  ])('refuse %s', async (_what, status, bytes) => {
    const before = await countFiles();
    const answer = await upload(await bytes());
    expect(answer.status).toBe(status);
    expect(await countFiles()).toBe(before);
  });

  it('refuse what is no form, two files at once, and another field', async () => {
    const { tomasz } = stage.clients;
    expect((await tomasz.post('/files', { file: 'x' })).status).toBe(415);
    const small = await picture(10, 10).png().toBuffer();
    const two = tomasz.post('/files').attach('file', small, 'a.png').attach('file', small, 'b.png');
    expect((await two).status).toBe(400);
    expect((await tomasz.post('/files').attach('picture', small, 'a.png')).status).toBe(400);
  });

  it('are given to a car’s owner only where they stand on a sheet of the car', async () => {
    const sheet = await stage.newSheet();
    const { body } = await upload(await picture(20, 20).png().toBuffer());
    expect((await stage.clients.ravi.get(`/files/${body.id}`)).status).toBe(404);
    const statement = `INSERT INTO entries (id, shop_id, sheet_id, step_id, round, content, verdict, reason, recorded_by,
        idempotency_key, body_hash)
      SELECT gen_random_uuid(), shop_id, sheet_id, id, 1, jsonb_build_object('kind', 'photo', 'shows', 'Timing marks',
        'fileId', $2::text), 'pass', 'A photo.', $3, gen_random_uuid(), repeat('0', 64)
      FROM steps WHERE sheet_id = $1 AND code = '2.4'`;
    await stage.app.db.sql(stage.workshop.shop, statement, [sheet.id, body.id, stage.ids.tomasz]);
    expect((await stage.clients.ravi.get(`/files/${body.id}`)).status).toBe(200);
    expect((await stage.clients.oona.get(`/files/${body.id}`)).status).toBe(404);
  });
});
