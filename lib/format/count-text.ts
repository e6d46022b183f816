import { decimalText } from './decimal-text';

/** A count with its noun: `countText(1, 'plant')` is "1 plant", `countText(1200, 'line')` "1,200 lines". */
export function countText(count: number, singular: string, plural = `${singular}s`): string {
  if (!Number.isInteger(count)) throw new RangeError(`A count must be a whole number, not ${count}.`);
  return `${decimalText(count, 0)} ${count === 1 ? singular : plural}`;
}
