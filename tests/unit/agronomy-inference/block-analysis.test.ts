import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { blockAnalysis } from '../../../lib/agronomy/inference/block-analysis';
import type { StripFigure } from '../../../lib/agronomy/inference/block-analysis';
import { studentQuantile } from '../../../lib/agronomy/inference/student-t';
import { ImpossibleInput } from '../../../lib/agronomy/outcome';
import { randomStream } from '../../../lib/agronomy/random';
import { answered, referenceJson, stripsOf } from './reference-designs';
import type { ReferenceDesign } from './reference-designs';

const designs = referenceJson<Record<string, ReferenceDesign>>('comparison.json');
const named = ['immer_1931', 'immer_1931_missing', 'immer_sub', 'barley_1931', 'npk_pairs'].map(
  (name) => [name, designs[name] as ReferenceDesign] as const,
);

function strip(block: string, setting: string, figure: number): StripFigure {
  return { block, setting, figure };
}

describe('blockAnalysis', () => {
  // Relative tolerance 1e-9 throughout: R prints 15 digits of sums that lose a few.
  it.each(named)('agrees with R on %s: error, F, p and least-squares means', (_, design) => {
    const analysis = answered(blockAnalysis(stripsOf(design)));
    const { expected } = design;
    expect(analysis.errorDegreesOfFreedom).toBe(expected.dfe);
    expect(analysis.meanSquareError / expected.mse).toBeCloseTo(1, 9);
    expect(analysis.fRatio / expected.anova.F).toBeCloseTo(1, 9);
    expect(analysis.p / expected.anova.p).toBeCloseTo(1, 9);
    expect(analysis.means).toHaveLength(expected.means.setting.length);
    expected.means.setting.forEach((setting, index) => {
      const mean = analysis.means.find((candidate) => candidate.setting === setting);
      expect((mean?.leastSquaresMean ?? 0) / (expected.means.mean[index] as number)).toBeCloseTo(1, 9);
      expect((mean?.standardError ?? 0) / (expected.means.se[index] as number)).toBeCloseTo(1, 9);
    });
  });

  it('counts the missing strip of the incomplete design', () => {
    const analysis = answered(blockAnalysis(stripsOf(designs.immer_1931_missing as ReferenceDesign)));
    expect(analysis).toMatchObject({ blocks: 6, strips: 29, missingStrips: 1 });
  });

  it('gives for two settings the F that is the square of the paired t', () => {
    // R 4.2.2, t.test(paired = TRUE) on npk: t 3.09942227408873.
    const analysis = answered(blockAnalysis(stripsOf(designs.npk_pairs as ReferenceDesign)));
    expect(analysis.fRatio).toBeCloseTo(3.09942227408873 ** 2, 9);
  });

  it('agrees with the paired t test of R on strips in pairs', () => {
    type Case = {
      id: string;
      input: { a: number[]; b: number[] };
      expected: { diff: number; paired: { df: number; p: number; lower: number; upper: number } };
    };
    const paired = referenceJson<Case[]>('multiple-comparisons.json').find(
      (entry) => entry.id === 'TTEST-01',
    ) as Case;
    const strips = paired.input.a.flatMap((figure, index) => [
      strip(`${index}`, 'a', figure),
      strip(`${index}`, 'b', paired.input.b[index] as number),
    ]);
    const analysis = answered(blockAnalysis(strips));
    const [pair] = analysis.differences;
    expect(pair?.difference).toBeCloseTo(paired.expected.diff, 10);
    expect(analysis.errorDegreesOfFreedom).toBe(paired.expected.paired.df);
    expect(analysis.p).toBeCloseTo(paired.expected.paired.p, 10);
    const reach = studentQuantile(0.975, analysis.errorDegreesOfFreedom) * (pair?.standardError ?? 0);
    expect((pair?.difference ?? 0) - reach).toBeCloseTo(paired.expected.paired.lower, 9);
    expect((pair?.difference ?? 0) + reach).toBeCloseTo(paired.expected.paired.upper, 9);
  });

  it('tests nothing in one block', () => {
    expect(blockAnalysis([strip('1', 'A', 3), strip('1', 'B', 4)])).toEqual({
      kind: 'insufficient',
      reason: 'one-block',
      needed: '2 blocks',
      had: '1 block',
    });
    expect(blockAnalysis([])).toMatchObject({ reason: 'one-block', had: 'no block' });
  });

  it('leaves a setting with a single strip out and changes nothing else by it', () => {
    const strips = [
      strip('1', 'A', 3),
      strip('1', 'B', 4.2),
      strip('2', 'A', 5),
      strip('2', 'B', 5.9),
      strip('3', 'A', 4),
      strip('3', 'B', 5.3),
    ];
    const without = answered(blockAnalysis(strips));
    const analysis = answered(blockAnalysis([...strips, strip('2', 'C', 99)]));
    expect(analysis).toEqual({ ...without, leftOut: [{ setting: 'C', figure: 99 }] });
    expect(blockAnalysis([strip('1', 'A', 3), strip('2', 'B', 4)])).toMatchObject({
      reason: 'single-strips',
    });
  });

  it('does not compare settings that no shared block connects', () => {
    const strips = ['1', '2'].flatMap((block) => [strip(block, 'A', Number(block)), strip(block, 'B', 5)]);
    const apart = ['3', '4'].flatMap((block) => [strip(block, 'C', Number(block)), strip(block, 'D', 5)]);
    expect(blockAnalysis([...strips, ...apart])).toMatchObject({ reason: 'not-connected' });
  });

  it('says when nothing is left to judge the error by', () => {
    // A ring: A and B, B and C, C and A. Six strips, three blocks, three settings: one degree of freedom.
    const ring = [
      strip('1', 'A', 1),
      strip('1', 'B', 2),
      strip('2', 'B', 2.5),
      strip('2', 'C', 4),
      strip('3', 'C', 3),
      strip('3', 'A', 1),
    ];
    expect(answered(blockAnalysis(ring)).errorDegreesOfFreedom).toBe(1);
    const chain = [strip('1', 'A', 1), strip('1', 'B', 2), strip('2', 'B', 2.5), strip('3', 'A', 1)];
    expect(blockAnalysis(chain)).toMatchObject({ reason: 'no-error-degrees-of-freedom', had: '0' });
  });

  it('says when strips do not vary', () => {
    const strips = ['1', '2', '3'].flatMap((block) => [
      strip(block, 'A', 0.1 * Number(block)),
      strip(block, 'B', 0.1 * Number(block) + 0.2),
    ]);
    expect(blockAnalysis(strips)).toMatchObject({ reason: 'no-variation' });
    expect(blockAnalysis(strips.map((each) => ({ ...each, figure: 0 })))).toMatchObject({
      reason: 'no-variation',
    });
  });

  it('takes 24 settings and refuses 25 with a clear message', () => {
    const stream = randomStream(3);
    const many = (count: number) =>
      ['1', '2', '3'].flatMap((block) =>
        Array.from({ length: count }, (_, index) => strip(block, `s${index}`, stream.nextUnit())),
      );
    expect(answered(blockAnalysis(many(24))).differences).toHaveLength(276);
    expect(() => blockAnalysis(many(25))).toThrow('A comparison takes at most 24 settings; there are 25.');
    expect(() => blockAnalysis([strip('1', 'A', Number.NaN)])).toThrow(ImpossibleInput);
  });

  it('gives each setting the same answer whatever order strips come in', () => {
    const strips = stripsOf(designs.immer_1931_missing as ReferenceDesign);
    const expected = answered(blockAnalysis(strips));
    fc.assert(
      fc.property(fc.shuffledSubarray(strips, { minLength: strips.length }), (order) => {
        const analysis = answered(blockAnalysis(Object.freeze(order)));
        expect(analysis.p).toBeCloseTo(expected.p, 10);
        for (const mean of expected.means) {
          const found = analysis.means.find((candidate) => candidate.setting === mean.setting);
          expect(found?.leastSquaresMean).toBeCloseTo(mean.leastSquaresMean, 9);
          expect(found?.standardError).toBeCloseTo(mean.standardError, 9);
        }
      }),
      { numRuns: 20 },
    );
  });

  it('moves with a change of unit: adding shifts means only, scaling scales all but F and p', () => {
    const strips = stripsOf(designs.immer_sub as ReferenceDesign);
    const plain = answered(blockAnalysis(strips));
    const moved = answered(
      blockAnalysis(strips.map((each) => ({ ...each, figure: 30_000 + 2.5 * each.figure }))),
    );
    expect(moved.fRatio).toBeCloseTo(plain.fRatio, 8);
    expect(moved.differences[0]?.difference).toBeCloseTo(2.5 * (plain.differences[0]?.difference ?? 0), 8);
    expect(moved.means[0]?.leastSquaresMean).toBeCloseTo(
      30_000 + 2.5 * (plain.means[0]?.leastSquaresMean ?? 0),
      8,
    );
  });
});
