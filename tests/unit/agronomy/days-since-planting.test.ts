import { describe, expect, test } from 'vitest';
import { daysSincePlanting } from '@/lib/agronomy/days-since-planting';
import { ImpossibleInput } from '@/lib/agronomy/outcome';

describe('daysSincePlanting', () => {
  test.each([
    ['2026-05-07', null, '2026-05-15', null, 8],
    ['2026-05-07', '12:00', '2026-05-15', '18:00', 8.25],
    ['2026-05-07', null, '2026-05-15', '06:00', 7.75],
    ['2026-04-28', null, '2026-05-18', null, 20],
    ['2024-02-28', null, '2024-03-01', null, 2],
    ['2026-05-07', null, '2026-05-06', null, -1],
  ])('from %s %s to %s %s is %s days', (plantedOn, plantedAt, visitedOn, visitedAt, days) => {
    const figured = daysSincePlanting({ on: plantedOn, at: plantedAt }, { on: visitedOn, at: visitedAt });
    expect(figured).toBeCloseTo(days, 12);
  });

  test.each(['2026-06-31', '2026-13-01', '7 May', ''])('refuses %s as a day', (on) => {
    expect(() => daysSincePlanting({ on: '2026-05-07', at: null }, { on, at: null })).toThrow(
      ImpossibleInput,
    );
  });

  test('refuses a time that does not exist', () => {
    const planted = { on: '2026-05-07', at: null };
    expect(() => daysSincePlanting(planted, { on: '2026-05-15', at: '25:10' })).toThrow(ImpossibleInput);
  });
});
