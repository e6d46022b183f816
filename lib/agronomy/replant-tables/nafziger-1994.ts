import { NAFZIGER_ROWS, NAFZIGER_STANDS } from '../replant-table-nafziger';
import type { StandDateTable } from '../stand-date-table';

/** The same grid that the keep-or-replant sum reads, as one table among others. */
export const nafziger1994: StandDateTable = {
  id: 'nafziger-1994',
  name: 'Nafziger 1994',
  source: 'Nafziger 1994, Journal of Production Agriculture 7:59, as printed by Purdue',
  age: 'Hybrids of the 1980s and 1990s, central Corn Belt; rows after 25 May extrapolated by the source',
  stands: NAFZIGER_STANDS,
  rows: NAFZIGER_ROWS.map(({ planted, percents }) => ({
    from: planted,
    to: planted,
    percents,
    extrapolatedInSource: planted.month === 6 || (planted.month === 5 && planted.day > 25),
  })),
};
