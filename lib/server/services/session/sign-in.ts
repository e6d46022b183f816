import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { wallClock } from '../../clock';
import { findPersonByEmail } from '../../data/person';
import { insertSession, revokeSession } from '../../data/session';
import { database } from '../../database';
import type { Caller } from '../../http/person-route';
import { hashOfSecret, newSecret } from '../../secret';
import { hashOfNobody, passwordMatches } from '../../session/password';
import { sessionCookie, sessionDays } from '../../session/session-cookie';
import { assertNotThrottled, forgetFailures, noteFailure } from '../../session/throttle';

/** Signs a person in. An unknown address and a wrong password take as long and answer alike. */
export async function signIn(input: { email: string; password: string }, caller: Caller): Promise<void> {
  const keys = [
    { kind: 'account' as const, key: input.email },
    { kind: 'address' as const, key: caller.socketAddress },
  ];
  await assertNotThrottled(keys);
  const found = await findPersonByEmail(database(), { email: input.email });
  const matches = await passwordMatches(input.password, found?.passwordHash ?? (await hashOfNobody()));
  if (!found || !matches || found.disabledAt) {
    await noteFailure(keys);
    throw new AppError('wrong-credentials');
  }
  await forgetFailures({ kind: 'account', key: input.email });
  await startSession(found.id);
}

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
