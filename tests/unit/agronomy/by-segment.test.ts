import { describe, expect, test } from 'vitest';
import { bySegment } from '@/lib/agronomy/by-segment';
import { plantSpacingsInches } from '@/lib/agronomy/spacing-figures';
import { rowScores } from '@/lib/agronomy/row-scores';
import { answerOf } from './answer-of';
import { placesOf, rowSampleOf } from './row-sample-of';

describe('a row whose tape was laid anew after a cut', () => {
  const cut = rowSampleOf({
    tape: [...placesOf([5, 11, 17]), ...placesOf([100, 107, 113]).map((place) => ({ ...place, segment: 1 }))],
  });

  test('is taken apart where the piece changes', () => {
    expect(bySegment([0, undefined, 1, 1, 2], (segment) => segment)).toEqual([[0, undefined], [1, 1], [2]]);
    expect(bySegment([], () => 0)).toEqual([]);
  });

  test('has no spacing over the cut', () => {
    // By hand: 6 6 within the first piece, 7 6 within the second.
    expect(plantSpacingsInches(cut)).toEqual([6, 6, 7, 6]);
    expect(answerOf(rowScores(cut).figures.spacingInchesMean)).toBe(6.25);
    expect(answerOf(rowScores(cut).figures.doublesAndGaps).gaps).toBe(0);
  });

  test('has no run of late plants over the cut', () => {
    const late = (sample: typeof cut) => ({ ...sample, tape: sample.tape?.map((place, index) => ({ ...place, kind: index === 2 || index === 3 ? ('late' as const) : place.kind })) ?? null });
    expect(answerOf(rowScores(late(cut)).figures.latePattern)).toMatchObject({ runs: 2, meanRunLength: 1 });
    const whole = { ...cut, tape: placesOf([5, 11, 17, 100, 107, 113]) };
    expect(answerOf(rowScores(late(whole)).figures.latePattern)).toMatchObject({ runs: 1, meanRunLength: 2 });
  });
});
