import { insufficient, value, type Outcome } from '../outcome';
import { residueMarksPercent, type ResidueMarks } from '../residue-marks';
import { ratioOfSums } from './ratio-of-sums';

export type ResidueCleared = {
  /** Cover of the field less cover in the row, in points of percent; below 0 where the row holds more. */
  points: number;
  places: number;
  interval: Outcome<{ pointsLower: number; pointsUpper: number; level: 0.95; method: 't-of-pairs' }>;
};

/**
 * How much less residue lies in the seed row than over the field?
 *
 * Takes places, each read both ways. Returns the mean difference in points of percent with a 95 % t interval.
 * Insufficient without a place; the interval below three. Throws ImpossibleInput for marks that cannot be.
 * Method: differences of pairs, field less row, mean ± t(n − 1) SD / √n.
 * What it does not tell: which part of the planter did it, nor what it is worth; residue that fell back counts as there.
 * Example: 60 less 20, 55 less 25 and 65 less 15 of 100 marks: 40 points, 15 to 65.
 */
export function residueCleared(
  places: readonly { field: ResidueMarks; inRow: ResidueMarks }[],
): Outcome<ResidueCleared> {
  const differences = places.map(({ field, inRow }) => ({
    amount: residueMarksPercent(field) - residueMarksPercent(inRow),
    size: 1,
  }));
  const count = places.length;
  if (count === 0) return insufficient('no-places', '1 place read both ways', 'none');
  const points = differences.reduce((sum, each) => sum + each.amount, 0) / count;
  if (count < 3) {
    return value({
      points,
      places: count,
      interval: insufficient('too-few-places', '3 places', `${count}`),
    });
  }
  const { reach } = ratioOfSums(differences);
  return value({
    points,
    places: count,
    interval: value({
      pointsLower: points - reach,
      pointsUpper: points + reach,
      level: 0.95,
      method: 't-of-pairs',
    }),
  });
}
