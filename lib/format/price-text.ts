import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { moneyText } from './money-text';
import { bushelsPerAcreInTonnePerHectare, hectaresPerAcre } from './shown-in-units';

/** A tonne of corn in bushels, by the same conversion as yields, so that yield times price agrees in both units. */
export const bushelsPerTonne = bushelsPerAcreInTonnePerHectare / hectaresPerAcre;

/** What corn brings: `priceText(4.2, 'us')` is "$4.20 a bushel", in metric "$165.33 a tonne". */
export function priceText(dollarsPerBushel: number, units: UnitSystem): string {
  return units === 'us'
    ? `${moneyText(dollarsPerBushel, { decimals: 2 })} a bushel`
    : `${moneyText(dollarsPerBushel * bushelsPerTonne, { decimals: 2 })} a tonne`;
}
