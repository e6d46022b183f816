import 'server-only';
import { AppError } from '@/lib/errors/app-error';

/** Reads a raw body, stopping at the limit whatever the length header says. */
export async function readBytes(request: Request, bytesMost: number): Promise<Uint8Array> {
  if (Number(request.headers.get('content-length') ?? 0) > bytesMost) throw new AppError('too-large');
  const parts: Uint8Array[] = [];
  let bytes = 0;
  const reader = request.body?.getReader();
  for (let part = await reader?.read(); part && !part.done; part = await reader?.read()) {
    bytes += part.value.byteLength;
    if (bytes > bytesMost) {
      await reader?.cancel();
      throw new AppError('too-large');
    }
    parts.push(part.value);
  }
  return Buffer.concat(parts);
}
