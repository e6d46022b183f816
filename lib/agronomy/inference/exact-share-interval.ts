import distributionF from '@stdlib/stats-base-dists-f';
import { requiredCount } from '../required-count';

/**
 * Between which shares does the true one lie, holding it at least 95 times of 100 whatever it is?
 *
 * Takes hits (whole, 0 or more) of trials (whole, 1 or more, not fewer than hits). Returns shares of 1. Never
 * insufficient; throws ImpossibleInput otherwise.
 * Method: Clopper and Pearson 1934, by the F distribution: lower x / (x + (n − x + 1) F(0.975; 2(n − x + 1), 2x)).
 * It is wider than Wilson's, which screens show and which holds 95 on average. Same limits: counting only, hits taken as
 * independent. Example: 31 of 34: 76.3 to 98.1 %.
 */
export function exactShareInterval(
  hits: number,
  trials: number,
): { shareLower: number; shareUpper: number; level: 0.95; method: 'binomial-exact' } {
  requiredCount(trials, 'trials', { atLeast: 1 });
  requiredCount(hits, 'hits', { atLeast: 0, atMost: trials });
  const least = (of: number) =>
    of === 0
      ? 0
      : of / (of + (trials - of + 1) * distributionF.quantile(0.975, 2 * (trials - of + 1), 2 * of));
  return {
    shareLower: least(hits),
    shareUpper: 1 - least(trials - hits),
    level: 0.95,
    method: 'binomial-exact',
  };
}
