import { describe, expect, it } from 'vitest';
import { gapLossShare } from '@/lib/agronomy/gap-loss-share';
import { ImpossibleInput } from '@/lib/agronomy/outcome';
import { nafzigerYieldPercent } from '@/lib/agronomy/replant-table-nafziger';
import { iowa2001 } from '@/lib/agronomy/replant-tables/iowa-2001';
import { minnesotaFullStandPercent, minnesotaTable, MINNESOTA_PERCENT_AT_22000 } from '@/lib/agronomy/replant-tables/minnesota-full-stand';
import { nafziger1994 } from '@/lib/agronomy/replant-tables/nafziger-1994';
import { publishedTables } from '@/lib/agronomy/replant-tables/published-tables';
import { wisconsin2003FullSeason, wisconsin2003ShortSeason } from '@/lib/agronomy/replant-tables/wisconsin-2003';
import { checkedTable, tableYieldPercent, type StandDateTable } from '@/lib/agronomy/stand-date-table';

const day = (month: number, dayOfMonth: number) => ({ month, day: dayOfMonth });

describe('the tables of stand and date', () => {
  it.each([nafziger1994, iowa2001, wisconsin2003FullSeason, wisconsin2003ShortSeason])('are whole: $id', (table) => {
    expect(checkedTable(table)).toBe(table);
  });

  it('read the grid of Nafziger 1994 as its own function does, cells, between cells and beyond', () => {
    for (let month = 3; month <= 7; month += 1) {
      for (const dayOfMonth of [1, 7, 10, 15, 23, 30]) {
        for (const stand of [0, 8_000, 10_000, 15_500, 20_000, 31_000, 36_000, 40_000]) {
          expect(tableYieldPercent(nafziger1994, day(month, dayOfMonth), stand)).toEqual(nafzigerYieldPercent(day(month, dayOfMonth), stand));
        }
      }
    }
  });

  // Iowa State 2001, PM 1885 table 7, and the comparison that Iowa and Nebraska 2009 make with it.
  it.each([
    [5, 1, 24_000, 94],
    [4, 20, 12_000, 68],
    [5, 28, 30_000, 90],
    [6, 12, 16_000, 50],
    [6, 28, 20_000, 42],
    [5, 16, 29_000, 99],
  ])('print Iowa 2001: %i/%i at %i is %i', (month, dayOfMonth, stand, percent) => {
    expect(tableYieldPercent(iowa2001, day(month, dayOfMonth), stand)).toMatchObject({ kind: 'value', percent });
  });

  it('label what stands between two bands of days, or between two stands, as interpolated', () => {
    // 9 May lies halfway from 5 to 13 May: 93.5 at 24,000.
    expect(tableYieldPercent(iowa2001, day(5, 9), 24_000)).toEqual({ kind: 'value', percent: 93.5, basis: 'interpolated', extrapolatedInSource: false });
    expect(tableYieldPercent(iowa2001, day(5, 1), 22_000)).toMatchObject({ percent: 87.5, basis: 'interpolated' });
    expect(tableYieldPercent(iowa2001, day(5, 5), 24_000)).toMatchObject({ basis: 'printed' });
  });

  // Wisconsin W120, southern zone, 2003.
  it.each([
    [wisconsin2003FullSeason, 5, 20, 32_000, 86],
    [wisconsin2003FullSeason, 6, 20, 30_000, 8],
    [wisconsin2003FullSeason, 5, 1, 28_000, 99],
    [wisconsin2003ShortSeason, 5, 20, 30_000, 87],
    [wisconsin2003ShortSeason, 6, 10, 30_000, 56],
    [wisconsin2003ShortSeason, 6, 10, 28_000, 55],
    [wisconsin2003ShortSeason, 4, 20, 36_000, 91],
  ])('print Wisconsin 2003: $id %i/%i at %i is %i', (table, month, dayOfMonth, stand, percent) => {
    expect(tableYieldPercent(table, day(month, dayOfMonth), stand)).toMatchObject({ kind: 'value', basis: 'printed', percent });
  });

  it('give only a bound where they end', () => {
    expect(tableYieldPercent(wisconsin2003FullSeason, day(5, 1), 20_000)).toEqual({ kind: 'at-most', percent: 99, beyond: ['stand-below'], extrapolatedInSource: false });
    expect(tableYieldPercent(iowa2001, day(7, 4), 40_000)).toMatchObject({ kind: 'at-most', beyond: ['stand-above', 'date-after'] });
    expect(tableYieldPercent(iowa2001, day(4, 1), 24_000)).toMatchObject({ kind: 'at-most', beyond: ['date-before'] });
    expect(tableYieldPercent(iowa2001, day(5, 1), 0)).toMatchObject({ kind: 'value', percent: 0, basis: 'no-plants' });
  });

  it('differ among themselves: at 20,000 planted early Iowa 2001 says 81 and Nafziger 92', () => {
    expect(tableYieldPercent(iowa2001, day(4, 30), 20_000)).toMatchObject({ percent: 81 });
    expect(tableYieldPercent(nafziger1994, day(4, 30), 20_000)).toMatchObject({ percent: 92 });
  });

  it('print a full stand as one value: 30,000 is printed in Iowa, as are 28,000 and 32,000, and 27,000 is read between', () => {
    const basisAt = (stand: number) => tableYieldPercent(iowa2001, day(5, 28), stand);
    for (const stand of [28_000, 29_999, 30_000, 32_000]) expect(basisAt(stand)).toMatchObject({ percent: 90, basis: 'printed' });
    expect(basisAt(27_000)).toMatchObject({ kind: 'value', basis: 'interpolated' });
    expect(tableYieldPercent(iowa2001, day(5, 22), 30_000)).toMatchObject({ kind: 'value', basis: 'interpolated' });
  });

  it('all answer through one door, each with its source and age, and hold as tables of one’s own would', () => {
    expect(new Set(publishedTables.map(({ id }) => id)).size).toBe(6);
    for (const table of publishedTables) {
      expect(checkedTable(table)).toBe(table);
      expect(table.age.length).toBeGreaterThan(10);
      expect(tableYieldPercent(table, day(5, 14), 30_000).percent).toBeGreaterThan(80);
    }
  });

  it('only bound a thinner stand in Minnesota, where full ones alone are printed by date', () => {
    expect(tableYieldPercent(minnesotaTable['lamberton-1988-2003'], day(5, 20), 22_000)).toEqual({ kind: 'at-most', percent: 92, beyond: ['stand-below'], extrapolatedInSource: false });
  });

  it('refuse a negative stand and a day in no calendar', () => {
    expect(() => tableYieldPercent(iowa2001, day(5, 1), -1)).toThrow(ImpossibleInput);
    expect(() => tableYieldPercent(iowa2001, day(5, 1), NaN)).toThrow(ImpossibleInput);
    expect(() => tableYieldPercent(iowa2001, day(2, 30), 20_000, 'replantOn')).toThrow('replantOn');
  });
});

describe('full stands in Minnesota', () => {
  // Lamberton 1988 to 2003 and three sites 2009 to 2011, University of Minnesota.
  it.each([
    ['lamberton-1988-2003', 5, 20, 92],
    ['lamberton-1988-2003', 4, 25, 100],
    ['lamberton-1988-2003', 6, 9, 69],
    ['three-sites-2009-2011', 5, 20, 95],
    ['three-sites-2009-2011', 6, 4, 84],
  ] as const)('are printed: %s %i/%i is %i', (trials, month, dayOfMonth, percent) => {
    expect(minnesotaFullStandPercent(trials, day(month, dayOfMonth))).toEqual({ kind: 'value', percent, basis: 'printed', extrapolatedInSource: false });
  });

  it('are read between dates, and bounded outside them', () => {
    expect(minnesotaFullStandPercent('lamberton-1988-2003', day(6, 2))).toMatchObject({ kind: 'value', basis: 'interpolated' });
    expect(minnesotaFullStandPercent('lamberton-1988-2003', day(4, 10))).toMatchObject({ kind: 'at-most', percent: 99, beyond: ['date-before'] });
    expect(minnesotaFullStandPercent('lamberton-1988-2003', day(6, 20))).toMatchObject({ kind: 'at-most', percent: 69, beyond: ['date-after'] });
    expect(() => minnesotaFullStandPercent('lamberton-1988-2003', day(13, 1))).toThrow(ImpossibleInput);
  });

  it('make replanting 22,000 lose its cost on or after about 20 May, as Hicks 2002 says of a tie', () => {
    const late = minnesotaFullStandPercent('lamberton-1988-2003', day(5, 24));
    expect(late.kind === 'value' ? Math.round(late.percent) : 0).toBe(MINNESOTA_PERCENT_AT_22000);
  });
});

describe('a table of one’s own', () => {
  const own: StandDateTable = {
    id: 'own', name: 'Own trials', source: 'Invented for this test', age: 'none', stands: [10_000, 30_000],
    rows: [{ from: day(5, 1), to: day(5, 1), percents: [60, 100] }, { from: day(6, 1), to: day(6, 3), percents: [40, 80] }],
  };

  it('is read like the published ones', () => {
    expect(tableYieldPercent(checkedTable(own), day(5, 1), 20_000)).toMatchObject({ percent: 80, basis: 'interpolated' });
    expect(tableYieldPercent(own, day(6, 2), 30_000)).toMatchObject({ percent: 80, basis: 'printed' });
  });

  it.each([
    ['no source', { source: ' ' }, 'source'],
    ['one stand', { stands: [10_000] }, 'stands'],
    ['one date', { rows: own.rows.slice(0, 1) }, 'rows'],
    ['stands that fall', { stands: [30_000, 10_000] }, 'stands.1'],
    ['a negative stand', { stands: [-1, 10_000] }, 'stands.0'],
    ['dates that fall', { rows: [...own.rows].reverse() }, 'rows.1.from'],
    ['a band that ends before it begins', { rows: [own.rows[0]!, { ...own.rows[1]!, to: day(5, 20) }] }, 'rows.1.to'],
    ['too few percents', { rows: [own.rows[0]!, { ...own.rows[1]!, percents: [40] }] }, 'rows.1.percents'],
    ['a percent over 110', { rows: [{ ...own.rows[0]!, percents: [60, 111] }, own.rows[1]!] }, 'rows.0.percents.1'],
    ['a percent below 0', { rows: [{ ...own.rows[0]!, percents: [-1, 100] }, own.rows[1]!] }, 'rows.0.percents.0'],
    ['a full stand of no width', { fullStandBand: { from: 28_000, to: 28_000 } }, 'fullStandBand'],
    ['a full stand below nothing', { fullStandBand: { from: -1, to: 28_000 } }, 'fullStandBand'],
    ['a day in no calendar', { rows: [{ ...own.rows[0]!, from: day(4, 31) }, own.rows[1]!] }, 'rows.0.from'],
  ])('is refused with %s, at its place', (_, changes, field) => {
    expect(() => checkedTable({ ...own, ...changes })).toThrow(expect.objectContaining({ name: 'ImpossibleInput', field }));
  });
});

describe('gaps in a kept stand', () => {
  // Iowa State 1996, 2004 and 2006.
  it.each([
    [[], 0, 0],
    [[0.5, 0.9], 0, 0],
    [[1.5, 2, 2.5], 0.02, 0.02],
    [[4, 5, 6], 0.04, 0.06],
    [[1, 1, 1, 4], 0.04, 0.06],
    [[1, 1, 1, 1, 4], 0.02, 0.06],
    [[1.5, 3.5], 0.02, 0.06],
    [[1, 3], 0.02, 0.02],
  ])('of %j ft cost %d to %d', (gaps, lossShareLower, lossShareUpper) => {
    expect(gapLossShare(gaps)).toEqual({ lossShareLower, lossShareUpper });
  });

  it('are refused when negative or no number', () => {
    expect(() => gapLossShare([-1])).toThrow(ImpossibleInput);
    expect(() => gapLossShare([NaN])).toThrow(ImpossibleInput);
  });
});
