import type { SettingRow } from '../../data/setting';
import { readingOf } from '../../operations/reading-columns';

/** A residue setting as it leaves the server. */
export function settingView(setting: SettingRow) {
  return {
    id: setting.id,
    name: setting.name,
    phrase: setting.phrase,
    cleaner: setting.cleaner,
    wheels: setting.wheels,
    pressureDirection: setting.pressureDirection,
    pressure: readingOf(setting.pressureTyped, setting.pressureUnit, setting.pressureThousandths),
    workingDepth: readingOf(setting.workingDepthTyped, setting.workingDepthUnit, setting.workingDepthThousandths),
    adjustedFrom: setting.adjustedFrom,
    note: setting.note,
    version: setting.version,
  };
}
export type SettingView = ReturnType<typeof settingView>;
