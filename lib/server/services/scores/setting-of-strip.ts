import type { SettingBasis } from '@/lib/schemas/scores';
import type { ListedStrip } from '../../data/strip';

/** Which setting a strip counts for: what was really run, else what was planned; none where it was lost. */
export function settingOfStrip(strip: ListedStrip): { settingId: string | null; basis: SettingBasis } {
  if (!strip.asPlanted) return { settingId: strip.plannedSettingId, basis: 'as-planned' };
  const { settingId } = strip.asPlanted;
  return { settingId, basis: settingId === null ? 'lost' : 'as-planted' };
}
