import { ImpossibleInput, mapOutcome, type Outcome } from '../outcome';
import type { Span } from '../replant-sum';
import { requiredNumber } from '../required-number';
import { meanInterval, type MeanInterval } from './mean-interval';

export type PredictedAgainstHarvested = {
  harvested: MeanInterval;
  /** Harvested less predicted: the mean against both ends of the prediction, and the outermost limits. */
  difference: { meanLower: number; meanUpper: number; lower: number; upper: number };
  /** The harvested interval and the predicted span share at least one value. */
  agrees: boolean;
  /** Both agree, and the harvest would agree with no difference at all just as well. */
  alsoAgreesWithNone: boolean;
};

/**
 * Does the harvest bear out what a study or a table predicted?
 *
 * Takes the predicted difference between two settings in bushels per acre, as a span whose ends are equal for one figure,
 * and the harvested difference of every block, same sign. Returns the harvested mean with its 95 % interval, the difference
 * between both, and whether they agree. Insufficient with fewer than two blocks or blocks that all differ by the same.
 * Throws ImpossibleInput for a span out of order and numbers that are not finite.
 * Method: mean ± t(n − 1) SD / √n over blocks; they agree when the interval reaches the span.
 * Agreement of a wide interval proves little: where it would agree with no difference too, that is said. A disagreement may
 * be the study's, the place's or the year's. Example: 5 to 6 predicted, blocks of 4, 6 and 8: mean 6, they agree.
 */
export function predictedAgainstHarvested(
  predicted: Span,
  harvestedByBlock: readonly number[],
): Outcome<PredictedAgainstHarvested> {
  requiredNumber(predicted.lower, 'predicted');
  requiredNumber(predicted.upper, 'predicted');
  if (predicted.lower > predicted.upper) throw new ImpossibleInput('The span is out of order.', 'predicted');
  return mapOutcome(meanInterval(harvestedByBlock, 'blocks'), (harvested) => {
    const agrees = harvested.lower <= predicted.upper && harvested.upper >= predicted.lower;
    return {
      harvested,
      difference: {
        meanLower: harvested.mean - predicted.upper,
        meanUpper: harvested.mean - predicted.lower,
        lower: harvested.lower - predicted.upper,
        upper: harvested.upper - predicted.lower,
      },
      agrees,
      alsoAgreesWithNone: agrees && harvested.lower <= 0 && harvested.upper >= 0,
    };
  });
}
