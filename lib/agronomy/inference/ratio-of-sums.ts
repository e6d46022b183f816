import { studentQuantile } from './student-t';

export type RatioOfSums = { ratio: number; standardError: number; degreesOfFreedom: number; reach: number };

/**
 * What is the ratio of two sums over places, and how sure is it from how the places differ?
 *
 * Takes at least two places, each with an amount and a size above 0, which its caller has checked. Returns the ratio, its
 * standard error and the half width of the 95 % t interval. Never insufficient; throws nothing of its own.
 * Method: R = Σy / Σa, standard error √(Σ(y − R a)² / (n − 1) / n) / mean a (Cochran 1977, ratio estimator,
 * linearized); with equal sizes the mean and its standard error.
 * It leans toward too small a standard error where places are few and sizes very unequal. Example: 44, 19 and 51 marks of
 * 100, 50 and 100: 0.456.
 */
export function ratioOfSums(places: readonly { amount: number; size: number }[]): RatioOfSums {
  const count = places.length;
  const sizeMean = places.reduce((sum, place) => sum + place.size, 0) / count;
  const ratio = places.reduce((sum, place) => sum + place.amount, 0) / (sizeMean * count);
  const squares = places.reduce((sum, place) => sum + (place.amount - ratio * place.size) ** 2, 0);
  const standardError = Math.sqrt(squares / (count - 1) / count) / sizeMean;
  const degreesOfFreedom = count - 1;
  return {
    ratio,
    standardError,
    degreesOfFreedom,
    reach: studentQuantile(0.975, degreesOfFreedom) * standardError,
  };
}
