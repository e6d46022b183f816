import { readingDraft, sentReading, type ReadingDraft } from '@/components/form/reading-draft';
import { pressureRule, workingDepthRule } from '@/lib/schemas/setting';
import type { AdjustedFrom, CleanerKind, PressureDirection, ReadingUnit, UnitSystem, WheelKind } from '@/lib/schemas/vocabulary';

type Typed = { typed: string; unit: ReadingUnit };

/** A setting as the server gives it. */
export type SettingFacts = {
  id: string;
  version: number;
  name: string;
  phrase: string;
  cleaner: CleanerKind;
  wheels: WheelKind | null;
  pressureDirection: PressureDirection | null;
  pressure: Typed | null;
  workingDepth: Typed | null;
  adjustedFrom: AdjustedFrom | null;
  note: string | null;
};

export type SettingDraft = {
  name: string;
  phrase: string;
  cleaner: string;
  wheels: string;
  pressureDirection: string;
  pressure: ReadingDraft;
  workingDepth: ReadingDraft;
  adjustedFrom: string;
  note: string;
};

export function settingDraft(setting: SettingFacts | undefined, units: UnitSystem): SettingDraft {
  return {
    name: setting?.name ?? '',
    phrase: setting?.phrase ?? '',
    cleaner: setting?.cleaner ?? '',
    wheels: setting?.wheels ?? '',
    pressureDirection: setting?.pressureDirection ?? '',
    pressure: readingDraft(setting?.pressure ?? null, pressureRule, units),
    workingDepth: readingDraft(setting?.workingDepth ?? null, workingDepthRule, units),
    adjustedFrom: setting?.adjustedFrom ?? '',
    note: setting?.note ?? '',
  };
}

const orNull = (text: string) => (text.trim() === '' ? null : text.trim());

export function settingBody(draft: SettingDraft): Record<string, unknown> {
  return {
    name: draft.name,
    phrase: draft.phrase,
    cleaner: draft.cleaner,
    wheels: orNull(draft.wheels),
    pressureDirection: orNull(draft.pressureDirection),
    pressure: sentReading(draft.pressure),
    workingDepth: sentReading(draft.workingDepth),
    adjustedFrom: orNull(draft.adjustedFrom),
    note: orNull(draft.note),
  };
}
