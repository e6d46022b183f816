import type { StandDateTable } from '../stand-date-table';

/** One copy prints 96 instead of 99 for the full stand of 13 to 19 May. The column 28,000 to 32,000 is one value. */
export const iowa2001: StandDateTable = {
  id: 'iowa-2001',
  name: 'Iowa State 2001',
  source: 'Iowa State University 2001, PM 1885 table 7',
  age: 'Hybrids of the 1990s, Iowa; between its bands of dates our own interpolation',
  stands: [12_000, 16_000, 20_000, 24_000, 28_000, 32_000],
  fullStandBand: { from: 28_000, to: 32_000 },
  rows: [
    { from: { month: 4, day: 20 }, to: { month: 5, day: 5 }, percents: [68, 74, 81, 94, 100, 100] },
    { from: { month: 5, day: 13 }, to: { month: 5, day: 19 }, percents: [67, 73, 80, 93, 99, 99] },
    { from: { month: 5, day: 26 }, to: { month: 6, day: 1 }, percents: [61, 67, 73, 85, 90, 90] },
    { from: { month: 6, day: 10 }, to: { month: 6, day: 16 }, percents: [46, 50, 55, 64, 68, 68] },
    { from: { month: 6, day: 24 }, to: { month: 6, day: 28 }, percents: [35, 38, 42, 49, 52, 52] },
  ],
};
