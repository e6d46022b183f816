import type { RowCount, RowSample } from './row-sample';

/**
 * The counts of a row sample in order of time.
 *
 * Takes a row sample, returns its counts sorted by day, as a new list. Never insufficient, throws nothing.
 * Two counts of one moment keep the order they came in. Example: days 9, 8 come back as 8, 9.
 */
export function sortedCounts(sample: RowSample): RowCount[] {
  return [...sample.counts].sort((left, right) => left.days - right.days);
}
