import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { findRowSample, lockRowSamples } from '../../data/row-sample';
import type { ReadContext } from '../../operations/context';
import { holdPlanting } from '../plantings/hold-planting';

/** A row sample with its planting, both held until the transaction ends, so that no count lands between look and change. */
export async function holdRowSample(context: ReadContext, rowSampleId: string) {
  const { tx, actor } = context;
  const { organisationId } = actor;
  const found = await findRowSample(tx, { organisationId, rowSampleId });
  if (!found) throw new AppError('not-found');
  const seen = await holdPlanting(context, found.plantingId);
  await lockRowSamples(tx, { organisationId, rowSampleIds: [rowSampleId] });
  // Somebody may have changed or removed it while this one waited.
  const rowSample = await findRowSample(tx, { organisationId, rowSampleId });
  if (!rowSample) throw new AppError('not-found');
  return { rowSample, ...seen };
}
