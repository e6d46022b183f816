import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { blockAnalysis, type StripFigure } from '../../../lib/agronomy/inference/block-analysis';
import { holmAgainstReference, tukeyPairs } from '../../../lib/agronomy/inference/pairwise';
import { pairwiseLetters } from '../../../lib/agronomy/inference/pairwise-letters';
import { randomisationTest } from '../../../lib/agronomy/inference/randomisation-test';
import { smallestDifference } from '../../../lib/agronomy/inference/smallest-difference';
import { studentQuantile } from '../../../lib/agronomy/inference/student-t';
import { layout } from '../../../lib/agronomy/layout';
import { randomStream } from '../../../lib/agronomy/random';
import { normalStream } from './normal-stream';
import { answered } from './reference-designs';

type Truth = { effects: readonly number[]; blocks: number; stripSd: number };

function simulated({ effects, blocks, stripSd }: Truth, normal: () => number): StripFigure[] {
  return Array.from({ length: blocks }, (_, block) => {
    const level = 10 + normal();
    return effects.map((effect, setting) => ({
      block: `${block}`,
      setting: `${setting}`,
      figure: level + effect + stripSd * normal(),
    }));
  }).flat();
}

function shareOf(trials: number, holds: (trial: number) => boolean): number {
  let held = 0;
  for (let trial = 0; trial < trials; trial += 1) if (holds(trial)) held += 1;
  return held / trials;
}

describe('over simulated trials', () => {
  it.each([
    ['pairs in four blocks', { effects: [0, 1.5], blocks: 4, stripSd: 0.4 }],
    ['six settings in three blocks', { effects: [0, 1.5, 0.2, 0.4, 0.6, 0.8], blocks: 3, stripSd: 0.4 }],
  ])('t intervals hold the true difference in 93 to 97 of 100: %s', (_, truth) => {
    const normal = normalStream(31);
    const held = shareOf(2000, () => {
      const pairs = holmAgainstReference(answered(blockAnalysis(simulated(truth, normal))), '0');
      const pair = pairs.find((each) => each.first === '1');
      return pair !== undefined && pair.lower <= 1.5 && pair.upper >= 1.5;
    });
    expect(held).toBeGreaterThan(0.93);
    expect(held).toBeLessThan(0.97);
  });

  it('t intervals hold it as often with a strip lost at random', () => {
    const stream = randomStream(20_240_507);
    const normal = normalStream(20_240_508);
    const trials = 2000;
    let held = 0;
    for (let trial = 0; trial < trials; trial += 1) {
      const strips = [0, 1, 2, 3].flatMap((block) => {
        const blockEffect = 0.5 * normal();
        return [0, 1.5, 0.7].map((effect, setting) => ({
          block: `${block}`,
          setting: `${setting}`,
          figure: 10 + blockEffect + effect + 0.35 * normal(),
        }));
      });
      strips.splice(stream.nextBelow(strips.length), 1);
      const analysis = answered(blockAnalysis(strips));
      const pair = analysis.differences.find(({ first, second }) => first < '2' && second < '2');
      if (!pair) throw new Error('the pair is there');
      const sign = pair.first === '0' ? 1 : -1;
      const reach = studentQuantile(0.975, analysis.errorDegreesOfFreedom) * pair.standardError;
      if (Math.abs(sign * pair.difference + 1.5) <= reach) held += 1;
    }
    expect(held / trials).toBeGreaterThan(0.93);
    expect(held / trials).toBeLessThan(0.97);
  });

  it('Tukey’s intervals hold all true differences at once in 93 to 97 of 100', () => {
    const normal = normalStream(37);
    const truth = { effects: [0, 1.5, 0.4, 0.9], blocks: 4, stripSd: 0.4 };
    const held = shareOf(1500, () =>
      tukeyPairs(answered(blockAnalysis(simulated(truth, normal)))).every(
        ({ first, second, lower, upper }) => {
          const real = (truth.effects[Number(first)] as number) - (truth.effects[Number(second)] as number);
          return lower <= real && upper >= real;
        },
      ),
    );
    expect(held).toBeGreaterThan(0.93);
    expect(held).toBeLessThan(0.97);
  });

  // The exact interval holds every difference that the test does not reject once it is taken off; so it holds the truth when
  // the truth is not rejected. The figures are far from normal, which the test does not ask about.
  it.each([
    ['pairs in six blocks', 2, 6],
    ['three settings in four blocks', 3, 4],
  ])(
    'the exact test keeps the truth in at least 95 of 100, whatever the figures: %s',
    (_, settings, blocks) => {
      const normal = normalStream(41);
      const truth = { effects: new Array<number>(settings).fill(0), blocks, stripSd: 1 };
      const kept = shareOf(1500, () => {
        const strips = simulated(truth, normal).map((each) => ({
          ...each,
          figure: Math.exp(2 * each.figure - 20),
        }));
        return answered(randomisationTest(strips, 1)).p > 0.05;
      });
      // At least 95, less three standard errors of 1,500 trials.
      expect(kept).toBeGreaterThan(0.95 - 3 * Math.sqrt((0.95 * 0.05) / 1500));
    },
  );

  it('the smallest difference a layout can show is shown in 80 of 100', () => {
    const normal = normalStream(43);
    const layoutPlanned = { settings: 3, blocks: 5, stripSd: 0.35 };
    const { difference } = answered(smallestDifference({ ...layoutPlanned, test: 'tukey' }));
    const truth = { effects: [0, difference, difference / 2], blocks: 5, stripSd: 0.35 };
    const shown = shareOf(2000, () =>
      tukeyPairs(answered(blockAnalysis(simulated(truth, normal)))).some(
        ({ first, second, toldApart }) => first === '0' && second === '1' && toldApart,
      ),
    );
    // Three standard errors of 2,000 trials are 2.7 points.
    expect(Math.abs(shown - 0.8)).toBeLessThan(0.027);
  });

  it('a sampled p lies within its own error of the exact one', () => {
    // Whole differences of 22 pairs: 4,194,304 arrangements, too many to be counted one by one, but their sums are few.
    const differences = [3, -1, 2, 2, 0, 1, 4, -2, 1, 1, -3, 2, 0, 5, -1, 1, 2, -2, 3, 0, 1, -1];
    const strips = differences.flatMap((difference, block) => [
      { block: `${block}`, setting: 'A', figure: 20 + difference },
      { block: `${block}`, setting: 'B', figure: 20 },
    ]);
    let ways = new Map([[0, 1]]);
    for (const difference of differences) {
      const next = new Map<number, number>();
      for (const [sum, count] of ways)
        for (const signed of [sum + difference, sum - difference])
          next.set(signed, (next.get(signed) ?? 0) + count);
      ways = next;
    }
    const observed = Math.abs(differences.reduce((sum, each) => sum + each, 0));
    const asLarge = [...ways].reduce(
      (sum, [each, count]) => sum + (Math.abs(each) >= observed ? count : 0),
      0,
    );
    for (const seed of [1, 2, 3]) {
      const test = answered(randomisationTest(strips, seed));
      if (test.method !== 'sampled') throw new Error('too few arrangements to be sampled');
      expect(Math.abs(test.p - asLarge / 2 ** 22)).toBeLessThan(4 * test.pStandardError);
      expect(test.smallestAttainableP).toBe(2 / 2 ** 22);
      expect(test.smallestSampledP).toBe(1 / 100_001);
    }
  });
});

describe('permuting settings', () => {
  it('permutes means, pairs and letters, and leaves the tests of all of them as they are', () => {
    const names = ['0', '1', '2', '3'];
    fc.assert(
      fc.property(
        fc.shuffledSubarray(names, { minLength: 4, maxLength: 4 }),
        fc.integer({ min: 1, max: 1000 }),
        fc.nat({ max: 15 }),
        (order, seed, lost) => {
          const strips = simulated({ effects: [0, 2, 1, 0.5], blocks: 4, stripSd: 0.4 }, normalStream(seed));
          strips.splice(lost, 1);
          const newName = (name: string) => order[names.indexOf(name)] as string;
          const renamed = strips.map((each) => ({ ...each, setting: newName(each.setting) }));
          const plain = answered(blockAnalysis(strips));
          const permuted = answered(blockAnalysis(renamed));
          expect(permuted.p).toBeCloseTo(plain.p, 12);
          for (const mean of plain.means) {
            const found = permuted.means.find((each) => each.setting === newName(mean.setting));
            expect(found?.leastSquaresMean).toBeCloseTo(mean.leastSquaresMean, 10);
            expect(found?.standardError).toBeCloseTo(mean.standardError, 10);
          }
          const lettersOf = (analysis: typeof plain) => pairwiseLetters(analysis.means, tukeyPairs(analysis));
          expect(lettersOf(permuted)).toEqual(
            lettersOf(plain).map((each) => ({ ...each, setting: newName(each.setting) })),
          );
        },
      ),
      { numRuns: 40 },
    );
  });

  it('permutes a layout of the same seed', () => {
    fc.assert(
      fc.property(fc.shuffledSubarray(['A', 'B', 'C'], { minLength: 3 }), fc.nat(), (order, seed) => {
        const laid = (settings: string[]) =>
          layout({ settings, blocks: 4, seed }).blocks.flatMap((block) =>
            block.strips.map((each) => each.setting),
          );
        const newName = (name: string) => order['ABC'.indexOf(name)] as string;
        expect(laid(order)).toEqual(laid(['A', 'B', 'C']).map(newName));
      }),
    );
  });
});
