import { describe, expect, test } from 'vitest';
import { emergenceCurve } from '@/lib/agronomy/emergence-curve';
import { emergenceSpread } from '@/lib/agronomy/emergence-spread';
import { poolEmergence } from '@/lib/agronomy/emergence-pool';
import { answerOf, reasonOf } from './answer-of';

function row(firstDay: number, plants: readonly number[], step = 1) {
  return plants.map((plantsUp, index) => ({ days: firstDay + index * step, plantsUp }));
}

// Expected values here are the definition worked by hand: no outside evidence.
describe('poolEmergence', () => {
  test('adds the counts of rows visited in the same rounds', () => {
    const pooled = answerOf(poolEmergence([row(8, [0, 10, 20]), row(8.1, [0, 12, 24])]));
    expect(pooled.calendar).toBe('same-rounds');
    expect(pooled.points.map((point) => point.plantsUp)).toEqual([0, 22, 44]);
    expect(pooled.points.map((point) => point.days)).toEqual([8.05, 9.05, 10.05]);
  });

  test('reads rows with rounds of their own by a straight line and adds them', () => {
    const pooled = answerOf(poolEmergence([row(8, [0, 10, 20, 20]), row(8, [0, 24], 2)]));
    expect(pooled.calendar).toBe('own-rounds');
    expect(pooled.points).toEqual([
      { days: 8, plantsUp: 0 },
      { days: 9, plantsUp: 22 },
      { days: 10, plantsUp: 44 },
      { days: 11, plantsUp: 44 },
    ]);
  });

  test('begins no earlier than the first visit of a row that already had plants', () => {
    const pooled = answerOf(poolEmergence([row(7, [0, 5, 10, 20]), row(9, [15, 20])]));
    expect(pooled.points[0]).toEqual({ days: 9, plantsUp: 25 });
  });

  test('adds losses over rows even where another row gained', () => {
    const pooled = answerOf(poolEmergence([row(8, [0, 20, 19]), row(8, [0, 20, 21])]));
    expect(pooled.plantsLost).toBe(1);
  });

  test('has ended only when every row has', () => {
    const ended = row(8, [0, 30, 30, 30]);
    expect(answerOf(poolEmergence([ended, ended])).countingEnded).toBe(true);
    expect(answerOf(poolEmergence([ended, row(8, [0, 28, 30, 31])])).countingEnded).toBe(false);
  });

  test('is wider than the mean of the rows’ own spreads when rows differ', () => {
    const early = row(8, [0, 6, 16, 26, 30, 30, 30]);
    const late = early.map((visit) => ({ ...visit, days: visit.days + 0.8 }));
    const pooled = answerOf(emergenceSpread(answerOf(poolEmergence([early, late]))));
    const own = answerOf(emergenceSpread(answerOf(emergenceCurve(early))));
    expect(pooled.days).toBeGreaterThan(own.days);
  });

  test('passes over rows without a count and is insufficient without any', () => {
    expect(answerOf(poolEmergence([[], row(8, [0, 30])])).rowSampleCount).toBe(1);
    expect(reasonOf(poolEmergence([[], []]))).toBe('no-counts');
    expect(reasonOf(poolEmergence([row(8, [0, 0]), row(8, [0, 0])]))).toBe('nothing-up');
  });
});
