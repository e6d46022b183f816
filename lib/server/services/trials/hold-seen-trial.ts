import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { findTrial } from '../../data/trial';
import type { ReadContext } from '../../operations/context';
import { holdPlanting } from '../plantings/hold-planting';

/** A standing trial with its planting, held until the transaction ends, or not found for one on a farm the person does not see. */
export async function holdSeenTrial(context: ReadContext, trialId: string) {
  const { tx, actor } = context;
  const { organisationId } = actor;
  const found = await findTrial(tx, { organisationId, trialId });
  if (!found) throw new AppError('not-found');
  const seen = await holdPlanting(context, found.plantingId);
  // Somebody may have drawn or locked it again while this one waited for the planting.
  const trial = await findTrial(tx, { organisationId, trialId });
  if (!trial) throw new AppError('not-found');
  return { trial, ...seen };
}
