import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { removeSchema } from '@/lib/schemas/row-sample';
import { removePlanting as removePlantingRow } from '../../data/planting';
import { listRowSamples } from '../../data/row-sample';
import { findTrialOfPlanting, removeTrial } from '../../data/trial';
import { assertVersion } from '../../operations/assert-version';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { holdPlanting } from './hold-planting';

async function service(context: WriteContext): Promise<Written> {
  const { tx, actor, operation } = context;
  const { organisationId } = actor;
  const { planting } = await holdPlanting(context, operation.thingId);
  assertVersion(planting.version, operation.baseVersion);
  if ((await listRowSamples(tx, { organisationId, plantingId: planting.id })).length > 0) {
    throw new AppError('in-use', { sentence: 'This planting has row samples, so it stays. Remove those first.' });
  }
  const trial = await findTrialOfPlanting(tx, { organisationId, plantingId: planting.id });
  if (trial?.lockedAt) throw new AppError('in-use', { sentence: 'A locked trial lies in this planting, so it stays.' });
  if (trial) await removeTrial(tx, { organisationId, trialId: trial.id });
  const removed = await removePlantingRow(tx, { organisationId, plantingId: planting.id, version: planting.version });
  if (!removed) throw new AppError('conflict', { standingVersion: planting.version + 1 });
  return { version: planting.version + 1 };
}

export const removePlanting = defineOperation({ kind: 'planting.remove', version: 1, action: 'plantings.write', body: removeSchema, service });
