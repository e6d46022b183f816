import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { settingSchema, type SettingInput } from '@/lib/schemas/setting';
import { listSettings, lockSetting, lockSettingNames, updateSetting, type SettingRow } from '../../data/setting';
import { listSettingsInUse } from '../../data/strip';
import { assertVersion } from '../../operations/assert-version';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { assertNameFree } from './assert-name-free';
import { settingColumns } from './setting-columns';

async function service({ tx, actor, operation }: WriteContext, body: SettingInput): Promise<Written> {
  const { organisationId } = actor;
  const standing = await lockSetting(tx, { organisationId, settingId: operation.thingId });
  if (!standing) throw new AppError('not-found');
  assertVersion(standing.version, operation.baseVersion);
  await lockSettingNames(tx, { organisationId });
  assertNameFree(body.name, await listSettings(tx, { organisationId }), standing.id);
  const used = (await listSettingsInUse(tx, { organisationId })).get(standing.id);
  if (used?.locked && isOtherOnThePlanter(standing, body)) {
    throw new AppError('in-use', { sentence: 'A locked trial compares this setting, so what it is on the planter stays. Add another setting for that; name, sentence and note may change.' });
  }
  const changed = await updateSetting(tx, { organisationId, settingId: standing.id, version: standing.version, values: settingColumns(body) });
  // Somebody was quicker between the look and the change.
  if (!changed) throw new AppError('conflict', { standingVersion: standing.version + 1 });
  return { version: standing.version + 1 };
}

const onThePlanter = [
  'cleaner', 'wheels', 'pressureDirection', 'pressureUnit', 'pressureThousandths', 'workingDepthUnit', 'workingDepthThousandths', 'adjustedFrom',
] as const;

/** Whether the edit makes it another setting, not only another name for the same one. */
function isOtherOnThePlanter(standing: SettingRow, body: SettingInput): boolean {
  const now = settingColumns(body);
  return onThePlanter.some((column) => standing[column] !== now[column]);
}

export const changeSetting = defineOperation({ kind: 'setting.change', version: 1, action: 'settings.write', body: settingSchema, service });
