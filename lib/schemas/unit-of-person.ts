import type { ReadingRule } from './reading';
import type { ReadingUnit, UnitSystem } from './vocabulary';

const metric: Partial<Record<ReadingUnit, ReadingUnit>> = {
  in: 'cm', ft: 'm', acres: 'ha', 'per-acre': 'per-ha', 'bu/ac': 't/ha', lb: 'kg', lbf: 'N', psi: 'kPa',
};

/** The unit a field stands in for a person: the rule's own, or its metric fellow where the rule takes that. */
export function unitOfPerson(rule: ReadingRule, units: UnitSystem): ReadingUnit {
  const fellow = metric[rule.unit];
  return units === 'metric' && fellow !== undefined && rule.otherUnits?.includes(fellow) ? fellow : rule.unit;
}
