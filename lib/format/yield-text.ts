import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { quantityText } from './quantity-text';
import type { TextOptions } from './text-options';

/** Corn grain at standard moisture: `yieldText(184, 'us')` is "184 bu/ac", in metric "11.6 t/ha". */
export function yieldText(bushelsPerAcre: number, units: UnitSystem, options?: TextOptions): string {
  return quantityText(bushelsPerAcre, 'yield', units, units === 'us' ? 0 : 1, options);
}
