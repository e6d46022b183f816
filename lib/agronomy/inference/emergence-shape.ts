import { normalCdf, normalDensity } from './normal-cdf';

/** How the logarithm of the days to emergence is spread about its location. */
export const emergenceShapes = ['log-normal', 'log-logistic', 'weibull'] as const;
export type EmergenceShape = (typeof emergenceShapes)[number];

type Standard = { below: (u: number) => number; quantile: (share: number) => number };

/** The standard distributions of (ln days − location) / scale: normal, logistic, and of smallest extremes. */
export const standardShapes: Record<EmergenceShape, Standard> = {
  'log-normal': { below: normalCdf, quantile: normalQuantile },
  'log-logistic': { below: (u) => 1 / (1 + Math.exp(-u)), quantile: (share) => Math.log(share / (1 - share)) },
  weibull: { below: (u) => -Math.expm1(-Math.exp(u)), quantile: (share) => Math.log(-Math.log1p(-share)) },
};

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
