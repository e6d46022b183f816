import 'server-only';
import { AppError } from '@/lib/errors/app-error';

/** The most a request body may hold: an import of 2,000 lines fits several times over. */
export const bodyBytesMost = 2_000_000;

/** Reads a JSON body, stopping at the limit whatever the length header says. */
export async function readJson(request: Request): Promise<unknown> {
  if (!/^application\/json\b/i.test(request.headers.get('content-type') ?? '')) throw new AppError('not-json');
  if (Number(request.headers.get('content-length') ?? 0) > bodyBytesMost) throw new AppError('too-large');
  const parts: Uint8Array[] = [];
  let bytes = 0;
  const reader = request.body?.getReader();
  for (let part = await reader?.read(); part && !part.done; part = await reader?.read()) {
    bytes += part.value.byteLength;
    if (bytes > bodyBytesMost) {
      await reader?.cancel();
      throw new AppError('too-large');
    }
    parts.push(part.value);
  }
  try {
    return JSON.parse(new TextDecoder('utf-8', { fatal: true }).decode(Buffer.concat(parts)));
  } catch {
    throw new AppError('bad-json');
  }
}
