import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { readBytes } from './read-bytes';

/** The most a request body may hold: an import of 2,000 lines fits several times over. */
export const bodyBytesMost = 2_000_000;

/** Reads a JSON body, stopping at the limit whatever the length header says. */
export async function readJson(request: Request): Promise<unknown> {
  if (!/^application\/json\b/i.test(request.headers.get('content-type') ?? '')) throw new AppError('not-json');
  const bytes = await readBytes(request, bodyBytesMost);
  try {
    return JSON.parse(new TextDecoder('utf-8', { fatal: true }).decode(bytes));
  } catch {
    throw new AppError('bad-json');
  }
}
