import { ImpossibleInput, insufficient, value } from '../outcome';
import type { Outcome } from '../outcome';
import { environmentDifferences, type EnvironmentDifference, type OwnError } from './environment-differences';
import type { EnvironmentStrip } from './environment-strip';
import { studentQuantile, studentTwoSidedP } from './student-t';

export type PooledInterval = {
  standardError: number;
  degreesOfFreedom: number;
  lower: number;
  upper: number;
  p: number;
};

export type PooledDifference = {
  /** `first` less `second`, each environment counting alike, in the figure's unit. */
  difference: number;
  environmentsPooled: number;
  /** Every environment, also those that could not be pooled. */
  environments: EnvironmentDifference[];
  /** Environments stand for others: what differs between them (settings × environment) is the error. */
  forOthers: Outcome<PooledInterval>;
  /** These environments only: the error is that of strips, each environment's own. */
  forThese: Outcome<PooledInterval>;
};

/**
 * How far apart are two settings over several fields or years?
 *
 * Takes strips with environment, block, setting and figure, and the two settings. Returns the mean of the environments' differences
 * with a 95 % t interval on environments (they stand for others) and one from the strips' own errors (these and no
 * others), beside each environment's own difference. Insufficient: fewer than two environments that hold both
 * settings in a block; the first interval where all differences are the same; the second where an environment has no error of its own.
 * Throws ImpossibleInput for a setting compared with itself and as blockAnalysis does.
 * Equation: mean d ± t(m − 1) SD(d) / √m; mean d ± t(ν) √(Σ SE²) / m with ν = (Σ SE²)² / Σ (SE⁴ / df), Satterthwaite
 * 1946, Biometrics Bulletin 2:110. Environments are not weighted, so that a large trial does not speak for the others.
 * What it does not tell: environments that were not drawn from those they stand for. Two of them leave 1 degree of freedom.
 * Example: 24.8 and 22.8 in two years: 23.8, interval 11.0 to 36.6 on 1 degree of freedom.
 */
export function pooledDifference(
  strips: readonly EnvironmentStrip[],
  first: string,
  second: string,
): Outcome<PooledDifference> {
  if (first === second) throw new ImpossibleInput('A setting is not compared with itself.', 'second');
  const environments = environmentDifferences(strips, first, second);
  const pooled = environments.flatMap(({ difference, ownError }) =>
    difference.kind === 'value' ? [{ difference: difference.value, ownError }] : [],
  );
  if (pooled.length < 2) {
    return insufficient('one-environment', '2 fields or years with both settings', `${pooled.length}`);
  }
  const differences = pooled.map((each) => each.difference);
  const difference = differences.reduce((sum, each) => sum + each, 0) / differences.length;
  return value({
    difference,
    environmentsPooled: pooled.length,
    environments,
    forOthers: betweenEnvironments(differences, difference),
    forThese: withinEnvironments(
      pooled.map((each) => each.ownError),
      difference,
    ),
  });
}

function betweenEnvironments(differences: readonly number[], mean: number): Outcome<PooledInterval> {
  const count = differences.length;
  const squares = differences.reduce((sum, each) => sum + (each - mean) ** 2, 0);
  const largest = Math.max(...differences.map(Math.abs));
  if (squares <= count * (1e-10 * largest) ** 2) {
    return insufficient(
      'no-variation',
      'differences that vary between environments',
      'the same in all of them',
    );
  }
  return value(intervalOf(mean, Math.sqrt(squares / (count - 1) / count), count - 1));
}

function withinEnvironments(errors: readonly Outcome<OwnError>[], mean: number): Outcome<PooledInterval> {
  let variances = 0;
  let parts = 0;
  for (const error of errors) {
    if (error.kind === 'insufficient') return error;
    const variance = error.value.standardError ** 2;
    variances += variance;
    parts += variance ** 2 / error.value.errorDegreesOfFreedom;
  }
  return value(intervalOf(mean, Math.sqrt(variances) / errors.length, variances ** 2 / parts));
}

function intervalOf(mean: number, standardError: number, degreesOfFreedom: number): PooledInterval {
  const reach = studentQuantile(0.975, degreesOfFreedom) * standardError;
  return {
    standardError,
    degreesOfFreedom,
    lower: mean - reach,
    upper: mean + reach,
    p: studentTwoSidedP(mean / standardError, degreesOfFreedom),
  };
}
