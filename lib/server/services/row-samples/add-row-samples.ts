import 'server-only';
import { addRowSamplesSchema, type AddRowSamplesInput } from '@/lib/schemas/row-sample';
import { insertRowSamples, listRowSamples } from '../../data/row-sample';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { originColumns } from '../../operations/origin-columns';
import { holdPlanting } from '../plantings/hold-planting';
import { placeGuard } from './assert-place';
import { rowSampleColumns } from './row-sample-columns';

async function service(context: WriteContext, body: AddRowSamplesInput): Promise<Written> {
  const { tx, actor } = context;
  const { planting } = await holdPlanting(context, body.plantingId);
  const standing = await listRowSamples(tx, { organisationId: actor.organisationId, plantingId: planting.id });
  const assertPlace = await placeGuard(context, planting.id, standing);
  body.samples.forEach((sample, index) => assertPlace(sample, `samples.${index}.`));
  await insertRowSamples(tx, body.samples.map((sample) => ({ id: sample.id, plantingId: planting.id, ...rowSampleColumns(sample), ...originColumns(context) })));
  return { version: 1 };
}

export const addRowSamples = defineOperation({ kind: 'row-samples.add', version: 1, action: 'plantings.write', body: addRowSamplesSchema, service });
