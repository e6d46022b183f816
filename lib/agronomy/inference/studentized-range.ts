import { requiredNumber } from '../required-number';
import { normalCdf, normalDensity } from './normal-cdf';

/** Beyond this the range of up to a hundred standard normal values is not found. */
const WIDEST_RANGE = 20;
/** Parts of the integrand below e^−44 of its peak are left out. */
const NEGLIGIBLE = -44;

const rangeTails = new Map<string, Map<number, number>>();
const quantiles = new Map<string, number>();

/**
 * How likely is a studentized range at least this large when nothing differs?
 *
 * Takes q (0 or more), the number of groups (whole, 2 or more) and the degrees of freedom of the error (above 0).
 * Returns p, 0 to 1, right to about 1e-13. Never insufficient; throws ImpossibleInput outside those limits.
 * Equation: P(Q > q) = ∫ [1 − W(q s)] f(s) ds, with W(w) = k ∫ φ(z) [Φ(z) − Φ(z − w)]^(k−1) dz and f the density of
 * √(χ²(ν)/ν). Method: the trapezoid rule in log s and in z, whose error falls exponentially with the step on such
 * integrands. The step in log s is a power of two and its grid is laid on log(q s), so that W is found once
 * for a number of groups and serves every q and ν.
 * Why its own: common routines are off at few degrees of freedom, where small trials live.
 * Example: q = 6.0849, 2 groups, 2 degrees of freedom: 0.05.
 */
export function studentizedRangeUpperTail(q: number, groups: number, degreesOfFreedom: number): number {
  requiredNumber(q, 'q', { atLeast: 0 });
  checkShape(groups, degreesOfFreedom);
  if (q === 0) return 1;

  const step = stepFor(degreesOfFreedom);
  const logQ = Math.log(q);
  const tails = tailsFor(groups, step);
  let weightSum = 0;
  let tailSum = 0;
  const add = (index: number): boolean => {
    const u = index * step - logQ;
    const exponent = degreesOfFreedom * (u - 0.5 * Math.expm1(2 * u));
    if (exponent < NEGLIGIBLE) return false;
    const weight = Math.exp(exponent);
    weightSum += weight;
    tailSum += weight * rangeTail(tails, index, step, groups);
    return true;
  };
  const middle = Math.round(logQ / step);
  for (let index = middle; add(index); index += 1);
  for (let index = middle - 1; add(index); index -= 1);
  return Math.min(1, tailSum / weightSum);
}

/**
 * Which studentized range is exceeded with this probability?
 *
 * Takes the upper tail's share (strictly between 0 and 1), the number of groups and the degrees of freedom.
 * Returns q. Never insufficient; throws ImpossibleInput outside those limits.
 * Method: halving of log q until it no longer moves; kept per share, groups and degrees of freedom.
 * Example: 0.05, 2 groups, 2 degrees of freedom: 6.0849, which is √2 × t(0.975; 2).
 */
export function studentizedRangeQuantile(
  upperShare: number,
  groups: number,
  degreesOfFreedom: number,
): number {
  requiredNumber(upperShare, 'upperShare', { above: 0, atMost: 1 - Number.EPSILON });
  checkShape(groups, degreesOfFreedom);
  const key = `${upperShare}:${groups}:${degreesOfFreedom}`;
  const kept = quantiles.get(key);
  if (kept !== undefined) return kept;

  let low = -20;
  let high = 5;
  while (studentizedRangeUpperTail(Math.exp(high), groups, degreesOfFreedom) > upperShare) high += 5;
  for (let middle = (low + high) / 2; middle > low && middle < high; middle = (low + high) / 2) {
    if (studentizedRangeUpperTail(Math.exp(middle), groups, degreesOfFreedom) > upperShare) low = middle;
    else high = middle;
  }
  const quantile = Math.exp((low + high) / 2);
  quantiles.set(key, quantile);
  return quantile;
}

function checkShape(groups: number, degreesOfFreedom: number): void {
  requiredNumber(groups, 'groups', { atLeast: 2, atMost: 100 });
  requiredNumber(degreesOfFreedom, 'degreesOfFreedom', { above: 0 });
}

/** At most an eighth, and at most six tenths of the standard deviation of log s, which is about 1/√(2ν). */
function stepFor(degreesOfFreedom: number): number {
  const finest = Math.min(0.125, 0.6 / Math.sqrt(2 * degreesOfFreedom));
  return 2 ** Math.floor(Math.log2(finest));
}

function tailsFor(groups: number, step: number): Map<number, number> {
  const key = `${groups}:${step}`;
  const known = rangeTails.get(key);
  if (known) return known;
  const fresh = new Map<number, number>();
  rangeTails.set(key, fresh);
  return fresh;
}

/** 1 − W at the grid's point. */
function rangeTail(tails: Map<number, number>, index: number, step: number, groups: number): number {
  const width = Math.exp(index * step);
  if (width > WIDEST_RANGE) return 0;
  if (width < 1e-17) return 1;
  const known = tails.get(index);
  if (known !== undefined) return known;
  const tail = 1 - normalRangeCdf(width, groups);
  tails.set(index, tail);
  return tail;
}

const Z_STEP = 0.2;
const Z_POINTS = Array.from({ length: 91 }, (_, index) => {
  const z = (index - 45) * Z_STEP;
  return { z, below: normalCdf(z), weight: normalDensity(z) * Z_STEP };
});

/** W: the share of samples of so many standard normal values whose range is at most `width`. */
function normalRangeCdf(width: number, groups: number): number {
  let sum = 0;
  for (const { z, below, weight } of Z_POINTS) sum += weight * (below - normalCdf(z - width)) ** (groups - 1);
  return groups * sum;
}
