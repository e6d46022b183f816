import type { UnitSystem } from '@/lib/schemas/vocabulary';
import type { Quantity } from './unit-name';

/** The international yard and pound agreement of 1959 makes a foot 0.3048 m, hence 4,046.8564224 square metres an acre. */
export const hectaresPerAcre = 0.40468564224;
export const centimetersPerInch = 2.54;
/** One Mg/ha of corn in bushels of 56 lb an acre, as published grids convert it. */
export const bushelsPerAcreInTonnePerHectare = 15.93;

const metricPerUs: Record<Quantity, number> = {
  'plants-per-area': 1 / hectaresPerAcre,
  length: centimetersPerInch,
  spacing: centimetersPerInch,
  'row-length': 0.3048,
  area: hectaresPerAcre,
  yield: 1 / bushelsPerAcreInTonnePerHectare,
  'money-per-area': 1 / hectaresPerAcre,
  'degree-days': 5 / 9,
};

/** A quantity held in US units, as the number that is shown to a person who reads in `units`; not rounded. */
export function shownInUnits(valueUs: number, quantity: Quantity, units: UnitSystem): number {
  return units === 'us' ? valueUs : valueUs * metricPerUs[quantity];
}
