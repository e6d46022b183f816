import type { MonthDay } from '../replant-date';
import type { StandDateReading } from '../replant-table-nafziger';
import { tableYieldPercent, type StandDateTable } from '../stand-date-table';

export type MinnesotaTrials = 'lamberton-1988-2003' | 'three-sites-2009-2011';

const days = [[4, 20], [4, 25], [4, 30], [5, 5], [5, 10], [5, 15], [5, 20], [5, 25], [5, 30], [6, 4], [6, 9]] as const;

const percents: Record<MinnesotaTrials, readonly number[]> = {
  'lamberton-1988-2003': [99, 100, 100, 99, 98, 95, 92, 87, 82, 76, 69],
  'three-sites-2009-2011': [98, 99, 100, 100, 99, 98, 95, 92, 89, 84, 79],
};

/** What a full stand is, the service does not print; the band is that of Iowa's and Wisconsin's (common practice, no source). */
const FULL_STAND = { from: 28_000, to: 36_000 };

/** A stand of 22,000 planted on time, against a full one (Hicks 2002). */
export const MINNESOTA_PERCENT_AT_22000 = 88;

/** The same trials as one table among others: a full stand has one value a date, a thinner one only a bound. */
export const minnesotaTable: Record<MinnesotaTrials, StandDateTable> = {
  'lamberton-1988-2003': tableOf('lamberton-1988-2003', 'Minnesota, Lamberton 1988 to 2003'),
  'three-sites-2009-2011': tableOf('three-sites-2009-2011', 'Minnesota, three sites 2009 to 2011'),
};

/**
 * What does a full stand make in Minnesota when it is planted on this day?
 *
 * Takes which trials and the planting day. Returns a percent of the best date's yield, printed or read between dates, or
 * a bound before 20 April and after 9 June. Never insufficient; throws ImpossibleInput for a day in no calendar.
 * Source: University of Minnesota, Lamberton 1988 to 2003, and three sites 2009 to 2011. For full stands only: the
 * service does not print thinner ones by date. Example: Lamberton, 20 May: 92 %.
 */
export function minnesotaFullStandPercent(trials: MinnesotaTrials, planted: MonthDay): StandDateReading {
  return tableYieldPercent(minnesotaTable[trials], planted, FULL_STAND.from);
}

function tableOf(trials: MinnesotaTrials, name: string): StandDateTable {
  return {
    id: `minnesota-${trials}`,
    name,
    source: 'University of Minnesota',
    age: 'For full stands only, taken as 28,000 plants and more; thinner ones are not printed by date, so only a bound',
    stands: [FULL_STAND.from, FULL_STAND.to],
    fullStandBand: FULL_STAND,
    rows: days.map(([month, day], index) => {
      const percent = percents[trials][index] as number;
      return { from: { month, day }, to: { month, day }, percents: [percent, percent] };
    }),
  };
}
