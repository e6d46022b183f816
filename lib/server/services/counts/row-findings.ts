import { countingEnded } from '@/lib/agronomy/counting-ended';
import { daysSincePlanting, type FieldTime } from '@/lib/agronomy/days-since-planting';
import type { ObservedCount, ObservedTapeSheet } from './read-observations';

/** What the counts and the tape sheet of one row sample say beside their numbers. */
export type RowFindings = {
  /** Nothing new at the last two visits. */
  countingEnded: boolean;
  /** The days at which two counts of one visit stand. */
  countedTwiceOn: string[];
  /** The days at which fewer plants stood than at the visit before. */
  fallingOn: string[];
  /** Days of counts that had not come yet when this was read: a phone whose clock is ahead. */
  datedAheadOn: string[];
  tapePlants: number | null;
  lastPlantsUp: number | null;
  /** Null without both. */
  tapeLessCounted: number | null;
};

/** Takes the standing observations of one row sample, counts in the order of visits, and the day it is there. */
export function rowFindings(planted: FieldTime, counts: readonly ObservedCount[], tapeSheet: ObservedTapeSheet | undefined, today: string): RowFindings {
  const used = counts.filter((count) => count.used);
  const visits = used.map((count) => ({
    days: daysSincePlanting(planted, { on: count.visitedOn, at: count.visitedAt }),
    plantsUp: count.plantsUp,
  }));
  const tapePlants = tapeSheet ? tapeSheet.places.filter((place) => place.kind !== 'missing').length : null;
  const lastPlantsUp = used.at(-1)?.plantsUp ?? null;
  return {
    countingEnded: countingEnded(visits),
    countedTwiceOn: [...new Set(counts.filter((count) => !count.used).map((count) => count.visitedOn))],
    fallingOn: used.filter((count, index) => count.plantsUp < (used[index - 1]?.plantsUp ?? 0)).map((count) => count.visitedOn),
    datedAheadOn: [...new Set(counts.filter((count) => count.visitedOn > today).map((count) => count.visitedOn))],
    tapePlants,
    lastPlantsUp,
    tapeLessCounted: tapePlants === null || lastPlantsUp === null ? null : tapePlants - lastPlantsUp,
  };
}
