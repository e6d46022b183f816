import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { addFieldSchema, type AddFieldInput } from '@/lib/schemas/field';
import { insertField } from '../../data/field';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { originColumns } from '../../operations/origin-columns';
import { readingColumns } from '../../operations/reading-columns';
import { holdFarm } from '../farms/hold-farm';

async function service(context: WriteContext, body: AddFieldInput): Promise<Written> {
  const farm = await holdFarm(context, body.farmId);
  const added = await insertField(context.tx, {
    id: context.operation.thingId,
    farmId: farm.id,
    name: body.name,
    ...readingColumns('area', body.area),
    ...originColumns(context),
  });
  if (!added) throw new AppError('operation-reused');
  return { version: 1 };
}

export const addField = defineOperation({ kind: 'field.add', version: 1, action: 'farms.write', body: addFieldSchema, service });
