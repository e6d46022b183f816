import { bisected } from './bisected';
import { upperTailF } from './f-distribution';
import { studentQuantile } from './student-t';
import { studentizedRangeQuantile } from './studentized-range';

/** What the trial will be held to: one pair among all, one pair against the reference, or any difference at all. */
export type PlannedTest = 'tukey' | 'holm' | 'any-difference';

/**
 * Which F must be exceeded for the planned test to speak at 5 %?
 *
 * Takes the test, the number of settings (2 or more) and the degrees of freedom of the error (above 0). Returns F: for
 * `tukey` and `holm` the square of the t a pair must exceed (on 1 degree of freedom), for `any-difference` the F of the
 * settings. Never insufficient; throws ImpossibleInput outside those limits.
 * Equation: tukey q²/2; holm t² at 0.05 / (settings − 1), its dearest step; any-difference F(0.95).
 * Example: two settings, 3 degrees of freedom: 10.128 by any of the three, the square of t = 3.182.
 */
export function criticalF(test: PlannedTest, settings: number, errorDf: number): number {
  if (test === 'tukey') return studentizedRangeQuantile(0.05, settings, errorDf) ** 2 / 2;
  if (test === 'holm') return studentQuantile(1 - 0.025 / (settings - 1), errorDf) ** 2;
  return bisected((ratio) => upperTailF(ratio, settings - 1, errorDf) <= 0.05, 0.1, 1);
}
