import { ImpossibleInput } from './outcome';
import { requiredNumber } from './required-number';

/** How many days after the first flush a plant is slow, late or very late. */
export type LateLimits = { slowDays: number; lateDays: number; veryLateDays: number };

/**
 * Our own classes: slow is a label and never a penalty; late and very late stand for one and two leaf collars
 * behind where neither leaf stage nor weather is known. They can be changed for a planting.
 */
export const defaultLateLimits: LateLimits = { slowDays: 2, lateDays: 7, veryLateDays: 14 };

/**
 * Are these limits in order?
 *
 * Takes three limits in days, 0 or more, ascending; returns them. Never insufficient; throws ImpossibleInput
 * for negative limits or limits out of order. Example: 2, 7 and 14 are in order.
 */
export function requiredLateLimits(limits: LateLimits): LateLimits {
  requiredNumber(limits.slowDays, 'slowDays', { atLeast: 0 });
  requiredNumber(limits.lateDays, 'lateDays', { atLeast: limits.slowDays });
  requiredNumber(limits.veryLateDays, 'veryLateDays', { atLeast: limits.lateDays });
  if (limits.lateDays === 0)
    throw new ImpossibleInput('A limit of 0 days makes every plant late.', 'lateDays');
  return limits;
}
