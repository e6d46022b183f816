import 'server-only';
import { inTransaction } from '@/db/connection';
import { badField } from '@/lib/errors/app-error';
import { findPasswordHash, updatePassword } from '../../data/person';
import { revokeSessionsOfPerson } from '../../data/session';
import { database } from '../../database';
import { hashPassword, passwordMatches } from '../../session/password';
import type { SignedIn } from '../../session/current-person';
import type { Caller } from '../../http/person-route';
import { assertNotThrottled, noteFailure } from '../../session/throttle';
import { startSession } from './start-session';

/** Changes a password. Every session of the person ends at once; this browser starts a new one. */
export async function changePassword(person: SignedIn, input: { current: string; next: string }, caller: Caller): Promise<void> {
  const keys = [
    { kind: 'account' as const, key: person.email },
    { kind: 'address' as const, key: caller.socketAddress },
  ];
  await assertNotThrottled(keys);
  const standing = await findPasswordHash(database(), { personId: person.personId });
  if (!standing || !(await passwordMatches(input.current, standing))) {
    await noteFailure(keys);
    throw badField('current', 'This is not your present password.');
  }
  const passwordHash = await hashPassword(input.next);
  await inTransaction(database(), async (tx) => {
    await updatePassword(tx, { personId: person.personId, passwordHash });
    await revokeSessionsOfPerson(tx, { personId: person.personId });
  });
  await startSession(person.personId);
}
