import type { RowSample, TapePlace } from '@/lib/agronomy/row-sample';

/** A row sample of 1/1000 acre in 30-inch rows between two marks, with what a test changes. */
export function rowSampleOf(changes: Partial<RowSample> = {}): RowSample {
  return {
    rowSampleId: 'row 1',
    stripId: null,
    crop: 'corn',
    rowSpacingInches: 30,
    seedsPerAcre: 34_000,
    intendedPlantsPerAcre: 32_000,
    lengthInches: 209.088,
    startEnd: 'mark',
    farEnd: 'mark',
    counts: [],
    tape: null,
    ...changes,
  };
}

/** Counts on the days from the first one on, one a day. */
export function countsFrom(firstDay: number, plants: readonly number[]): RowSample['counts'] {
  return plants.map((plantsUp, index) => ({ days: firstDay + index, plantsUp, plantsDoubtful: 0 }));
}

export function placesOf(positionsInches: readonly number[]): TapePlace[] {
  return positionsInches.map((positionInches) => ({ positionInches, kind: 'plant', firstSeen: null }));
}
