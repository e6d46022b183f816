import 'server-only';
import { z } from 'zod';
import { AppError } from '@/lib/errors/app-error';
import { photoBytesMost } from '@/lib/schemas/field-limits';
import { wallClock } from '../clock';
import { database } from '../database';
import { files } from '../files/files';
import { readPhoto } from '../services/photos/read-photo';
import { takePhotoFile } from '../services/photos/take-photo-file';
import { currentPerson } from '../session/current-person';
import { parseIds } from './parse';
import { readBytes } from './read-bytes';
import { answering, respond } from './respond';
import { assertSameOrigin } from './same-origin';

type Context = { params: Promise<Record<string, string | string[] | undefined>> };

const addressSchema = z.object({ org: z.uuid(), photo: z.uuid() });
const taken = /^image\/(jpeg|png|webp)$/;

async function askedBy(context: Context) {
  const person = await currentPerson();
  if (!person) throw new AppError('not-signed-in');
  const { org, photo } = parseIds(addressSchema, await context.params);
  return { organisationId: org, photoId: photo, personId: person.personId, now: wallClock.now };
}

/** PUT: the raw bytes of a photo that was recorded. Under a cookie session, so only from our own pages. */
export const putPhoto = (request: Request, context: Context) =>
  answering(async () => {
    assertSameOrigin(request);
    const asked = await askedBy(context);
    if (!taken.test(request.headers.get('content-type') ?? '')) throw new AppError('not-a-picture');
    return respond(await takePhotoFile(database(), files(), asked, await readBytes(request, photoBytesMost)));
  });

/** GET: the stored picture, or the small one. Served so that nothing in it could ever run. */
export const getPhoto = (request: Request, context: Context) =>
  answering(async () => {
    const small = new URL(request.url).searchParams.get('size') === 'small';
    const bytes = await readPhoto(database(), files(), { ...(await askedBy(context)), small });
    return new Response(Buffer.from(bytes), {
      headers: {
        'Content-Type': 'image/jpeg',
        'Content-Disposition': 'inline',
        'X-Content-Type-Options': 'nosniff',
        'Content-Security-Policy': "default-src 'none'; sandbox",
        'Cross-Origin-Resource-Policy': 'same-origin',
        'Cache-Control': 'private, max-age=86400',
      },
    });
  });
