import { decimalText } from './decimal-text';
import { moneyAmount } from './money-amount';

export type MoneyOptions = {
  /** Whole dollars unless cents matter, as in a price a bushel. */
  decimals?: 0 | 2;
  signed?: boolean;
};

/** The sign stands before the dollar: `moneyText('-97.40')` is "−$97". */
export function moneyText(
  amount: string | number,
  { decimals = 0, signed = false }: MoneyOptions = {},
): string {
  return decimalText(moneyAmount(amount), decimals, { signed }).replace(/^([+\u2212]?)/, '$1$$');
}
