import { dayOfYear, type MonthDay } from './replant-date';
import { gainOfReadings } from './replant-gain-by-table';
import type { ReplantTerms } from './replant-sum';
import { tableYieldPercent, type StandDateTable } from './stand-date-table';

/** `never`: not even on the day after planting; `beyond-table`: still on the table's last day; `cannot-tell`: a bound. */
export type LastReplantDay = { kind: 'day'; day: MonthDay } | { kind: 'never' } | { kind: 'beyond-table' } | { kind: 'cannot-tell' };

const DAYS_IN_MONTH = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31];

/**
 * Until which day does replanting still earn more than keeping?
 *
 * Takes a table, the terms of replantSum (their own replant day is not read) and the stand in plants per acre. Returns the
 * last such day. Never insufficient; `cannot-tell` where the table gives only a bound for the stand that is kept or for the
 * second stand. Throws as replantGainByTable.
 * Method: day by day from the day after planting to the table's last; a full stand's yield falls with the date after its
 * best, so the last day with a gain is looked for from the end.
 * Costs are taken as the same on every day. Example: where a second stand gains $5 on 20 May and loses $3 on 21 May: 20 May.
 */
export function lastReplantDay(table: StandDateTable, terms: ReplantTerms, plantsPerAcre: number): LastReplantDay {
  const last = table.rows[table.rows.length - 1]?.to ?? terms.replantOn;
  const lastDay = dayOfYear(last, 'rows');
  const firstDay = dayOfYear(terms.plantedOn, 'plantedOn') + 1;
  const kept = tableYieldPercent(table, terms.plantedOn, plantsPerAcre, 'plantedOn');
  for (let day = lastDay; day >= firstDay; day -= 1) {
    const second = tableYieldPercent(table, monthDay(day), terms.replantPlantsPerAcre, 'replantOn');
    const { gainDollarsPerAcre: gain } = gainOfReadings(terms, kept, second);
    if (gain.lower > 0) return day === lastDay ? { kind: 'beyond-table' } : { kind: 'day', day: monthDay(day) };
    if (gain.upper > 0) return { kind: 'cannot-tell' };
  }
  return { kind: 'never' };
}

function monthDay(dayOfTheYear: number): MonthDay {
  let left = dayOfTheYear;
  let month = 0;
  while (left > (DAYS_IN_MONTH[month] as number)) {
    left -= DAYS_IN_MONTH[month] as number;
    month += 1;
  }
  return { month: month + 1, day: left };
}
