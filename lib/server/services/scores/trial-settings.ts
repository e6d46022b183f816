import type { SettingRow } from '../../data/setting';
import type { CoreSamples } from './core-samples';
import { settingOfStrip } from './setting-of-strip';

export type TrialSetting = { setting: SettingRow; seriesIndex: number; isReference: boolean };

/**
 * The settings of a trial, planned or really run, the reference first and the others in the order they were made. The place
 * in this order is a setting's color, dash and marker on every screen.
 */
export function trialSettings({ trial, strips, settings }: Pick<CoreSamples, 'trial' | 'strips' | 'settings'>): TrialSetting[] {
  if (!trial) return [];
  const named = new Set(strips.flatMap((strip) => [strip.plannedSettingId, settingOfStrip(strip).settingId]));
  const isReference = (setting: SettingRow) => setting.id === trial.referenceSettingId;
  return settings
    .filter((setting) => named.has(setting.id))
    .sort((a, b) => Number(isReference(b)) - Number(isReference(a)))
    .map((setting, seriesIndex) => ({ setting, seriesIndex, isReference: isReference(setting) }));
}
