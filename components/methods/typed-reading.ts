import { parseReading, readingIn, type ReadingRule } from '@/lib/schemas/reading';
import type { ReadingUnit } from '@/lib/schemas/vocabulary';
import type { TryAnswer } from './try-definition';

/** A length as the product's own forms read it, in the unit a formula needs; or what is wrong with it. */
export function typedReading(typed: string, field: string, rule: ReadingRule, unit: ReadingUnit): number | TryAnswer {
  const parsed = parseReading(typed, rule);
  return parsed.ok ? readingIn(parsed.reading, unit) : { kind: 'wrong', field, message: parsed.message };
}
