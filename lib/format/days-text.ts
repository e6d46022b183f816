import { decimalText } from './decimal-text';
import type { TextOptions } from './text-options';

/** A span of days: `daysText(2.94)` is "2.9 days"; whole days with `{ decimals: 0 }`, "1 day". */
export function daysText(
  days: number,
  { withUnit = true, decimals = 1, signed = false }: TextOptions = {},
): string {
  const number = decimalText(days, decimals, { signed });
  if (!withUnit) return number;
  return `${number} ${/^[+\u2212]?1$/.test(number) ? 'day' : 'days'}`;
}
