const decimalAmount = /^-?\d+(\.\d+)?$/;

/** Money is carried as a decimal text and becomes a number only to be shown. Throws for anything else. */
export function moneyAmount(amount: string | number): number {
  if (typeof amount === 'string' && !decimalAmount.test(amount))
    throw new RangeError(`An amount of money must be a decimal number, not "${amount}".`);
  return Number(amount);
}
