import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { addSpotPlaceSchema, type AddSpotPlaceInput } from '@/lib/schemas/spot-count';
import { insertRowSamples, listRowSamples } from '../../data/row-sample';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { originColumns } from '../../operations/origin-columns';
import { holdPlanting } from '../plantings/hold-planting';
import { placeGuard } from '../row-samples/assert-place';
import { rowSampleColumns } from '../row-samples/row-sample-columns';

/** A place that the scout measures out on the spot: it lies in no strip, so no comparison of settings takes it in. */
async function service(context: WriteContext, body: AddSpotPlaceInput): Promise<Written> {
  const { tx, actor, operation } = context;
  const { planting } = await holdPlanting(context, body.plantingId);
  const place = { ...body, stripId: null, planterRow: null };
  const columns = { plantingId: planting.id, ...rowSampleColumns(place) };
  const standing = await listRowSamples(tx, { organisationId: actor.organisationId, plantingId: planting.id });
  const twin = standing.find((sample) => sample.id === operation.thingId);
  if (twin) {
    if (!Object.entries(columns).every(([key, value]) => twin[key as keyof typeof columns] === value)) throw new AppError('operation-reused');
    return { version: twin.version };
  }
  const assertPlace = await placeGuard(context, planting.id, standing);
  assertPlace(place, '');
  await insertRowSamples(tx, [{ id: operation.thingId, ...columns, ...originColumns(context) }]);
  return { version: 1 };
}

export const addSpotPlace = defineOperation({ kind: 'spot-place.add', version: 1, action: 'observations.write', body: addSpotPlaceSchema, service });
