import { requiredNumber } from '../required-number';
import { upperTailF } from './f-distribution';

/** Terms of the mixture below this share of its largest weight are left out. */
const NEGLIGIBLE_WEIGHT = 1e-18;

/**
 * How likely is an F at least this large when the settings do differ by so much?
 *
 * Takes F (0 or more), its two degrees of freedom (above 0) and the non-centrality (0 or more, at most 100,000). Returns a
 * probability, 0 to 1. Never insufficient; throws ImpossibleInput outside those limits.
 * Equation: Σ Poisson(j; λ/2) P(F(d₁ + 2j, d₂) > F d₁ / (d₁ + 2j)), central tails mixed by Poisson weights (Johnson, Kotz
 * & Balakrishnan 1995, Continuous Univariate Distributions 2, ch. 30). Weights run outwards from the largest one and
 * are divided by their sum, so that no factorial is needed. With d₁ = 1 it is the two-sided non-central t.
 * Example: F = 10.128 on 1 and 3 degrees of freedom, λ = 16.33: 0.7625.
 */
export function nonCentralUpperTailF(
  ratio: number,
  numeratorDf: number,
  denominatorDf: number,
  nonCentrality: number,
): number {
  requiredNumber(ratio, 'ratio', { atLeast: 0 });
  requiredNumber(numeratorDf, 'numeratorDf', { above: 0 });
  requiredNumber(nonCentrality, 'nonCentrality', { atLeast: 0, atMost: 100_000 });
  const half = nonCentrality / 2;
  const mode = Math.floor(half);
  const tail = (j: number) =>
    upperTailF((ratio * numeratorDf) / (numeratorDf + 2 * j), numeratorDf + 2 * j, denominatorDf);
  let weightSum = 1;
  let tailSum = tail(mode);
  const add = (j: number, weight: number) => {
    weightSum += weight;
    tailSum += weight * tail(j);
  };
  for (let j = mode + 1, weight = half / j; weight > NEGLIGIBLE_WEIGHT; j += 1, weight *= half / j)
    add(j, weight);
  for (
    let j = mode - 1, weight = mode / half;
    j >= 0 && weight > NEGLIGIBLE_WEIGHT;
    weight *= j / half, j -= 1
  ) {
    add(j, weight);
  }
  return Math.min(1, tailSum / weightSum);
}
