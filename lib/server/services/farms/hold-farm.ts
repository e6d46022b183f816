import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { lockFarm } from '../../data/farm';
import type { ReadContext } from '../../operations/context';
import { findSeenFarm } from './find-seen-farm';

/** The farm, held until the transaction ends, so that no field is added to one that is being removed. */
export async function holdFarm(context: ReadContext, farmId: string) {
  const held = await lockFarm(context.tx, { organisationId: context.actor.organisationId, farmId });
  if (!held) throw new AppError('not-found');
  return findSeenFarm(context, farmId);
}
