import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { decimalText } from './decimal-text';
import { shownInUnits } from './shown-in-units';
import type { TextOptions } from './text-options';
import { unitName } from './unit-name';

/** A field or a part of it, with a tenth only where there is one: "62 acres", "1 acre", "12.5 acres", "25.1 ha". */
export function areaText(
  acres: number,
  units: UnitSystem,
  { withUnit = true, decimals, signed = false }: TextOptions = {},
): string {
  const shown = shownInUnits(acres, 'area', units);
  const tenths = decimalText(shown, 1, { signed });
  const number =
    decimals === undefined ? tenths.replace(/\.0$/, '') : decimalText(shown, decimals, { signed });
  if (!withUnit) return number;
  return `${number} ${units === 'us' && number === '1' ? 'acre' : unitName('area', units)}`;
}
