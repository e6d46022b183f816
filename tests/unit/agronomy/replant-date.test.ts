import { describe, expect, it } from 'vitest';
import { ImpossibleInput } from '@/lib/agronomy/outcome';
import { dayOfYear } from '@/lib/agronomy/replant-date';

describe('the day of the year', () => {
  // Ordinary years of 365 days: any calendar.
  it.each([
    [1, 1, 1], [1, 31, 31], [2, 1, 32], [2, 28, 59], [3, 1, 60], [3, 31, 90], [4, 1, 91], [4, 30, 120], [5, 1, 121], [5, 31, 151], [6, 1, 152], [6, 30, 181],
    [7, 1, 182], [7, 31, 212], [8, 1, 213], [8, 31, 243], [9, 1, 244], [9, 30, 273], [10, 1, 274], [10, 31, 304], [11, 1, 305], [11, 30, 334], [12, 1, 335], [12, 31, 365],
  ])('of %i/%i is %i', (month, day, expected) => {
    expect(dayOfYear({ month, day }, 'plantedOn')).toBe(expected);
  });

  it('of 29 February is that of 1 March', () => {
    expect(dayOfYear({ month: 2, day: 29 }, 'plantedOn')).toBe(60);
  });

  it.each([[0, 1], [13, 1], [4, 0], [4, 31], [2, 30], [6, 31], [5, 1.5], [NaN, 1], [5, NaN], [1, 32], [12, 32]])('refuses %d/%d, by the name of its field', (month, day) => {
    expect(() => dayOfYear({ month, day }, 'replantOn')).toThrow(expect.objectContaining({ name: 'ImpossibleInput', field: 'replantOn' }));
    expect(() => dayOfYear({ month, day }, 'replantOn')).toThrow(ImpossibleInput);
  });
});
