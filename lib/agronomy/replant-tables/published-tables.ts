import type { StandDateTable } from '../stand-date-table';
import { iowa2001 } from './iowa-2001';
import { minnesotaTable } from './minnesota-full-stand';
import { nafziger1994 } from './nafziger-1994';
import { wisconsin2003FullSeason, wisconsin2003ShortSeason } from './wisconsin-2003';

/** Every published table of stand and date; those that print thin stands first, since the others only bound them. */
export const publishedTables: readonly StandDateTable[] = [
  nafziger1994,
  iowa2001,
  wisconsin2003FullSeason,
  wisconsin2003ShortSeason,
  minnesotaTable['lamberton-1988-2003'],
  minnesotaTable['three-sites-2009-2011'],
];
