import { describe, expect, it } from 'vitest';
import {
  residueAgainstTiming,
  type ResidueAndTiming,
} from '../../../lib/agronomy/inference/residue-against-timing';
import { ImpossibleInput } from '../../../lib/agronomy/outcome';
import { answered } from './reference-designs';
import { trialComparison } from './trial-comparison';

function stripsOf({ y, x, block }: { y: number[]; x: number[]; block: string[] }): ResidueAndTiming[] {
  return y.map((timingDays, index) => ({
    timingDays,
    inRowCoverPercent: x[index] as number,
    block: block[index] as string,
  }));
}

const strip = (block: string, inRowCoverPercent: number, timingDays: number) => ({
  block,
  inRowCoverPercent,
  timingDays,
});

const trial = [
  strip('1', 10, 8),
  strip('1', 40, 9),
  strip('2', 20, 8.1),
  strip('2', 60, 9.9),
  strip('2', 5, 8),
];

describe('residueAgainstTiming', () => {
  it.each(Object.entries(trialComparison.residue))(
    'agrees with lm(y ~ block + x) of R: %s',
    (_, { input, expected }) => {
      const found = answered(residueAgainstTiming(stripsOf(input)));
      // Slopes are told for ten points.
      expect(found.daysPerTenPoints).toBeCloseTo(10 * expected.slope, 8);
      expect(found.standardError).toBeCloseTo(10 * expected.se, 8);
      expect(found.lower).toBeCloseTo(10 * expected.lower, 8);
      expect(found.upper).toBeCloseTo(10 * expected.upper, 8);
      expect(found.p / expected.p).toBeCloseTo(1, 6);
      expect(found.errorDegreesOfFreedom).toBe(expected.df);
    },
  );

  it('leaves out a strip that is alone in its block', () => {
    const found = answered(residueAgainstTiming([...trial, strip('3', 90, 30)]));
    expect(found).toEqual(answered(residueAgainstTiming(trial)));
    expect(found).toMatchObject({ strips: 5, blocks: 2, coverPercentLeast: 5, coverPercentMost: 60 });
  });

  it('does not change when a block is later as a whole, and turns with the sign of timing', () => {
    const plain = answered(residueAgainstTiming(trial));
    const later = trial.map((each) => ({
      ...each,
      timingDays: each.timingDays + (each.block === '2' ? 5 : 0),
    }));
    expect(answered(residueAgainstTiming(later)).daysPerTenPoints).toBeCloseTo(plain.daysPerTenPoints, 10);
    const turned = trial.map((each) => ({ ...each, timingDays: -each.timingDays }));
    expect(answered(residueAgainstTiming(turned)).lower).toBeCloseTo(-plain.upper, 10);
  });

  it('is insufficient, each time for its own reason', () => {
    expect(residueAgainstTiming([])).toMatchObject({ reason: 'single-strips' });
    expect(residueAgainstTiming([strip('1', 10, 8), strip('2', 20, 9)])).toMatchObject({
      reason: 'single-strips',
    });
    expect(residueAgainstTiming(trial.slice(0, 2))).toMatchObject({
      reason: 'no-error-degrees-of-freedom',
      had: '0',
    });
    expect(residueAgainstTiming(trial.map((each) => ({ ...each, inRowCoverPercent: 33.3 })))).toMatchObject({
      reason: 'cover-does-not-vary',
    });
    const online = trial.map((each) => ({ ...each, timingDays: 8 + 0.02 * each.inRowCoverPercent }));
    expect(residueAgainstTiming(online)).toMatchObject({ reason: 'no-variation' });
    expect(residueAgainstTiming(trial.map((each) => ({ ...each, timingDays: 8 })))).toMatchObject({
      reason: 'no-variation',
    });
  });

  it.each([
    ['a cover below nothing', { inRowCoverPercent: -1 }],
    ['a cover above all', { inRowCoverPercent: 101 }],
    ['a cover that is no number', { inRowCoverPercent: Number.NaN }],
    ['a timing that is no number', { timingDays: Number.NaN }],
    ['an endless timing', { timingDays: Number.POSITIVE_INFINITY }],
  ])('refuses %s', (_, change) => {
    expect(() => residueAgainstTiming([...trial, { ...strip('1', 10, 8), ...change }])).toThrow(
      ImpossibleInput,
    );
  });
});
