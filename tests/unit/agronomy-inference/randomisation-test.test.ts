import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { StripFigure } from '../../../lib/agronomy/inference/block-analysis';
import { randomisationTest } from '../../../lib/agronomy/inference/randomisation-test';
import { smallestAttainableP } from '../../../lib/agronomy/layout';
import { randomStream } from '../../../lib/agronomy/random';
import { answered, referenceJson, stripsOf } from './reference-designs';
import type { ReferenceDesign } from './reference-designs';

const designs = referenceJson<Record<string, ReferenceDesign>>('comparison.json');

function trial(blocks: number, settings: number, seed: number, effect = 0): StripFigure[] {
  const stream = randomStream(seed);
  return Array.from({ length: blocks }, (_, block) =>
    Array.from({ length: settings }, (__, setting) => ({
      block: `${block}`,
      setting: `${setting}`,
      figure: stream.nextUnit() + effect * setting,
    })),
  ).flat();
}

describe('randomisationTest', () => {
  it('counts 66 of 1,296 arrangements, as R did by enumeration', () => {
    const design = designs.immer_sub as ReferenceDesign;
    const test = answered(randomisationTest(stripsOf(design), 1));
    expect(test).toMatchObject({ method: 'exact', arrangements: 1296, asExtreme: 66 });
    expect(test.p).toBeCloseTo(design.expected.randomisation?.p ?? -1, 12);
    expect(test.smallestAttainableP).toBeCloseTo(6 / 1296, 12);
  });

  it('counts 331,776 arrangements of four settings in four blocks', () => {
    const test = answered(randomisationTest(trial(4, 4, 1), 1));
    expect(test).toMatchObject({ method: 'exact', arrangements: 331_776 });
    expect(test.smallestAttainableP).toBeCloseTo(smallestAttainableP(4, 4), 15);
  });

  it.each([
    [4, 0.125],
    [5, 0.0625],
    [6, 0.03125],
  ])(
    'cannot go below the floor for two settings in %d blocks, however large the difference',
    (blocks, floor) => {
      const test = answered(randomisationTest(trial(blocks, 2, 1, 100), 1));
      expect(test.p).toBeCloseTo(floor, 12);
      expect(test.smallestAttainableP).toBeCloseTo(floor, 12);
    },
  );

  it('gives for pairs the share of sign changes with as large a sum, counted another way', () => {
    fc.assert(
      fc.property(
        fc.array(fc.integer({ min: -9, max: 9 }), { minLength: 2, maxLength: 7 }),
        (differences) => {
          const strips = differences.flatMap((difference, block) => [
            { block: `${block}`, setting: 'A', figure: 10 + difference },
            { block: `${block}`, setting: 'B', figure: 10 },
          ]);
          const observed = Math.abs(differences.reduce((sum, difference) => sum + difference, 0));
          let asLarge = 0;
          for (let signs = 0; signs < 2 ** differences.length; signs += 1) {
            const sum = differences.reduce(
              (total, difference, index) => total + ((signs >> index) & 1 ? -difference : difference),
              0,
            );
            if (Math.abs(sum) >= observed) asLarge += 1;
          }
          expect(answered(randomisationTest(strips, 1)).p).toBeCloseTo(asLarge / 2 ** differences.length, 12);
        },
      ),
    );
  });

  it('keeps a lost strip lost, and still ranks the arrangement that was laid', () => {
    const strips = stripsOf(designs.immer_sub as ReferenceDesign).slice(1);
    const test = answered(randomisationTest(strips, 1));
    // 2! × 3! × 3! × 3!
    expect(test.arrangements).toBe(432);
    expect(test.p).toBeGreaterThan(0);
    expect(test.p).toBeLessThanOrEqual(1);
  });

  it('gives the same with symmetry and without it', () => {
    // A second strip of one setting in a block of its own kind breaks the symmetry but holds no information.
    const strips = trial(3, 3, 8, 0.4);
    const plain = answered(randomisationTest(strips, 1));
    const broken = answered(
      randomisationTest(
        [...strips, { block: 'x', setting: '0', figure: 5 }, { block: 'x', setting: '0', figure: 7 }],
        1,
      ),
    );
    expect(broken.p).toBeCloseTo(plain.p, 12);
  });

  it('samples above two million arrangements, repeatably, with its error', () => {
    const strips = trial(6, 4, 5, 0.12);
    const test = answered(randomisationTest(strips, 9));
    expect(test).toMatchObject({ method: 'sampled', sampled: 100_000, seed: 9, arrangements: 24 ** 6 });
    if (test.method !== 'sampled') return;
    expect(test.pStandardError).toBeCloseTo(Math.sqrt((test.p * (1 - test.p)) / 100_000), 12);
    expect(answered(randomisationTest(strips, 9))).toEqual(test);
    expect(test.smallestAttainableP).toBeCloseTo(smallestAttainableP(4, 6), 18);
  });

  it('does not depend on names or order', () => {
    const strips = trial(3, 3, 4, 0.3);
    const expected = answered(randomisationTest(strips, 1)).p;
    const renamed = strips
      .map((strip) => ({ ...strip, setting: `x${(Number(strip.setting) + 1) % 3}` }))
      .reverse();
    expect(answered(randomisationTest(renamed, 1)).p).toBeCloseTo(expected, 12);
  });

  it('is insufficient for one block and for settings that share none', () => {
    expect(randomisationTest(trial(1, 3, 1), 1)).toMatchObject({ reason: 'one-block' });
    const apart = [
      ...trial(2, 2, 1),
      ...trial(2, 2, 2).map((strip) => ({
        ...strip,
        block: `b${strip.block}`,
        setting: `s${strip.setting}`,
      })),
    ];
    expect(randomisationTest(apart, 1)).toMatchObject({ reason: 'not-connected' });
  });

  it('rejects at 5 % in at most about 5 of 100 trials without a difference', () => {
    let rejected = 0;
    for (let seed = 0; seed < 400; seed += 1) {
      if (answered(randomisationTest(trial(4, 3, seed), 1)).p <= 0.05) rejected += 1;
    }
    // Four standard errors of 400 trials at 5 % are 4.4 points.
    expect(rejected / 400).toBeLessThan(0.094);
  });
});
