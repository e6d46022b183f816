import 'server-only';
import { createHash } from 'node:crypto';
import type { Database } from '@/db/connection';
import { can } from '@/lib/access/can';
import { AppError, badField } from '@/lib/errors/app-error';
import { findPhoto } from '../../data/photo';
import { findPhotoFile, insertPhotoFile } from '../../data/photo-file';
import type { FileStore } from '../../files/file-store';
import { withActor } from '../../operations/actor-context';
import { findSeenPlanting } from '../plantings/find-seen-planting';
import { makePhoto } from './make-photo';

type Asked = { organisationId: string; personId: string; photoId: string; now: () => Date };

const sha256 = (bytes: Uint8Array) => createHash('sha256').update(bytes).digest('hex');

/**
 * Takes the file of a photo that was recorded: held against its hash, made anew, stored, and only then noted. Sent again,
 * it is answered as before. Whoever brings it must be able to see the planting; a file without its record comes too soon.
 */
export async function takePhotoFile(db: Database, store: FileStore, asked: Asked, bytes: Uint8Array): Promise<{ photoId: string }> {
  const { organisationId, photoId } = asked;
  const recorded = await withActor(db, asked, async (context) => {
    if (!can(context.actor, 'observations.write')) throw new AppError('forbidden');
    const photo = await findPhoto(context.tx, { organisationId, id: photoId });
    if (!photo) throw new AppError('follows-unknown');
    await findSeenPlanting(context, photo.plantingId);
    return { photo, file: await findPhotoFile(context.tx, { organisationId, photoId }) };
  });
  if (sha256(bytes) !== recorded.photo.sha256) throw badField('', 'These are not the bytes that were recorded for this photo. Take it again.');
  if (recorded.file) return { photoId };
  const made = await makePhoto(bytes);
  const [storedKey, smallKey] = [`${organisationId}/${photoId}.jpg`, `${organisationId}/${photoId}-small.jpg`];
  // Outside any transaction: a slow store must not hold a connection of the database.
  await store.put(storedKey, made.stored, 'image/jpeg');
  await store.put(smallKey, made.small, 'image/jpeg');
  await withActor(db, asked, ({ tx }) =>
    insertPhotoFile(tx, { organisationId, photoId, storedKey, smallKey, sha256: sha256(made.stored), bytes: made.stored.length, width: made.width, height: made.height }),
  );
  return { photoId };
}
