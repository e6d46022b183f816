import { moneyText } from './money-text';

/**
 * Dollars for a whole field inside a sentence, no finer than the sentence can know: to the nearest 100 from 1,000 on, to
 * the nearest 10 below. `fieldMoneyText(6039)` is "$6,000", `fieldMoneyText(412)` "$410".
 */
export function fieldMoneyText(dollars: number): string {
  const nearest = Math.abs(dollars) < 1000 ? 10 : 100;
  return moneyText(Math.round(dollars / nearest) * nearest);
}
