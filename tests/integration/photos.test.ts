import { createHash } from 'node:crypto';
import { mkdtemp, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { deflateSync } from 'node:zlib';
import sharp from 'sharp';
import { sql } from 'drizzle-orm';
import { v7 } from 'uuid';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { connect, inOrganisation, type Database } from '@/db/connection';
import type { FileStore } from '@/lib/server/files/file-store';
import { folderStore } from '@/lib/server/files/folder-store';
import { s3Store } from '@/lib/server/files/s3-store';
import { readPhoto } from '@/lib/server/services/photos/read-photo';
import { takePhotoFile } from '@/lib/server/services/photos/take-photo-file';
import { CountScene } from '../support/count-scene';
import { DecideScene } from '../support/decide-scene';
import { FakeS3 } from '../support/fake-s3';
import { makeTestDatabase, type TestDatabase } from '../support/test-database';

let own: TestDatabase;
let db: Database;
let scene: DecideScene;
let counted: CountScene;
let folder: string;
let store: FileStore;
let jpeg: Buffer;
const now = () => new Date('2026-05-20T15:00:00Z');

beforeAll(async () => {
  own = await makeTestDatabase();
  process.env.DATABASE_URL = own.appUrl;
  process.env.SESSION_SECRET = 'a secret of the tests, long enough to be one';
  db = connect(own.appUrl);
  scene = await new DecideScene(db).settle();
  counted = await new CountScene(scene).settle(['A-1']);
  folder = await mkdtemp(join(tmpdir(), 'rowrise-photos-'));
  store = folderStore(folder);
  jpeg = await sharp({ create: { width: 800, height: 600, channels: 3, background: '#7a5200' } })
    .jpeg()
    .withExif({ IFD0: { Make: 'CanaryCamera' }, IFD3: { GPSLatitudeRef: 'N', GPSLatitude: '41/1 30/1 0/1' } })
    .toBuffer();
});

afterAll(async () => {
  await db.$client.end();
  await own.drop();
  await rm(folder, { recursive: true, force: true });
});

const hash = (bytes: Uint8Array) => createHash('sha256').update(bytes).digest('hex');

async function record(bytes: Uint8Array, more: Record<string, unknown> = {}): Promise<string> {
  const photoId = v7();
  const place = { latitude: 41.5, longitude: -93.5, accuracyMeters: 9 };
  const body = { plantingId: counted.plantingId, rowSampleId: counted.row('A-1'), digId: null, takenOn: '2026-05-19', takenAt: '09:10', place, sha256: hash(bytes), bytes: Math.max(1, bytes.length), ...more };
  await scene.must('scout', 'photo.record', photoId, body);
  return photoId;
}

const asked = (photoId: string, who: 'scout' | 'agronomist' | 'grower' | 'neighbor' = 'scout') => ({ organisationId: scene.organisationId, personId: scene.people[who].id, photoId, now });
const take = (photoId: string, bytes: Uint8Array, into: FileStore = store) => takePhotoFile(db, into, asked(photoId), bytes);
const rowsOf = (photoId: string) =>
  inOrganisation(db, { organisationId: scene.organisationId }, async (tx) => (await tx.execute<{ sha256: string; stored_key: string; width: number; height: number }>(sql`select sha256, stored_key, width, height from photo_file where photo_id = ${photoId}`)).rows);

/** A PNG that says it is as large as it likes, and holds nothing. */
function pngOf(width: number, height: number): Buffer {
  const chunk = (kind: string, data: Buffer) => {
    const body = Buffer.concat([Buffer.from(kind), data]);
    const length = Buffer.alloc(4);
    length.writeUInt32BE(data.length);
    let crc = ~0;
    for (const byte of body) for (let bit = 0, c = (crc ^ byte) & 0xff; bit < 8; bit += 1, crc = bit === 8 ? crc : crc) {
      c = c & 1 ? 0xedb88320 ^ (c >>> 1) : c >>> 1;
      if (bit === 7) crc = (crc >>> 8) ^ c;
    }
    const sum = Buffer.alloc(4);
    sum.writeUInt32BE(~crc >>> 0);
    return Buffer.concat([length, body, sum]);
  };
  const header = Buffer.alloc(13);
  header.writeUInt32BE(width, 0);
  header.writeUInt32BE(height, 4);
  header.set([8, 0, 0, 0, 0], 8);
  return Buffer.concat([Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]), chunk('IHDR', header), chunk('IDAT', deflateSync(Buffer.alloc(1000))), chunk('IEND', Buffer.alloc(0))]);
}

describe('a photo', () => {
  it('is stored made anew, without what its metadata said, with a small one beside it, and matches its hash', async () => {
    const photoId = await record(jpeg);
    expect(await take(photoId, jpeg)).toEqual({ photoId });
    const [file] = await rowsOf(photoId);
    const stored = await readFile(join(folder, file?.stored_key ?? ''));
    expect([hash(stored), file?.width, file?.height]).toEqual([file?.sha256, 800, 600]);
    expect(stored.includes('CanaryCamera')).toBe(false);
    expect((await sharp(stored).metadata()).exif).toBeUndefined();
    const small = await readPhoto(db, store, { ...asked(photoId), small: true });
    expect((await sharp(small).metadata()).width).toBe(320);
  });

  it('sent again, and by twins at once, is stored once and answered alike', async () => {
    const photoId = await record(jpeg);
    const answers = await Promise.all(Array.from({ length: 8 }, () => take(photoId, jpeg)));
    expect(new Set(answers.map((answer) => JSON.stringify(answer)))).toEqual(new Set([JSON.stringify({ photoId })]));
    expect(await take(photoId, jpeg)).toEqual({ photoId });
    expect(await rowsOf(photoId)).toHaveLength(1);
  });

  it('waits for its record', async () => {
    await expect(take(v7(), jpeg)).rejects.toMatchObject({ code: 'follows-unknown' });
  });

  it('is refused with other bytes than were recorded', async () => {
    const photoId = await record(jpeg);
    await expect(take(photoId, Buffer.concat([jpeg, Buffer.from('x')]))).rejects.toMatchObject({ code: 'bad-input' });
    expect(await rowsOf(photoId)).toEqual([]);
  });

  it('keeps nothing that hangs behind the picture', async () => {
    const polyglot = Buffer.concat([jpeg, Buffer.from('<script>alert(1)</script>')]);
    const photoId = await record(polyglot);
    await take(photoId, polyglot);
    expect(Buffer.from(await readPhoto(db, store, { ...asked(photoId), small: false })).includes('script')).toBe(false);
  });

  it('is turned upright, whatever way the phone was held', async () => {
    const turned = await sharp({ create: { width: 400, height: 300, channels: 3, background: '#1d4f91' } }).withMetadata({ orientation: 6 }).jpeg().toBuffer();
    const photoId = await record(turned);
    await take(photoId, turned);
    expect((await rowsOf(photoId))[0]).toMatchObject({ width: 300, height: 400 });
  });

  const svg = Buffer.from('<svg xmlns="http://www.w3.org/2000/svg" width="10" height="10"><script>alert(1)</script></svg>');
  it.each([
    ['an SVG', () => svg],
    ['a GIF', () => Buffer.from('GIF89a\x01\x00\x01\x00\x00\x00\x00;', 'latin1')],
    ['text', () => Buffer.from('a count of plants')],
    ['half a JPEG', () => jpeg.subarray(0, 400)],
    ['an SVG behind the first bytes of a JPEG', () => Buffer.concat([Buffer.from([0xff, 0xd8, 0xff]), svg])],
    ['a picture that claims ten thousand million pixels', () => pngOf(100_000, 100_000)],
    ['a picture of 41 million pixels', () => pngOf(6_500, 6_500)],
  ])('is refused where it is %s', async (_, make) => {
    const bytes = make();
    const photoId = await record(bytes);
    await expect(take(photoId, bytes)).rejects.toMatchObject({ code: 'bad-input' });
    expect(await rowsOf(photoId)).toEqual([]);
  });

  it('is seen by whoever sees its planting and by nobody else', async () => {
    const photoId = await record(jpeg);
    await take(photoId, jpeg);
    const small = false;
    await expect(readPhoto(db, store, { ...asked(photoId, 'agronomist'), small })).resolves.toBeDefined();
    await expect(readPhoto(db, store, { ...asked(photoId, 'grower'), small })).resolves.toBeDefined();
    await expect(readPhoto(db, store, { ...asked(photoId, 'neighbor'), small })).rejects.toMatchObject({ code: 'not-found' });
    await expect(readPhoto(db, store, { ...asked(v7()), small })).rejects.toMatchObject({ code: 'not-found' });
    await expect(readPhoto(db, store, { ...asked(photoId), organisationId: v7(), small })).rejects.toMatchObject({ code: 'not-found' });
    await expect(takePhotoFile(db, store, asked(photoId, 'grower'), jpeg)).rejects.toMatchObject({ code: 'forbidden' });
  });

  it('goes into a store that several servers share; one that is away is busy and nothing is noted, and later it is taken', async () => {
    const fake = new FakeS3({ region: 'us-east-1', accessKeyId: 'ROWRISETEST', secretAccessKey: 'a secret of the tests' });
    const shared = s3Store({ endpoint: await fake.start(), bucket: 'photos', ...fake.keys });
    try {
      const photoId = await record(jpeg);
      fake.away = true;
      await expect(take(photoId, jpeg, shared)).rejects.toMatchObject({ code: 'busy' });
      expect(await rowsOf(photoId)).toEqual([]);
      fake.away = false;
      await take(photoId, jpeg, shared);
      expect([...fake.kept.keys()].sort()).toEqual([`/photos/${scene.organisationId}/${photoId}-small.jpg`, `/photos/${scene.organisationId}/${photoId}.jpg`]);
      expect(hash(await readPhoto(db, shared, { ...asked(photoId), small: false }))).toBe((await rowsOf(photoId))[0]?.sha256);
    } finally {
      await fake.stop();
    }
  });
});
