import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { farmSchema, type FarmInput } from '@/lib/schemas/farm';
import { updateFarm } from '../../data/farm';
import { assertVersion } from '../../operations/assert-version';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { findSeenFarm } from './find-seen-farm';

async function service(context: WriteContext, body: FarmInput): Promise<Written> {
  const { tx, actor, operation } = context;
  const standing = await findSeenFarm(context, operation.thingId);
  assertVersion(standing.version, operation.baseVersion);
  const changed = await updateFarm(tx, { organisationId: actor.organisationId, farmId: standing.id, version: standing.version, ...body });
  // Somebody was quicker between the look and the change.
  if (!changed) throw new AppError('conflict', { standingVersion: standing.version + 1 });
  return { version: standing.version + 1 };
}

export const changeFarm = defineOperation({ kind: 'farm.change', version: 1, action: 'farms.write', body: farmSchema, service });
