import 'server-only';
import { readFile } from 'node:fs/promises';
import { join } from 'node:path';

/**
 * The worker that keeps the field page on the phone, as the build left it. Without a build (`npm run dev`) there is none,
 * and the page then works with the network only. It is never cached by age, so that a new version is seen at once.
 */
export async function serveRoundWorker(): Promise<Response> {
  const headers = { 'Content-Type': 'text/javascript; charset=utf-8', 'Cache-Control': 'no-cache', 'X-Content-Type-Options': 'nosniff' };
  try {
    return new Response(await readFile(join(process.cwd(), '.next', 'round-worker.js')), { headers });
  } catch {
    return new Response('', { status: 404, headers: { ...headers, 'Cache-Control': 'no-store' } });
  }
}
