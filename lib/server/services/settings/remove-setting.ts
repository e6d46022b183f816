import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { removeSchema } from '@/lib/schemas/row-sample';
import { lockSetting, removeSetting as removeSettingRow } from '../../data/setting';
import { listSettingsInUse } from '../../data/strip';
import { assertVersion } from '../../operations/assert-version';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';

async function service({ tx, actor, operation }: WriteContext): Promise<Written> {
  const { organisationId } = actor;
  const standing = await lockSetting(tx, { organisationId, settingId: operation.thingId });
  if (!standing) throw new AppError('not-found');
  assertVersion(standing.version, operation.baseVersion);
  if ((await listSettingsInUse(tx, { organisationId })).has(standing.id)) {
    throw new AppError('in-use', { sentence: 'A trial compares this setting, so it stays.' });
  }
  const removed = await removeSettingRow(tx, { organisationId, settingId: standing.id, version: standing.version });
  if (!removed) throw new AppError('conflict', { standingVersion: standing.version + 1 });
  return { version: standing.version + 1 };
}

export const removeSetting = defineOperation({ kind: 'setting.remove', version: 1, action: 'settings.write', body: removeSchema, service });
