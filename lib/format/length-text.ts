import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { quantityText } from './quantity-text';
import type { TextOptions } from './text-options';

/** A short length or a place on the tape: `lengthText(68, 'us')` is "68.0 in", in metric "172.7 cm". */
export function lengthText(inches: number, units: UnitSystem, options?: TextOptions): string {
  return quantityText(inches, 'length', units, 1, options);
}
