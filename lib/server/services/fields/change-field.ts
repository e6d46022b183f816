import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { fieldSchema, type FieldInput } from '@/lib/schemas/field';
import { updateField } from '../../data/field';
import { assertVersion } from '../../operations/assert-version';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { readingColumns } from '../../operations/reading-columns';
import { findSeenField } from './find-seen-field';

async function service(context: WriteContext, body: FieldInput): Promise<Written> {
  const { tx, actor, operation } = context;
  const { field } = await findSeenField(context, operation.thingId);
  assertVersion(field.version, operation.baseVersion);
  const changed = await updateField(tx, {
    organisationId: actor.organisationId,
    fieldId: field.id,
    version: field.version,
    values: { name: body.name, ...readingColumns('area', body.area) },
  });
  // Somebody was quicker between the look and the change.
  if (!changed) throw new AppError('conflict', { standingVersion: field.version + 1 });
  return { version: field.version + 1 };
}

export const changeField = defineOperation({ kind: 'field.change', version: 1, action: 'farms.write', body: fieldSchema, service });
