import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { quantityText } from './quantity-text';
import type { TextOptions } from './text-options';

/** Growing degree days held in °F: `degreeDaysText(17.5, 'us')` is "17.5 °F degree days". */
export function degreeDaysText(degreeDaysF: number, units: UnitSystem, options?: TextOptions): string {
  return quantityText(degreeDaysF, 'degree-days', units, 1, options);
}
