import 'server-only';
import sharp from 'sharp';
import { badField } from '@/lib/errors/app-error';

export type MadePhoto = { stored: Buffer; small: Buffer; width: number; height: number };

const sideMost = 2_000;
const smallSide = 320;
const pixelsMost = 40_000_000;

// Everything but the three kinds of picture that phones make is shut: other decoders read scripts, archives and more.
sharp.block({ operation: ['VipsForeignLoad'] });
sharp.unblock({ operation: ['VipsForeignLoadJpegBuffer', 'VipsForeignLoadPngBuffer', 'VipsForeignLoadWebpBuffer'] });

const begins: readonly (readonly [kind: string, test: (bytes: Uint8Array) => boolean])[] = [
  ['jpeg', (bytes) => bytes[0] === 0xff && bytes[1] === 0xd8 && bytes[2] === 0xff],
  ['png', (bytes) => [0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a].every((byte, index) => bytes[index] === byte)],
  ['webp', (bytes) => Buffer.from(bytes.subarray(0, 4)).toString('latin1') === 'RIFF' && Buffer.from(bytes.subarray(8, 12)).toString('latin1') === 'WEBP'],
];

/**
 * Reads a picture that was sent and makes it anew, in full and small: what is stored was written by us from its pixels, so
 * that neither a place in its metadata nor anything hung behind it comes along. Refuses what is no JPEG, PNG or WebP by
 * its first bytes, before any decoder sees it, and more pixels than a phone's camera makes.
 */
export async function makePhoto(bytes: Uint8Array): Promise<MadePhoto> {
  if (!begins.some(([, test]) => test(bytes))) throw badField('', 'This is no JPEG, PNG or WebP picture.');
  try {
    const picture = sharp(bytes, { limitInputPixels: pixelsMost, failOn: 'error', animated: false, pages: 1 });
    const { pages } = await picture.metadata();
    if ((pages ?? 1) > 1) throw new Error('moving');
    const { data: stored, info } = await picture.rotate().resize(sideMost, sideMost, { fit: 'inside', withoutEnlargement: true }).flatten({ background: 'white' }).jpeg({ quality: 82 }).toBuffer({ resolveWithObject: true });
    const small = await sharp(stored).resize(smallSide, smallSide, { fit: 'inside', withoutEnlargement: true }).jpeg({ quality: 75 }).toBuffer();
    return { stored, small, width: info.width, height: info.height };
  } catch {
    throw badField('', 'This picture could not be read. Take it again.');
  }
}
