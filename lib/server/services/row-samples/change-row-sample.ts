import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { rowSampleSchema, type RowSampleInput } from '@/lib/schemas/row-sample';
import { listRowSamples, updateRowSample } from '../../data/row-sample';
import { hasVisits } from '../../data/visit';
import { askAbout } from '../../operations/ask-about';
import { assertVersion } from '../../operations/assert-version';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { placeGuard } from './assert-place';
import { changeQuestions } from './change-questions';
import { holdRowSample } from './hold-row-sample';
import { rowSampleColumns } from './row-sample-columns';

async function service(context: WriteContext, body: RowSampleInput): Promise<Written> {
  const { tx, actor, operation } = context;
  const { organisationId } = actor;
  const { rowSample, planting } = await holdRowSample(context, operation.thingId);
  assertVersion(rowSample.version, operation.baseVersion);
  const standing = await listRowSamples(tx, { organisationId, plantingId: planting.id });
  const assertPlace = await placeGuard(context, planting.id, standing.filter((each) => each.id !== rowSample.id));
  assertPlace(body, '');
  if (await hasVisits(tx, { organisationId, rowSampleId: rowSample.id })) askAbout(changeQuestions(rowSample, body), operation.confirmations);
  const changed = await updateRowSample(tx, { organisationId, rowSampleId: rowSample.id, version: rowSample.version, values: rowSampleColumns(body) });
  // Somebody was quicker between the look and the change.
  if (!changed) throw new AppError('conflict', { standingVersion: rowSample.version + 1 });
  return { version: rowSample.version + 1 };
}

export const changeRowSample = defineOperation({ kind: 'row-sample.change', version: 1, action: 'plantings.write', body: rowSampleSchema, service });
