import { requiredNumber } from '../required-number';
import { insufficient, value, type Outcome } from '../outcome';
import { studentQuantile } from './student-t';

/** A mean with what its own values say of its error; the interval holds 95 %. */
export type MeanInterval = {
  mean: number;
  standardError: number;
  degreesOfFreedom: number;
  lower: number;
  upper: number;
};

/**
 * What is the mean of these values, and within which limits does it lie?
 *
 * Takes numbers of one unit, one for each independent unit (a strip, a pair, a block). Returns the mean in that unit, its
 * standard error, degrees of freedom and 95 % interval. Insufficient with fewer than two values, and where all are equal,
 * since then nothing says how far another would lie. Throws ImpossibleInput for values that are not finite.
 * Equation: mean ± t(0.975; n − 1) × SD / √n. It assumes independent values; few of them lean on a normal shape.
 * Example: 1, 2 and 3: mean 2, interval −0.48 to 4.48.
 */
export function meanInterval(values: readonly number[], unitWord: string): Outcome<MeanInterval> {
  values.forEach((each, index) => requiredNumber(each, `${index}`));
  const count = values.length;
  if (count < 2) return insufficient('too-few-units', `2 ${unitWord}`, `${count}`);
  const mean = values.reduce((sum, each) => sum + each, 0) / count;
  const squares = values.reduce((sum, each) => sum + (each - mean) ** 2, 0);
  const standardError = Math.sqrt(squares / (count - 1) / count);
  if (standardError <= Math.abs(mean) * Number.EPSILON * count) {
    return insufficient('no-spread', `${unitWord} that differ`, 'all equal');
  }
  const reach = studentQuantile(0.975, count - 1) * standardError;
  return value({
    mean,
    standardError,
    degreesOfFreedom: count - 1,
    lower: mean - reach,
    upper: mean + reach,
  });
}
