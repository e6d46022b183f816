import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { findMembership, lockOwners } from '../../data/membership';
import type { WriteContext } from '../../operations/context';
import { assertVersion } from '../../operations/assert-version';

/** The member an operation is about, at the version it was made on; not found for somebody who is none. */
export async function findMember({ tx, actor, operation }: WriteContext) {
  const found = await findMembership(tx, { organisationId: actor.organisationId, personId: operation.thingId });
  if (!found) throw new AppError('not-found');
  assertVersion(found.version, operation.baseVersion);
  return found;
}

/** An account without an owner could never be opened again, so the last one stays. */
export async function assertNotLastOwner({ tx, actor, operation }: WriteContext): Promise<void> {
  const owners = await lockOwners(tx, { organisationId: actor.organisationId });
  if (owners.length === 1 && owners[0]?.personId === operation.thingId) {
    throw new AppError('in-use', { sentence: 'This is the only owner of the account. Make somebody else an owner first.' });
  }
}
