import { ImpossibleInput } from './outcome';

type Limits = { atLeast?: number; above?: number; atMost?: number };

/**
 * Is this a number that can be? Takes a value, the name of the field it came from and its limits; returns
 * the same number. It is never insufficient; it throws ImpossibleInput, naming the field, for NaN, an
 * infinity or a number outside the limits. Example: `requiredNumber(30, 'rowSpacingInches', { above: 0 })` is 30.
 */
export function requiredNumber(candidate: number, field: string, limits: Limits = {}): number {
  if (typeof candidate !== 'number' || !Number.isFinite(candidate)) {
    throw new ImpossibleInput(`${field} is not a finite number.`, field);
  }
  if (limits.atLeast !== undefined && candidate < limits.atLeast) {
    throw new ImpossibleInput(`${field} is ${candidate}; it cannot be below ${limits.atLeast}.`, field);
  }
  if (limits.above !== undefined && candidate <= limits.above) {
    throw new ImpossibleInput(`${field} is ${candidate}; it must be above ${limits.above}.`, field);
  }
  if (limits.atMost !== undefined && candidate > limits.atMost) {
    throw new ImpossibleInput(`${field} is ${candidate}; it cannot be above ${limits.atMost}.`, field);
  }
  return candidate;
}
