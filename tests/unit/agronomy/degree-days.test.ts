import { describe, expect, test } from 'vitest';
import { degreeDaysCelsius, degreeDaysFahrenheit } from '@/lib/agronomy/degree-days';
import { ImpossibleInput } from '@/lib/agronomy/outcome';
import degreeDays from '../../reference/degree-days.json';
import published from '../../reference/published-examples.json';
import { referenceCase } from './reference-case';

describe('degreeDaysFahrenheit', () => {
  test.each(published.degreeDays.rows)('is $degreeDays for $highFahrenheit and $lowFahrenheit °F', (day) => {
    expect(degreeDaysFahrenheit(day.highFahrenheit, day.lowFahrenheit)).toBe(day.degreeDays);
  });

  test('agrees with GDU-01', () => {
    const { input, expected } = referenceCase<{ tmax_f: number[]; tmin_f: number[] }, { daily: number[] }>(
      degreeDays,
      'GDU-01',
    );
    input.tmax_f.forEach((high, index) => {
      const figured = degreeDaysFahrenheit(high, input.tmin_f[index] as number);
      expect(figured).toBeCloseTo(expected.daily[index] as number, 10);
    });
  });

  test('gives the same heat in °C', () => {
    for (const [high, low] of [
      [80, 55],
      [93, 66],
      [49, 30],
      [88, 61],
    ] as const) {
      const celsius = degreeDaysCelsius(((high - 32) * 5) / 9, ((low - 32) * 5) / 9);
      expect(celsius * 1.8).toBeCloseTo(degreeDaysFahrenheit(high, low), 9);
    }
  });

  test('refuses a high below the low', () => {
    expect(() => degreeDaysFahrenheit(50, 60)).toThrow(ImpossibleInput);
  });
});
