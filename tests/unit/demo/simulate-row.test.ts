import { describe, expect, it } from 'vitest';
import { randomStream } from '@/lib/agronomy/random';
import { emergencePattern } from '@/db/demo/simulate-emergence';
import { simulateRow } from '@/db/demo/simulate-row';
import { simulateTrial } from '@/db/demo/simulate-trial';
import { standardNormalQuantile } from '@/db/demo/standard-normal-quantile';
import { trialTruth } from '@/db/demo/trial-truth';

const theoreticalSpacingInches = 6_272_640 / (34_000 * 30);
const rowOf = (truth: (typeof trialTruth)[number], seeds: number) => ({
  lengthInches: seeds * theoreticalSpacingInches,
  theoreticalSpacingInches,
  emergedShare: truth.standShare,
  lossRunSeedsMean: 1.6,
  pattern: emergencePattern(truth),
  shiftDays: 0,
  rowSdDays: 0,
});

const [raised] = trialTruth as [(typeof trialTruth)[number]];
const seedsInLongRow = 200_000;
const longRow = simulateRow(rowOf(raised, seedsInLongRow), randomStream(7));

describe('the generator of rows', () => {
  it('makes the same trial from the same seed, and another from another', () => {
    expect(simulateTrial(11)).toEqual(simulateTrial(11));
    expect(simulateTrial(12)).not.toEqual(simulateTrial(11));
  });

  it('keeps seeds inside the length and in order', () => {
    const row = simulateRow(rowOf(raised, 34), randomStream(3));
    const places = row.map(({ positionInches }) => positionInches);
    expect(places).toEqual([...places].sort((a, b) => a - b));
    expect(Math.min(...places)).toBeGreaterThanOrEqual(0);
    expect(Math.max(...places)).toBeLessThan(34 * theoreticalSpacingInches);
  });

  // Tolerances are four standard errors in 200,000 seeds, or a little more.
  it('drops as many seeds as the rate says, one in a hundred places skipped and one doubled', () => {
    expect(longRow.length / seedsInLongRow).toBeCloseTo(1, 2);
    // The second seed of a double falls within 0.8 in; so do few others: by 1.3 in placement, 0.4 % of the spacings.
    const close = longRow.filter((seed, index) => index > 0 && seed.positionInches - (longRow[index - 1]?.positionInches ?? 0) < 0.8).length;
    expect(close / seedsInLongRow).toBeGreaterThan(0.01);
    expect(close / seedsInLongRow).toBeLessThan(0.017);
  });

  it('places seeds 1.3 in off on average, so that a spacing is √2 times as uncertain', () => {
    // Seeds a whole number of spacings apart: what is left of the difference is two placement errors.
    const left = longRow.slice(1).map(({ positionInches }, index) => {
      const spacing = positionInches - (longRow[index]?.positionInches ?? 0);
      return spacing - Math.max(1, Math.round(spacing / theoreticalSpacingInches)) * theoreticalSpacingInches;
    });
    const middle = left.filter((each) => Math.abs(each) < theoreticalSpacingInches / 2);
    const sd = Math.sqrt(middle.reduce((sum, each) => sum + each ** 2, 0) / middle.length);
    // Cut off at half a spacing, a normal SD of 1.84 in reads as 1.5.
    expect(sd).toBeGreaterThan(1.4);
    expect(sd).toBeLessThan(1.6);
  });

  it('loses the wanted share of seeds, 1.6 in a row where one is lost', () => {
    const isLost = longRow.map(({ emergedDays }) => emergedDays === null);
    const lost = isLost.filter(Boolean).length;
    const runs = isLost.filter((each, index) => each && !isLost[index - 1]).length;
    expect(lost / longRow.length).toBeCloseTo(1 - raised.standShare, 2);
    expect(lost / runs).toBeGreaterThan(1.5);
    expect(lost / runs).toBeLessThan(1.7);
  });
});

describe('how plants come up', () => {
  it('agrees with the printed quantiles of the standard normal distribution', () => {
    // Tables of the normal distribution: 0.975 → 1.959964, 0.9 → 1.281552, 0.5 → 0.
    expect(standardNormalQuantile(0.975)).toBeCloseTo(1.959964, 6);
    expect(standardNormalQuantile(0.1)).toBeCloseTo(-1.281552, 6);
    expect(standardNormalQuantile(0.5)).toBeCloseTo(0, 9);
  });

  it.each(trialTruth.map((truth) => [truth.key, truth] as const))('gives %s its half-up day, spread and late share', (_, truth) => {
    const plants = simulateRow(rowOf(truth, 60_000), randomStream(5)).flatMap(({ emergedDays, isLate }) => (emergedDays === null ? [] : [{ emergedDays, isLate }]));
    const days = plants.map(({ emergedDays }) => emergedDays).sort((a, b) => a - b);
    const at = (share: number) => days[Math.round((days.length - 1) * share)] ?? NaN;
    expect(Math.abs(at(0.5) - truth.halfUpDays)).toBeLessThan(0.05);
    // Nine tenths of the raised setting are reached where hardly any plant comes up, so that this day is read less surely.
    expect(Math.abs(at(0.9) - at(0.1) - truth.spreadDays)).toBeLessThan(0.15);
    // Behind the first flush by more than the planting's limit of 5 days: the late ones, and a few of the main flush.
    const behind = days.filter((day) => day > at(0.1) + 5).length / days.length;
    expect(Math.abs(behind - truth.lateShare)).toBeLessThan(0.006);
    expect(plants.filter(({ isLate }) => isLate).length / plants.length).toBeCloseTo(truth.lateShare, 2);
  });

  it('refuses a tenth of late plants, among whom nine tenths up would fall', () => {
    expect(() => emergencePattern({ halfUpDays: 12, spreadDays: 4, lateShare: 0.1 })).toThrow(RangeError);
  });
});
