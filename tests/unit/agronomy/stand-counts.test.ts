import { describe, expect, test } from 'vitest';
import { cutRow } from '@/lib/agronomy/cut-row';
import { hoopFactor, hoopSquareFeet } from '@/lib/agronomy/hoop-factor';
import { hoopStand } from '@/lib/agronomy/hoop-stand';
import { standInterval } from '@/lib/agronomy/inference/stand-interval';
import { ImpossibleInput } from '@/lib/agronomy/outcome';
import { rowLengthFeet, rowLengthMeters } from '@/lib/agronomy/row-length';
import { rowSamplesAlike } from '@/lib/agronomy/row-samples-alike';
import { standByDoubtful } from '@/lib/agronomy/stand-by-doubtful';
import { wheelStand } from '@/lib/agronomy/wheel-stand';
import published from '../../reference/published-stand-counts.json';
import estimators from '../../reference/stand-estimators.json';
import standMeasures from '../../reference/stand-measures.json';
import { answerOf, reasonOf } from './answer-of';
import { referenceCase } from './reference-case';

const marks = { startEnd: 'mark', farEnd: 'mark' } as const;
const plants = { startEnd: 'plant', farEnd: 'plant' } as const;
const refused = [Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY, -1, 0];

function expectClose(figured: number, expected: number, relative = 1e-9): void {
  expect(Math.abs(figured / expected - 1)).toBeLessThan(relative);
}

describe('rowLengthMeters', () => {
  test('is 13.33 m at 0.75 m, and the same piece of ground as in feet and acres', () => {
    const { rowSpacingMeters, meters, tolerance } = published.rowLengthMeters;
    expect(Math.abs(rowLengthMeters(rowSpacingMeters) - meters)).toBeLessThan(tolerance);
    // 1/1000 ha over 1/1000 acre is 2.4710538 (definition of both).
    const feet = rowLengthFeet(rowSpacingMeters / 0.0254);
    expectClose(rowLengthMeters(rowSpacingMeters) / (feet * 0.3048), 2.471053814671653, 1e-12);
  });

  test.each(refused)('refuses a row spacing of %s', (spacing) => {
    expect(() => rowLengthMeters(spacing)).toThrow(ImpossibleInput);
  });
});

describe('cutRow', () => {
  const piece = (lengthInches: number, plantsUp: number) => ({
    lengthInches,
    plantsUp,
    plantsDoubtful: 0,
    ...marks,
  });

  test('adds lengths and plants of the pieces', () => {
    expect(answerOf(cutRow([piece(120, 18), piece(89.088, 12)]))).toEqual({
      plantsHeld: 30,
      lengthInches: 209.088,
      segments: 2,
    });
  });

  test('settles the ends and the doubtful plants of every piece by itself', () => {
    const row = answerOf(
      cutRow([
        { ...piece(68, 11), ...plants },
        { ...piece(60, 10), plantsDoubtful: 2 },
      ]),
    );
    expect(row.plantsHeld).toBe(10 + 9);
  });

  test('is insufficient without a piece', () => {
    expect(reasonOf(cutRow([]))).toBe('no-segments');
  });

  test.each(refused)('refuses a piece of %s in, and names the field', (length) => {
    expect(() => cutRow([piece(120, 18), piece(length, 3)])).toThrow(
      expect.objectContaining({ field: 'lengthInches' }),
    );
  });

  test('refuses a negative count in any piece', () => {
    expect(() => cutRow([piece(120, 18), piece(60, -3)])).toThrow(ImpossibleInput);
  });
});

describe('hoopFactor', () => {
  test.each(published.hoopFactor.rows)('is the printed one at $diameterInches in', (row) => {
    expectClose(hoopFactor(row.diameterInches), row.factor, published.hoopFactor.toleranceShare);
  });

  test('falls with the square of the diameter', () => {
    expectClose(hoopFactor(18) / hoopFactor(36), 4, 1e-12);
  });

  test.each(refused)('refuses a diameter of %s', (diameter) => {
    expect(() => hoopFactor(diameter)).toThrow(expect.objectContaining({ field: 'diameterInches' }));
    expect(() => hoopSquareFeet(diameter)).toThrow(ImpossibleInput);
  });
});

describe('hoopStand', () => {
  test.each(published.hoopStands.rows)('makes $plants plants in $diameterInches in $plantsPerAcre', (row) => {
    const stand = answerOf(hoopStand([row.plants], row.diameterInches));
    expectClose(stand.plantsPerAcre, row.plantsPerAcre, published.hoopStands.toleranceShare);
  });

  test('makes 36 plants in a 30-in hoop 7.33 per square foot', () => {
    const { plantsPerSquareFoot } = answerOf(hoopStand([36], 30));
    expect(plantsPerSquareFoot).toBeCloseTo(published.hoopStands.plantsPerSquareFoot, 2);
  });

  test('hands its throws on as places, whose t interval is that of R', () => {
    const { plants: counted, diameterInches, plantsPerAcre: mean, lower, upper } = estimators.hoops;
    const stand = answerOf(hoopStand(counted, diameterInches));
    expectClose(stand.plantsPerAcre, mean);
    const estimate = answerOf(standInterval(stand.throws, 'row-samples'));
    const interval = answerOf(estimate.interval);
    expectClose(interval.plantsPerAcreLower, lower);
    expectClose(interval.plantsPerAcreUpper, upper);
  });

  test('is 0 where every throw was empty, and insufficient without one', () => {
    expect(answerOf(hoopStand([0, 0], 30)).plantsPerAcre).toBe(0);
    expect(reasonOf(hoopStand([], 30))).toBe('no-throws');
  });

  test.each([Number.NaN, Number.POSITIVE_INFINITY, -1])('refuses %s plants', (counted) => {
    expect(() => hoopStand([18, counted], 30)).toThrow(expect.objectContaining({ field: 'plants' }));
  });

  test('refuses a hoop without a width before it looks at the plants', () => {
    expect(() => hoopStand([], 0)).toThrow(expect.objectContaining({ field: 'diameterInches' }));
  });
});

describe('wheelStand', () => {
  const { plants: plantsPassed, distanceInches, rowSpacingInches } = published.wheel;
  const wheel = { plantsPassed, distanceInches, rowSpacingInches };

  test('holds one plant fewer than were passed from a plant to a plant', () => {
    const stand = answerOf(wheelStand({ ...wheel, ...plants }));
    expect(stand.plantsHeld).toBe(10);
    expect(Math.abs(stand.plantsPerAcre - published.wheel.plantsPerAcre)).toBeLessThan(
      published.wheel.tolerance,
    );
    expectClose(stand.plantsHeld / stand.areaAcres, stand.plantsPerAcre, 1e-12);
  });

  test.each([
    { plantsPassed: 1, ...plants },
    { plantsPassed: 0, ...plants },
    { plantsPassed: 0, startEnd: 'plant', farEnd: 'mark' } as const,
  ])('is insufficient with $plantsPassed plants from a $startEnd to a $farEnd', (short) => {
    expect(wheelStand({ ...wheel, ...short })).toMatchObject({
      reason: 'too-few-plants',
      had: `${short.plantsPassed}`,
    });
  });

  test('is 0 plants per acre where none stood between two marks', () => {
    expect(answerOf(wheelStand({ ...wheel, plantsPassed: 0, ...marks })).plantsPerAcre).toBe(0);
  });

  test('has a stand of one space from two plants', () => {
    expect(answerOf(wheelStand({ ...wheel, plantsPassed: 2, ...plants })).plantsHeld).toBe(1);
  });

  test.each([-1, 10.5, Number.NaN])('refuses %s plants', (passed) => {
    expect(() => wheelStand({ ...wheel, plantsPassed: passed, ...plants })).toThrow(
      expect.objectContaining({ field: 'plantsPassed' }),
    );
  });

  test.each(refused)('refuses a distance of %s', (distance) => {
    expect(() => wheelStand({ ...wheel, distanceInches: distance, ...plants })).toThrow(ImpossibleInput);
  });
});

describe('standByDoubtful', () => {
  const row = { plantsUp: 30, plantsDoubtful: 6, lengthInches: 209.088, rowSpacingInches: 30, ...marks };

  test('has none, half and all of the doubtful plants live', () => {
    const stand = standByDoubtful(row);
    expect(stand.plantsPerAcreNoneLive).toBeCloseTo(24_000, 6);
    expect(stand.plantsPerAcreHalfLive).toBeCloseTo(27_000, 6);
    expect(stand.plantsPerAcreAllLive).toBeCloseTo(30_000, 6);
  });

  test('is one stand three times where no plant is doubtful', () => {
    const stand = standByDoubtful({ ...row, plantsDoubtful: 0 });
    expect(new Set(Object.values(stand)).size).toBe(1);
  });

  test('divides by all rows counted', () => {
    expect(standByDoubtful({ ...row, rowsCounted: 2 }).plantsPerAcreAllLive).toBeCloseTo(15_000, 6);
  });

  test('refuses more doubtful plants than plants', () => {
    expect(() => standByDoubtful({ ...row, plantsDoubtful: 31 })).toThrow(
      expect.objectContaining({ field: 'plantsDoubtful' }),
    );
  });
});

describe('rowSamplesAlike', () => {
  const rowsOf = (figures: readonly number[], strips: readonly number[]) =>
    figures.map((figure, index) => ({ figure, stripId: String(strips[index]) }));

  test('agrees with AREA-09', () => {
    const { input, expected } = referenceCase<
      { y: number[]; plot: number[] },
      { ms_plots: number; ms_within: number; var_within: number; var_plots: number; icc: number }
    >(standMeasures, 'AREA-09');
    const alike = answerOf(rowSamplesAlike(rowsOf(input.y, input.plot)));
    expectClose(alike.meanSquareStrips, expected.ms_plots);
    expectClose(alike.meanSquareWithin, expected.ms_within);
    expectClose(alike.varianceWithin, expected.var_within);
    expectClose(alike.varianceStrips, expected.var_plots);
    expectClose(answerOf(alike.likeness), expected.icc);
  });

  test('agrees with R where strips have unlike numbers of row samples', () => {
    const { figures, strips, ...expected } = estimators.alikeUnequal;
    const alike = answerOf(rowSamplesAlike(rowsOf(figures, strips)));
    expectClose(alike.meanSquareStrips, expected.meanSquareStrips);
    expectClose(alike.meanSquareWithin, expected.meanSquareWithin);
    expectClose(alike.varianceStrips, expected.varianceStrips);
    expectClose(answerOf(alike.likeness), expected.likeness);
  });

  test('is 0 where row samples of a strip differ more than strips do', () => {
    const alike = answerOf(rowSamplesAlike(rowsOf([20, 40, 21, 39], [1, 1, 2, 2])));
    expect(alike.varianceStrips).toBe(0);
    expect(answerOf(alike.likeness)).toBe(0);
  });

  test('has no likeness where all are equal', () => {
    const alike = answerOf(rowSamplesAlike(rowsOf([30, 30, 30, 30], [1, 1, 2, 2])));
    expect(reasonOf(alike.likeness)).toBe('no-spread');
  });

  test.each([
    { figures: [], strips: [], reason: 'one-strip' },
    { figures: [30, 31], strips: [1, 1], reason: 'one-strip' },
    { figures: [30, 31], strips: [1, 2], reason: 'single-row-samples' },
  ])('is insufficient for strips $strips', ({ figures, strips, reason }) => {
    expect(reasonOf(rowSamplesAlike(rowsOf(figures, strips)))).toBe(reason);
  });

  test('refuses a figure that is no number and a strip without a name', () => {
    expect(() => rowSamplesAlike(rowsOf([30, Number.NaN], [1, 1]))).toThrow(
      expect.objectContaining({ field: 'figure' }),
    );
    expect(() => rowSamplesAlike([{ stripId: '', figure: 30 }])).toThrow(
      expect.objectContaining({ field: 'stripId' }),
    );
  });
});
