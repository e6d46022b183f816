import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { findField } from '../../data/field';
import type { ReadContext } from '../../operations/context';
import { findSeenFarm } from '../farms/find-seen-farm';

/** A field with its farm, or not found for one the person does not see. */
export async function findSeenField(context: ReadContext, fieldId: string) {
  const field = await findField(context.tx, { organisationId: context.actor.organisationId, fieldId });
  if (!field) throw new AppError('not-found');
  return { field, farm: await findSeenFarm(context, field.farmId) };
}
