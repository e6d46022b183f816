import { interpolate } from '../interpolate';
import { dayOfYear, type MonthDay } from '../replant-date';
import type { StandDateReading } from '../replant-table-nafziger';

export type MinnesotaTrials = 'lamberton-1988-2003' | 'three-sites-2009-2011';

const days = [[4, 20], [4, 25], [4, 30], [5, 5], [5, 10], [5, 15], [5, 20], [5, 25], [5, 30], [6, 4], [6, 9]] as const;

const percents: Record<MinnesotaTrials, readonly number[]> = {
  'lamberton-1988-2003': [99, 100, 100, 99, 98, 95, 92, 87, 82, 76, 69],
  'three-sites-2009-2011': [98, 99, 100, 100, 99, 98, 95, 92, 89, 84, 79],
};

/** A stand of 22,000 planted on time, against a full one (Hicks 2002). */
export const MINNESOTA_PERCENT_AT_22000 = 88;

/**
 * What does a full stand make in Minnesota when it is planted on this day?
 *
 * Takes which trials and the planting day. Returns a percent of the best date's yield, printed or read between dates, or
 * a bound before 20 April and after 9 June. Never insufficient; throws ImpossibleInput for a day in no calendar.
 * Source: University of Minnesota, Lamberton 1988 to 2003, and three sites 2009 to 2011. For full stands only: the
 * service does not print thinner ones by date. Example: Lamberton, 20 May: 92 %.
 */
export function minnesotaFullStandPercent(trials: MinnesotaTrials, planted: MonthDay): StandDateReading {
  const day = dayOfYear(planted, 'plantedOn');
  const anchors = days.map(([month, dayOfMonth], index) => ({ at: dayOfYear({ month, day: dayOfMonth }, 'plantedOn'), result: percents[trials][index] as number }));
  const percent = interpolate(anchors, day);
  const [first, last] = [anchors[0]?.at ?? day, anchors[anchors.length - 1]?.at ?? day];
  if (day < first) return { kind: 'at-most', percent: 100, beyond: ['date-before'], extrapolatedInSource: false };
  if (day > last) return { kind: 'at-most', percent, beyond: ['date-after'], extrapolatedInSource: false };
  return { kind: 'value', percent, basis: anchors.some(({ at }) => at === day) ? 'printed' : 'interpolated', extrapolatedInSource: false };
}
