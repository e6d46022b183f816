import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { findTrial } from '../../data/trial';
import type { ReadContext } from '../../operations/context';
import { findSeenPlanting } from '../plantings/find-seen-planting';

/** A standing trial with its planting, or not found for one on a farm the person does not see. */
export async function findSeenTrial(context: ReadContext, trialId: string) {
  const trial = await findTrial(context.tx, { organisationId: context.actor.organisationId, trialId });
  if (!trial) throw new AppError('not-found');
  return { trial, ...(await findSeenPlanting(context, trial.plantingId)) };
}
