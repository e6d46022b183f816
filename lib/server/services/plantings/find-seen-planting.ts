import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { findField } from '../../data/field';
import { findPlanting } from '../../data/planting';
import type { ReadContext } from '../../operations/context';
import { findSeenFarm } from '../farms/find-seen-farm';

/** A planting with its field and farm, or not found: for one that is gone, another's, or on a farm the person does not see, alike. */
export async function findSeenPlanting(context: ReadContext, plantingId: string) {
  const { tx, actor } = context;
  const { organisationId } = actor;
  const planting = await findPlanting(tx, { organisationId, plantingId });
  if (!planting) throw new AppError('not-found');
  const field = await findField(tx, { organisationId, fieldId: planting.fieldId });
  if (!field) throw new AppError('not-found');
  return { planting, field, farm: await findSeenFarm(context, field.farmId) };
}
