import { decimalText } from './decimal-text';

/** "p = 0.03", "p = 0.004", or "p less than 0.001". */
export function pValueText(p: number): string {
  if (!(p >= 0 && p <= 1)) throw new RangeError(`A probability lies between 0 and 1, ${p} does not.`);
  if (p < 0.001) return 'p less than 0.001';
  return `p = ${decimalText(p, p < 0.0095 ? 3 : 2)}`;
}
