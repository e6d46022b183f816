import type { ReadingUnit } from '@/lib/schemas/vocabulary';

const words: Record<ReadingUnit, string> = {
  in: 'in', ft: 'ft', cm: 'cm', m: 'm', mm: 'mm',
  acres: 'acres', ha: 'ha',
  'per-acre': 'per acre', 'per-ha': 'per hectare',
  percent: '%',
  'bu/ac': 'bu/ac', 't/ha': 't/ha',
  lb: 'lb', kg: 'kg', lbf: 'lb of force', psi: 'psi', kPa: 'kPa', N: 'N',
};

/** The unit of a reading as it is said after the number: "per acre", "in", "%". */
export function readingUnitText(unit: ReadingUnit): string {
  return words[unit];
}
