import { requiredNumber } from './required-number';

/**
 * What part of the ground does a band cleared along each row take up?
 *
 * Takes the width of the band (0 or more, at most the row spacing) and the row spacing (above 0), in inches. Returns
 * percent: the most that field cover can fall by clearing the rows. Never insufficient; throws ImpossibleInput otherwise.
 * Method: width / row spacing. Why it matters: a line over the rows sees only this part of what a row cleaner does, so
 * cover in the row is read apart. Example: 8 in of 30 in are 26.7 %, a quarter.
 */
export function clearedBandPercent(bandInches: number, rowSpacingInches: number): number {
  requiredNumber(rowSpacingInches, 'rowSpacingInches', { above: 0 });
  requiredNumber(bandInches, 'bandInches', { atLeast: 0, atMost: rowSpacingInches });
  return (100 * bandInches) / rowSpacingInches;
}
