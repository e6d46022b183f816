import { namesItsUnit } from '@/lib/format/reading-text';
import type { ReadingRule } from '@/lib/schemas/reading';
import { unitOfPerson } from '@/lib/schemas/unit-of-person';
import type { ReadingUnit, UnitSystem } from '@/lib/schemas/vocabulary';

/** A reading while it is typed: the text, and the unit the field stands in when the text names none. */
export type ReadingDraft = { typed: string; unit: ReadingUnit };

/**
 * The draft of a standing reading comes back as it was typed, in the unit it was typed in, whoever reads it; an empty
 * one, or one that names its own unit, stands in the person's.
 */
export function readingDraft(reading: { typed: string; unit: ReadingUnit } | null, rule: ReadingRule, units: UnitSystem): ReadingDraft {
  const unit = unitOfPerson(rule, units);
  if (reading === null) return { typed: '', unit };
  return { typed: reading.typed, unit: namesItsUnit(reading.typed) ? unit : reading.unit };
}

/** What goes out for a reading that may stay empty. */
export const sentReading = (draft: ReadingDraft): ReadingDraft | null => (draft.typed.trim() === '' ? null : draft);
