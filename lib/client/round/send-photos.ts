import { apiPaths } from '@/lib/paths/paths';
import type { RoundStore } from './round-store';

type SendingPhotos = { store: RoundStore; fetch: typeof fetch; personId: string; organisationId: string };

const patienceMilliseconds = 60_000;

/** Uploads what waits, one at a time; the bytes go from the phone only on an answer that names the photo. */
export async function sendPhotos({ store, fetch, personId, organisationId }: SendingPhotos): Promise<void> {
  const photos = await store.photos.where('[personId+organisationId]').equals([personId, organisationId]).toArray();
  for (const photo of photos.filter((each) => each.state === 'kept')) {
    try {
      const response = await fetch(apiPaths.photo(organisationId, photo.photoId), {
        method: 'PUT', headers: { 'Content-Type': 'image/jpeg' }, body: photo.bytes, redirect: 'error', signal: AbortSignal.timeout(patienceMilliseconds),
      });
      if (!/json/i.test(response.headers.get('content-type') ?? '')) continue;
      const body = (await response.json()) as { photoId?: unknown; title?: unknown };
      if (response.ok && body.photoId === photo.photoId) await store.photos.delete(photo.photoId);
      else if (response.status === 422) await store.photos.update(photo.photoId, { state: 'needs-look', sentence: typeof body.title === 'string' ? body.title : '' });
    } catch {
      return;
    }
  }
}
