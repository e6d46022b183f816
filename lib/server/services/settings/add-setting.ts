import 'server-only';
import { AppError } from '@/lib/errors/app-error';
import { settingSchema, type SettingInput } from '@/lib/schemas/setting';
import { insertSetting, listSettings, lockSettingNames } from '../../data/setting';
import type { WriteContext, Written } from '../../operations/context';
import { defineOperation } from '../../operations/define-operation';
import { originColumns } from '../../operations/origin-columns';
import { assertNameFree } from './assert-name-free';
import { settingColumns } from './setting-columns';

async function service(context: WriteContext, body: SettingInput): Promise<Written> {
  const { tx, actor } = context;
  const { organisationId } = actor;
  await lockSettingNames(tx, { organisationId });
  assertNameFree(body.name, await listSettings(tx, { organisationId }));
  const added = await insertSetting(tx, { id: context.operation.thingId, ...settingColumns(body), ...originColumns(context) });
  if (!added) throw new AppError('operation-reused');
  return { version: 1 };
}

export const addSetting = defineOperation({ kind: 'setting.add', version: 1, action: 'settings.write', body: settingSchema, service });
