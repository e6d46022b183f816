import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { removeSchema } from '@/lib/schemas/row-sample';
import { removeRowSample as removeRowSampleRow } from '../../data/row-sample';
import { hasVisits } from '../../data/visit';
import { assertVersion } from '../../operations/assert-version';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { holdRowSample } from './hold-row-sample';

async function service(context: WriteContext): Promise<Written> {
  const { tx, actor, operation } = context;
  const { organisationId } = actor;
  const { rowSample } = await holdRowSample(context, operation.thingId);
  assertVersion(rowSample.version, operation.baseVersion);
  if (await hasVisits(tx, { organisationId, rowSampleId: rowSample.id })) {
    throw new AppError('in-use', { sentence: 'This row sample has been counted, so it stays. Take its counts back instead.' });
  }
  const removed = await removeRowSampleRow(tx, { organisationId, rowSampleId: rowSample.id, version: rowSample.version });
  if (!removed) throw new AppError('conflict', { standingVersion: rowSample.version + 1 });
  return { version: rowSample.version + 1 };
}

export const removeRowSample = defineOperation({ kind: 'row-sample.remove', version: 1, action: 'plantings.write', body: removeSchema, service });
