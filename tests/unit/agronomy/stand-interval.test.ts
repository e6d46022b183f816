import { describe, expect, test } from 'vitest';
import { standInterval, standStrips, type StandUnit } from '@/lib/agronomy/inference/stand-interval';
import { standPoisson } from '@/lib/agronomy/inference/stand-poisson';
import { standZones } from '@/lib/agronomy/inference/stand-zones';
import { rowAreaAcres } from '@/lib/agronomy/stand';
import published from '../../reference/published-examples.json';
import standMeasures from '../../reference/stand-measures.json';
import { answerOf, reasonOf } from './answer-of';
import { referenceCase } from './reference-case';

type Sampled = { count: number[]; length_ft: number[]; row_width_in: number };

function unitsOf({ count, length_ft, row_width_in }: Sampled): StandUnit[] {
  return count.map((plantsHeld, index) => ({
    plantsHeld,
    areaAcres: rowAreaAcres((length_ft[index] as number) * 12, row_width_in),
  }));
}

/** Whether two numbers agree to a relative tolerance of 1e-8, the one of the reference values. */
function expectClose(figured: number | undefined, expected: number): void {
  expect(Math.abs((figured as number) / expected - 1)).toBeLessThan(1e-8);
}

describe('standInterval', () => {
  test('is the t interval of the mean when lengths are equal (AREA-04)', () => {
    const { input, expected } = referenceCase<
      Sampled,
      { mean: number; se: number; lower: number; upper: number; df: number }
    >(standMeasures, 'AREA-04');
    const estimate = answerOf(standInterval(unitsOf(input), 'row-samples'));
    const interval = answerOf(estimate.interval);
    expectClose(estimate.plantsPerAcre, expected.mean);
    expectClose(interval.student?.standardErrorPlantsPerAcre, expected.se);
    expectClose(interval.plantsPerAcreLower, expected.lower);
    expectClose(interval.plantsPerAcreUpper, expected.upper);
    expect(interval.student?.degreesOfFreedom).toBe(expected.df);
    expect(interval.method).toBe('t-of-mean');
  });

  test('is the ratio estimator when lengths differ (AREA-05)', () => {
    const { input, expected } = referenceCase<
      Sampled,
      { plants_per_acre: number; se: number; lower: number; upper: number }
    >(standMeasures, 'AREA-05');
    const estimate = answerOf(standInterval(unitsOf(input), 'row-samples'));
    const interval = answerOf(estimate.interval);
    expectClose(estimate.plantsPerAcre, expected.plants_per_acre);
    expectClose(interval.student?.standardErrorPlantsPerAcre, expected.se);
    expectClose(interval.plantsPerAcreLower, expected.lower);
    expectClose(interval.plantsPerAcreUpper, expected.upper);
    expect(interval.method).toBe('ratio-linearized');
  });

  test('takes its standard error from strip means, not from row samples (AREA-09)', () => {
    const { input, expected } = referenceCase<
      { y: number[]; plot: number[] },
      { mean: number; se: number; df: number; lower: number; upper: number; naive_se: number }
    >(standMeasures, 'AREA-09');
    const rows = input.y.map((plantsHeld, index) => ({
      plantsHeld,
      areaAcres: 1,
      stripId: String(input.plot[index]),
    }));
    const estimate = answerOf(standInterval(standStrips(rows), 'strips'));
    const interval = answerOf(estimate.interval);
    expectClose(estimate.plantsPerAcre, expected.mean);
    expectClose(interval.student?.standardErrorPlantsPerAcre, expected.se);
    expectClose(interval.plantsPerAcreLower, expected.lower);
    expectClose(interval.plantsPerAcreUpper, expected.upper);
    expect(interval.student?.degreesOfFreedom).toBe(expected.df);
    const naive = answerOf(answerOf(standInterval(rows, 'row-samples')).interval);
    expectClose(naive.student?.standardErrorPlantsPerAcre, expected.naive_se);
  });

  test('has a stand but no interval from one place, and says so', () => {
    const estimate = answerOf(standInterval([{ plantsHeld: 31, areaAcres: 0.001 }], 'row-samples'));
    expect(estimate.plantsPerAcre).toBeCloseTo(31_000, 6);
    expect(estimate.interval).toMatchObject({ needed: '2 row samples', had: '1 row sample' });
  });

  test('is insufficient without a place', () => {
    expect(reasonOf(standInterval([], 'strips'))).toBe('no-row-samples');
  });
});

describe('standPoisson', () => {
  test('is the exact interval (AREA-06)', () => {
    const { input, expected } = referenceCase<
      { count: number; area_acre: number },
      { lower: number; upper: number }
    >(standMeasures, 'AREA-06');
    const interval = standPoisson({ plantsHeld: input.count, areaAcres: input.area_acre });
    expectClose(interval.plantsPerAcreLower, expected.lower);
    expectClose(interval.plantsPerAcreUpper, expected.upper);
    expect(interval.basis).toBe('counting-only');
  });

  test('begins at 0 when nothing stands (AREA-07)', () => {
    const { input, expected } = referenceCase<
      { count: number; area_acre: number },
      { lower: number; upper: number }
    >(standMeasures, 'AREA-07');
    const interval = standPoisson({ plantsHeld: input.count, areaAcres: input.area_acre });
    expect(interval.plantsPerAcreLower).toBe(expected.lower);
    expectClose(interval.plantsPerAcreUpper, expected.upper);
  });

  test('makes 31 plants 21 to 44', () => {
    const interval = standPoisson({ plantsHeld: 31, areaAcres: 1 });
    const [lower, upper] = published.countingInterval.poisson as [number, number];
    expect(Math.abs(interval.plantsPerAcreLower - lower)).toBeLessThan(0.5);
    expect(Math.abs(interval.plantsPerAcreUpper - upper)).toBeLessThan(0.5);
  });

  test('errs on the wide side for half plants', () => {
    const half = standPoisson({ plantsHeld: 30.5, areaAcres: 1 });
    expect(half.plantsPerAcreLower).toBe(standPoisson({ plantsHeld: 30, areaAcres: 1 }).plantsPerAcreLower);
    expect(half.plantsPerAcreUpper).toBe(standPoisson({ plantsHeld: 31, areaAcres: 1 }).plantsPerAcreUpper);
  });
});

describe('standZones', () => {
  const zoneOf = (acres: number, plants: readonly number[]) => ({
    acres,
    rowSamples: plants.map((plantsHeld) => ({ plantsHeld, areaAcres: 1 })),
  });

  test('has half of Welch’s half width and his degrees of freedom for two equal zones', () => {
    const { a, b, t, difference, degreesOfFreedom, lower, upper } = published.welch;
    const interval = answerOf(answerOf(standZones([zoneOf(31, a), zoneOf(31, b)])).interval);
    expectClose(interval.student?.degreesOfFreedom, degreesOfFreedom);
    expectClose(interval.student?.standardErrorPlantsPerAcre, difference / t / 2);
    expectClose(interval.plantsPerAcreUpper - interval.plantsPerAcreLower, (upper - lower) / 2);
  });

  test('weights zones by acres: 18 of 62 acres at 13,000 and the rest at 23,568 are 20,500', () => {
    const estimate = answerOf(standZones([zoneOf(18, [13_000, 13_000]), zoneOf(44, [23_568, 23_568])]));
    expect(estimate.plantsPerAcre).toBeCloseTo((18 * 13_000 + 44 * 23_568) / 62, 6);
    expect(Math.abs(estimate.plantsPerAcre - 20_500)).toBeLessThan(1);
  });

  test('has no interval when a zone has a single row sample', () => {
    const estimate = answerOf(standZones([zoneOf(18, [13]), zoneOf(44, [23, 24])]));
    expect(estimate.interval).toMatchObject({ kind: 'insufficient', had: '1 zones with 1' });
  });

  test('is insufficient when a zone was not counted', () => {
    expect(reasonOf(standZones([zoneOf(18, []), zoneOf(44, [23, 24])]))).toBe('zone-not-counted');
  });
});
