import { NextResponse, type NextRequest } from 'next/server';
import { roundScriptHashes } from '@/lib/server/round/round-policy';

const development = process.env.NODE_ENV === 'development';

function policyWith(scripts: string): string {
  return [
    "default-src 'self'",
    `script-src 'self' ${scripts}${development ? " 'unsafe-eval'" : ''}`,
    // Charts and the framework set style attributes; a style cannot run a script.
    "style-src 'self' 'unsafe-inline'",
    "img-src 'self' data: blob:",
    "font-src 'self'",
    `connect-src 'self'${development ? ' ws:' : ''}`,
    "worker-src 'self'",
    "manifest-src 'self'",
    "object-src 'none'",
    "base-uri 'none'",
    "form-action 'self'",
    "frame-ancestors 'none'",
  ].join('; ');
}

/**
 * Gives each page the headers that keep others' scripts and frames out: a nonce for pages made at the request, the hashes
 * of its scripts for the field page, which is made at build time. It decides nothing about access, and the interface under
 * /api is outside it: a proxy cuts bodies over ten megabytes short without saying so.
 */
export function proxy(request: NextRequest) {
  const hashes = request.nextUrl.pathname === '/round' ? roundScriptHashes() : undefined;
  const policy = policyWith(hashes ?? `'nonce-${btoa(crypto.randomUUID())}'`);
  const headers = new Headers(request.headers);
  if (hashes === undefined) headers.set('content-security-policy', policy);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set('Content-Security-Policy', policy);
  response.headers.set('Referrer-Policy', 'no-referrer');
  response.headers.set('X-Content-Type-Options', 'nosniff');
  response.headers.set('Cross-Origin-Opener-Policy', 'same-origin');
  // Only the field page may ask where it is, for the place of a photo.
  response.headers.set('Permissions-Policy', `camera=(), microphone=(), geolocation=${hashes === undefined ? '()' : '(self)'}`);
  return response;
}

export const config = { matcher: ['/((?!api/|_next/static|_next/image|icon.svg|theme.js|round-worker.js|round.webmanifest|round-icon).*)'] };
