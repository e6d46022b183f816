import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { countingEnded } from '@/lib/agronomy/counting-ended';
import { emergenceCurve, lossesByVisit } from '@/lib/agronomy/emergence-curve';
import { emergencePercentile } from '@/lib/agronomy/emergence-percentile';
import { emergenceSpread } from '@/lib/agronomy/emergence-spread';
import { isotonicFit } from '@/lib/agronomy/isotonic-fit';
import type { VisitCount } from '@/lib/agronomy/merged-visits';
import { ImpossibleInput } from '@/lib/agronomy/outcome';
import emergenceMeasures from '../../reference/emergence-measures.json';
import { answerOf, reasonOf } from './answer-of';
import { referenceCase } from './reference-case';

type Percentiles = { T10: number; T25: number; T50: number; T75: number; T90: number };

function visitsOf(days: readonly number[], cumulative: readonly number[]): VisitCount[] {
  return days.map((day, index) => ({ days: day, plantsUp: cumulative[index] as number }));
}

function cumulativeOf(added: readonly number[]): number[] {
  let sum = 0;
  return added.map((plants) => (sum += plants));
}

function daysTo(visits: readonly VisitCount[], share: number): number {
  return answerOf(emergencePercentile(answerOf(emergenceCurve(visits)), share)).days;
}

describe('emergencePercentile', () => {
  test('takes a count equal to the target as that count’s day (EMRG-03)', () => {
    const { input, expected } = referenceCase<
      { t: number[]; cumulative: number[] },
      { T: Percentiles; spread_10_90: number }
    >(emergenceMeasures, 'EMRG-03');
    const visits = visitsOf(input.t, input.cumulative);
    expect(daysTo(visits, 0.1)).toBeCloseTo(expected.T.T10, 9);
    expect(daysTo(visits, 0.25)).toBeCloseTo(expected.T.T25, 9);
    expect(daysTo(visits, 0.5)).toBe(expected.T.T50);
    expect(daysTo(visits, 0.75)).toBeCloseTo(expected.T.T75, 9);
    expect(daysTo(visits, 0.9)).toBe(expected.T.T90);
    const spread = answerOf(emergenceSpread(answerOf(emergenceCurve(visits))));
    expect(spread.days).toBeCloseTo(expected.spread_10_90, 9);
    expect(spread.bound).toBe('exact');
  });

  test('says "by day 5 at the latest" when the first visit found a tenth up (EMRG-04)', () => {
    const { input, expected } = referenceCase<{ t: number[]; new: number[] }, { T: Percentiles }>(
      emergenceMeasures,
      'EMRG-04',
    );
    const curve = answerOf(emergenceCurve(visitsOf(input.t, cumulativeOf(input.new))));
    expect(answerOf(emergencePercentile(curve, 0.1))).toEqual({
      days: 5,
      bound: 'at-latest',
      afterDays: null,
      byDays: 5,
    });
    expect(answerOf(emergencePercentile(curve, 0.5)).days).toBeCloseTo(expected.T.T50, 9);
    expect(answerOf(emergencePercentile(curve, 0.9)).days).toBeCloseTo(expected.T.T90, 9);
    expect(answerOf(emergenceSpread(curve))).toMatchObject({
      bound: 'at-least',
      boundReasons: ['still-coming', 'first-visit-too-late'],
    });
  });

  test('spreads plants that came up in one interval over that interval (EMRG-05)', () => {
    const { input, expected } = referenceCase<
      { t: number[]; new: number[] },
      { T: Percentiles; spread_10_90: number }
    >(emergenceMeasures, 'EMRG-05');
    const visits = visitsOf(input.t, cumulativeOf(input.new));
    expect(daysTo(visits, 0.1)).toBeCloseTo(expected.T.T10, 9);
    expect(daysTo(visits, 0.5)).toBeCloseTo(expected.T.T50, 9);
    expect(daysTo(visits, 0.9)).toBeCloseTo(expected.T.T90, 9);
    expect(answerOf(emergenceSpread(answerOf(emergenceCurve(visits)))).days).toBeCloseTo(
      expected.spread_10_90,
      9,
    );
  });

  test('fits falling counts and keeps the losses as their own number (EMRG-06)', () => {
    const { input, expected } = referenceCase<
      { t: number[]; cumulative: number[] },
      { pava: number[]; lost: number[]; t50_pava: number }
    >(emergenceMeasures, 'EMRG-06');
    const visits = visitsOf(input.t, input.cumulative);
    const curve = answerOf(emergenceCurve(visits));
    expect(curve.points.map((point) => point.plantsUp)).toEqual(expected.pava);
    expect(lossesByVisit(visits)).toEqual(expected.lost);
    expect(curve.plantsLost).toBe(3);
    expect(daysTo(visits, 0.5)).toBeCloseTo(expected.t50_pava, 9);
  });

  test('has nothing to say when nothing came up, and bounds a single plant by its visits (EMRG-07)', () => {
    const { input } = referenceCase<
      { a: { t: number[]; new: number[] }; b: { t: number[]; new: number[] } },
      unknown
    >(emergenceMeasures, 'EMRG-07');
    expect(reasonOf(emergenceCurve(visitsOf(input.a.t, cumulativeOf(input.a.new))))).toBe('nothing-up');
    const single = answerOf(emergenceCurve(visitsOf(input.b.t, cumulativeOf(input.b.new))));
    expect(answerOf(emergencePercentile(single, 0.5))).toMatchObject({ afterDays: 5, byDays: 6 });
  });

  test('is insufficient for the spread when the first visit came after nine tenths were up', () => {
    const curve = answerOf(emergenceCurve(visitsOf([9, 10, 11], [30, 30, 30])));
    expect(reasonOf(emergenceSpread(curve))).toBe('first-visit-after-most-were-up');
  });

  test('works in parts of days, for visits at seven in the morning and six in the evening', () => {
    expect(daysTo(visitsOf([8.79, 9.25, 9.79], [0, 10, 20]), 0.5)).toBe(9.25);
  });
});

describe('emergenceCurve', () => {
  test('is insufficient without a count', () => {
    expect(emergenceCurve([])).toMatchObject({ kind: 'insufficient', reason: 'no-counts' });
  });

  test('takes two counts of one moment together', () => {
    const curve = answerOf(emergenceCurve(visitsOf([8, 9, 9], [0, 20, 22])));
    expect(curve.points).toEqual([
      { days: 8, plantsUp: 0 },
      { days: 9, plantsUp: 21 },
    ]);
  });

  test('refuses visits out of order, negative counts and days that are no number', () => {
    expect(() => emergenceCurve(visitsOf([9, 8], [1, 2]))).toThrow(ImpossibleInput);
    expect(() => emergenceCurve(visitsOf([8, 9], [1, -2]))).toThrow(ImpossibleInput);
    expect(() => emergenceCurve(visitsOf([Number.NaN], [1]))).toThrow(ImpossibleInput);
  });

  test('leaves frozen counts as they were', () => {
    const visits = Object.freeze(visitsOf([5, 6, 7], [2, 9, 8]).map((visit) => Object.freeze(visit)));
    expect(() => emergenceCurve(visits)).not.toThrow();
  });

  test('shifts every percentile by as many days as the visits are shifted', () => {
    const counts = fc.array(fc.nat(12), { minLength: 3, maxLength: 12 });
    fc.assert(
      fc.property(counts, fc.integer({ min: 1, max: 40 }), (added, shift) => {
        const days = added.map((_, index) => 5 + index);
        const cumulative = cumulativeOf([0, ...added.slice(1)]);
        fc.pre((cumulative[cumulative.length - 1] as number) > 0);
        const here = visitsOf(days, cumulative);
        const later = here.map((visit) => ({ ...visit, days: visit.days + shift }));
        for (const share of [0.1, 0.5, 0.9]) {
          expect(daysTo(later, share)).toBeCloseTo(daysTo(here, share) + shift, 9);
        }
      }),
    );
  });

  test('does not depend on how many times over the plants are counted', () => {
    fc.assert(
      fc.property(
        fc.array(fc.nat(12), { minLength: 3, maxLength: 12 }),
        fc.integer({ min: 2, max: 9 }),
        (added, times) => {
          const days = added.map((_, index) => 5 + index);
          const cumulative = cumulativeOf([0, ...added.slice(1)]);
          fc.pre((cumulative[cumulative.length - 1] as number) > 0);
          const here = visitsOf(days, cumulative);
          const more = here.map((visit) => ({ ...visit, plantsUp: visit.plantsUp * times }));
          expect(daysTo(more, 0.5)).toBeCloseTo(daysTo(here, 0.5), 9);
        },
      ),
    );
  });
});

describe('isotonicFit', () => {
  test('never falls and keeps the sum', () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 0, max: 60 }), { minLength: 1 }), (readings) => {
        const fitted = isotonicFit(readings);
        const sum = (numbers: readonly number[]) => numbers.reduce((total, each) => total + each, 0);
        expect(sum(fitted)).toBeCloseTo(sum(readings), 6);
        fitted.slice(1).forEach((each, index) => {
          expect(each).toBeGreaterThanOrEqual((fitted[index] as number) - 1e-12);
        });
      }),
    );
  });
});

describe('countingEnded', () => {
  test.each([
    { plants: [0, 30, 33, 33, 33], ended: true },
    { plants: [0, 30, 33, 33], ended: false },
    { plants: [30, 33, 32, 33], ended: true },
    { plants: [33, 33], ended: false },
    { plants: [0, 0, 0], ended: false },
  ])('is $ended after $plants', ({ plants, ended }) => {
    expect(countingEnded(plants.map((plantsUp, index) => ({ days: 8 + index, plantsUp })))).toBe(ended);
  });

  test('takes two people at one moment as one visit', () => {
    expect(countingEnded(visitsOf([8, 9, 10, 10], [0, 30, 30, 30]))).toBe(false);
  });
});
