import { insufficient, value, type Outcome } from '../outcome';
import { requiredNumber } from '../required-number';
import type { SeenBetween } from '../turnbull';
import { emergenceLikelihood } from './emergence-likelihood';
import { emergenceShapes, standardShapes, type EmergenceShape } from './emergence-shape';
import { likeliestCurve, type LikeliestCurve } from './likeliest-curve';
import { invertedPositive, symmetricForm } from './linear-algebra';

/**
 * What the curve describes: the plants that emerged (the default, all of them up by the last visit); those that will have
 * emerged, of which the last visit saw only the early ones (divided by F at that visit); all seeds; or all seeds of which a
 * share d ≤ 1 ever emerges.
 */
export type FitBasis = 'emerged' | 'emerged-by-last-visit' | 'seeds' | 'seeds-with-final-share';

export type Estimate = { estimate: number; standardError: number };

export type EmergenceFit = {
  shape: EmergenceShape;
  basis: FitBasis;
  /** Of the logarithm of days. */
  location: Estimate;
  scale: Estimate;
  /** d; null where none was fitted. At its bound of 1 it has no standard error of its own. */
  finalShare: { estimate: number; standardError: number | null } | null;
  daysTo10: Estimate;
  daysTo50: Estimate;
  daysTo90: Estimate;
  spreadDays: Estimate;
  logLikelihood: number;
  aic: number;
};

const NON_EMPTY_LEAST = 3;

/**
 * Which smooth curve of this shape fits what the visits saw?
 *
 * Takes intervals in days since planting with the plants that came up in each (seeds not seen yet have `byDays` null), a
 * shape and a basis. Returns location and scale of the logarithm of days, days to 10, 50 and 90 % and the spread with
 * standard errors, log-likelihood and AIC. The last visit is the latest day of any interval, so give one that found nothing
 * as 0 plants. Insufficient below three intervals with plants (interpolate then, and say so) and where the likelihood has no
 * single top, or one so flat that the standard error of the scale or of the days to 50 or 90 % is as large as they are.
 * Throws ImpossibleInput for intervals or plants that cannot be.
 * Method: maximum of Σ nᵢ log{F(tᵢ) − F(tᵢ₋₁)} for interval-censored data (Onofri, Mesgaran and Ritz 2022, Weed Science),
 * seeds not seen adding n log{1 − d F(tₖ)}, and N log F(tₖ) taken off on the basis of the last visit, where AIC is not to be
 * held against that of another basis; standard errors from the observed information by the delta method. Least squares
 * on cumulative counts would be the wrong likelihood. Agrees with survreg of R on type interval2, save where a plant lies so
 * far in a tail that survreg stops short of the top; there it agrees with optim.
 * The basis of the last visit is for rows that were all visited to the same day; pooled rows with last days of their own are not.
 * Plants of one row are not independent, so its standard errors are too small for a row and serve to compare fits; settings
 * are compared by strips. With a final share at 1 the rest is fitted with all seeds emerging.
 * Example: 4 17 10 7 1 1 plants in (4, 5], (5, 6], (6, 7], (7, 8], (8, 9], (10, 11]: log-normal half up on day 6.10, AIC 125.5.
 */
export function emergenceFit(seen: readonly SeenBetween[], shape: EmergenceShape, basis: FitBasis = 'emerged'): Outcome<EmergenceFit> {
  for (const { afterDays, byDays, plants } of seen) {
    requiredNumber(afterDays, 'afterDays', { atLeast: 0 });
    requiredNumber(plants, 'plants', { atLeast: 0 });
    if (byDays !== null) requiredNumber(byDays, 'byDays', { above: afterDays });
  }
  const emerged = seen.filter(({ plants, byDays }) => plants > 0 && byDays !== null);
  const filled = new Set(emerged.map(({ afterDays, byDays }) => `${afterDays} ${byDays}`)).size;
  if (filled < NON_EMPTY_LEAST) return insufficient('too-few-intervals', `${NON_EMPTY_LEAST} intervals with new plants, or interpolation`, `${filled}`);
  const counted = basis === 'emerged' || basis === 'emerged-by-last-visit' ? emerged : seen.filter(({ plants }) => plants > 0);
  const fitsShare = basis === 'seeds-with-final-share' && counted.some(({ byDays }) => byDays === null);
  const sought = { shape, fitsShare, byLastVisitDays: basis === 'emerged-by-last-visit' ? lastVisitOf(seen) : null };
  const curve = likeliestCurve(counted, sought);
  const within = curve && !(fitsShare && (curve.finalShare as number) > AT_BOUND);
  return within ? described(curve, shape, basis) : fitsShare ? atTheBound(counted, shape) : unsettled('none that is better than its neighbors');
}

/** All three shapes, and the one with the lowest AIC; insufficient where none settles. */
export function bestEmergenceFit(seen: readonly SeenBetween[], basis: FitBasis = 'emerged'): Outcome<{ best: EmergenceFit; fits: Record<EmergenceShape, Outcome<EmergenceFit>> }> {
  const fits = Object.fromEntries(emergenceShapes.map((shape) => [shape, emergenceFit(seen, shape, basis)])) as Record<EmergenceShape, Outcome<EmergenceFit>>;
  const settled = emergenceShapes.flatMap((shape) => (fits[shape].kind === 'value' ? [fits[shape].value] : []));
  const [first, ...others] = settled;
  if (!first) return fits['log-normal'] as Outcome<never>;
  return value({ best: others.reduce((best, each) => (each.aic < best.aic ? each : best), first), fits });
}

/** A final share this near to 1 is taken for 1. */
const AT_BOUND = 1 - 1e-4;

const unsettled = (had: string) => insufficient('fit-does-not-settle', 'one best curve', had);

const lastVisitOf = (seen: readonly SeenBetween[]) => Math.max(...seen.map(({ afterDays, byDays }) => byDays ?? afterDays));

function described({ location, scale, finalShare, logLikelihood, information }: LikeliestCurve, shape: EmergenceShape, basis: FitBasis): Outcome<EmergenceFit> {
  const covariance = covarianceOf(information);
  if (!covariance) return unsettled('a flat top');
  const others = finalShare === null ? [] : [0];
  const estimate = (of: number, [byLocation, byLogScale]: readonly [number, number]): Estimate => ({
    estimate: of,
    standardError: Math.sqrt(symmetricForm(covariance, [byLocation * scale, byLogScale, ...others])),
  });
  const { quantile } = standardShapes[shape];
  const dayOf = (share: number) => Math.exp(location + scale * quantile(share));
  const slopeOf = (share: number) => [dayOf(share), dayOf(share) * scale * quantile(share)] as const;
  const [early, late] = [slopeOf(0.1), slopeOf(0.9)];
  const fit: EmergenceFit = {
    shape,
    basis,
    location: estimate(location, [1, 0]),
    scale: estimate(scale, [0, scale]),
    finalShare: finalShare === null ? null : { estimate: finalShare, standardError: Math.sqrt(symmetricForm(covariance, [0, 0, finalShare * (1 - finalShare)])) },
    daysTo10: estimate(dayOf(0.1), early),
    daysTo50: estimate(dayOf(0.5), slopeOf(0.5)),
    daysTo90: estimate(dayOf(0.9), late),
    spreadDays: estimate(dayOf(0.9) - dayOf(0.1), [late[0] - early[0], late[1] - early[1]]),
    logLikelihood,
    aic: -2 * logLikelihood + 2 * information.length,
  };
  // Where the last visit saw only the beginning, a ridge of curves fits alike: such errors are as large as what they belong to.
  const told = [fit.scale, fit.daysTo50, fit.daysTo90].every(({ estimate: of, standardError }) => standardError < of);
  return told ? value(fit) : unsettled('a top so flat that the day half are up is not told');
}

/**
 * A final share of 1 lies on its bound, where the top is no top in d: the rest is fitted with all seeds emerging. It holds only
 * where a little less than 1 is no likelier.
 */
function atTheBound(counted: readonly SeenBetween[], shape: EmergenceShape): Outcome<EmergenceFit> {
  const curve = likeliestCurve(counted, { shape, fitsShare: false, byLastVisitDays: null });
  const lessThanAll = { location: curve?.location ?? NaN, scale: curve?.scale ?? NaN, finalShareLogit: Math.log(AT_BOUND / (1 - AT_BOUND)) };
  if (!curve || emergenceLikelihood(counted, shape, lessThanAll, null) > curve.logLikelihood) return unsettled('none with a final share of 1');
  const fit = described(curve, shape, 'seeds-with-final-share');
  return fit.kind === 'value' ? value({ ...fit.value, finalShare: { estimate: 1, standardError: null }, aic: fit.value.aic + 2 }) : fit;
}

function covarianceOf(information: readonly (readonly number[])[]): number[][] | null {
  try {
    return invertedPositive(information);
  } catch {
    return null;
  }
}
