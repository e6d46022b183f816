import { ImpossibleInput } from '../outcome';
import { requiredNumber } from '../required-number';
import { studentQuantile } from './student-t';

/** A part of the field with its row samples in plants per acre. */
export type CountedZone = { id: string; acres: number; plantsPerAcre: readonly number[] };

export type OneMoreRowSample = {
  zoneId: string;
  /** False where no count that is at all likely would turn the answer; null below two row samples, where any could. */
  couldTurn: boolean | null;
  /** What the field's mean could be after one more row sample here, in nineteen of twenty cases. */
  fieldMeanLower: number | null;
  fieldMeanUpper: number | null;
};

/**
 * Could one more row sample turn the answer, and where?
 *
 * Takes the zones with their acres (above 0) and row samples, and a function that says for a mean of the whole field in
 * plants per acre whether keeping wins. Returns one entry a zone, in order. Never insufficient as a whole: a zone with
 * fewer than two row samples answers null, for nobody knows how far another could lie from it. Throws ImpossibleInput for
 * no zone, acres that are not above 0, and counts that are negative or not finite.
 * Method: another row sample of n lies within m ± t(0.975; n − 1) × s × √(1 + 1/n) in nineteen of twenty cases; it moves its
 * zone's mean by its part 1/(n + 1) and the field's by the zone's share of the acres. The answer could turn where it
 * differs at either end from the one at the mean as it stands.
 * It looks one row sample ahead only, and assumes that the next place is found as the others were.
 * Example: counts of 20,000 and 22,000 on one zone, turning at 15,000: the mean can fall to 14,000, so it could.
 */
export function oneMoreRowSample(zones: readonly CountedZone[], keepWins: (fieldMean: number) => boolean): OneMoreRowSample[] {
  if (zones.length === 0) throw new ImpossibleInput('There is no zone.', 'zones');
  const acres = zones.reduce((sum, zone) => sum + requiredNumber(zone.acres, 'acres', { above: 0 }), 0);
  const summaries = zones.map((zone) => ({ zone, ...summaryOf(zone.plantsPerAcre) }));
  if (summaries.some(({ count }) => count === 0)) throw new ImpossibleInput('Every zone needs at least one row sample.', 'plantsPerAcre');
  const fieldMean = summaries.reduce((sum, { zone, mean }) => sum + (zone.acres / acres) * mean, 0);
  const now = keepWins(fieldMean);
  return summaries.map(({ zone, mean, sd, count }) => {
    if (count < 2) return { zoneId: zone.id, couldTurn: null, fieldMeanLower: null, fieldMeanUpper: null };
    const reach = studentQuantile(0.975, count - 1) * sd * Math.sqrt(1 + 1 / count);
    const meanWith = (next: number) => fieldMean + ((zone.acres / acres) * (Math.max(0, next) - mean)) / (count + 1);
    const [fieldMeanLower, fieldMeanUpper] = [meanWith(mean - reach), meanWith(mean + reach)];
    return { zoneId: zone.id, couldTurn: keepWins(fieldMeanLower) !== now || keepWins(fieldMeanUpper) !== now, fieldMeanLower, fieldMeanUpper };
  });
}

function summaryOf(counts: readonly number[]) {
  counts.forEach((each) => requiredNumber(each, 'plantsPerAcre', { atLeast: 0 }));
  const count = counts.length;
  const mean = counts.reduce((sum, each) => sum + each, 0) / count;
  const squares = counts.reduce((sum, each) => sum + (each - mean) ** 2, 0);
  return { count, mean, sd: Math.sqrt(squares / Math.max(1, count - 1)) };
}
