import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { settingSchema, type SettingInput } from '@/lib/schemas/setting';
import { findSetting, updateSetting } from '../../data/setting';
import { assertVersion } from '../../operations/assert-version';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { settingColumns } from './setting-columns';

async function service({ tx, actor, operation }: WriteContext, body: SettingInput): Promise<Written> {
  const { organisationId } = actor;
  const standing = await findSetting(tx, { organisationId, settingId: operation.thingId });
  if (!standing) throw new AppError('not-found');
  assertVersion(standing.version, operation.baseVersion);
  const changed = await updateSetting(tx, { organisationId, settingId: standing.id, version: standing.version, values: settingColumns(body) });
  // Somebody was quicker between the look and the change.
  if (!changed) throw new AppError('conflict', { standingVersion: standing.version + 1 });
  return { version: standing.version + 1 };
}

export const changeSetting = defineOperation({ kind: 'setting.change', version: 1, action: 'settings.write', body: settingSchema, service });
