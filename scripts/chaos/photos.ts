import { createHash } from 'node:crypto';
import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import type pg from 'pg';
import sharp from 'sharp';
import type { Chance } from './chance';
import { httpRequest } from './http-request';
import type { Made } from './entry';

/** Sent is said by the answer that names it; until then its bytes stay on the phone. */
export type TakenPhoto = { photoId: string; bytes: Buffer; sha256: string; sent: boolean };
export type PhotoLedger = { made: number; lost: number; doubled: number; invented: number; altered: number };

const digest = (bytes: Buffer) => createHash('sha256').update(bytes).digest('hex');

/** A small picture that is no other's, as a phone has shrunk it. */
export async function takePhoto(photoId: string, chance: Chance): Promise<TakenPhoto> {
  const background = { r: chance.whole(0, 255), g: chance.whole(0, 255), b: chance.whole(0, 255) };
  const bytes = await sharp({ create: { width: 320, height: 240, channels: 3, background } }).jpeg({ quality: 80 }).toBuffer();
  return { photoId, bytes, sha256: digest(bytes), sent: false };
}

/** Uploads photos one at a time, each until an answer names it; anything else leaves its bytes on the phone. */
export async function uploadAll(photos: readonly TakenPhoto[], at: { addresses: readonly string[]; organisationId: string; cookie: string }, chance: Chance, over: () => boolean): Promise<number> {
  const waiting = [...photos];
  while (waiting.length > 0 && !over()) {
    const next = chance.pick(waiting);
    try {
      const answer = await httpRequest(`${chance.pick(at.addresses)}/api/o/${at.organisationId}/photos/${next.photoId}`, {
        method: 'PUT',
        headers: { 'Content-Type': 'image/jpeg', 'Sec-Fetch-Site': 'same-origin', Cookie: at.cookie },
        body: next.bytes,
        hangUpAfterMs: chance.happens(0.2) ? chance.whole(0, 300) : 20_000,
      });
      const told = (answer.headers['content-type'] ?? '').startsWith('application/json') && answer.status === 200 ? (JSON.parse(answer.text) as { photoId?: unknown }) : {};
      if (told.photoId === next.photoId) {
        next.sent = true;
        waiting.splice(waiting.indexOf(next), 1);
      }
      // Its entry may not have arrived yet.
      else await pause(200);
    } catch {
      await pause(100);
    }
  }
  return waiting.length;
}

/** Each photo has one record of its file, and what lies in the store under that key is what was recorded, and that picture. */
export async function countPhotos(client: pg.Client, organisationId: string, made: readonly Made[], photos: readonly TakenPhoto[], folder: string): Promise<PhotoLedger> {
  const ids = photos.filter(({ sent }) => sent).map(({ photoId }) => photoId);
  const { rows } = await client.query<{ photo_id: string; stored_key: string; small_key: string; sha256: string; bytes: number; width: number; height: number }>(
    'select photo_id, stored_key, small_key, sha256, bytes, width, height from photo_file where organisation_id = $1',
    [organisationId],
  );
  const ledger: PhotoLedger = { made: made.filter(({ entry }) => entry.kind === 'photo.record').length, lost: 0, doubled: rows.length - new Set(rows.map((row) => row.photo_id)).size, invented: 0, altered: 0 };
  ledger.lost = ids.filter((id) => !rows.some((row) => row.photo_id === id)).length;
  for (const row of rows) {
    const photo = photos.find(({ photoId }) => photoId === row.photo_id);
    if (!photo) {
      ledger.invented += 1;
      continue;
    }
    const stored = await readFile(join(folder, row.stored_key)).catch(() => undefined);
    const small = await readFile(join(folder, row.small_key)).catch(() => undefined);
    if (!stored || !small) ledger.lost += 1;
    else if (digest(stored) !== row.sha256 || stored.length !== row.bytes || row.width !== 320 || row.height !== 240 || !(await looksAlike(stored, photo.bytes))) ledger.altered += 1;
  }
  return ledger;
}

export const photosBalance = (ledger: PhotoLedger) => ledger.lost + ledger.doubled + ledger.invented + ledger.altered === 0;

/** The stored picture is encoded anew, so that its bytes differ; its color may differ by the rounding of that. */
async function looksAlike(a: Buffer, b: Buffer): Promise<boolean> {
  const [first, second] = await Promise.all([a, b].map((bytes) => sharp(bytes).stats()));
  return (first?.channels ?? []).every((channel, index) => Math.abs(channel.mean - (second?.channels[index]?.mean ?? -99)) < 3);
}
