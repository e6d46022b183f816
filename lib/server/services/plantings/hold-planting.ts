import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { lockPlanting } from '../../data/planting';
import type { ReadContext } from '../../operations/context';
import { findSeenPlanting } from './find-seen-planting';

/** The planting, held until the transaction ends: its strips, zones and row samples are checked against each other. */
export async function holdPlanting(context: ReadContext, plantingId: string) {
  const held = await lockPlanting(context.tx, { organisationId: context.actor.organisationId, plantingId });
  if (!held) throw new AppError('not-found');
  return findSeenPlanting(context, plantingId);
}
