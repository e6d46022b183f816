import { requiredCount } from './required-count';
import { requiredNumber } from './required-number';

export type Investment = {
  costDollars: number;
  returnDollarsPerYear: number;
  remainingValueDollars: number;
  years: number;
  interestShare: number;
};

/**
 * What is an investment worth today, all its years together?
 *
 * Takes the cost paid now in dollars (0 or more), the same return at the end of every year (below 0 where it loses), what it
 * is worth at the end (0 or more), whole years (1 to 100) and the yearly interest as a share (0 to 1). Returns dollars of
 * today: above 0 it earns more than the interest. Never insufficient; throws ImpossibleInput outside those limits.
 * Equation: −cost + return × (1 − (1 + r)⁻ⁿ) / r + remaining × (1 + r)⁻ⁿ; without interest the plain sum.
 * The return is one figure here; its uncertainty is for the caller to carry by its two ends.
 * Example: $1,000 now, $400 a year for 3 years at 10 %: −$5.26.
 */
export function netPresentValueDollars(investment: Investment): number {
  const cost = requiredNumber(investment.costDollars, 'costDollars', { atLeast: 0 });
  const yearly = requiredNumber(investment.returnDollarsPerYear, 'returnDollarsPerYear');
  const left = requiredNumber(investment.remainingValueDollars, 'remainingValueDollars', { atLeast: 0 });
  const years = requiredCount(investment.years, 'years', { atLeast: 1, atMost: 100 });
  const interest = requiredNumber(investment.interestShare, 'interestShare', { atLeast: 0, atMost: 1 });
  const logDiscount = -years * Math.log1p(interest);
  const yearsOfReturn = interest === 0 ? years : -Math.expm1(logDiscount) / interest;
  return -cost + yearly * yearsOfReturn + left * Math.exp(logDiscount);
}
