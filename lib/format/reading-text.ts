import type { ReadingUnit } from '@/lib/schemas/vocabulary';
import { readingUnitText } from './reading-unit-text';

/** Whether the typed text names its unit itself, as "17 ft 5 in" or "17'5" do. */
export const namesItsUnit = (typed: string) => /[a-z%'"′″]/i.test(typed);

/** A reading as it was typed, its unit said once: "30 in", "17 ft 5 in", "34,000 per acre". */
export function readingText(reading: { typed: string; unit: ReadingUnit }): string {
  return namesItsUnit(reading.typed) ? reading.typed : `${reading.typed} ${readingUnitText(reading.unit)}`;
}
