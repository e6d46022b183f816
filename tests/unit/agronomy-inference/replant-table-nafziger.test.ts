import { describe, expect, it } from 'vitest';
import { ImpossibleInput } from '../../../lib/agronomy/outcome';
import {
  NAFZIGER_ROWS,
  NAFZIGER_STANDS,
  nafzigerYieldPercent,
} from '../../../lib/agronomy/replant-table-nafziger';

const april30 = { month: 4, day: 30 };

describe('nafzigerYieldPercent', () => {
  // Source of the printed cells: Nafziger 1994, J Prod Agric 7:59, as printed by Purdue. Tolerance: none.
  it.each([
    [4, 30, 20_000, 92],
    [5, 25, 30_000, 87],
    [4, 10, 10_000, 62],
    [4, 15, 14_000, 76],
    [4, 15, 18_000, 85],
    [5, 20, 22_000, 86],
    [6, 9, 36_000, 65],
  ])('reads the printed cell of %d/%d at %d plants', (month, day, plantsPerAcre, percent) => {
    expect(nafzigerYieldPercent({ month, day }, plantsPerAcre)).toMatchObject({
      kind: 'value',
      percent,
      basis: 'printed',
    });
  });

  it('gives back every cell of the grid, and only the printed ones as printed', () => {
    for (const row of NAFZIGER_ROWS) {
      NAFZIGER_STANDS.forEach((stand, column) => {
        const reading = nafzigerYieldPercent(row.planted, stand);
        expect(reading).toMatchObject({ kind: 'value', percent: row.percents[column], basis: 'printed' });
      });
    }
    expect(nafzigerYieldPercent(april30, 20_001)).toMatchObject({ basis: 'interpolated' });
    expect(nafzigerYieldPercent({ month: 5, day: 1 }, 20_000)).toMatchObject({ basis: 'interpolated' });
  });

  it('reads between four cells by date and stand', () => {
    // By hand: 30 Apr 21,000 is 93.5, 5 May 21,000 is 92.5; 2 May is two fifths of the way: 93.1.
    const reading = nafzigerYieldPercent({ month: 5, day: 2 }, 21_000);
    expect(reading.percent).toBeCloseTo(93.1, 10);
  });

  it('bounds by the edge where the grid ends and names the end', () => {
    expect(nafzigerYieldPercent(april30, 6_000)).toMatchObject({
      kind: 'at-most',
      percent: 68,
      beyond: ['stand-below'],
    });
    expect(nafzigerYieldPercent(april30, 40_000)).toMatchObject({
      kind: 'at-most',
      percent: 97,
      beyond: ['stand-above'],
    });
    expect(nafzigerYieldPercent({ month: 4, day: 1 }, 30_000)).toMatchObject({
      kind: 'at-most',
      percent: 94,
      beyond: ['date-before'],
    });
    expect(nafzigerYieldPercent({ month: 6, day: 20 }, 8_000)).toMatchObject({
      kind: 'at-most',
      percent: 36,
      beyond: ['stand-below', 'date-after'],
    });
  });

  it('marks rows that the source itself extrapolated', () => {
    expect(nafzigerYieldPercent({ month: 5, day: 25 }, 30_000).extrapolatedInSource).toBe(false);
    expect(nafzigerYieldPercent({ month: 5, day: 26 }, 30_000).extrapolatedInSource).toBe(true);
    expect(nafzigerYieldPercent({ month: 6, day: 9 }, 30_000).extrapolatedInSource).toBe(true);
  });

  it('makes nothing of no plants, and does not call that a bound', () => {
    expect(nafzigerYieldPercent(april30, 0)).toMatchObject({ kind: 'value', percent: 0, basis: 'no-plants' });
  });

  it('refuses a negative stand and a day that is in no calendar', () => {
    expect(() => nafzigerYieldPercent(april30, -1)).toThrow(ImpossibleInput);
    expect(() => nafzigerYieldPercent({ month: 4, day: 31 }, 20_000)).toThrow(ImpossibleInput);
    expect(() => nafzigerYieldPercent({ month: 13, day: 1 }, 20_000)).toThrow(ImpossibleInput);
  });
});
