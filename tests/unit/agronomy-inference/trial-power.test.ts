import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bisected } from '../../../lib/agronomy/inference/bisected';
import { blocksNeeded } from '../../../lib/agronomy/inference/blocks-needed';
import { criticalF, type PlannedTest } from '../../../lib/agronomy/inference/critical-f';
import { nonCentralUpperTailF } from '../../../lib/agronomy/inference/non-central-f';
import { smallestDifference } from '../../../lib/agronomy/inference/smallest-difference';
import { stripSdOfTrials } from '../../../lib/agronomy/inference/strip-sd-of-trials';
import { trialPower } from '../../../lib/agronomy/inference/trial-power';
import { smallestAttainableP } from '../../../lib/agronomy/layout';
import { ImpossibleInput } from '../../../lib/agronomy/outcome';
import { answered } from './reference-designs';
import { trialComparison } from './trial-comparison';

const stripSd = 0.35;
const tests = { any: 'any-difference', holm: 'holm', tukey: 'tukey' } as const;

describe('nonCentralUpperTailF', () => {
  it('agrees with pf of R over 240 cells', () => {
    const { f, d1, d2, ncp, p } = trialComparison.noncentral_f;
    expect(f).toHaveLength(240);
    f.forEach((ratio, index) => {
      const tail = nonCentralUpperTailF(
        ratio,
        d1[index] as number,
        d2[index] as number,
        ncp[index] as number,
      );
      // R stops its own sum at an error of 1e-9.
      expect(Math.abs(tail - (p[index] as number)), `cell ${index}`).toBeLessThan(2e-9);
    });
  });

  it('is certain from F of zero on and refuses what cannot be', () => {
    expect(nonCentralUpperTailF(0, 2, 6, 3)).toBe(1);
    expect(() => nonCentralUpperTailF(1, 2, 6, -1)).toThrow(ImpossibleInput);
    expect(() => nonCentralUpperTailF(1, 2, 6, 100_001)).toThrow(ImpossibleInput);
    expect(() => nonCentralUpperTailF(Number.NaN, 2, 6, 1)).toThrow(ImpossibleInput);
    expect(() => nonCentralUpperTailF(1, 0, 6, 1)).toThrow(ImpossibleInput);
  });
});

describe('trialPower', () => {
  it.each(trialComparison.paired)('agrees with power.t.test of R for pairs in $blocks blocks', (paired) => {
    for (const test of Object.values(tests)) {
      const power = trialPower({ settings: 2, blocks: paired.blocks, test, stripSd }, 1);
      expect(power).toBeCloseTo(paired.power_of_1, 8);
    }
  });

  it.each(trialComparison.blocks)(
    'agrees with R for $settings settings in $blocks blocks, by each test',
    ({ settings, blocks, power_of_1 }) => {
      for (const [name, test] of Object.entries(tests)) {
        const power = trialPower({ settings, blocks, test, stripSd }, 1);
        expect(power, name).toBeCloseTo(power_of_1[name as keyof typeof tests], 8);
      }
    },
  );

  it('is the error of 5 % where nothing differs, and grows with difference and blocks', () => {
    const trial = { settings: 2, blocks: 4, test: 'tukey' as const, stripSd };
    expect(trialPower(trial, 0)).toBeCloseTo(0.05, 10);
    expect(trialPower(trial, 1e6)).toBe(1);
    fc.assert(
      fc.property(
        fc.double({ min: 0.05, max: 3, noNaN: true }),
        fc.integer({ min: 2, max: 12 }),
        (difference, blocks) => {
          const own = trialPower({ ...trial, blocks }, difference);
          expect(trialPower({ ...trial, blocks }, difference * 1.1)).toBeGreaterThanOrEqual(own - 1e-12);
          expect(trialPower({ ...trial, blocks: blocks + 1 }, difference)).toBeGreaterThanOrEqual(
            own - 1e-12,
          );
        },
      ),
      { numRuns: 40 },
    );
  });

  it.each([
    ['25 settings', { settings: 25 }, 'settings'],
    ['one setting', { settings: 1 }, 'settings'],
    ['two and a half settings', { settings: 2.5 }, 'settings'],
    ['41 blocks', { blocks: 41 }, 'blocks'],
    ['4.5 blocks', { blocks: 4.5 }, 'blocks'],
    ['strips that do not vary', { stripSd: 0 }, 'stripSd'],
    ['a standard deviation that is no number', { stripSd: Number.NaN }, 'stripSd'],
  ])('refuses %s and names the field', (_, change, field) => {
    const trial = { settings: 3, blocks: 4, test: 'holm' as PlannedTest, stripSd, ...change };
    expect(() => trialPower(trial, 1)).toThrow(expect.objectContaining({ name: 'ImpossibleInput', field }));
    expect(() => smallestDifference(trial)).toThrow(ImpossibleInput);
  });

  it('refuses a negative difference', () => {
    expect(() => trialPower({ settings: 2, blocks: 4, test: 'holm', stripSd }, -1)).toThrow(ImpossibleInput);
  });
});

describe('smallestDifference', () => {
  it.each(trialComparison.paired)('agrees with power.t.test of R for pairs in $blocks blocks', (paired) => {
    const found = answered(smallestDifference({ settings: 2, blocks: paired.blocks, test: 'holm', stripSd }));
    expect(found.difference).toBeCloseTo(paired.delta_at_80, 8);
    expect(found).toMatchObject({
      power: 0.8,
      errorDegreesOfFreedom: paired.blocks - 1,
      smallestAttainableP: smallestAttainableP(2, paired.blocks),
      method: 'non-central t',
    });
  });

  it.each(trialComparison.blocks)(
    'agrees with R for $settings settings in $blocks blocks, by each test',
    ({ settings, blocks, delta_at_80 }) => {
      for (const [name, test] of Object.entries(tests)) {
        const found = answered(smallestDifference({ settings, blocks, test, stripSd }));
        expect(found.difference, name).toBeCloseTo(delta_at_80[name as keyof typeof tests], 8);
        expect(found.method).toBe(name === 'any' ? 'non-central F' : 'non-central t');
      }
    },
  );

  it('is insufficient in one block, and refuses a power that no trial has', () => {
    const trial = { settings: 2, blocks: 1, test: 'holm' as const, stripSd };
    expect(smallestDifference(trial)).toMatchObject({ kind: 'insufficient', reason: 'one-block' });
    expect(() => smallestDifference({ ...trial, blocks: 4 }, 1)).toThrow(ImpossibleInput);
    expect(() => smallestDifference({ ...trial, blocks: 4 }, 0.05)).toThrow(ImpossibleInput);
  });
});

describe('blocksNeeded', () => {
  it.each(trialComparison.needed)('rounds up what power.t.test of R asks for $delta days', ({ delta, n }) => {
    const needed = answered(blocksNeeded({ settings: 2, test: 'holm', stripSd, difference: delta }));
    expect(needed.blocks).toBe(Math.ceil(n));
    expect(needed.strips).toBe(2 * Math.ceil(n));
    expect(needed.power).toBeGreaterThanOrEqual(0.8);
    expect(needed.errorDegreesOfFreedom).toBe(needed.blocks - 1);
    expect(needed.smallestAttainableP).toBe(smallestAttainableP(2, needed.blocks));
  });

  it('says when 40 blocks are not enough', () => {
    const plan = { settings: 2, test: 'tukey' as const, stripSd, difference: 0.05 };
    expect(blocksNeeded(plan)).toMatchObject({
      kind: 'insufficient',
      reason: 'difference-too-small',
      needed: 'more than 40 blocks',
    });
    expect(() => blocksNeeded({ ...plan, difference: 0 })).toThrow(ImpossibleInput);
    expect(() => blocksNeeded(plan, 1.2)).toThrow(ImpossibleInput);
    expect(() => blocksNeeded({ ...plan, settings: 25 })).toThrow('cannot be above 24');
  });
});

describe('stripSdOfTrials', () => {
  it('agrees with R on the two years of Immer pooled', () => {
    const found = answered(
      stripSdOfTrials(
        trialComparison.environments.immer.expected.each.map(({ mse, df }) => ({
          meanSquareError: mse,
          errorDegreesOfFreedom: df,
        })),
      ),
    );
    const { sd, df, lower, upper } = trialComparison.strip_sd;
    expect(found.stripSd).toBeCloseTo(sd, 8);
    expect(found.degreesOfFreedom).toBe(df);
    expect(found.lower).toBeCloseTo(lower, 8);
    expect(found.upper).toBeCloseTo(upper, 8);
  });

  it('is insufficient without a trial or without variation, and refuses what cannot be', () => {
    expect(stripSdOfTrials([])).toMatchObject({ reason: 'no-earlier-trial' });
    expect(stripSdOfTrials([{ meanSquareError: 0, errorDegreesOfFreedom: 3 }])).toMatchObject({
      reason: 'no-variation',
    });
    expect(() => stripSdOfTrials([{ meanSquareError: -1, errorDegreesOfFreedom: 3 }])).toThrow(
      ImpossibleInput,
    );
    expect(() => stripSdOfTrials([{ meanSquareError: 1, errorDegreesOfFreedom: 0 }])).toThrow(
      ImpossibleInput,
    );
  });
});

describe('criticalF', () => {
  it('is one number for two settings whatever the test, the square of t', () => {
    // t(0.975; 3) = 3.18244630528371, R 4.2.2; q(0.95; 3, 6) = 4.339 in every printed table.
    for (const test of Object.values(tests))
      expect(criticalF(test, 2, 3)).toBeCloseTo(3.18244630528371 ** 2, 8);
    expect(Math.sqrt(2 * criticalF('tukey', 3, 6))).toBeCloseTo(4.339, 3);
  });
});

describe('bisected', () => {
  it('finds where a condition begins to hold, also above the end it was given', () => {
    expect(bisected((x) => x * x >= 2, 1, 1.1)).toBeCloseTo(Math.SQRT2, 14);
  });
});
