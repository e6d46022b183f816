import type { TrueEmergence } from './simulate-emergence';

export type SettingKey = 'raised' | 'pinned' | 'own-weight' | 'light-down';

export type SettingTruth = TrueEmergence & {
  key: SettingKey;
  /** Plants of the seeds planted, 1 being all. */
  standShare: number;
  /** Of the marks along the seed row, those on residue, 1 being all. */
  inRowCoverShare: number;
};

/**
 * What is true of the demo's four settings, beside which the tests hold what the product finds. Invented, in the range of
 * what trials of this kind report; no real equipment was measured.
 */
export const trialTruth: readonly SettingTruth[] = [
  { key: 'raised', halfUpDays: 12.4, spreadDays: 4.4, standShare: 0.88, lateShare: 0.09, inRowCoverShare: 0.72 },
  { key: 'pinned', halfUpDays: 11.9, spreadDays: 3.9, standShare: 0.895, lateShare: 0.07, inRowCoverShare: 0.4 },
  { key: 'own-weight', halfUpDays: 11.4, spreadDays: 3.2, standShare: 0.915, lateShare: 0.05, inRowCoverShare: 0.3 },
  { key: 'light-down', halfUpDays: 11.1, spreadDays: 2.9, standShare: 0.92, lateShare: 0.04, inRowCoverShare: 0.18 },
];

/** How far places differ by themselves: half-up days of blocks, of strips in a block, of rows in a strip. */
export const placeSdDays = { block: 0.5, strip: 0.35, row: 0.25 };

/** Lost seeds lie together: 1.6 in a row on average, against 1.1 if each were lost by itself. */
export const lossRunSeedsMean = 1.6;

/** How far cover differs from row to row beyond the chance of the marks. */
export const rowCoverSd = 0.06;

export const trialPlan = {
  plantedOn: '2026-05-07',
  seedsPerAcre: 34_000,
  rowSpacingInches: 30,
  /** 17 ft 5 in, 1/1000 acre of a 30-inch row. */
  rowLengthInches: 209,
  blocks: 4,
  rowSamplesPerStrip: 3,
  firstVisitDay: 8,
  lastVisitDay: 19,
  coverMarks: 50,
  /**
   * The planting's own limits. Late begins at 5 days instead of 7: with half the stand up on day 12.4 and visits to day 19,
   * a plant more than 7 days behind the first flush would come up when nobody comes to count any more.
   */
  lateLimits: { slowDays: 2, lateDays: 5, veryLateDays: 10 },
};
