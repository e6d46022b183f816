import type { EmergenceCurve } from './emergence-curve';
import { emergencePercentile } from './emergence-percentile';
import { insufficient, value, type Outcome } from './outcome';

export type RowToRow = { rows: number; earliestDays: number; latestDays: number; apartDays: number; sdDays: number };

/**
 * How far apart were the rows of one strip in coming half up?
 *
 * Takes the curves of the row samples of one strip. Returns the earliest and the latest day half up, how far they lie
 * apart, and the SD between rows. Insufficient below two rows whose half-up day lies between two visits. Throws nothing.
 * Method: T50 of each row sample; sample SD with n − 1. A figure of its own, because it is the planter's row units and
 * the ground, not the spread within a row: pooling rows 0.8 days apart makes a spread of 3.2 days read 3.6.
 * Rows counted in other rounds differ by that too. Example: rows half up on days 11, 11.4 and 11.8 lie 0.8 apart, SD 0.4.
 */
export function rowToRowDays(curves: readonly EmergenceCurve[]): Outcome<RowToRow> {
  const halves = curves.flatMap((curve) => {
    const half = emergencePercentile(curve, 0.5);
    return half.kind === 'value' && half.value.bound === 'exact' ? [half.value.days] : [];
  });
  if (halves.length < 2) return insufficient('too-few-rows', '2 row samples half up between two visits', `${halves.length}`);
  const mean = halves.reduce((sum, days) => sum + days, 0) / halves.length;
  const squares = halves.reduce((sum, days) => sum + (days - mean) ** 2, 0);
  const [earliestDays, latestDays] = [Math.min(...halves), Math.max(...halves)];
  return value({ rows: halves.length, earliestDays, latestDays, apartDays: latestDays - earliestDays, sdDays: Math.sqrt(squares / (halves.length - 1)) });
}
