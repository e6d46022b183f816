import 'server-only';
import { getIronSession } from 'iron-session';
import { cookies } from 'next/headers';
import { environment } from '../environment';

/** A scout's session lasts a season: somebody signed out in a field without signal cannot sign in again. */
export const sessionDays = 200;

type Sealed = { secret?: string };

/** The sealed cookie. It carries a random secret and nothing else; the session itself is a row. */
export async function sessionCookie() {
  const { SESSION_SECRET, ORIGIN } = environment();
  return getIronSession<Sealed>(await cookies(), {
    password: SESSION_SECRET,
    cookieName: 'rowrise_session',
    ttl: sessionDays * 86_400,
    cookieOptions: { httpOnly: true, sameSite: 'lax', path: '/', secure: ORIGIN?.startsWith('https:') ?? false },
  });
}
