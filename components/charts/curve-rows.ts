import type { CurveSeries } from './curve-series';

export type CurveRow = { day: number; values: Record<string, number> };

/** One row a day, over all series; a day on which a setting was not visited has no value of it. */
export function curveRows(series: readonly CurveSeries[], scale: number): CurveRow[] {
  const byDay = new Map<number, Record<string, number>>();
  for (const { id, points } of series)
    for (const { daysAfterPlanting, value } of points) {
      const values = byDay.get(daysAfterPlanting) ?? {};
      values[id] = value * scale;
      byDay.set(daysAfterPlanting, values);
    }
  return [...byDay.entries()].sort(([a], [b]) => a - b).map(([day, values]) => ({ day, values }));
}
