import { requiredNumber } from './required-number';

/** The 97.5 % points of Student's t for 1 to 30 degrees of freedom, as every printed table has them (NIST/SEMATECH e-Handbook, 1.3.6.7.2). */
const points = [
  12.706, 4.303, 3.182, 2.776, 2.571, 2.447, 2.365, 2.306, 2.262, 2.228, 2.201, 2.179, 2.16, 2.145, 2.131, 2.12, 2.11, 2.101, 2.093, 2.086,
  2.08, 2.074, 2.069, 2.064, 2.06, 2.056, 2.052, 2.048, 2.045, 2.042,
];

/**
 * How many standard errors does a 95 % interval reach to each side?
 *
 * Takes degrees of freedom (a whole number, 1 or more). Returns the two-sided 95 % point of Student's t; above 30 that of
 * 30, which is a little too wide. Never insufficient; throws ImpossibleInput for less than 1.
 * Source: printed table, NIST/SEMATECH e-Handbook of Statistical Methods 1.3.6.7.2. For a phone, which carries no
 * distribution functions; checked against them in a test.
 * Example: 4 degrees of freedom: 2.776.
 */
export function smallT(degreesOfFreedom: number): number {
  const df = Math.floor(requiredNumber(degreesOfFreedom, 'degreesOfFreedom', { atLeast: 1 }));
  return points[Math.min(df, points.length) - 1] ?? 2.042;
}
