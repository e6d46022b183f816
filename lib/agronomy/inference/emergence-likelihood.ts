import type { SeenBetween } from '../turnbull';
import { standardShapes, type EmergenceShape } from './emergence-shape';

/** `location` and `scale` are of the logarithm of days; `finalShareLogit` is ln(d / (1 − d)), null where all seeds emerge. */
export type CurveAt = { location: number; scale: number; finalShareLogit: number | null };

/**
 * How likely are these counts under this curve?
 *
 * Takes intervals in days since planting with the plants in each (`byDays` null: seeds not seen), a shape, a curve, and the day
 * of the last visit where the likelihood is to be conditional on having emerged by then, or null. Returns the log-likelihood;
 * minus infinity where the curve cannot have made the counts. Never insufficient; throws nothing.
 * Method: Σ n log{d (F(by) − F(after))}, n log{1 − d F(after)} for seeds not seen, less N log F(last visit) where conditional;
 * all by logarithms of tails. It does not tell whether the curve is a good one: only how it stands beside another.
 * Example: 10 plants in (0, 5] under a log-normal curve with location ln 5: 10 ln ½ = −6.93.
 */
export function emergenceLikelihood(counted: readonly SeenBetween[], shape: EmergenceShape, at: CurveAt, byLastVisitDays: number | null): number {
  const { logBetween } = standardShapes[shape];
  const placeOf = (days: number) => (Math.log(days) - at.location) / at.scale;
  const never = at.finalShareLogit === null ? 0 : 1 / (1 + Math.exp(at.finalShareLogit));
  const logFinal = at.finalShareLogit === null ? 0 : -Math.log1p(Math.exp(-at.finalShareLogit));
  const logUpByLast = byLastVisitDays === null ? 0 : logBetween(-Infinity, placeOf(byLastVisitDays));
  return counted.reduce((sum, { afterDays, byDays, plants }) => {
    const from = placeOf(afterDays);
    if (byDays !== null) return sum + plants * (logFinal + logBetween(from, placeOf(byDays)) - logUpByLast);
    const logLater = logFinal + logBetween(from, Infinity);
    return sum + plants * (never > 0 ? Math.log(never + Math.exp(logLater)) : logLater);
  }, 0);
}
