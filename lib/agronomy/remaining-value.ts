import { requiredNumber } from './required-number';

export type RemainingValue = { remainingDollars: number; lostDollars: number };

/**
 * What will a machine still be worth, and how much of its price is lost?
 *
 * Takes the list price when new and the price paid, in dollars (above 0), and the share of the list price that remains (0 to
 * 1), as a table of machinery costs gives it. Returns the value left and what is lost of the price paid, below 0 where more
 * is left than was paid. Never insufficient; throws ImpossibleInput outside those limits.
 * Equation: list price × share; price paid − that (Iowa State, machinery costs). The share is of the list price, not of the
 * price paid. Example: $110,000 list, $93,500 paid, 23 %: $25,300 left, $68,200 lost.
 */
export function remainingValue(
  listDollars: number,
  paidDollars: number,
  remainingShare: number,
): RemainingValue {
  const list = requiredNumber(listDollars, 'listDollars', { above: 0 });
  const paid = requiredNumber(paidDollars, 'paidDollars', { above: 0 });
  const remainingDollars = list * requiredNumber(remainingShare, 'remainingShare', { atLeast: 0, atMost: 1 });
  return { remainingDollars, lostDollars: paid - remainingDollars };
}
