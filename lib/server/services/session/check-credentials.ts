import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { findPersonByEmail } from '../../data/person';
import { database } from '../../database';
import type { Caller } from '../../http/person-route';
import { hashOfNobody, passwordMatches } from '../../session/password';
import { assertNotThrottled, forgetFailures, noteFailure } from '../../session/throttle';

/**
 * Whose e-mail and password these are. An unknown address, a disabled account and a wrong password take as long and answer
 * alike; each failure counts against the account and against the socket address.
 */
export async function checkCredentials(input: { email: string; password: string }, caller: Caller): Promise<string> {
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
  return found.id;
}
