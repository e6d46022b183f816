import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { findRowSample } from '../../data/row-sample';
import type { ReadContext } from '../../operations/context';
import { findSeenPlanting } from '../plantings/find-seen-planting';

/** A row sample with its planting, field and farm, or not found for one the person does not see. */
export async function findSeenRowSample(context: ReadContext, rowSampleId: string) {
  const rowSample = await findRowSample(context.tx, { organisationId: context.actor.organisationId, rowSampleId });
  if (!rowSample) throw new AppError('not-found');
  return { rowSample, ...(await findSeenPlanting(context, rowSample.plantingId)) };
}
