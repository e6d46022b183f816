/** The longest side of what is sent; a leaf collar is still seen at it. */
export const photoSideMost = 1_600;
const bytesMost = 1_500_000;
const qualities = [0.8, 0.65, 0.5, 0.35];

export type ShrunkPhoto = { bytes: ArrayBuffer; sha256: string; byteLength: number };

/** A photo small enough to wait on a phone and to leave it over a weak signal, with the hash it will be held against. */
export async function shrinkPhoto(file: Blob): Promise<ShrunkPhoto> {
  const picture = await createImageBitmap(file, { imageOrientation: 'from-image' });
  try {
    const scale = Math.min(1, photoSideMost / Math.max(picture.width, picture.height));
    const canvas = document.createElement('canvas');
    canvas.width = Math.max(1, Math.round(picture.width * scale));
    canvas.height = Math.max(1, Math.round(picture.height * scale));
    const context = canvas.getContext('2d');
    if (!context) throw new Error('This browser draws no pictures.');
    context.drawImage(picture, 0, 0, canvas.width, canvas.height);
    for (const quality of qualities) {
      const shrunk = await new Promise<Blob | null>((done) => canvas.toBlob(done, 'image/jpeg', quality));
      if (!shrunk) break;
      if (shrunk.size > bytesMost && quality !== qualities.at(-1)) continue;
      const bytes = await shrunk.arrayBuffer();
      return { bytes, sha256: await sha256Of(bytes), byteLength: bytes.byteLength };
    }
    throw new Error('This picture could not be made smaller.');
  } finally {
    picture.close();
  }
}

export async function sha256Of(bytes: ArrayBuffer): Promise<string> {
  const digest = await crypto.subtle.digest('SHA-256', bytes);
  return [...new Uint8Array(digest)].map((byte) => byte.toString(16).padStart(2, '0')).join('');
}
