import { describe, expect, it } from 'vitest';
import { comparisonDescription } from '../../../lib/agronomy/comparison-description';
import { blockAnalysis, type StripFigure } from '../../../lib/agronomy/inference/block-analysis';
import { pairwiseLetters } from '../../../lib/agronomy/inference/pairwise-letters';
import { blockLeastSquares } from '../../../lib/agronomy/inference/block-least-squares';
import { invertedPositive } from '../../../lib/agronomy/inference/linear-algebra';
import { holmAgainstReference, tukeyPairs } from '../../../lib/agronomy/inference/pairwise';
import {
  EXACT_ARRANGEMENTS_MAX,
  randomisationTest,
} from '../../../lib/agronomy/inference/randomisation-test';
import { studentizedRangeUpperTail } from '../../../lib/agronomy/inference/studentized-range';
import { layout } from '../../../lib/agronomy/layout';
import { ImpossibleInput } from '../../../lib/agronomy/outcome';
import { normalStream } from './normal-stream';
import { answered } from './reference-designs';

function strip(block: string, setting: string, figure: number): StripFigure {
  return { block, setting, figure };
}

/** Blocks written as the settings that stand in them; figures are noise about 10. */
function blocksOf(blocks: readonly string[], seed = 6): StripFigure[] {
  const normal = normalStream(seed);
  return blocks.flatMap((settings, block) =>
    [...settings].map((name) => strip(`${block}`, name, 10 + normal())),
  );
}

describe('blocks with different settings', () => {
  it('are compared through the blocks they share, and count what complete blocks would have had', () => {
    const strips = blocksOf(['ABC', 'ABD', 'ACD', 'BCD']);
    const analysis = answered(blockAnalysis(strips));
    expect(analysis).toMatchObject({ strips: 12, missingStrips: 4, errorDegreesOfFreedom: 5 });
    // A balanced incomplete block design: every difference has the same error (Cochran & Cox 1957, ch. 11).
    // Its variance is 2 k / (λ t) of the error mean square, with k = 3, λ = 2, t = 4.
    for (const pair of analysis.differences) {
      expect(pair.standardError ** 2 / analysis.meanSquareError).toBeCloseTo((2 * 3) / (2 * 4), 10);
    }
    expect(answered(randomisationTest(strips, 1)).arrangements).toBe(6 ** 4);
  });

  it('are not compared when they share nothing', () => {
    const strips = blocksOf(['AB', 'AB', 'CD', 'CD']);
    expect(blockAnalysis(strips)).toMatchObject({ kind: 'insufficient', reason: 'not-connected' });
    expect(randomisationTest(strips, 1)).toMatchObject({ kind: 'insufficient', reason: 'not-connected' });
  });
});

describe('a setting in a single strip', () => {
  it('is described and named as left out, and not compared', () => {
    const strips = blocksOf(['ABC', 'AB', 'AB']);
    const analysis = answered(blockAnalysis(strips));
    expect(analysis.leftOut).toEqual([{ setting: 'C', figure: strips[2]?.figure }]);
    expect(analysis.means.map((mean) => mean.setting)).toEqual(['A', 'B']);
    expect(() => holmAgainstReference(analysis, 'C')).toThrow(ImpossibleInput);
    expect(comparisonDescription(strips).find((each) => each.setting === 'C')).toMatchObject({ strips: 1 });
  });
});

describe('figures that are all equal', () => {
  const equal = blocksOf(['ABC', 'ABC', 'ABC', 'ABC']).map((each) => ({ ...each, figure: 30_000 }));

  it('are insufficient for the analysis, which has no error to judge by', () => {
    expect(blockAnalysis(equal)).toMatchObject({ kind: 'insufficient', reason: 'no-variation' });
  });

  it('are as extreme in every arrangement: p is 1', () => {
    expect(answered(randomisationTest(equal, 1))).toMatchObject({
      asExtreme: 1296,
      p: 1,
      smallestAttainableP: 1,
    });
  });
});

describe('one block', () => {
  it('is described and tested by neither', () => {
    const strips = blocksOf(['ABC']);
    expect(blockAnalysis(strips)).toMatchObject({ kind: 'insufficient', reason: 'one-block' });
    expect(randomisationTest(strips, 1)).toMatchObject({ kind: 'insufficient', reason: 'one-block' });
    expect(comparisonDescription(strips)).toHaveLength(3);
  });
});

describe('numbers that are none', () => {
  it.each([Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY])(
    'refuses %d everywhere',
    (figure) => {
      const strips = [...blocksOf(['AB', 'AB', 'AB']), strip('0', 'A', figure)];
      for (const ask of [
        () => blockAnalysis(strips),
        () => randomisationTest(strips, 1),
        () => comparisonDescription(strips),
      ]) {
        expect(ask).toThrow(expect.objectContaining({ name: 'ImpossibleInput', field: 'figure' }));
      }
    },
  );

  it('refuses a seed that is none where chance is asked', () => {
    const strips = blocksOf(Array.from({ length: 6 }, () => 'ABCD'));
    expect(() => randomisationTest(strips, 0.5)).toThrow(ImpossibleInput);
  });
});

describe('what the parts refuse', () => {
  it('a matrix that cannot be inverted, as of settings that share nothing', () => {
    expect(() => invertedPositive([[0]])).toThrow('not positive definite');
    const apart = blocksOf(['AB', 'AB', 'CD', 'CD']);
    expect(() => blockLeastSquares(apart, ['0', '1', '2', '3'], ['A', 'B', 'C', 'D'])).toThrow(
      ImpossibleInput,
    );
  });

  it('a range of zero is reached by all', () => {
    expect(studentizedRangeUpperTail(0, 3, 6)).toBe(1);
  });

  it('knows no ties of incomplete blocks it did not count, and says only what one arrangement is worth', () => {
    const strips = blocksOf(['ABCD', 'ABCD', 'ABCD', 'ABCD', 'ABCD', 'ABC']);
    const test = answered(randomisationTest(strips, 3));
    expect(test).toMatchObject({ method: 'sampled', arrangements: 24 ** 5 * 6 });
    expect(test.smallestAttainableP).toBe(1 / (24 ** 5 * 6));
  });

  it('gives the twenty-seventh letter a number of its own', () => {
    // Every second of 60 settings apart from its neighbours: more groups than the alphabet has letters.
    const means = Array.from({ length: 60 }, (_, index) => ({
      setting: `${index}`,
      strips: 2,
      leastSquaresMean: -index,
      standardError: 1,
    }));
    const pairs = means.flatMap((first, index) =>
      means.slice(index + 1).map((second) => ({
        first: first.setting,
        second: second.setting,
        difference: 1,
        standardError: 1,
        pUnadjusted: 0,
        p: 0,
        lower: 0.5,
        upper: 1.5,
        toldApart: true,
      })),
    );
    const letters = pairwiseLetters(means, pairs).map((each) => each.letters);
    expect([letters[0], letters[25], letters[26], letters[59]]).toEqual(['a', 'z', 'a2', 'h3']);
  });
});

describe('nothing at all', () => {
  it('is insufficient', () => {
    expect(blockAnalysis([])).toMatchObject({ reason: 'one-block', had: 'no block' });
    expect(randomisationTest([], 1)).toMatchObject({ reason: 'one-block', had: '0 such blocks' });
    expect(comparisonDescription([])).toEqual([]);
  });

  it('is insufficient for one setting in many blocks', () => {
    const strips = [strip('1', 'A', 3), strip('1', 'A', 4), strip('2', 'A', 5), strip('2', 'A', 3)];
    expect(blockAnalysis(strips)).toMatchObject({ reason: 'single-strips' });
    expect(randomisationTest(strips, 1)).toMatchObject({ reason: 'one-setting' });
  });
});

describe('25 settings', () => {
  const names = Array.from({ length: 25 }, (_, index) => String.fromCharCode(97 + index));

  it('are refused with their number, in the layout and in the analysis', () => {
    expect(() => layout({ settings: names, blocks: 4, seed: 1 })).toThrow(
      'A trial compares at most 24 settings; there are 25.',
    );
    expect(() => blockAnalysis(blocksOf([names.join(''), names.join('')]))).toThrow(
      'A comparison takes at most 24 settings; there are 25.',
    );
  });

  it('24 of them are laid, compared in 276 pairs and sampled', () => {
    const settings = names.slice(0, 24);
    expect(layout({ settings, blocks: 2, seed: 1 }).blocks[0]?.strips).toHaveLength(24);
    const strips = blocksOf([settings.join(''), settings.join(''), settings.join('')]);
    expect(tukeyPairs(answered(blockAnalysis(strips)))).toHaveLength(276);
    const test = answered(randomisationTest(strips, 1));
    expect(test.method).toBe('sampled');
    expect(test.arrangements).toBeGreaterThan(EXACT_ARRANGEMENTS_MAX);
  });
});
