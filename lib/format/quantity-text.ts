import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { decimalText } from './decimal-text';
import { shownInUnits } from './shown-in-units';
import type { TextOptions } from './text-options';
import { unitName, type Quantity } from './unit-name';

/** Converts, rounds and names the unit; the functions beside this file give each quantity its usual decimals. */
export function quantityText(
  valueUs: number,
  quantity: Quantity,
  units: UnitSystem,
  usualDecimals: number,
  { withUnit = true, decimals = usualDecimals, signed = false }: TextOptions = {},
): string {
  const number = decimalText(shownInUnits(valueUs, quantity, units), decimals, { signed });
  return withUnit ? `${number} ${unitName(quantity, units)}` : number;
}
