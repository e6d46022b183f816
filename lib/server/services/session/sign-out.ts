import 'server-only';
import { revokeSession } from '../../data/session';
import { database } from '../../database';
import { hashOfSecret } from '../../secret';
import { sessionCookie } from '../../session/session-cookie';

/** Ends this browser's session: its row is revoked, so that a copied cookie is worth nothing either. */
export async function signOut(): Promise<void> {
  const cookie = await sessionCookie();
  if (cookie.secret) await revokeSession(database(), { secretHash: hashOfSecret(cookie.secret) });
  cookie.destroy();
}
