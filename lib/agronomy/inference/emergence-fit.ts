import { insufficient, value, type Outcome } from '../outcome';
import { requiredNumber } from '../required-number';
import type { SeenBetween } from '../turnbull';
import { emergenceShapes, standardShapes, type EmergenceShape } from './emergence-shape';
import { invertedPositive, symmetricForm } from './linear-algebra';
import { newtonMaximum, type Maximum } from './newton-maximum';

/**
 * What the curve describes: the plants that emerged (the default), all seeds, or all seeds of which a share d ≤ 1 ever
 * emerges.
 */
export type FitBasis = 'emerged' | 'seeds' | 'seeds-with-final-share';

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
 * standard errors, log-likelihood and AIC. Insufficient below three intervals with plants (interpolate then, and say so)
 * and where the likelihood has no single top. Throws ImpossibleInput for intervals or plants that cannot be.
 * Method: maximum of Σ nᵢ log{F(tᵢ) − F(tᵢ₋₁)} for interval-censored data (Onofri, Mesgaran and Ritz 2022, Weed Science),
 * seeds not seen adding n log{1 − d F(tₖ)}; standard errors from the observed information by the delta method. Least squares
 * on cumulative counts would be the wrong likelihood. Agrees with survreg of R on type interval2.
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
  const counted = basis === 'emerged' ? emerged : seen.filter(({ plants }) => plants > 0);
  const fitsShare = basis === 'seeds-with-final-share' && counted.some(({ byDays }) => byDays === null);
  const top = newtonMaximum((at) => logLikelihood(counted, shape, at, fitsShare), startOf(emerged, counted, fitsShare));
  if (top && fitsShare && shareOf(top.at[2] as number) > 1 - 1e-4) return atTheBound(counted, shape, emerged);
  return top ? described(top, shape, basis, fitsShare) : insufficient('fit-does-not-settle', 'one best curve', 'none that is better than its neighbors');
}

/** All three shapes, and the one with the lowest AIC; insufficient where none settles. */
export function bestEmergenceFit(seen: readonly SeenBetween[], basis: FitBasis = 'emerged'): Outcome<{ best: EmergenceFit; fits: Record<EmergenceShape, Outcome<EmergenceFit>> }> {
  const fits = Object.fromEntries(emergenceShapes.map((shape) => [shape, emergenceFit(seen, shape, basis)])) as Record<EmergenceShape, Outcome<EmergenceFit>>;
  const settled = emergenceShapes.flatMap((shape) => (fits[shape].kind === 'value' ? [fits[shape].value] : []));
  const [first, ...others] = settled;
  if (!first) return fits['log-normal'] as Outcome<never>;
  return value({ best: others.reduce((best, each) => (each.aic < best.aic ? each : best), first), fits });
}

const shareOf = (logit: number) => 1 / (1 + Math.exp(-logit));

function logLikelihood(counted: readonly SeenBetween[], shape: EmergenceShape, at: readonly number[], fitsShare: boolean): number {
  const [location, logScale, logit] = at as [number, number, number];
  const scale = Math.exp(logScale);
  const { below } = standardShapes[shape];
  const upBy = (days: number) => (days === 0 ? 0 : below((Math.log(days) - location) / scale));
  const final = fitsShare ? shareOf(logit) : 1;
  return counted.reduce((sum, { afterDays, byDays, plants }) => {
    const likely = byDays === null ? 1 - final * upBy(afterDays) : final * (upBy(byDays) - upBy(afterDays));
    return sum + plants * Math.log(Math.max(likely, 1e-300));
  }, 0);
}

function startOf(emerged: readonly SeenBetween[], counted: readonly SeenBetween[], fitsShare: boolean): number[] {
  const total = emerged.reduce((sum, { plants }) => sum + plants, 0);
  const middle = ({ afterDays, byDays }: SeenBetween) => Math.log((afterDays + (byDays ?? afterDays)) / 2);
  const mean = emerged.reduce((sum, each) => sum + each.plants * middle(each), 0) / total;
  const variance = emerged.reduce((sum, each) => sum + each.plants * (middle(each) - mean) ** 2, 0) / total;
  const start = [mean, Math.log(Math.max(0.05, Math.sqrt(variance)))];
  if (!fitsShare) return start;
  const all = counted.reduce((sum, { plants }) => sum + plants, 0);
  const share = Math.min(0.99, total / all);
  return [...start, Math.log(share / (1 - share))];
}

function described(top: Maximum, shape: EmergenceShape, basis: FitBasis, fitsShare: boolean): Outcome<EmergenceFit> {
  const covariance = covarianceOf(top.information);
  if (!covariance) return insufficient('fit-does-not-settle', 'one best curve', 'a flat top');
  const [location, logScale, logit] = top.at as [number, number, number];
  const scale = Math.exp(logScale);
  const estimate = (of: number, gradient: readonly number[]): Estimate => ({
    estimate: of,
    standardError: Math.sqrt(symmetricForm(covariance, [...gradient, ...(fitsShare ? [0] : [])])),
  });
  const { quantile } = standardShapes[shape];
  const dayOf = (share: number) => Math.exp(location + scale * quantile(share));
  const slopeOf = (share: number) => [dayOf(share), dayOf(share) * scale * quantile(share)] as const;
  const [early, late] = [slopeOf(0.1), slopeOf(0.9)];
  const final = shareOf(logit);
  return value({
    shape,
    basis,
    location: estimate(location, [1, 0]),
    scale: estimate(scale, [0, scale]),
    finalShare: fitsShare ? { estimate: final, standardError: Math.sqrt(symmetricForm(covariance, [0, 0, final * (1 - final)])) } : null,
    daysTo10: estimate(dayOf(0.1), early),
    daysTo50: estimate(dayOf(0.5), slopeOf(0.5)),
    daysTo90: estimate(dayOf(0.9), late),
    spreadDays: estimate(dayOf(0.9) - dayOf(0.1), [late[0] - early[0], late[1] - early[1]]),
    logLikelihood: top.value,
    aic: -2 * top.value + 2 * top.at.length,
  });
}

/** A final share of 1 lies on its bound, where the top is no top in d: the rest is fitted with all seeds emerging. */
function atTheBound(counted: readonly SeenBetween[], shape: EmergenceShape, emerged: readonly SeenBetween[]): Outcome<EmergenceFit> {
  const top = newtonMaximum((at) => logLikelihood(counted, shape, at, false), startOf(emerged, counted, false));
  const fit = top ? described(top, shape, 'seeds-with-final-share', false) : null;
  if (fit?.kind !== 'value') return insufficient('fit-does-not-settle', 'one best curve', 'none with a final share of 1');
  return value({ ...fit.value, finalShare: { estimate: 1, standardError: null }, aic: fit.value.aic + 2 });
}

function covarianceOf(information: readonly (readonly number[])[]): number[][] | null {
  try {
    return invertedPositive(information);
  } catch {
    return null;
  }
}
