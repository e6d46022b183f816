import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { decimalText, minusSign } from './decimal-text';
import { centimetersPerInch } from './shown-in-units';

const inchesPerFoot = 12;

/** A length of row, to the inch or the centimeter: `rowLengthText(209.088, 'us')` is "17 ft 5 in", in metric "5.31 m". */
export function rowLengthText(inches: number, units: UnitSystem): string {
  if (units === 'metric') return `${decimalText((inches * centimetersPerInch) / 100, 2)} m`;
  if (!Number.isFinite(inches)) throw new RangeError(`A length to be shown must be finite, not ${inches}.`);
  const wholeInches = Math.round(Math.abs(inches));
  const feet = Math.floor(wholeInches / inchesPerFoot);
  const rest = wholeInches - feet * inchesPerFoot;
  const sign = inches < 0 && wholeInches > 0 ? minusSign : '';
  if (feet === 0) return `${sign}${rest} in`;
  return rest === 0 ? `${sign}${decimalText(feet, 0)} ft` : `${sign}${decimalText(feet, 0)} ft ${rest} in`;
}
