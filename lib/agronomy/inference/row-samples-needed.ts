import { NORMAL_QUANTILE_975 } from '../constants';
import { requiredNumber } from '../required-number';
import { studentQuantile } from './student-t';

/**
 * How many row samples bring the 95 % interval of the stand within a wanted share of it?
 *
 * Takes the variation from row sample to row sample (SD over mean, 0 or more) and the wanted half width as a share of
 * the stand (above 0). Returns a whole number, at least 2. Never insufficient; throws ImpossibleInput otherwise.
 * Method: smallest n ≥ 2 with n ≥ (t(0.975; n − 1) × CV / E)² (Cochran 1977, ch. 4), t taken anew for every n. With the
 * normal 1.96 in its place n comes out short: 4 where 7 are needed. The search begins there, since t is never less.
 * It is about half the time enough and half the time not, since the next sample's own SD decides. Where row samples lie
 * in strips it counts strips. Example: CV 10 %, within 10 %: 7.
 */
export function rowSamplesNeeded(cv: number, withinShare: number): number {
  requiredNumber(cv, 'cv', { atLeast: 0 });
  requiredNumber(withinShare, 'withinShare', { above: 0 });
  let count = Math.max(2, Math.ceil(((NORMAL_QUANTILE_975 * cv) / withinShare) ** 2));
  while (count < ((studentQuantile(0.975, count - 1) * cv) / withinShare) ** 2) count += 1;
  return count;
}
