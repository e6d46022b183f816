import { normalCdf, normalDensity } from './normal-cdf';

/** How the logarithm of the days to emergence is spread about its location. */
export const emergenceShapes = ['log-normal', 'log-logistic', 'weibull'] as const;
export type EmergenceShape = (typeof emergenceShapes)[number];

type Standard = {
  below: (u: number) => number;
  quantile: (share: number) => number;
  /** The logarithm of the share between two places, either of which may be infinite. */
  logBetween: (low: number, high: number) => number;
};

/**
 * The standard distributions of (ln days − location) / scale: normal, logistic, and of smallest extremes.
 * Shares between two visits are taken as logarithms: a plant far out in a tail has a share that underflows to 0, and a
 * likelihood held up from below by a least share is flat there, so that a fit would settle where no top is.
 */
export const standardShapes: Record<EmergenceShape, Standard> = {
  'log-normal': { below: normalCdf, quantile: normalQuantile, logBetween: logNormalBetween },
  'log-logistic': {
    below: (u) => 1 / (1 + Math.exp(-u)),
    quantile: (share) => Math.log(share / (1 - share)),
    logBetween: (low, high) => logOneLessExp(low - high) - logOnePlusExp(-high) - logOnePlusExp(low),
  },
  weibull: {
    below: (u) => -Math.expm1(-Math.exp(u)),
    quantile: (share) => Math.log(-Math.log1p(-share)),
    logBetween: (low, high) => {
      const logHazard = high + logOneLessExp(low - high);
      // So small a hazard is the share itself; its exponential would round to 0.
      return -Math.exp(low) + (logHazard < -36 ? logHazard : logOneLessExp(-Math.exp(logHazard)));
    },
  },
};

/** ln(1 − eˣ) for x below 0. */
const logOneLessExp = (x: number) => Math.log(-Math.expm1(x));

/** ln(1 + eˣ), for any x without overflow. */
const logOnePlusExp = (x: number) => Math.max(x, 0) + Math.log1p(Math.exp(-Math.abs(x)));

/** Below this the normal share loses digits as a difference from 1, and its continued fraction settles. */
const FAR_BELOW = -2.5;
const FRACTION_TERMS = 80;

function logNormalBetween(low: number, high: number): number {
  if (low > 0) return logNormalBetween(-high, -low);
  if (high >= FAR_BELOW) return Math.log(normalCdf(high) - (low < FAR_BELOW ? Math.exp(logNormalBelow(low)) : normalCdf(low)));
  const top = logNormalBelow(high);
  return top + logOneLessExp(logNormalBelow(low) - top);
}

/** ln Φ(u) for u far below 0: the density times Mills’ ratio, by Laplace’s continued fraction 1/(x + 1/(x + 2/(x + …))). */
function logNormalBelow(u: number): number {
  const x = -u;
  let fraction = x;
  for (let term = FRACTION_TERMS; term >= 1; term -= 1) fraction = x + term / fraction;
  return -0.5 * x * x - 0.5 * Math.log(2 * Math.PI) - Math.log(fraction);
}

/** The standard normal quantile of a share between 0 and 1, by Newton’s steps on the distribution; from 0 they always settle. */
function normalQuantile(share: number): number {
  let u = 0;
  for (let step = 0; step < 60; step += 1) {
    const off = (normalCdf(u) - share) / normalDensity(u);
    // A step is cut short, so that a far tail is not overshot.
    u -= Math.max(-1, Math.min(1, off));
    if (Math.abs(off) < 1e-14) break;
  }
  return u;
}
