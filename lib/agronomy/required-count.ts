import { ImpossibleInput } from './outcome';
import { requiredNumber } from './required-number';

/**
 * Is this a whole number that can be? Takes a value, the name of its field and its limits; returns the same number. It is
 * never insufficient; it throws ImpossibleInput, naming the field, for what is not whole or outside the limits.
 * Example: `requiredCount(4, 'blocks', { atLeast: 2 })` is 4; 4.5 is refused.
 */
export function requiredCount(
  candidate: number,
  field: string,
  limits: { atLeast?: number; atMost?: number },
): number {
  requiredNumber(candidate, field, limits);
  if (!Number.isInteger(candidate))
    throw new ImpossibleInput(`${field} is ${candidate}; it must be whole.`, field);
  return candidate;
}
