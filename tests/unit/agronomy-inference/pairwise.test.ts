import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { blockAnalysis } from '../../../lib/agronomy/inference/block-analysis';
import type { SettingMean } from '../../../lib/agronomy/inference/block-analysis';
import { holm } from '../../../lib/agronomy/inference/holm';
import { holmAgainstReference, tukeyPair, tukeyPairs } from '../../../lib/agronomy/inference/pairwise';
import type { ComparedPair } from '../../../lib/agronomy/inference/pairwise';
import { pairwiseLetters } from '../../../lib/agronomy/inference/pairwise-letters';
import { ImpossibleInput } from '../../../lib/agronomy/outcome';
import { answered, referenceJson, stripsOf } from './reference-designs';
import type { ReferenceDesign } from './reference-designs';

const designs = referenceJson<Record<string, ReferenceDesign>>('comparison.json');
const named = ['immer_1931', 'immer_1931_missing', 'immer_sub', 'barley_1931', 'npk_pairs'].map(
  (name) => [name, designs[name] as ReferenceDesign] as const,
);
type Case<Input, Expected> = { id: string; input: Input; expected: Expected };
const cases = referenceJson<Case<unknown, unknown>[]>('multiple-comparisons.json');

/** R's pairs, whichever way round, as a list. */
function expectedPairs(design: ReferenceDesign) {
  const list = <T>(entry: T | T[]): T[] => (Array.isArray(entry) ? entry : [entry]);
  const { pairs } = design.expected;
  return list(pairs.pair).map((name, index) => {
    const [first, second] = name.replaceAll('setting', '').split(' - ') as [string, string];
    const at = (column: number[] | number) => list(column)[index] as number;
    return {
      first,
      second,
      difference: at(pairs.difference),
      se: at(pairs.se),
      lower: at(pairs.lower),
      upper: at(pairs.upper),
      pUnadjusted: at(pairs.p_unadjusted),
      pTukey: at(pairs.p_tukey),
      pHolm: at(pairs.p_holm),
    };
  });
}

describe('tukeyPairs', () => {
  it.each(named)('agrees with emmeans on %s: differences, errors, p', (_, design) => {
    const pairs = tukeyPairs(answered(blockAnalysis(stripsOf(design))));
    const expected = expectedPairs(design);
    expect(pairs).toHaveLength(expected.length);
    for (const each of expected) {
      const found = pairs.find(
        (pair) => [pair.first, pair.second].sort().join() === [each.first, each.second].sort().join(),
      );
      if (!found) throw new Error(`no pair ${each.first} ${each.second}`);
      const sign = found.first === each.first ? 1 : -1;
      expect(sign * found.difference).toBeCloseTo(each.difference, 9);
      expect(found.standardError).toBeCloseTo(each.se, 9);
      expect(found.pUnadjusted).toBeCloseTo(each.pUnadjusted, 10);
      // R's studentized range is good to about 1e-6 at these degrees of freedom.
      expect(Math.abs(found.p - each.pTukey)).toBeLessThan(2e-6);
    }
  });

  it('agrees with TukeyHSD of R on a one-way layout', () => {
    const tukey = cases.find((entry) => entry.id === 'TUKEY-01') as Case<
      { groups: Record<string, number[]> },
      { pair: string[]; diff: number[]; lower: number[]; upper: number[]; p: number[] }
    >;
    const groups = Object.entries(tukey.input.groups);
    const mean = (figures: number[]) => figures.reduce((sum, figure) => sum + figure, 0) / figures.length;
    const squares = groups.reduce(
      (sum, [, own]) => sum + own.reduce((inner, y) => inner + (y - mean(own)) ** 2, 0),
      0,
    );
    const standardError = Math.sqrt((squares / 66) * (2 / 12));
    tukey.expected.pair.forEach((name, index) => {
      const [first, second] = name.split('-') as [string, string];
      const difference =
        mean(tukey.input.groups[first] as number[]) - mean(tukey.input.groups[second] as number[]);
      const pair = tukeyPair({ first, second, difference, standardError }, 6, 66);
      // Absolute tolerance 1e-6, as the case states it.
      expect(Math.abs(pair.difference - (tukey.expected.diff[index] as number))).toBeLessThan(1e-12);
      expect(Math.abs(pair.p - (tukey.expected.p[index] as number))).toBeLessThan(1e-6);
      expect(Math.abs(pair.lower - (tukey.expected.lower[index] as number))).toBeLessThan(1e-6);
      expect(Math.abs(pair.upper - (tukey.expected.upper[index] as number))).toBeLessThan(1e-6);
    });
  });

  it('tells two apart exactly when their interval leaves zero out', () => {
    for (const [, design] of named) {
      for (const pair of tukeyPairs(answered(blockAnalysis(stripsOf(design))))) {
        expect(pair.toldApart).toBe(pair.lower > 0 || pair.upper < 0);
      }
    }
  });
});

describe('holm', () => {
  it('agrees with R on the printed case', () => {
    const adjusted = cases.find((entry) => entry.id === 'PADJ-01') as Case<
      { p: number[] },
      { holm: number[] }
    >;
    holm(adjusted.input.p).forEach((p, index) =>
      expect(p).toBeCloseTo(adjusted.expected.holm[index] as number, 12),
    );
  });

  it.each(named)('agrees with R over all pairs of %s', (_, design) => {
    const expected = expectedPairs(design);
    holm(expected.map((pair) => pair.pUnadjusted)).forEach((p, index) =>
      expect(p).toBeCloseTo(expected[index]?.pHolm ?? -1, 10),
    );
  });

  it('does not depend on the order and never lowers a p', () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { maxLength: 12 }), (ps) => {
        const adjusted = holm(Object.freeze(ps) as number[]);
        adjusted.forEach((p, index) => expect(p).toBeGreaterThanOrEqual(ps[index] as number));
        expect(holm([...ps].reverse())).toEqual([...adjusted].reverse());
      }),
    );
    expect(() => holm([1.2])).toThrow(ImpossibleInput);
  });
});

describe('holmAgainstReference', () => {
  it.each(named)(
    'gives the t intervals of emmeans on %s, whichever setting is the reference',
    (_, design) => {
      // The intervals of the file are each pair's own t interval.
      const analysis = answered(blockAnalysis(stripsOf(design)));
      for (const each of expectedPairs(design)) {
        const pair = holmAgainstReference(analysis, each.second).find(({ first }) => first === each.first);
        expect(pair?.difference).toBeCloseTo(each.difference, 9);
        expect(pair?.lower).toBeCloseTo(each.lower, 8);
        expect(pair?.upper).toBeCloseTo(each.upper, 8);
      }
    },
  );

  it('compares each setting with the reference, that way round, with t intervals', () => {
    const analysis = answered(blockAnalysis(stripsOf(designs.immer_sub as ReferenceDesign)));
    const pairs = holmAgainstReference(analysis, 'S');
    expect(pairs.map(({ first, second }) => [first, second])).toEqual([
      ['M', 'S'],
      ['T', 'S'],
    ]);
    // T − S 24.6, SE 9.58696308, p 0.0425643758 (R); Holm over two: 0.0851287516; t(0.975; 6) = 2.44691 (R).
    expect(pairs[1]?.difference).toBeCloseTo(24.6, 9);
    expect(pairs[1]?.p).toBeCloseTo(0.0851287516243742, 9);
    expect(pairs[1]?.upper).toBeCloseTo(24.6 + 2.44691185114497 * 9.58696308072119, 8);
    expect(pairs[1]?.toldApart).toBe(false);
    expect(() => holmAgainstReference(analysis, 'X')).toThrow(ImpossibleInput);
  });
});

describe('pairwiseLetters', () => {
  const mean = (setting: string, leastSquaresMean: number): SettingMean => ({
    setting,
    strips: 4,
    leastSquaresMean,
    standardError: 1,
  });
  const apart = (first: string, second: string): ComparedPair => ({
    first,
    second,
    difference: 1,
    standardError: 1,
    pUnadjusted: 0,
    p: 0,
    lower: 0.5,
    upper: 1.5,
    toldApart: true,
  });

  it('gives A a, B ab, C b when only the ends are told apart', () => {
    expect(pairwiseLetters([mean('C', 1), mean('B', 2), mean('A', 3)], [apart('A', 'C')])).toEqual([
      { setting: 'A', letters: 'a' },
      { setting: 'B', letters: 'ab' },
      { setting: 'C', letters: 'b' },
    ]);
  });

  it('shares a letter between two settings exactly when they are not told apart', () => {
    const names = ['A', 'B', 'C', 'D', 'E', 'F'];
    const allPairs = names.flatMap((first, index) =>
      names.slice(index + 1).map((second) => apart(first, second)),
    );
    fc.assert(
      fc.property(fc.subarray(allPairs), (told) => {
        const letters = new Map(
          pairwiseLetters(
            names.map((name, index) => mean(name, index)),
            told,
          ).map((each) => [each.setting, each.letters]),
        );
        for (const { first, second } of allPairs) {
          const shared = [...(letters.get(first) ?? '')].some((one) => letters.get(second)?.includes(one));
          expect(shared).toBe(!told.some((pair) => pair.first === first && pair.second === second));
        }
      }),
    );
  });
});
