import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { environment } from '../environment';

/**
 * Route handlers have no guard of their own against requests from other sites. A browser says where a request comes
 * from in headers that a page cannot set; a request that says nothing is refused as well.
 */
export function assertSameOrigin(request: Request): void {
  if (request.headers.get('sec-fetch-site') === 'same-origin') return;
  const origin = request.headers.get('origin');
  const expected = environment().ORIGIN;
  const own = expected ? new URL(expected).host : request.headers.get('host');
  if (!origin || !URL.canParse(origin) || new URL(origin).host !== own) throw new AppError('other-origin');
}
