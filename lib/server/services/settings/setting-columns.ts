import type { SettingInput } from '@/lib/schemas/setting';
import { readingColumns } from '../../operations/reading-columns';

/** The columns that a setting's body fills, the same when it is added and when it is changed. */
export function settingColumns({ pressure, workingDepth, ...plain }: SettingInput) {
  return { ...plain, ...readingColumns('pressure', pressure), ...readingColumns('workingDepth', workingDepth) };
}
