import { decimalText } from './decimal-text';
import type { TextOptions } from './text-options';

/** A share from 0 to 1 as percent: `percentText(0.9044)` is "90 %". */
export function percentText(
  share: number,
  { withUnit = true, decimals = 0, signed = false }: TextOptions = {},
): string {
  const number = decimalText(share * 100, decimals, { signed });
  return withUnit ? `${number} %` : number;
}
