import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { removeSchema } from '@/lib/schemas/row-sample';
import { removeField as removeFieldRow } from '../../data/field';
import { listPlantings } from '../../data/planting';
import { assertVersion } from '../../operations/assert-version';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { holdField } from './hold-field';

async function service(context: WriteContext): Promise<Written> {
  const { tx, actor, operation } = context;
  const { organisationId } = actor;
  const { field } = await holdField(context, operation.thingId);
  assertVersion(field.version, operation.baseVersion);
  const plantings = await listPlantings(tx, { organisationId });
  if (plantings.some((each) => each.fieldId === field.id)) {
    throw new AppError('in-use', { sentence: 'This field has plantings, so it stays. Remove those first.' });
  }
  const removed = await removeFieldRow(tx, { organisationId, fieldId: field.id, version: field.version });
  if (!removed) throw new AppError('conflict', { standingVersion: field.version + 1 });
  return { version: field.version + 1 };
}

export const removeField = defineOperation({ kind: 'field.remove', version: 1, action: 'farms.write', body: removeSchema, service });
