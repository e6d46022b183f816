import type { DrawnPlant } from '@/lib/schemas/drawn-plant';

/** The days between the first plants and the late ones; a plant later than the last of them is drawn no shorter. */
export type EarlinessScale = { firstDays: number | null; lastDays: number | null; earliness: (days: number) => number };

/**
 * Heights for the plants of one or more rows: tallest for the first to come up, shortest for the last that were not late.
 * Late plants have a head of their own, and would press all others against the top if the scale reached to them.
 */
export function earlinessScale(plants: readonly DrawnPlant[]): EarlinessScale {
  const days = (wanted: readonly DrawnPlant[]) => wanted.flatMap((plant) => (plant.days === null ? [] : [plant.days]));
  const all = days(plants);
  if (all.length === 0) return { firstDays: null, lastDays: null, earliness: () => 1 };
  const inTime = days(plants.filter((plant) => !plant.late));
  const firstDays = Math.min(...all);
  const lastDays = Math.max(...(inTime.length > 0 ? inTime : all));
  const range = lastDays - firstDays;
  return {
    firstDays,
    lastDays,
    earliness: (day) => (range === 0 ? 1 : Math.min(1, Math.max(0, 1 - (day - firstDays) / range))),
  };
}
