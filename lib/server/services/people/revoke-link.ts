import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { removeSchema } from '@/lib/schemas/row-sample';
import { revokeLink as revokeLinkRow } from '../../data/one-time-link';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';

async function service({ tx, actor, operation }: WriteContext): Promise<Written> {
  const revoked = await revokeLinkRow(tx, { organisationId: actor.organisationId, linkId: operation.thingId });
  if (!revoked) throw new AppError('not-found');
  return {};
}

export const revokeLink = defineOperation({ kind: 'link.revoke', version: 1, action: 'people.write', body: removeSchema, service });
