import 'server-only';
import { badField } from '@/lib/errors/app-error';
import { inviteSchema, type InviteInput } from '@/lib/schemas/invitation';
import { paths } from '@/lib/paths/paths';
import { listMembers } from '../../data/membership';
import { insertLink } from '../../data/one-time-link';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { hashOfSecret, linkSecretOf } from '../../secret';
import { assertFarmsKnown } from './assert-farms-known';

export const invitationDays = 14;

async function service(context: WriteContext, body: InviteInput): Promise<Written> {
  const { tx, actor, operation, clock } = context;
  const { organisationId } = actor;
  await assertFarmsKnown(context, body.role, body.farmIds);
  const members = await listMembers(tx, { organisationId });
  if (members.some((member) => member.email === body.email)) throw badField('email', 'This person is in the account already.');
  await insertLink(tx, {
    id: operation.thingId,
    secretHash: hashOfSecret(linkSecretOf(operation.operationId)),
    purpose: 'invitation',
    organisationId,
    email: body.email,
    name: body.name,
    role: body.role,
    farmIds: body.farmIds,
    createdBy: actor.personId,
    expiresAt: new Date(clock.now().getTime() + invitationDays * 86_400_000).toISOString(),
  });
  return { version: 1 };
}

export const invitePerson = defineOperation({
  kind: 'person.invite',
  version: 1,
  action: 'people.write',
  body: inviteSchema,
  service,
  // Worked out from the operation anew, so that a resent request shows the same link and no table holds it.
  reveal: (operation) => ({ path: paths.link(linkSecretOf(operation.operationId)) }),
});
