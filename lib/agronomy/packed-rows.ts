/**
 * Many row samples laid one after another in typed arrays, for a whole season at once. Row `r` has the places from
 * `placesFrom[r]` up to, not including, `placesFrom[r + 1]`, and its visits likewise.
 */
export type PackedRows = {
  /** Places of the plants on the tape in inches, ascending within a row. */
  placesInches: Float64Array;
  /** One entry more than there are rows. */
  placesFrom: Uint32Array;
  /** Days since planting of each visit, ascending within a row. */
  visitDays: Float64Array;
  /** All plants up at that visit. */
  plantsUp: Float64Array;
  /** One entry more than there are rows. */
  visitsFrom: Uint32Array;
  /** Plants that each length holds, its ends and doubtful plants already settled. */
  plantsHeld: Float64Array;
  /** The part of an acre that each length stands for. */
  areaAcres: Float64Array;
  /** From the seeding rate of each row. */
  theoreticalSpacingInches: Float64Array;
};

/** What is known of a row; a figure whose bit is not set is insufficient and its place in the array says nothing. */
export const packedKnown = {
  spacingMean: 1,
  /** SD and, unless all plants share one place, CV. */
  spacingSd: 2,
  spacingCv: 4,
  placement: 8,
  days: 16,
  spread: 32,
  /** A tenth were up at the first visit: `daysTo10` is "by that day at the latest". */
  daysTo10AtLatest: 64,
  daysTo50AtLatest: 128,
  daysTo90AtLatest: 256,
} as const;

export type PackedFigures = {
  known: Uint16Array;
  plantsPerAcre: Float64Array;
  spacingInchesMean: Float64Array;
  spacingInchesSd: Float64Array;
  spacingCv: Float64Array;
  multiplesShare: Float64Array;
  singlesShare: Float64Array;
  missesShare: Float64Array;
  daysTo10: Float64Array;
  daysTo50: Float64Array;
  daysTo90: Float64Array;
  spreadDays: Float64Array;
};
