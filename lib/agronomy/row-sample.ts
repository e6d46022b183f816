import type { LateLimits } from './late-limits';
import type { FirstSeen } from './plant-delays';
import type { RowEnd } from './plants-held';

/**
 * One place on the tape. `plant`, `late` (late by sight) and `double` (the second plant of a double) are each
 * one plant standing there; `missing` is a place where the scout saw that a plant is missing, and no plant.
 */
export type TapePlace = {
  positionInches: number;
  /** Which piece of a cut row it lies on, from 0; no distance is known from one piece to the next. One piece where not given. */
  segment?: number;
  kind: 'plant' | 'late' | 'double' | 'missing';
  firstSeen: FirstSeen | null;
};

/** One count: days since planting, all plants up so far, and how many of those are doubtful. */
export type RowCount = { days: number; plantsUp: number; plantsDoubtful: number };

/** One row sample as it was measured, with what its planting says; plain data, no dates and no units to guess. */
export type RowSample = {
  rowSampleId: string;
  /** Null for a spot count that lies in no strip. */
  stripId: string | null;
  /** `corn` gets everything; for other crops the penalties are insufficient. */
  crop: string;
  rowSpacingInches: number;
  /** Null where the seeding rate is not known. */
  seedsPerAcre: number | null;
  intendedPlantsPerAcre: number | null;
  lengthInches: number;
  startEnd: RowEnd;
  farEnd: RowEnd;
  /** In any order; the calculations sort them by day. */
  counts: readonly RowCount[];
  /** In ascending place; null without a tape sheet. */
  tape: readonly TapePlace[] | null;
  /** 2, 7 and 14 days unless the planting has its own. */
  lateLimits?: LateLimits;
};
