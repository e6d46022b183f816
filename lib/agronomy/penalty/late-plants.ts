import { requiredNumber } from '../required-number';

/** How many plants are late, as a share of 1, and how many days behind the first flush those are on average. */
export type LatePlants = { lateShare: number; delayDays: number };

/**
 * Are these late plants possible?
 *
 * Takes a share from 0 to 1 and a delay of 0 days or more; returns them. Never insufficient; throws
 * ImpossibleInput otherwise. Example: a quarter of the plants, 11 days late.
 */
export function requiredLatePlants(late: LatePlants): LatePlants {
  requiredNumber(late.lateShare, 'lateShare', { atLeast: 0, atMost: 1 });
  requiredNumber(late.delayDays, 'delayDays', { atLeast: 0 });
  return late;
}

/** Whether there is nothing late, which is every study's own even check: no loss. */
export function isEvenStand(late: { lateShare: number; delayDays: number }): boolean {
  return late.lateShare === 0 || late.delayDays === 0;
}
