import { keptFileMark, keptFileVersion, type KeptFile } from '@/lib/schemas/kept-file';
import type { RoundStore } from './round-store';
import { envelopeOf } from './send-entries';

const base64 = (bytes: ArrayBuffer): string => {
  let text = '';
  const view = new Uint8Array(bytes);
  // In pieces, because a whole photo is more arguments than a call may have.
  for (let at = 0; at < view.length; at += 0x8000) text += String.fromCharCode(...view.subarray(at, at + 0x8000));
  return btoa(text);
};

/**
 * All that waits of one person on this phone, as a file that the office can read in: the entries as they would be sent,
 * the photos with their bytes. Nothing is taken away by saving it.
 */
export async function keptFile(store: RoundStore, person: { id: string; name: string } | null, savedAt: number): Promise<string> {
  const mine = <Each extends { personId: string }>(each: Each) => each.personId === person?.id;
  const entries = (await store.entries.orderBy('deviceSequence').toArray()).filter((entry) => mine(entry) && entry.state !== 'sent');
  const photos = (await store.photos.toArray()).filter(mine);
  const file: KeptFile = {
    what: keptFileMark,
    version: keptFileVersion,
    savedAt: new Date(savedAt).toISOString(),
    person: person ?? { id: '', name: '' },
    operations: entries.map(envelopeOf),
    photos: photos.map(({ photoId, organisationId, sha256, byteLength, bytes }) => ({ photoId, organisationId, sha256, byteLength, base64: base64(bytes) })),
  };
  return JSON.stringify(file);
}

export const keptFileName = (now: { date: string; time: string }) => `rowrise-kept-${now.date}-${now.time.replace(':', '')}.json`;
