import type { UnitSystem } from '@/lib/schemas/vocabulary';

export type Quantity =
  | 'plants-per-area'
  | 'length'
  | 'spacing'
  | 'row-length'
  | 'area'
  | 'yield'
  | 'money-per-area'
  | 'degree-days';

const names: Record<Quantity, Record<UnitSystem, string>> = {
  'plants-per-area': { us: 'plants per acre', metric: 'plants per hectare' },
  length: { us: 'in', metric: 'cm' },
  spacing: { us: 'in', metric: 'cm' },
  'row-length': { us: 'ft', metric: 'm' },
  area: { us: 'acres', metric: 'ha' },
  yield: { us: 'bu/ac', metric: 't/ha' },
  'money-per-area': { us: 'per acre', metric: 'per hectare' },
  'degree-days': { us: '°F degree days', metric: '°C degree days' },
};

/** The unit a quantity is shown in, for labels and column heads: `unitName('yield', 'us')` is "bu/ac". */
export function unitName(quantity: Quantity, units: UnitSystem): string {
  return names[quantity][units];
}
