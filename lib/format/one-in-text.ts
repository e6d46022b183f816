import { decimalText } from './decimal-text';

/** A small chance as people say it: `oneInText(0.125)` is "1 in 8". Throws for a chance that is none. */
export function oneInText(chance: number): string {
  if (!(chance > 0 && chance <= 1)) throw new RangeError(`A chance lies above 0 and at most at 1, ${chance} does not.`);
  return `1 in ${decimalText(Math.round(1 / chance), 0)}`;
}
