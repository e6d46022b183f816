import { sheetDelays } from './late-figures';
import { defaultLateLimits } from './late-limits';
import { settledClasses } from './late-share';
import { insufficient, value, type Outcome } from './outcome';
import type { RowSample } from './row-sample';
import type { AccountedRow, DigFinding } from './seed-account';
import { rowAreaAcres } from './stand';

/**
 * What does one tape sheet say about its seeds, as the account of seeds takes it?
 *
 * Takes a row sample and what was found at each of its missing places that was dug. Returns the seeds planned in the
 * length and its plants by class. Insufficient without a tape sheet or a seeding rate. Throws ImpossibleInput as
 * plantDelays and rowAreaAcres do.
 * Method: each plant is late against the first flush of its own row sample; slow is a label and stands with on time; very
 * late with late; the second plant of a double stands apart. Seeds are the rate times the area and half a seed for each
 * end that is a plant, since that plant is on the sheet whole while half of its space lies outside (own derivation, as in
 * plantsHeld).
 * What it does not tell: plants that died before the sheet was read are among the missing.
 * Example: 31 plants, 2 of them late, and 1 double on 1/1000 acre at 34,000 seeds: 34 seeds, 29 on time, 2 late, 1 double.
 */
export function accountedRow(sample: RowSample, digs: readonly DigFinding[]): Outcome<AccountedRow> {
  if (sample.tape === null) return insufficient('no-tape-sheet', '1 tape sheet', 'no tape sheet');
  if (sample.seedsPerAcre === null) {
    return insufficient('seeds-not-known', 'seeds per acre', 'no seeding rate');
  }
  const places = sample.tape.filter((place) => place.kind !== 'missing');
  const classes = settledClasses(sheetDelays(sample, sample.lateLimits ?? defaultLateLimits).plants);
  const planned = classes.filter((_, index) => places[index]?.kind !== 'double');
  const plantEnds = [sample.startEnd, sample.farEnd].filter((end) => end === 'plant').length;
  const area = rowAreaAcres(sample.lengthInches, sample.rowSpacingInches);
  return value({
    seeds: sample.seedsPerAcre * area + plantEnds / 2,
    onTime: planned.filter((each) => each === 'on-time' || each === 'slow').length,
    late: planned.filter((each) => each === 'late' || each === 'very-late').length,
    dayNotSeen: planned.filter((each) => each === 'unknown').length,
    doubles: places.length - planned.length,
    digs,
  });
}
