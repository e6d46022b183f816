import 'server-only';
import type { Database } from '@/db/connection';
import { can } from '@/lib/access/can';
import { AppError } from '@/lib/errors/app-error';
import { findPhoto } from '../../data/photo';
import { findPhotoFile } from '../../data/photo-file';
import type { FileStore } from '../../files/file-store';
import { withActor } from '../../operations/actor-context';
import { findSeenPlanting } from '../plantings/find-seen-planting';

type Asked = { organisationId: string; personId: string; photoId: string; now: () => Date; small: boolean };

/** The stored file of a photo, for whoever sees its planting; not found for everybody else and before it has come. */
export async function readPhoto(db: Database, store: FileStore, { small, ...asked }: Asked): Promise<Uint8Array> {
  const { organisationId, photoId } = asked;
  const file = await withActor(db, asked, async (context) => {
    if (!can(context.actor, 'observations.read')) throw new AppError('forbidden');
    const photo = await findPhoto(context.tx, { organisationId, id: photoId });
    if (!photo) throw new AppError('not-found');
    await findSeenPlanting(context, photo.plantingId);
    return findPhotoFile(context.tx, { organisationId, photoId });
  });
  const bytes = file && (await store.get(small ? file.smallKey : file.storedKey));
  if (!bytes) throw new AppError('not-found');
  return bytes;
}
