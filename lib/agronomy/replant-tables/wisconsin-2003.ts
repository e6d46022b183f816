import type { StandDateTable } from '../stand-date-table';

const dates = [
  { month: 4, day: 20 },
  { month: 5, day: 1 },
  { month: 5, day: 10 },
  { month: 5, day: 20 },
  { month: 6, day: 1 },
  { month: 6, day: 10 },
  { month: 6, day: 20 },
] as const;

const shared = {
  source: 'University of Wisconsin 2003, W120, southern zone',
  age: 'Hybrids of the 1990s, southern Wisconsin; stands below 28,000 are not to hand, so below that only a bound',
  stands: [28_000, 30_000, 32_000, 34_000, 36_000],
};

const rowsOf = (byDate: readonly (readonly number[])[]) => dates.map((date, index) => ({ from: date, to: date, percents: byDate[index] as readonly number[] }));

export const wisconsin2003FullSeason: StandDateTable = {
  ...shared,
  id: 'wisconsin-2003-full-season',
  name: 'Wisconsin 2003, full-season hybrid',
  rows: rowsOf([
    [96, 96, 97, 97, 96],
    [99, 100, 100, 100, 99],
    [95, 96, 96, 96, 95],
    [84, 85, 86, 85, 85],
    [63, 63, 63, 63, 63],
    [40, 40, 40, 40, 40],
    [8, 8, 8, 8, 8],
  ]),
};

export const wisconsin2003ShortSeason: StandDateTable = {
  ...shared,
  id: 'wisconsin-2003-short-season',
  name: 'Wisconsin 2003, short-season hybrid',
  rows: rowsOf([
    [91, 92, 92, 92, 91],
    [95, 96, 96, 96, 95],
    [93, 94, 94, 94, 93],
    [86, 87, 87, 87, 87],
    [71, 72, 72, 72, 71],
    [55, 56, 56, 56, 55],
    [32, 32, 32, 32, 32],
  ]),
};
