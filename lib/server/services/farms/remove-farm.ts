import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { removeSchema } from '@/lib/schemas/row-sample';
import { removeFarm as removeFarmRow } from '../../data/farm';
import { listFields } from '../../data/field';
import { assertVersion } from '../../operations/assert-version';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { holdFarm } from './hold-farm';

async function service(context: WriteContext): Promise<Written> {
  const { tx, actor, operation } = context;
  const { organisationId } = actor;
  const farm = await holdFarm(context, operation.thingId);
  assertVersion(farm.version, operation.baseVersion);
  const fields = await listFields(tx, { organisationId });
  if (fields.some((each) => each.farmId === farm.id)) {
    throw new AppError('in-use', { sentence: 'This farm has fields, so it stays. Remove those first.' });
  }
  const removed = await removeFarmRow(tx, { organisationId, farmId: farm.id, version: farm.version });
  if (!removed) throw new AppError('conflict', { standingVersion: farm.version + 1 });
  return { version: farm.version + 1 };
}

export const removeFarm = defineOperation({ kind: 'farm.remove', version: 1, action: 'farms.write', body: removeSchema, service });
