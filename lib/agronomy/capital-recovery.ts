import { requiredCount } from './required-count';
import { requiredNumber } from './required-number';

/**
 * Which share of a sum pays it off, with interest, in equal yearly parts?
 *
 * Takes the yearly interest as a share (0 to 1) and whole years (1 to 100). Returns a share of the sum a year. Never
 * insufficient; throws ImpossibleInput outside those limits.
 * Equation: r(1 + r)ⁿ / ((1 + r)ⁿ − 1), and 1 / n without interest (ASABE EP496). Parts are paid at the end of each year.
 * It says nothing of taxes. Example: 7.5 % over 8 years: 0.170727; without interest 0.125.
 */
export function capitalRecoveryShare(interestShare: number, years: number): number {
  const interest = requiredNumber(interestShare, 'interestShare', { atLeast: 0, atMost: 1 });
  const count = requiredCount(years, 'years', { atLeast: 1, atMost: 100 });
  if (interest === 0) return 1 / count;
  // r / (1 − (1 + r)⁻ⁿ), in a form that keeps its digits where the interest is tiny.
  return interest / -Math.expm1(-count * Math.log1p(interest));
}
