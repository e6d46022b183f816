import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { changeMemberSchema, type ChangeMemberInput } from '@/lib/schemas/invitation';
import { setFarmsOfPerson, updateMembership } from '../../data/membership';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { assertFarmsKnown } from './assert-farms-known';
import { assertNotLastOwner, findMember } from './find-member';

async function service(context: WriteContext, body: ChangeMemberInput): Promise<Written> {
  const { tx, actor, operation } = context;
  const { organisationId } = actor;
  const member = await findMember(context);
  await assertFarmsKnown(context, body.role, body.farmIds);
  if (member.role === 'owner' && body.role !== 'owner') await assertNotLastOwner(context);
  const changed = await updateMembership(tx, {
    organisationId,
    personId: operation.thingId,
    version: member.version,
    values: { role: body.role },
  });
  if (!changed) throw new AppError('conflict', { standingVersion: member.version + 1 });
  await setFarmsOfPerson(tx, { organisationId, personId: operation.thingId, farmIds: body.farmIds });
  return { version: member.version + 1 };
}

export const changeRole = defineOperation({ kind: 'person.change-role', version: 1, action: 'people.write', body: changeMemberSchema, service });
