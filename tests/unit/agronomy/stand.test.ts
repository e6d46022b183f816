import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { plantsHeld } from '@/lib/agronomy/plants-held';
import { rowLengthFeet, rowLengthMeters } from '@/lib/agronomy/row-length';
import { shareOfSeed, wilsonInterval } from '@/lib/agronomy/share-of-seed';
import { plantsPerAcre, plantsPerHectare } from '@/lib/agronomy/stand';
import { standOfOneRow } from '@/lib/agronomy/stand-of-one-row';
import { theoreticalSpacingInches } from '@/lib/agronomy/theoretical-spacing';
import { ImpossibleInput } from '@/lib/agronomy/outcome';
import published from '../../reference/published-examples.json';
import standMeasures from '../../reference/stand-measures.json';
import { answerOf, reasonOf } from './answer-of';
import { referenceCase } from './reference-case';

const INCHES_PER_METER = 1 / 0.0254;

describe('rowLengthFeet', () => {
  test.each(published.rowLengthFeet.rows)(
    'gives the printed length for 1/1000 acre at $rowSpacingInches in',
    ({ rowSpacingInches, feet }) => {
      const off = Math.abs(rowLengthFeet(rowSpacingInches) - feet);
      expect(off).toBeLessThan(published.rowLengthFeet.toleranceFeet);
    },
  );

  test('agrees with AREA-01', () => {
    const { input, expected } = referenceCase<{ row_width_in: number[] }, { length_ft: number[] }>(
      standMeasures,
      'AREA-01',
    );
    input.row_width_in.forEach((width, index) => {
      expect(rowLengthFeet(width)).toBeCloseTo(expected.length_ft[index] as number, 10);
    });
  });

  test('is 13.33 m for 1/1000 hectare at 0.75 m', () => {
    expect(rowLengthMeters(0.75)).toBeCloseTo(13.33, 2);
  });

  test.each([0, -30, Number.NaN, Number.POSITIVE_INFINITY])('refuses a row spacing of %s', (spacing) => {
    expect(() => rowLengthFeet(spacing)).toThrow(ImpossibleInput);
  });
});

describe('plantsPerAcre', () => {
  test('agrees with AREA-02, and per hectare', () => {
    const { expected } = referenceCase<unknown, { plants_per_acre: number; plants_per_ha: number }>(
      standMeasures,
      'AREA-02',
    );
    const stand = plantsPerAcre({ plantsHeld: 31, lengthInches: 17.424 * 12, rowSpacingInches: 30 });
    expect(stand).toBeCloseTo(expected.plants_per_acre, 6);
    expect(plantsPerHectare(stand)).toBeCloseTo(expected.plants_per_ha, 6);
  });

  test('agrees with AREA-03, two rows over a metric length', () => {
    const { input, expected } = referenceCase<
      { count: number; length_m: number; row_width_m: number; rows: number },
      { plants_per_acre: number }
    >(standMeasures, 'AREA-03');
    const stand = plantsPerAcre({
      plantsHeld: input.count,
      lengthInches: input.length_m * INCHES_PER_METER,
      rowSpacingInches: input.row_width_m * INCHES_PER_METER,
      rowsCounted: input.rows,
    });
    expect(stand).toBeCloseTo(expected.plants_per_acre, 6);
  });

  test('figures 31 plants in 17 ft 5 in from the length measured, not from the rounded 31,000', () => {
    const stand = plantsPerAcre({ plantsHeld: 31, lengthInches: 17 * 12 + 5, rowSpacingInches: 30 });
    // 31 × 6,272,640 / (209 × 30), worked by hand.
    expect(stand).toBeCloseTo(31_013.05, 1);
  });

  test.each(published.meanSpacing.rows)('turns $plantsPerAcre per acre into a mean spacing', (row) => {
    const inches = theoreticalSpacingInches(row.plantsPerAcre, row.rowSpacingInches);
    expect(Math.abs(inches - row.spacingInches)).toBeLessThan(row.tolerance);
  });
});

describe('plantsHeld', () => {
  test.each([
    { startEnd: 'mark', farEnd: 'mark', held: 11 },
    { startEnd: 'plant', farEnd: 'mark', held: 10.5 },
    { startEnd: 'mark', farEnd: 'plant', held: 10.5 },
    { startEnd: 'plant', farEnd: 'plant', held: 10 },
  ] as const)('holds $held of 11 plants from a $startEnd to a $farEnd', ({ startEnd, farEnd, held }) => {
    expect(plantsHeld({ plantsUp: 11, plantsDoubtful: 0, startEnd, farEnd })).toBe(held);
  });

  test('is right on average for even spacing when one end is a mark', () => {
    // 40 plants at 6, 12, … 240 in. The mark falls anywhere in the space before one, the tape ends at a plant.
    const stands: number[] = [];
    for (let markInches = 0.05; markInches < 6; markInches += 0.1) {
      const held = plantsHeld({ plantsUp: 40, plantsDoubtful: 0, startEnd: 'mark', farEnd: 'plant' });
      stands.push((240 - markInches) / held);
    }
    const spacing = stands.reduce((sum, each) => sum + each, 0) / stands.length;
    expect(spacing).toBeCloseTo(6, 6);
  });

  test('counts a doubtful plant one half', () => {
    expect(plantsHeld({ plantsUp: 30, plantsDoubtful: 3, startEnd: 'mark', farEnd: 'mark' })).toBe(28.5);
  });

  test('refuses more doubtful plants than plants, and names the field', () => {
    const impossible = () => plantsHeld({ plantsUp: 2, plantsDoubtful: 3, startEnd: 'mark', farEnd: 'mark' });
    expect(impossible).toThrow(expect.objectContaining({ field: 'plantsDoubtful' }));
  });
});

describe('shareOfSeed', () => {
  test('agrees with PROP-01, Wilson without correction', () => {
    const { input, expected } = referenceCase<
      { x: number[]; n: number[] },
      { p: number[]; wilson_lower: number[]; wilson_upper: number[] }
    >(standMeasures, 'PROP-01');
    input.x.forEach((plants, index) => {
      const share = shareOfSeed(plants, input.n[index] as number);
      const interval = answerOf(share.interval);
      expect(share.share).toBeCloseTo(expected.p[index] as number, 9);
      expect(interval.shareLower).toBeCloseTo(expected.wilson_lower[index] as number, 9);
      expect(interval.shareUpper).toBeCloseTo(expected.wilson_upper[index] as number, 9);
    });
  });

  test('is not cut off above 100 %, and has no interval there', () => {
    const share = shareOfSeed(36, 34);
    expect(share.share).toBeCloseTo(36 / 34, 12);
    expect(reasonOf(share.interval)).toBe('more-plants-than-seeds');
  });

  test('agrees with PROP-02, a stand and its ends over the seeding rate', () => {
    const { input, expected } = referenceCase<
      { plants_per_acre: number; lower: number; upper: number; seeds_per_acre: number },
      { pct: number; lower: number; upper: number }
    >(standMeasures, 'PROP-02');
    const percentOf = (plants: number) => 100 * shareOfSeed(plants, input.seeds_per_acre).share;
    expect(percentOf(input.plants_per_acre)).toBeCloseTo(expected.pct, 10);
    expect(percentOf(input.lower)).toBeCloseTo(expected.lower, 10);
    expect(percentOf(input.upper)).toBeCloseTo(expected.upper, 10);
  });

  test('has an interval for a full stand, whose seeds decimals make a hair fewer', () => {
    // 34,000 × 209.088 × 30 / 6,272,640 is 33.99999999999999 in binary arithmetic, and 34 plants stand.
    const row = { plantsHeld: 34, lengthInches: 209.088, rowSpacingInches: 30, seedsPerAcre: 34_000 };
    const interval = answerOf(standOfOneRow(row));
    // PROP-01 has 34 of 34 from 0.898485445846676 to 1, R 4.2.2 prop.test.
    expect(interval.plantsPerAcreLower).toBeCloseTo(34_000 * 0.898485445846676, 4);
    expect(interval.plantsPerAcreUpper).toBe(34_000);
    expect(reasonOf(wilsonInterval(34.001, 34))).toBe('more-plants-than-seeds');
  });

  test('makes 31 of 34 seeds 26 to 33 plants', () => {
    const { plants, seeds, wilson, tolerance } = published.countingInterval;
    const interval = answerOf(wilsonInterval(plants, seeds));
    expect(Math.abs(interval.shareLower * seeds - (wilson[0] as number))).toBeLessThan(tolerance);
    expect(Math.abs(interval.shareUpper * seeds - (wilson[1] as number))).toBeLessThan(tolerance);
  });

  test('turns into a counting-only interval in plants per acre', () => {
    const row = { plantsHeld: 31, lengthInches: 209.088, rowSpacingInches: 30, seedsPerAcre: 34_000 };
    const interval = answerOf(standOfOneRow(row));
    expect(interval.basis).toBe('counting-only');
    expect(interval.plantsPerAcreLower / 1000).toBeCloseTo(26.2, 1);
    expect(interval.plantsPerAcreUpper / 1000).toBeCloseTo(33.0, 1);
  });

  test('holds the share it came from, whatever the count', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 400 }), fc.nat(400), (seeds, draw) => {
        const plants = draw % (seeds + 1);
        const interval = answerOf(wilsonInterval(plants, seeds));
        expect(interval.shareLower).toBeLessThanOrEqual(plants / seeds + 1e-12);
        expect(interval.shareUpper).toBeGreaterThanOrEqual(plants / seeds - 1e-12);
      }),
    );
  });
});
