import 'server-only';
import { listSettings } from '../../data/setting';
import { listSettingsInUse } from '../../data/strip';
import type { ReadContext } from '../../operations/context';
import { settingView } from './setting-view';

/** The organisation's residue settings in the order they were added, and where each is compared. */
export async function readSettings({ tx, actor }: ReadContext) {
  const { organisationId } = actor;
  const used = await listSettingsInUse(tx, { organisationId });
  return (await listSettings(tx, { organisationId })).map((setting) => {
    const use = used.get(setting.id);
    return { ...settingView(setting), trials: use?.plantingIds.size ?? 0, locked: use?.locked ?? false };
  });
}
