import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { paths } from '@/lib/paths/paths';
import { removeSchema } from '@/lib/schemas/row-sample';
import { v7 } from 'uuid';
import { countOrganisationsOfPerson, findMembership } from '../../data/membership';
import { insertLink } from '../../data/one-time-link';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { hashOfSecret, linkSecretOf } from '../../secret';

const resetDays = 2;

/**
 * A link with which a member sets a new password. Only for people of this organisation alone: with it, one account's owner
 * could otherwise walk into another account that the same person belongs to.
 */
async function service({ tx, actor, operation, clock }: WriteContext): Promise<Written> {
  const personId = operation.thingId;
  const member = await findMembership(tx, { organisationId: actor.organisationId, personId });
  if (!member) throw new AppError('not-found');
  if ((await countOrganisationsOfPerson(tx, { personId })) !== 1) {
    throw new AppError('forbidden', { sentence: 'This person belongs to another account too, so this account cannot set a password for them.' });
  }
  await insertLink(tx, {
    id: v7(),
    secretHash: hashOfSecret(linkSecretOf(operation.operationId)),
    purpose: 'password-reset',
    organisationId: actor.organisationId,
    personId,
    name: member.personName,
    createdBy: actor.personId,
    expiresAt: new Date(clock.now().getTime() + resetDays * 86_400_000).toISOString(),
  });
  return {};
}

export const makeResetLink = defineOperation({
  kind: 'person.reset-link',
  version: 1,
  action: 'people.write',
  body: removeSchema,
  service,
  reveal: (operation) => ({ path: paths.link(linkSecretOf(operation.operationId)) }),
});
