import type { EmergenceCurve } from './emergence-curve';
import { emergencePercentile } from './emergence-percentile';
import { emergenceSpread } from './emergence-spread';
import type { DaysFigure, Figures } from './figures';
import { chainOutcome, mapOutcome, type Outcome } from './outcome';

export type TimingFigures = Pick<
  Figures,
  'emergenceCurve' | 'daysTo10' | 'daysTo50' | 'daysTo90' | 'spreadDays'
>;

/**
 * What does one curve say about timing?
 *
 * Takes the curve of a row sample or of a strip (or insufficient). Returns days to 10, 50 and 90 % of the
 * emerged stand and the spread, each insufficient where the curve is or its own needs are not met. Throws
 * nothing of its own. Method: see emergencePercentile and emergenceSpread.
 * Example: the ten counts printed there give 3.09, 5, 7 and 3.91 days.
 */
export function timingFigures(curve: Outcome<EmergenceCurve>): TimingFigures {
  const daysTo = (share: number): Outcome<DaysFigure> =>
    mapOutcome(
      chainOutcome(curve, (fitted) => emergencePercentile(fitted, share)),
      ({ days, bound }) => ({ days, bound }),
    );
  return {
    emergenceCurve: curve,
    daysTo10: daysTo(0.1),
    daysTo50: daysTo(0.5),
    daysTo90: daysTo(0.9),
    spreadDays: chainOutcome(curve, emergenceSpread),
  };
}
