import { smallT } from '@/lib/agronomy/small-t-table';

export type PlacesSoFar =
  | { answer: 'insufficient'; places: number }
  | { answer: 'interval'; places: number; mean: number; lower: number; upper: number; /** How many plants per acre one more place is expected to take off each side. */ narrowerBy: number };

/** Fewer than these tell nothing of a field. Extension services ask for 5 (Tennessee) to 20 (North Dakota). */
export const placesWanted = 5;

/**
 * What the places of a spot count say so far of the whole field, and what one more is likely to add: the mean with its 95 %
 * interval from the spread between places, and how much narrower the interval is expected to be with one more like them.
 */
export function placesSoFar(plantsPerAcre: readonly number[]): PlacesSoFar {
  const places = plantsPerAcre.length;
  if (places < 2) return { answer: 'insufficient', places };
  const mean = plantsPerAcre.reduce((sum, each) => sum + each, 0) / places;
  const sd = Math.sqrt(plantsPerAcre.reduce((sum, each) => sum + (each - mean) ** 2, 0) / (places - 1));
  const half = (count: number) => (smallT(count - 1) * sd) / Math.sqrt(count);
  return { answer: 'interval', places, mean, lower: Math.max(0, mean - half(places)), upper: mean + half(places), narrowerBy: half(places) - half(places + 1) };
}
