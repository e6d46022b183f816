import 'server-only';
import { wallClock } from '../../clock';
import { insertSession, revokeSession } from '../../data/session';
import { database } from '../../database';
import { hashOfSecret, newSecret } from '../../secret';
import { sessionCookie, sessionDays } from '../../session/session-cookie';

/** Starts a session with a secret of its own; one that the browser held before ends, so that none can be planted. */
export async function startSession(personId: string): Promise<void> {
  const cookie = await sessionCookie();
  if (cookie.secret) await revokeSession(database(), { secretHash: hashOfSecret(cookie.secret) });
  const secret = newSecret();
  const expiresAt = new Date(wallClock.now().getTime() + sessionDays * 86_400_000).toISOString();
  await insertSession(database(), { secretHash: hashOfSecret(secret), personId, expiresAt });
  cookie.secret = secret;
  await cookie.save();
}
