import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { doublesAndGaps } from '@/lib/agronomy/doubles-and-gaps';
import { kachmanSmith, type Placement } from '@/lib/agronomy/kachman-smith';
import { missingPlantsSdInches } from '@/lib/agronomy/missing-plants-sd';
import { ImpossibleInput, type Outcome } from '@/lib/agronomy/outcome';
import { spacingInchesMean, spacingsInches, spacingVariation } from '@/lib/agronomy/spacing';
import { theoreticalSpacingInches } from '@/lib/agronomy/theoretical-spacing';
import published from '../../reference/published-examples.json';
import spacingMeasures from '../../reference/spacing-measures.json';
import { answerOf, reasonOf } from './answer-of';
import { referenceCase } from './reference-case';

type Expected = {
  N: number;
  regions: number[];
  mean: number;
  sd: number | null;
  cv_pct: number | null;
  D: number;
  M: number;
  A: number;
  precision_C: number | null;
  iso: { n_prime: number; multiples: number; miss: number; feed: number };
};

/** Compares with an expected number, where null stands for our insufficient. */
function expectOutcome(figured: Outcome<number>, expected: number | null, factor = 1): void {
  if (expected === null) expect(figured.kind).toBe('insufficient');
  else expect(answerOf(figured) * factor).toBeCloseTo(expected, 8);
}

function expectAll(spacings: readonly number[], theoretical: number, expected: Expected): void {
  const variation = spacingVariation(spacings);
  const sd = variation.kind === 'value' ? variation.value.spacingInchesSd : null;
  if (expected.sd === null) expect(sd).toBeNull();
  else expect(sd).toBeCloseTo(expected.sd, 8);
  if (variation.kind === 'value') expectOutcome(variation.value.spacingCv, expected.cv_pct, 100);
  expect(answerOf(spacingInchesMean(spacings))).toBeCloseTo(expected.mean, 8);
  const placement: Placement = answerOf(
    kachmanSmith([{ spacingsInches: spacings, theoreticalSpacingInches: theoretical }]),
  );
  expect(placement.spacings).toBe(expected.N);
  expect(placement.regions).toEqual(expected.regions);
  expect(placement.ofSpacings.multiplesShare * 100).toBeCloseTo(expected.D, 8);
  expect(placement.ofSpacings.missesShare * 100).toBeCloseTo(expected.M, 8);
  expect(placement.ofSpacings.singlesShare * 100).toBeCloseTo(expected.A, 8);
  expect(placement.theoreticalPlaces).toBe(expected.iso.n_prime);
  expect(placement.ofPlaces.multiplesShare * 100).toBeCloseTo(expected.iso.multiples, 8);
  expect(placement.ofPlaces.missesShare * 100).toBeCloseTo(expected.iso.miss, 8);
  expect(placement.ofPlaces.singlesShare * 100).toBeCloseTo(expected.iso.feed, 8);
  expectOutcome(placement.precision, expected.precision_C, 100);
}

describe('spacing against the reference values', () => {
  test.each(['SPAC-01', 'SPAC-03', 'SPAC-04'])('agrees with %s', (id) => {
    const { input, expected } = referenceCase<{ positions: number[]; xref: number }, Expected>(
      spacingMeasures,
      id,
    );
    expectAll(spacingsInches(input.positions), input.xref, expected);
  });

  test('closes the limits 0.5, 1.5, 2.5 and 3.5 on the right (SPAC-02)', () => {
    const { input, expected } = referenceCase<{ spacings: number[]; xref: number }, Expected>(
      spacingMeasures,
      'SPAC-02',
    );
    expectAll(input.spacings, input.xref, expected);
  });

  test('has shares but no SD from one spacing, and nothing from one plant or none (SPAC-05)', () => {
    const { input, expected } = referenceCase<
      { a: { positions: number[]; xref: number }; b: { positions: number[] }; c: { positions: number[] } },
      { a: Expected }
    >(spacingMeasures, 'SPAC-05');
    expectAll(spacingsInches(input.a.positions), input.a.xref, expected.a);
    for (const positions of [input.b.positions, input.c.positions]) {
      const spacings = spacingsInches(positions);
      expect(spacings).toEqual([]);
      const rows = [{ spacingsInches: spacings, theoreticalSpacingInches: 6 }];
      expect(reasonOf(kachmanSmith(rows))).toBe('too-few-spacings');
      expect(spacingVariation(spacings)).toMatchObject({ kind: 'insufficient', had: '0 spacings' });
    }
  });

  test('takes the theoretical spacing from the seeding rate (SPAC-07)', () => {
    const { input, expected } = referenceCase<
      { seeds_per_acre: number[]; row_width_in: number[] },
      { xref_in: number[] }
    >(spacingMeasures, 'SPAC-07');
    input.seeds_per_acre.forEach((seeds, index) => {
      const inches = theoreticalSpacingInches(seeds, input.row_width_in[index] as number);
      expect(inches).toBeCloseTo(expected.xref_in[index] as number, 10);
    });
  });

  test('describes as R does, also far from zero (DESC-01, DESC-02)', () => {
    const first = referenceCase<{ x: number[] }, { mean: number; sd: number; cv_pct: number }>(
      spacingMeasures,
      'DESC-01',
    );
    const variation = answerOf(spacingVariation(first.input.x));
    expect(variation.spacingInchesMean).toBeCloseTo(first.expected.mean, 9);
    expect(variation.spacingInchesSd).toBeCloseTo(first.expected.sd, 9);
    expect(answerOf(variation.spacingCv) * 100).toBeCloseTo(first.expected.cv_pct, 8);
    const far = referenceCase<{ x: number[] }, { var: number }>(spacingMeasures, 'DESC-02');
    expect(answerOf(spacingVariation(far.input.x)).spacingInchesSd ** 2).toBeCloseTo(far.expected.var, 9);
  });

  test('has a mean and no SD from one value (DESC-03)', () => {
    const { input, expected } = referenceCase<{ x1: number[] }, { mean: number }>(spacingMeasures, 'DESC-03');
    expect(answerOf(spacingInchesMean(input.x1))).toBe(expected.mean);
    expect(reasonOf(spacingVariation(input.x1))).toBe('too-few-spacings');
  });
});

describe('the printed tape readings', () => {
  const spacings = spacingsInches(published.tapeReadings.positionsInches);

  test('have a mean of 6.8 and an SD of 5.1 in, not 4.85', () => {
    const variation = answerOf(spacingVariation(spacings));
    const { spacingInchesMean: mean, spacingInchesSd: sd, tolerance } = published.tapeReadings;
    expect(Math.abs(variation.spacingInchesMean - mean)).toBeLessThan(tolerance);
    expect(Math.abs(variation.spacingInchesSd - sd)).toBeLessThan(tolerance);
  });

  test('hold one double and two gaps with their lengths', () => {
    const found = answerOf(doublesAndGaps(spacings));
    expect(found).toMatchObject({ doubles: 1, gaps: 2, gapLengthsInches: [15, 16], gapInchesTotal: 31 });
  });
});

describe('doublesAndGaps', () => {
  test('takes 2 in as no double and 12 in as a gap', () => {
    expect(answerOf(doublesAndGaps([2, 1.99, 11.99, 12]))).toMatchObject({ doubles: 1, gaps: 1 });
  });

  test('is insufficient without a spacing', () => {
    expect(reasonOf(doublesAndGaps([]))).toBe('too-few-spacings');
  });
});

describe('kachmanSmith', () => {
  test('joins rows without bridging them, each by its own theoretical spacing', () => {
    const placement = answerOf(
      kachmanSmith([
        { spacingsInches: spacingsInches([0, 6, 12]), theoreticalSpacingInches: 6 },
        { spacingsInches: spacingsInches([100, 112]), theoreticalSpacingInches: 12 },
      ]),
    );
    expect(placement.regions).toEqual([0, 3, 0, 0, 0]);
  });

  test('takes 1.5 as a single though decimals put it a hair above', () => {
    // 0.9 / 0.6 is 1.5000000000000002 in binary arithmetic.
    const placement = answerOf(kachmanSmith([{ spacingsInches: [0.9], theoreticalSpacingInches: 0.6 }]));
    expect(placement.regions).toEqual([0, 1, 0, 0, 0]);
  });
});

describe('missingPlantsSdInches', () => {
  test('agrees with a geometric number of places to the next plant', () => {
    // Mean and SD of places drawn by the geometric law, summed directly rather than by the closed form.
    const missing = 0.25;
    let mean = 0;
    let meanOfSquares = 0;
    for (let places = 1; places < 400; places += 1) {
      const chance = (1 - missing) * missing ** (places - 1);
      mean += chance * places;
      meanOfSquares += chance * places ** 2;
    }
    const sd = 6 * Math.sqrt(meanOfSquares - mean ** 2);
    expect(answerOf(missingPlantsSdInches(6, 1 - missing))).toBeCloseTo(sd, 9);
  });

  test('is 0 when everything stands and insufficient when nothing does', () => {
    expect(answerOf(missingPlantsSdInches(6, 1.05))).toBe(0);
    expect(reasonOf(missingPlantsSdInches(6, 0))).toBe('nothing-up');
  });
});

describe('properties of spacing', () => {
  const steps = fc.array(fc.integer({ min: 1, max: 3000 }), { minLength: 2, maxLength: 40 });
  const placesOf = (found: readonly number[]) => {
    let place = 0;
    return [0, ...found.map((step) => (place += step / 100))];
  };
  const variationOf = (places: readonly number[]) => answerOf(spacingVariation(spacingsInches(places)));

  test('a shifted row is the same', () => {
    fc.assert(
      fc.property(steps, fc.integer({ min: 1, max: 500 }), (found, shift) => {
        const here = variationOf(placesOf(found));
        const there = variationOf(placesOf(found).map((place) => place + shift));
        expect(there.spacingInchesSd).toBeCloseTo(here.spacingInchesSd, 8);
        expect(there.spacingInchesMean).toBeCloseTo(here.spacingInchesMean, 8);
      }),
    );
  });

  test('a row scaled by k has k times the mean and the same CV', () => {
    fc.assert(
      fc.property(steps, fc.integer({ min: 2, max: 9 }), (found, k) => {
        const here = variationOf(placesOf(found));
        const there = variationOf(placesOf(found).map((place) => place * k));
        expect(there.spacingInchesMean).toBeCloseTo(here.spacingInchesMean * k, 6);
        expect(answerOf(there.spacingCv)).toBeCloseTo(answerOf(here.spacingCv), 8);
      }),
    );
  });

  test('a mirrored row is the same', () => {
    fc.assert(
      fc.property(steps, (found) => {
        const here = spacingsInches(placesOf(found));
        const there = spacingsInches(placesOf([...found].reverse()));
        expect(variationOf(placesOf(found)).spacingInchesSd).toBeCloseTo(
          variationOf(placesOf([...found].reverse())).spacingInchesSd,
          8,
        );
        const shares = (spacings: number[]) =>
          answerOf(kachmanSmith([{ spacingsInches: spacings, theoreticalSpacingInches: 6.15 }])).ofPlaces;
        expect(shares(there).missesShare).toBeCloseTo(shares(here).missesShare, 12);
      }),
    );
  });
});

test('spacingsInches refuses places out of order, negative or no number', () => {
  for (const places of [
    [0, 5, 4],
    [-1, 3],
    [0, Number.NaN],
    [0, Number.POSITIVE_INFINITY],
  ]) {
    expect(() => spacingsInches(places)).toThrow(ImpossibleInput);
  }
});
