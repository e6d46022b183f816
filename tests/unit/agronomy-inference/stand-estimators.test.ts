import { describe, expect, test } from 'vitest';
import { NORMAL_QUANTILE_975 } from '../../../lib/agronomy/constants';
import { chiSquareTails } from '../../../lib/agronomy/inference/chi-square-tails';
import { exactShareInterval } from '../../../lib/agronomy/inference/exact-share-interval';
import { moreRowSamples } from '../../../lib/agronomy/inference/more-row-samples';
import { ratioOfSums } from '../../../lib/agronomy/inference/ratio-of-sums';
import { rowSamplesNeeded } from '../../../lib/agronomy/inference/row-samples-needed';
import { standDispersion } from '../../../lib/agronomy/inference/stand-dispersion';
import { standInterval, standStrips } from '../../../lib/agronomy/inference/stand-interval';
import { ImpossibleInput } from '../../../lib/agronomy/outcome';
import { wilsonInterval } from '../../../lib/agronomy/share-of-seed';
import published from '../../reference/published-stand-counts.json';
import estimators from '../../reference/stand-estimators.json';
import standMeasures from '../../reference/stand-measures.json';
import { answerOf, reasonOf } from '../agronomy/answer-of';
import { referenceCase } from '../agronomy/reference-case';

function expectClose(figured: number, expected: number): void {
  expect(Math.abs(figured / expected - 1)).toBeLessThan(1e-9);
}

const unitsOf = (plants: readonly number[], lengths: readonly number[] = []) =>
  plants.map((plantsHeld, index) => ({ plantsHeld, areaAcres: (lengths[index] ?? 17.424) / 17_424 }));

describe('standDispersion', () => {
  test.each([
    { name: 'evenly set plants', expected: estimators.dispersionEven },
    { name: 'unequal lengths', expected: estimators.dispersionUnequal },
    { name: 'plants in patches', expected: estimators.dispersionPatchy },
  ])('is the chi-square test of R for $name', ({ expected }) => {
    const dispersion = answerOf(standDispersion(unitsOf(expected.plants, expected.lengths)));
    const { chiSquare, pPatchy, pEven, p } = answerOf(dispersion.test);
    expectClose(dispersion.index, expected.index);
    expectClose(chiSquare, expected.chiSquare);
    expect(dispersion.degreesOfFreedom).toBe(expected.degreesOfFreedom);
    expect(Math.abs(pPatchy - expected.pPatchy)).toBeLessThan(1e-12);
    expect(Math.abs(pEven - expected.pEven)).toBeLessThan(1e-11);
    expect(p).toBe(2 * Math.min(pPatchy, pEven));
  });

  test('is the variance over the mean for equal lengths, and falls as counts and areas are halved', () => {
    const plants = [31, 28, 33, 26, 30, 29];
    const { sd, mean } = referenceCase<unknown, { sd: number; mean: number }>(
      standMeasures,
      'AREA-04',
    ).expected;
    const { index } = answerOf(standDispersion(unitsOf(plants)));
    // Plants in 1/1000 acre are thousandths of the reference's plants per acre.
    expectClose(index, sd ** 2 / mean / 1000);
    expectClose(answerOf(standDispersion(unitsOf(plants.map((each) => each / 2)))).index, index / 2);
  });

  test('has an index but no test where a place would hold fewer than five plants', () => {
    const dispersion = answerOf(standDispersion(unitsOf([2, 4, 3])));
    // Variance 1 over mean 3, by hand.
    expectClose(dispersion.index, 1 / 3);
    expect(reasonOf(dispersion.test)).toBe('few-plants-a-place');
    expect(answerOf(standDispersion(unitsOf([5, 5, 5]))).test.kind).toBe('value');
  });

  test('looks at the place that would hold fewest, however many the others hold', () => {
    const dispersion = answerOf(standDispersion(unitsOf([40, 41, 3], [20, 20, 1])));
    expect(reasonOf(dispersion.test)).toBe('few-plants-a-place');
  });

  test.each([
    { plants: [], reason: 'too-few-places' },
    { plants: [31], reason: 'too-few-places' },
    { plants: [0, 0], reason: 'none-standing' },
  ])('is insufficient for $plants', ({ plants, reason }) => {
    expect(reasonOf(standDispersion(unitsOf(plants)))).toBe(reason);
  });

  test.each([Number.NaN, Number.POSITIVE_INFINITY, -1])('refuses %s plants', (plants) => {
    expect(() => standDispersion(unitsOf([31, plants]))).toThrow(
      expect.objectContaining({ field: 'plantsHeld' }),
    );
  });

  test('refuses a place without an area', () => {
    expect(() => standDispersion(unitsOf([31, 30], [17, 0]))).toThrow(
      expect.objectContaining({ field: 'areaAcres' }),
    );
  });
});

describe('chiSquareTails', () => {
  test('adds up to 1, with 3.841459 as the 95 % point on one degree of freedom', () => {
    // 1.959964 squared; the table value printed everywhere.
    const { lower, upper } = chiSquareTails(NORMAL_QUANTILE_975 ** 2, 1);
    expect(lower).toBeCloseTo(0.95, 12);
    expect(upper).toBeCloseTo(0.05, 12);
    expect(chiSquareTails(0, 3)).toEqual({ lower: 0, upper: 1 });
  });

  test.each([
    [-1, 3],
    [Number.NaN, 3],
    [1, 0],
    [1, Number.NaN],
  ])('refuses %s on %s degrees of freedom', (statistic, degreesOfFreedom) => {
    expect(() => chiSquareTails(statistic, degreesOfFreedom)).toThrow(ImpossibleInput);
  });
});

describe('rowSamplesNeeded', () => {
  type Grid = { grid: { cv: number; E: number; n_t: number; n_z: number }[] };
  const { grid } = referenceCase<unknown, Grid>(standMeasures, 'SAMP-01').expected;

  test.each(grid)('is $n_t for CV $cv % within $E % (SAMP-01), where the normal says $n_z', (cell) => {
    expect(rowSamplesNeeded(cell.cv / 100, cell.E / 100)).toBe(cell.n_t);
    expect(Math.max(1, Math.ceil(((NORMAL_QUANTILE_975 * cell.cv) / cell.E) ** 2))).toBe(cell.n_z);
  });

  test('asks for 7 where the normal asks for 4', () => {
    const { cv, withinShare, byT } = published.sampleSize;
    expect(rowSamplesNeeded(cv, withinShare)).toBe(byT);
  });

  test('is two where row samples do not differ', () => {
    expect(rowSamplesNeeded(0, 0.05)).toBe(2);
  });

  test('answers at once for a precision no one walks for', () => {
    // For so many t is the normal's: 1.959964² × 10⁶ = 3,841,459, and a few more.
    const needed = rowSamplesNeeded(1, 0.001);
    expect(needed - 3_841_459).toBeGreaterThanOrEqual(0);
    expect(needed - 3_841_459).toBeLessThan(5);
  });

  test.each([
    [-0.1, 0.1, 'cv'],
    [Number.NaN, 0.1, 'cv'],
    [Number.POSITIVE_INFINITY, 0.1, 'cv'],
    [0.1, 0, 'withinShare'],
    [0.1, -0.1, 'withinShare'],
    [0.1, Number.NaN, 'withinShare'],
  ])('refuses a CV of %s within %s', (cv, within, field) => {
    expect(() => rowSamplesNeeded(cv, within)).toThrow(expect.objectContaining({ field }));
  });
});

describe('moreRowSamples', () => {
  const { plants, within, cv, needed } = estimators.needed;

  test('says how many more, from how those counted differ', () => {
    const more = answerOf(moreRowSamples(unitsOf(plants), within));
    expectClose(more.cv, cv);
    expect(more).toMatchObject({ needed, had: 6, more: needed - 6 });
  });

  test('is none more where those counted already do, and says what they reach (AREA-04)', () => {
    const { mean, upper } = referenceCase<unknown, { mean: number; upper: number }>(
      standMeasures,
      'AREA-04',
    ).expected;
    const more = answerOf(moreRowSamples(unitsOf(plants), 0.2));
    expect(more.more).toBe(0);
    expectClose(more.withinShareNow, upper / mean - 1);
  });

  test.each([
    { counted: [], reason: 'no-row-samples' },
    { counted: [31], reason: 'one-place' },
    { counted: [0, 0], reason: 'none-standing' },
  ])('is insufficient for $counted', ({ counted, reason }) => {
    expect(reasonOf(moreRowSamples(unitsOf(counted), 0.1))).toBe(reason);
  });

  test('refuses a precision of none, whatever was counted', () => {
    expect(() => moreRowSamples([], 0)).toThrow(expect.objectContaining({ field: 'withinShare' }));
  });
});

describe('exactShareInterval', () => {
  test('agrees with PROP-01, Clopper and Pearson', () => {
    const { input, expected } = referenceCase<
      { x: number[]; n: number[] },
      { cp_lower: number[]; cp_upper: number[] }
    >(standMeasures, 'PROP-01');
    input.x.forEach((hits, index) => {
      const interval = exactShareInterval(hits, input.n[index] as number);
      expect(interval.shareLower).toBeCloseTo(expected.cp_lower[index] as number, 9);
      expect(interval.shareUpper).toBeCloseTo(expected.cp_upper[index] as number, 9);
    });
  });

  test('agrees with R for 31 of 34, none, all and 44 of 100', () => {
    const { hits, trials, lower, upper } = estimators.exactShare;
    hits.forEach((each, index) => {
      const interval = exactShareInterval(each, trials[index] as number);
      expect(interval.shareLower).toBeCloseTo(lower[index] as number, 9);
      expect(interval.shareUpper).toBeCloseTo(upper[index] as number, 9);
    });
  });

  test.each([
    [31.5, 34, 'hits'],
    [-1, 34, 'hits'],
    [35, 34, 'hits'],
    [0, 0, 'trials'],
    [0, 3.5, 'trials'],
    [Number.NaN, 34, 'hits'],
  ])('refuses %s of %s', (hits, trials, field) => {
    expect(() => exactShareInterval(hits, trials)).toThrow(expect.objectContaining({ field }));
  });

  test('lies around Wilson’s where some but not all stand', () => {
    for (let hits = 1; hits < 34; hits += 1) {
      const exact = exactShareInterval(hits, 34);
      const wilson = answerOf(wilsonInterval(hits, 34));
      expect(exact.shareUpper - exact.shareLower).toBeGreaterThan(wilson.shareUpper - wilson.shareLower);
    }
  });
});

describe('ratioOfSums', () => {
  test('is the ratio estimator of AREA-05, per foot', () => {
    const { input, expected } = referenceCase<
      { count: number[]; length_ft: number[] },
      { ratio_per_ft: number; plants_per_acre: number; se: number; upper: number }
    >(standMeasures, 'AREA-05');
    const ratio = ratioOfSums(
      input.count.map((amount, index) => ({ amount, size: input.length_ft[index] as number })),
    );
    const perAcre = expected.plants_per_acre / expected.ratio_per_ft;
    expectClose(ratio.ratio, expected.ratio_per_ft);
    expectClose(ratio.standardError * perAcre, expected.se);
    expectClose(ratio.reach * perAcre, expected.upper - expected.plants_per_acre);
    expect(ratio.degreesOfFreedom).toBe(5);
  });
});

describe('standInterval and standStrips', () => {
  const sound = { plantsHeld: 30, areaAcres: 0.001 };

  test.each([
    { field: 'plantsHeld', plantsHeld: -1, areaAcres: 0.001 },
    { field: 'plantsHeld', plantsHeld: Number.NaN, areaAcres: 0.001 },
    { field: 'areaAcres', plantsHeld: 30, areaAcres: 0 },
    { field: 'areaAcres', plantsHeld: 30, areaAcres: Number.POSITIVE_INFINITY },
  ])('refuse $plantsHeld plants on $areaAcres acres, alone or among the sound ones of a strip', (place) => {
    const { field, ...unit } = place;
    expect(() => standInterval([sound, unit], 'row-samples')).toThrow(expect.objectContaining({ field }));
    const inStrip = [sound, unit].map((each) => ({ ...each, stripId: 'A' }));
    expect(() => standStrips(inStrip)).toThrow(expect.objectContaining({ field }));
  });

  test('refuse a strip without a name', () => {
    expect(() => standStrips([{ ...sound, stripId: '' }])).toThrow(
      expect.objectContaining({ field: 'stripId' }),
    );
  });

  test('say which place they had too few of', () => {
    const one = (basis: 'strips' | 'row-samples') => answerOf(standInterval([sound], basis)).interval;
    expect(one('strips')).toMatchObject({ needed: '2 strips', had: '1 strip' });
    expect(one('row-samples')).toMatchObject({ needed: '2 row samples', had: '1 row sample' });
  });

  test('call the interval a ratio as soon as one area differs', () => {
    const method = (lengths: number[]) =>
      answerOf(answerOf(standInterval(unitsOf([30, 31, 29], lengths), 'row-samples')).interval).method;
    expect(method([10, 10, 10])).toBe('t-of-mean');
    expect(method([9, 10, 11])).toBe('ratio-linearized');
  });
});
