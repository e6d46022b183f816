import { requiredNumber } from './required-number';

export type FieldCondition = {
  /** Sound sprouts under the crust, plants per acre; 0 where there are none or nobody dug. */
  soundSproutsPerAcre: number;
  crusted: boolean;
  damage: 'frost' | 'hail' | 'water' | null;
  daysSinceDamage: number | null;
};

export type FirstDo =
  | { answer: 'wait'; because: 'damage-too-fresh'; lookAgainInDaysFrom: number; lookAgainInDaysTo: number }
  | { answer: 'hoe'; because: 'sound-sprouts-under-crust' }
  | { answer: 'wait'; because: 'sound-sprouts-coming'; lookAgainInDaysFrom: number; lookAgainInDaysTo: number }
  | { answer: 'decide-now' };

/**
 * Is it too early to decide between keeping and replanting?
 *
 * Takes sound sprouts per acre found by digging (0 or more), whether the soil is crusted, and frost, hail or water with the
 * days since (0 or more). Returns what to do first. Never insufficient; throws ImpossibleInput for negative numbers.
 * Method: extension guides: after frost, hail or water look again in 3 to 5 days, when regrowth shows; sound sprouts under
 * a crust count, and a rotary hoe lets them through; without a crust they come by themselves.
 * Whether a hoe does more good than harm at this stage is for a look on site; it takes some plants along.
 * Example: hail yesterday: wait, look again in 2 to 4 days.
 */
export function firstLookAgain(condition: FieldCondition): FirstDo {
  requiredNumber(condition.soundSproutsPerAcre, 'soundSproutsPerAcre', { atLeast: 0 });
  if (condition.damage !== null) {
    const since = condition.daysSinceDamage === null ? 0 : requiredNumber(condition.daysSinceDamage, 'daysSinceDamage', { atLeast: 0 });
    if (since < 3) return { answer: 'wait', because: 'damage-too-fresh', lookAgainInDaysFrom: 3 - since, lookAgainInDaysTo: 5 - since };
  }
  if (condition.soundSproutsPerAcre === 0) return { answer: 'decide-now' };
  return condition.crusted
    ? { answer: 'hoe', because: 'sound-sprouts-under-crust' }
    : { answer: 'wait', because: 'sound-sprouts-coming', lookAgainInDaysFrom: 3, lookAgainInDaysTo: 5 };
}
