import { describe, expect, test } from 'vitest';
import { insufficient, value } from '@/lib/agronomy/outcome';
import { spacingPoints, standPoints, timingPoints, wholeScore } from '@/lib/agronomy/score';
import { answerOf, reasonOf } from './answer-of';

// The anchors of the spacing part are Nielsen's survey (2, 4.5 and 10 in); all others are our own choice.
const missing = insufficient('no-tape-sheet', '1 tape sheet', 'no tape sheet');

describe('the parts of the score', () => {
  test.each([
    [32_000, 100],
    [30_000, 100],
    [28_500, 90],
    [15_000, 0],
    [9_000, 0],
  ])('stand: %i plants of 30,000 intended are %i points', (plants, points) => {
    expect(standPoints(plants, 30_000).points).toBeCloseTo(points, 9);
  });

  test.each([
    [1, 100],
    [2, 100],
    [4.5, 50],
    [7, 0],
    [11, 0],
  ])('timing: a spread of %s days is %i points', (amount, points) => {
    expect(timingPoints({ amount, unit: 'days', bound: 'exact' }).points).toBeCloseTo(points, 9);
  });

  test.each([
    [25, 100],
    [53.5, 50],
    [82, 0],
  ])('timing: a spread of %s degree days is %i points', (amount, points) => {
    expect(timingPoints({ amount, unit: 'degree-days', bound: 'exact' }).points).toBeCloseTo(points, 9);
  });

  test('timing is "at most" so many points when the spread is "at least"', () => {
    expect(timingPoints({ amount: 4.5, unit: 'days', bound: 'at-least' }).bound).toBe('at-most');
    expect(timingPoints({ amount: 8, unit: 'days', bound: 'at-least' })).toEqual({
      points: 0,
      bound: 'exact',
    });
  });

  test.each([
    [1.5, 100],
    [2, 100],
    [3.25, 75],
    [4.5, 50],
    [10, 0],
    [14, 0],
  ])('spacing: an SD of %s in is %i points', (sd, points) => {
    expect(spacingPoints(sd).points).toBeCloseTo(points, 9);
  });
});

describe('wholeScore', () => {
  const exact = (points: number) => value({ points, bound: 'exact' as const });

  test('weights stand 0.4, timing 0.4 and spacing 0.2', () => {
    const score = answerOf(wholeScore({ stand: exact(90), timing: exact(50), spacing: exact(40) }));
    expect(score.points).toBeCloseTo(64, 9);
    expect(score).toMatchObject({ leftOut: [], version: '1', bound: 'exact' });
  });

  test('leaves an insufficient part out, says so and raises the other weights', () => {
    const score = answerOf(wholeScore({ stand: exact(90), timing: exact(50), spacing: missing }));
    expect(score.points).toBeCloseTo(70, 9);
    expect(score.leftOut).toEqual(['spacing']);
    expect(score.weights).toEqual({ stand: 0.5, timing: 0.5, spacing: 0 });
  });

  test('is "at most" when a part is', () => {
    const timing = value({ points: 50, bound: 'at-most' as const });
    expect(answerOf(wholeScore({ stand: exact(90), timing, spacing: missing })).bound).toBe('at-most');
  });

  test('is insufficient when no part is there', () => {
    expect(reasonOf(wholeScore({ stand: missing, timing: missing, spacing: missing }))).toBe('no-part');
  });
});
