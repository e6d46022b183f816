import { insufficient, value, type Outcome } from '../outcome';
import { requiredNumber } from '../required-number';
import { standInterval, type StandEstimate, type StandUnit } from './stand-interval';
import { studentQuantile } from './student-t';

export type StandZone = { acres: number; rowSamples: readonly StandUnit[] };

/**
 * How many plants per acre stand in a field of unlike parts, each counted by itself?
 *
 * Takes zones with their acres (above 0) and the row samples counted in each. Returns the mean weighted by
 * acres, with a 95 % interval. Insufficient without a zone, or when a zone has no row sample; the interval
 * also when a zone has only one. Throws ImpossibleInput for acres that are not positive and as standInterval.
 * Method: stratified mean Σ W ȳ, standard error √Σ W² SE² (Cochran 1977, ch. 5), degrees of freedom by
 * Satterthwaite (1946), (Σ a)² / Σ a²/(n − 1) with a = W² SE².
 * The zones are as drawn; how sure their borders are is not in the interval.
 * Example: 44 acres at 23,568 and 18 acres at 13,000 are 20,500 over 62 acres.
 */
export function standZones(zones: readonly StandZone[]): Outcome<StandEstimate> {
  if (zones.length === 0) return insufficient('no-zones', '1 zone', '0 zones');
  const acresTotal = zones.reduce((sum, zone) => sum + requiredNumber(zone.acres, 'acres', { above: 0 }), 0);
  const parts = [];
  for (const zone of zones) {
    const estimate = standInterval(zone.rowSamples, 'row-samples');
    if (estimate.kind === 'insufficient') {
      return insufficient('zone-not-counted', 'a row sample in every zone', 'a zone with none');
    }
    parts.push({ weight: zone.acres / acresTotal, estimate: estimate.value, count: zone.rowSamples.length });
  }
  const plantsPerAcre = parts.reduce((sum, part) => sum + part.weight * part.estimate.plantsPerAcre, 0);
  const variances = parts.flatMap(({ weight, estimate, count }) => {
    const student = estimate.interval.kind === 'value' ? estimate.interval.value.student : null;
    return student
      ? [{ amount: (weight * student.standardErrorPlantsPerAcre) ** 2, degrees: count - 1 }]
      : [];
  });
  if (variances.length < parts.length) {
    const single = parts.length - variances.length;
    const needed = insufficient('one-place', '2 row samples in every zone', `${single} zones with 1`);
    return value({ plantsPerAcre, interval: needed });
  }
  const variance = variances.reduce((sum, part) => sum + part.amount, 0);
  const spreadOfVariance = variances.reduce((sum, part) => sum + part.amount ** 2 / part.degrees, 0);
  // Identical counts leave no variance to apportion; the fewest degrees any zone has are then the safe ones.
  const degreesOfFreedom =
    spreadOfVariance > 0
      ? variance ** 2 / spreadOfVariance
      : Math.min(...variances.map((part) => part.degrees));
  const standardError = Math.sqrt(variance);
  const reach = studentQuantile(0.975, degreesOfFreedom) * standardError;
  return value({
    plantsPerAcre,
    interval: value({
      plantsPerAcreLower: Math.max(0, plantsPerAcre - reach),
      plantsPerAcreUpper: plantsPerAcre + reach,
      level: 0.95,
      method: 'stratified-satterthwaite',
      basis: 'zones',
      units: zones.length,
      student: { standardErrorPlantsPerAcre: standardError, degreesOfFreedom },
    }),
  });
}
