import { describe, expect, it } from 'vitest';
import { blockAnalysis } from '../../../lib/agronomy/inference/block-analysis';
import { environmentDifferences } from '../../../lib/agronomy/inference/environment-differences';
import type { EnvironmentStrip } from '../../../lib/agronomy/inference/environment-strip';
import { pooledDifference } from '../../../lib/agronomy/inference/pooled-difference';
import { settingByEnvironment } from '../../../lib/agronomy/inference/setting-by-environment';
import { ImpossibleInput } from '../../../lib/agronomy/outcome';
import { randomStream } from '../../../lib/agronomy/random';
import { answered, referenceJson } from './reference-designs';
import { trialComparison, type ReferenceEnvironments } from './trial-comparison';

const named = Object.entries(trialComparison.environments);

function stripsOf({ input, block }: ReferenceEnvironments): EnvironmentStrip[] {
  return input.y.map((figure, index) => ({
    figure,
    setting: input.setting[index] as string,
    environment: input.environment[index] as string,
    block: block[index] as string,
  }));
}

function closeTo(figured: number, expected: number, what?: string) {
  // R printed twelve digits.
  expect(figured / expected, what).toBeCloseTo(1, 9);
}

/** Two settings in so many environments of two blocks; `effects` says how far b lies above a in each. */
function trials(effects: readonly number[], seed = 4): EnvironmentStrip[] {
  const stream = randomStream(seed);
  return effects.flatMap((effect, environment) =>
    ['1', '2', '3'].flatMap((block) =>
      ['a', 'b'].map((setting) => ({
        environment: `field ${environment}`,
        block,
        setting,
        figure: 5 + stream.nextUnit() + (setting === 'b' ? effect : 0),
      })),
    ),
  );
}

describe('pooledDifference', () => {
  it('gives the pooled case of comparison.json: each year and a t interval on years', () => {
    type Pooled = {
      input: { y: number; setting: string; block: string; year: number }[];
      expected: { per_year: number[]; mean: number; lower: number; upper: number; df: number };
    };
    const { input, expected } = referenceJson<{ immer_pooled: Pooled }>('comparison.json').immer_pooled;
    const pooled = answered(
      pooledDifference(
        input.map(({ y, year, ...strip }) => ({ ...strip, figure: y, environment: `${year}` })),
        'T',
        'M',
      ),
    );
    expect(pooled.environments.map((each) => answered(each.difference))).toEqual([
      expect.closeTo(expected.per_year[0] as number, 9),
      expect.closeTo(expected.per_year[1] as number, 9),
    ]);
    const others = answered(pooled.forOthers);
    expect(pooled.difference).toBeCloseTo(expected.mean, 9);
    expect(others.lower).toBeCloseTo(expected.lower, 9);
    expect(others.upper).toBeCloseTo(expected.upper, 9);
    expect(others.degreesOfFreedom).toBe(expected.df);
  });

  it.each(named)(
    'agrees with R on %s: intervals for others and for these, each environment with its error',
    (_, design) => {
      const { first, second, expected } = design;
      const pooled = answered(pooledDifference(stripsOf(design), first, second));
      closeTo(pooled.difference, expected.others.mean);
      expect(pooled.environmentsPooled).toBe(expected.each.length);
      for (const [answer, reference] of [
        [answered(pooled.forOthers), expected.others],
        [answered(pooled.forThese), expected.these],
      ] as const) {
        closeTo(answer.standardError, reference.se);
        closeTo(answer.degreesOfFreedom, reference.df);
        closeTo(answer.lower, reference.lower);
        closeTo(answer.upper, reference.upper);
        closeTo(answer.p, reference.p);
      }
      expected.environments.forEach((environment, index) => {
        const own = pooled.environments.find((each) => each.environment === environment);
        const reference = expected.each[index];
        if (!own || !reference) throw new Error(environment);
        const error = answered(own.ownError);
        closeTo(answered(own.difference), reference.difference, environment);
        closeTo(error.standardError, reference.se);
        closeTo(error.meanSquareError, reference.mse);
        closeTo(error.lower, reference.lower);
        closeTo(error.upper, reference.upper);
        expect(error.errorDegreesOfFreedom).toBe(reference.df);
      });
    },
  );

  it('is the same the other way round, with the sign turned', () => {
    const strips = trials([1, 2, 1.5]);
    const there = answered(pooledDifference(strips, 'b', 'a'));
    const back = answered(pooledDifference(strips, 'a', 'b'));
    expect(back.difference).toBeCloseTo(-there.difference, 12);
    expect(answered(back.forOthers).upper).toBeCloseTo(-answered(there.forOthers).lower, 12);
  });

  it('takes one block a farm as environments, without an error of their own', () => {
    const strips = trials([1, 2, 1.5, 1.2]).filter((strip) => strip.block === '1');
    const pooled = answered(pooledDifference(strips, 'b', 'a'));
    expect(pooled.environmentsPooled).toBe(4);
    expect(pooled.forOthers.kind).toBe('value');
    expect(pooled.forThese).toMatchObject({ kind: 'insufficient', reason: 'one-block' });
    // The same strips as one trial of four blocks: the t interval on environments is that of the pairs.
    const pairs = answered(blockAnalysis(strips.map((strip) => ({ ...strip, block: strip.environment }))));
    expect(answered(pooled.forOthers).standardError).toBeCloseTo(
      pairs.differences[0]?.standardError ?? 0,
      12,
    );
  });

  it('passes over an environment without both settings, and says why', () => {
    const strips = [...trials([1, 2]), { environment: 'far', block: '1', setting: 'a', figure: 5 }];
    const pooled = answered(pooledDifference(strips, 'b', 'a'));
    expect(pooled.environmentsPooled).toBe(2);
    expect(pooled.environments[2]).toMatchObject({ difference: { reason: 'no-shared-block' } });
  });

  it('takes the difference from shared blocks where a setting has a single strip', () => {
    const strips = trials([1, 2]).filter(
      (strip) => strip.environment === 'field 0' || strip.setting === 'a' || strip.block === '1',
    );
    const added = strips.flatMap((strip) =>
      strip.environment === 'field 1' && strip.setting === 'a'
        ? [strip, { ...strip, setting: 'c', figure: strip.figure + Number(strip.block) ** 2 }]
        : [strip],
    );
    const [, second] = environmentDifferences(added, 'b', 'a');
    expect(second?.ownError).toMatchObject({ reason: 'single-strips' });
    const own = added.filter((strip) => strip.environment === 'field 1' && strip.block === '1');
    const figureOf = (setting: string) => own.find((strip) => strip.setting === setting)?.figure ?? 0;
    expect(
      answered(second?.difference ?? { kind: 'insufficient', reason: '', needed: '', had: '' }),
    ).toBeCloseTo(figureOf('b') - figureOf('a'), 12);
  });

  it('is insufficient for one environment, for equal differences, and refuses what cannot be', () => {
    expect(pooledDifference(trials([1]), 'b', 'a')).toMatchObject({ reason: 'one-environment', had: '1' });
    expect(pooledDifference([], 'b', 'a')).toMatchObject({ reason: 'one-environment', had: '0' });
    const equal = trials([1, 1]).map((strip) => ({ ...strip, figure: strip.setting === 'b' ? 6 : 5 }));
    const pooled = answered(pooledDifference(equal, 'b', 'a'));
    expect(pooled.difference).toBe(1);
    expect(pooled.forOthers).toMatchObject({ reason: 'no-variation' });
    expect(pooled.forThese).toMatchObject({ reason: 'no-variation' });
    expect(() => pooledDifference(trials([1, 2]), 'a', 'a')).toThrow(ImpossibleInput);
    const broken = trials([1, 2]).map((strip) => ({ ...strip, figure: Number.NaN }));
    expect(() => pooledDifference(broken, 'b', 'a')).toThrow(ImpossibleInput);
  });
});

describe('settingByEnvironment', () => {
  it.each(named)('agrees with aov of R on %s, with and without settings × environment', (_, design) => {
    const { expected, first, second } = design;
    const found = answered(settingByEnvironment(stripsOf(design)));
    closeTo(found.interaction.squares, expected.interaction.ss);
    expect(found.interaction.numeratorDf).toBe(expected.interaction.df);
    closeTo(found.interaction.fRatio, expected.interaction.F);
    closeTo(found.interaction.p, expected.interaction.p);
    closeTo(found.error.meanSquare, expected.error.ms);
    expect(found.error.degreesOfFreedom).toBe(expected.error.df);
    closeTo(found.settingsAgainstError.fRatio, expected.settings_against_error.F);
    closeTo(found.settingsAgainstError.p, expected.settings_against_error.p);
    closeTo(found.settingsAgainstInteraction.fRatio, expected.settings_against_interaction.F);
    closeTo(found.settingsAgainstInteraction.p, expected.settings_against_interaction.p);
    closeTo(found.withoutInteraction.meanSquareError, expected.without.ms);
    closeTo(found.withoutInteraction.fRatio, expected.without.F);
    closeTo(found.withoutInteraction.p, expected.without.p);
    const pair = found.withoutInteraction.differences.find((each) =>
      [each.first, each.second].every((setting) => [first, second].includes(setting)),
    );
    closeTo(Math.abs(pair?.difference ?? 0), Math.abs(expected.without_difference.difference));
    closeTo(pair?.standardError ?? 0, expected.without_difference.se);
    const meanSquares = expected.each.map((each) => each.mse);
    closeTo(found.errorRatio, Math.max(...meanSquares) / Math.min(...meanSquares));
    expect(found.environments).toHaveLength(expected.environments.length);
  });

  it('keeps blocks of one name in two fields apart', () => {
    const strips = trials([0.3, 2, 1]);
    const renamed = strips.map((strip) => ({ ...strip, block: `${strip.environment}, ${strip.block}` }));
    expect(answered(settingByEnvironment(strips)).interaction).toEqual(
      answered(settingByEnvironment(renamed)).interaction,
    );
  });

  it('lets a one-block environment count for the interaction and not for the error', () => {
    const strips = trials([0.3, 2, 1]).filter(
      (strip) => strip.environment !== 'field 2' || strip.block === '1',
    );
    const found = answered(settingByEnvironment(strips));
    expect(found.error.degreesOfFreedom).toBe(4);
    expect(found.interaction.numeratorDf).toBe(2);
    expect(found.environments[2]?.analysis).toMatchObject({ reason: 'one-block' });
  });

  it('is insufficient, each time for its own reason', () => {
    expect(settingByEnvironment(trials([1]))).toMatchObject({ reason: 'one-environment' });
    const oneBlock = trials([1, 2, 0.5]).filter((strip) => strip.block === '1');
    expect(settingByEnvironment(oneBlock)).toMatchObject({ reason: 'no-error-degrees-of-freedom' });
    const apart = trials([1, 2]).map((strip) => ({ ...strip, setting: strip.environment + strip.setting }));
    expect(settingByEnvironment(apart)).toMatchObject({ reason: 'not-connected' });
    const flat = trials([1, 2]).map((strip) =>
      strip.environment === 'field 1' ? { ...strip, figure: 5 } : strip,
    );
    expect(settingByEnvironment(flat)).toMatchObject({ reason: 'no-variation' });
    const mirrored = [...trials([1]), ...trials([1]).map((strip) => ({ ...strip, environment: 'twin' }))];
    expect(settingByEnvironment(mirrored)).toMatchObject({
      reason: 'no-variation',
      needed: 'differences that vary between environments',
    });
    expect(() =>
      settingByEnvironment(trials([1, 2]).map((strip) => ({ ...strip, figure: Number.POSITIVE_INFINITY }))),
    ).toThrow(ImpossibleInput);
  });
});
