import { mapOutcome, type Outcome } from './outcome';
import { requiredNumber } from './required-number';
import { wilsonInterval } from './share-of-seed';
import { rowAreaAcres } from './stand';
import type { StandInterval } from './stand-interval-shape';

export type OneRow = {
  plantsHeld: number;
  lengthInches: number;
  rowSpacingInches: number;
  seedsPerAcre: number;
};

/**
 * How sure is the count of one length, when its seeds are known?
 *
 * Takes the plants the length holds, its length and row spacing in inches, and the seeds per acre (above 0).
 * Returns a 95 % interval in plants per acre, labeled counting only. Insufficient when the length holds more
 * plants than seeds. Throws ImpossibleInput for negative plants or a length that is not positive.
 * Method: Wilson's interval of the share of seeds, times seeds per acre.
 * It is about this length alone: how the rest of the field differs is not in it.
 * Example: 31 plants of 34 seeds in 1/1000 acre: 26,200 to 33,000.
 */
export function standOfOneRow(row: OneRow): Outcome<StandInterval> {
  requiredNumber(row.seedsPerAcre, 'seedsPerAcre', { above: 0 });
  const seedsInLength = row.seedsPerAcre * rowAreaAcres(row.lengthInches, row.rowSpacingInches);
  return mapOutcome(wilsonInterval(row.plantsHeld, seedsInLength), (shares) => ({
    plantsPerAcreLower: shares.shareLower * row.seedsPerAcre,
    plantsPerAcreUpper: shares.shareUpper * row.seedsPerAcre,
    level: 0.95,
    method: 'binomial-wilson',
    basis: 'counting-only',
    units: 1,
    student: null,
  }));
}
