import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { quantityText } from './quantity-text';
import type { TextOptions } from './text-options';

/** The distance between plants, and its SD: `spacingText(6.8, 'us')` is "6.8 in", in metric "17.3 cm". */
export function spacingText(inches: number, units: UnitSystem, options?: TextOptions): string {
  return quantityText(inches, 'spacing', units, 1, options);
}
