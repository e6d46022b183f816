import { SAME_NUMBER } from './constants';
import { ImpossibleInput, insufficient, value, type Outcome } from './outcome';
import { requiredNumber } from './required-number';

/**
 * How far is each plant from the one before it?
 *
 * Takes the places of the plants of one row in inches from the tape's zero, ascending (two plants may share a
 * place). Returns one spacing less than there are plants, 0 allowed. Never insufficient: one plant or none
 * have no spacing. Throws ImpossibleInput for places that are not finite, negative or out of order.
 * Method: differences. Rows are never bridged: take each row by itself and join the spacings.
 * The distance from a mark to the first plant is no spacing. Example: 0 2 17 gives 2 15.
 */
export function spacingsInches(positionsInches: readonly number[]): number[] {
  positionsInches.forEach((position) => requiredNumber(position, 'positionsInches', { atLeast: 0 }));
  return positionsInches.slice(1).map((position, index) => {
    const before = positionsInches[index] as number;
    if (position < before) {
      throw new ImpossibleInput('Places on the tape must ascend.', 'positionsInches');
    }
    return position - before;
  });
}

export type SpacingVariation = {
  spacings: number;
  spacingInchesMean: number;
  spacingInchesSd: number;
  /** SD over mean, 1 being the mean itself. */
  spacingCv: Outcome<number>;
};

/**
 * How evenly do the plants stand along the row?
 *
 * Takes spacings in inches (0 or more) of one row, or of several rows joined. Returns their mean, sample
 * standard deviation and coefficient of variation. Insufficient below two spacings; the CV also when all
 * plants share one place. Throws ImpossibleInput for a spacing that is negative or not finite.
 * Method: sample standard deviation with n − 1, as the worked example printed with the SSMG-37 guide.
 * Missing plants raise the SD by themselves, however well the planter placed the rest.
 * Example: places 0 2 17 33 38 39 44 52 55 60 68 in: mean 6.8, SD 5.116 in.
 */
export function spacingVariation(spacings: readonly number[]): Outcome<SpacingVariation> {
  spacings.forEach((spacing) => requiredNumber(spacing, 'spacings', { atLeast: 0 }));
  const count = spacings.length;
  if (count < 2) {
    return insufficient('too-few-spacings', '2 spacings, that is 3 plants in a row', `${count} spacings`);
  }
  const mean = spacings.reduce((sum, spacing) => sum + spacing, 0) / count;
  const squares = spacings.reduce((sum, spacing) => sum + (spacing - mean) ** 2, 0);
  const sd = Math.sqrt(squares / (count - 1));
  return value({
    spacings: count,
    spacingInchesMean: mean,
    spacingInchesSd: sd,
    spacingCv:
      mean > SAME_NUMBER
        ? value(sd / mean)
        : insufficient('all-at-one-place', 'plants at two places', 'every plant at the same place'),
  });
}

/** The mean alone, which one spacing is enough for. */
export function spacingInchesMean(spacings: readonly number[]): Outcome<number> {
  spacings.forEach((spacing) => requiredNumber(spacing, 'spacings', { atLeast: 0 }));
  if (spacings.length === 0)
    return insufficient('too-few-spacings', '1 spacing, that is 2 plants', '0 spacings');
  return value(spacings.reduce((sum, spacing) => sum + spacing, 0) / spacings.length);
}
