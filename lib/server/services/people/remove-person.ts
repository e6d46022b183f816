import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { removeSchema } from '@/lib/schemas/row-sample';
import { setFarmsOfPerson, updateMembership } from '../../data/membership';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { assertNotLastOwner, findMember } from './find-member';

/** Ends a membership. It is read at every request, so the person is out from the next one on; what they entered stays. */
async function service(context: WriteContext): Promise<Written> {
  const { tx, actor, operation } = context;
  const { organisationId } = actor;
  const member = await findMember(context);
  if (member.role === 'owner') await assertNotLastOwner(context);
  const removed = await updateMembership(tx, {
    organisationId,
    personId: operation.thingId,
    version: member.version,
    values: { removed: true },
  });
  if (!removed) throw new AppError('conflict', { standingVersion: member.version + 1 });
  await setFarmsOfPerson(tx, { organisationId, personId: operation.thingId, farmIds: [] });
  return { version: member.version + 1 };
}

export const removePerson = defineOperation({ kind: 'person.remove', version: 1, action: 'people.write', body: removeSchema, service });
