import 'server-only';
import { cache } from 'react';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { wallClock } from '../clock';
import { findSessionPerson, touchSession } from '../data/session';
import { database } from '../database';
import { hashOfSecret } from '../secret';
import { sessionCookie, sessionDays } from './session-cookie';

export type SignedIn = { personId: string; name: string; email: string; units: UnitSystem };

/** Who is signed in, looked up anew at every request, so that a revoked session or disabled account ends at once. */
export const currentPerson = cache(async (): Promise<SignedIn | undefined> => {
  const { secret } = await sessionCookie();
  if (!secret) return undefined;
  const now = wallClock.now();
  const secretHash = hashOfSecret(secret);
  const found = await findSessionPerson(database(), { secretHash, now: now.toISOString() });
  if (!found) return undefined;
  // Once a day is enough to keep a season's session alive without a write at every request.
  if (now.getTime() - Date.parse(found.lastSeenAt) > 86_400_000) {
    const expiresAt = new Date(now.getTime() + sessionDays * 86_400_000).toISOString();
    await touchSession(database(), { secretHash, expiresAt });
  }
  return { personId: found.personId, name: found.name, email: found.email, units: found.units };
});
