import 'server-only';
import { badField } from '@/lib/errors/app-error';
import { findRowSample } from '../../data/row-sample';
import type { WriteContext } from '../../operations/context';
import { holdPlanting } from '../plantings/hold-planting';

/** The planting that a record is about, held until the transaction ends; a row sample it names lies in that planting. */
export async function holdPlace(context: WriteContext, { plantingId, rowSampleId }: { plantingId: string; rowSampleId: string | null }) {
  const seen = await holdPlanting(context, plantingId);
  if (rowSampleId !== null) {
    const rowSample = await findRowSample(context.tx, { organisationId: context.actor.organisationId, rowSampleId });
    if (rowSample?.plantingId !== plantingId) throw badField('rowSampleId', 'This row sample is not in the planting. Open its sheet again.');
  }
  return seen;
}
