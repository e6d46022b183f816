import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { farmSchema, type FarmInput } from '@/lib/schemas/farm';
import { insertFarm } from '../../data/farm';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { originColumns } from '../../operations/origin-columns';

async function service(context: WriteContext, body: FarmInput): Promise<Written> {
  const added = await insertFarm(context.tx, { id: context.operation.thingId, ...body, ...originColumns(context) });
  if (!added) throw new AppError('operation-reused');
  return { version: 1 };
}

export const addFarm = defineOperation({ kind: 'farm.add', version: 1, action: 'farms.write', body: farmSchema, service });
