import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';

let hashes: string | undefined;

/**
 * The hashes of the inline scripts of the field page, as a policy names them. The page is made once at build time and
 * can carry no nonce of a request; its scripts are read from the built file when the first phone asks. Undefined where
 * nothing is built, as in development.
 */
export function roundScriptHashes(): string | undefined {
  if (hashes !== undefined) return hashes;
  try {
    const html = readFileSync(join(process.cwd(), '.next', 'server', 'app', 'round.html'), 'utf8');
    const inline = [...html.matchAll(/<script(?![^>]*\ssrc=)[^>]*>([\s\S]*?)<\/script>/g)].map((match) => match[1] ?? '');
    hashes = inline.map((script) => `'sha256-${createHash('sha256').update(script).digest('base64')}'`).join(' ');
    return hashes;
  } catch {
    return undefined;
  }
}
