import { z } from 'zod';
import { parseReading, readingIn, sameQuantity, type Reading, type ReadingRule } from './reading';
import { readingUnits } from './vocabulary';

/**
 * A reading on the wire: the text as typed and the unit the field stood in. The number is made from it here, by the one
 * parser, so that a sender cannot say one thing and mean another.
 */
export function readingSchema(rule: ReadingRule) {
  return z
    .object({ typed: z.string().max(60), unit: z.enum(readingUnits).optional() })
    .transform((sent, context): Reading => {
      const units = [rule.unit, ...(rule.otherUnits ?? [])];
      const unit = sent.unit && units.includes(sent.unit) ? sent.unit : rule.unit;
      const parsed = parseReading(sent.typed, unitRule(rule, unit));
      if (parsed.ok) return parsed.reading;
      context.addIssue({ code: 'custom', message: parsed.message });
      return z.NEVER;
    });
}

/** The same rule standing in another unit, with its limits converted and rounded outward to what reads well. */
export function unitRule(rule: ReadingRule, unit: ReadingRule['unit']): ReadingRule {
  if (unit === rule.unit) return rule;
  const otherUnits = [rule.unit, ...(rule.otherUnits ?? [])].filter((each) => each !== unit);
  if (!sameQuantity(rule.unit, unit)) return { ...rule, unit, otherUnits };
  const factor = readingIn({ unit: rule.unit, thousandths: 1000 }, unit);
  return {
    ...rule,
    unit,
    otherUnits,
    least: Number((rule.least * factor).toPrecision(3)),
    most: Number((rule.most * factor).toPrecision(3)),
  };
}
