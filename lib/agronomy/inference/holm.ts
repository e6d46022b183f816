import { requiredNumber } from '../required-number';

/**
 * What are these p-values worth when all of them are looked at together?
 *
 * Takes p-values, 0 to 1. Returns adjusted ones in the same order: declaring those at or below 0.05 different is
 * wrong about any of them in at most 5 % of trials. Never insufficient; throws ImpossibleInput for a p outside 0 to 1.
 * Equation: with p sorted ascending, the i-th of m becomes the largest of (m − j + 1) p_j over j ≤ i, at most 1.
 * Source: Holm 1979, Scandinavian Journal of Statistics 6:65.
 * Example: 0.01, 0.03, 0.04 become 0.03, 0.06, 0.06.
 */
export function holm(ps: readonly number[]): number[] {
  const order = ps.map((p, index) => ({ p: requiredNumber(p, 'p', { atLeast: 0, atMost: 1 }), index }));
  order.sort((first, second) => first.p - second.p);
  const adjusted = new Array<number>(ps.length).fill(1);
  let largest = 0;
  order.forEach(({ p, index }, rank) => {
    largest = Math.max(largest, Math.min(1, (ps.length - rank) * p));
    adjusted[index] = largest;
  });
  return adjusted;
}
