import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { lockField } from '../../data/field';
import type { ReadContext } from '../../operations/context';
import { findSeenField } from './find-seen-field';

/** The field with its farm, held until the transaction ends, so that nothing is planted in one that is being removed. */
export async function holdField(context: ReadContext, fieldId: string) {
  const held = await lockField(context.tx, { organisationId: context.actor.organisationId, fieldId });
  if (!held) throw new AppError('not-found');
  return findSeenField(context, fieldId);
}
