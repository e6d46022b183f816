import { ImpossibleInput } from './outcome';

/** A day of any year. */
export type MonthDay = { month: number; day: number };

const DAYS_BEFORE_MONTH = [0, 31, 59, 90, 120, 151, 181, 212, 243, 273, 304, 334];
const DAYS_IN_MONTH = [31, 29, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31];

/**
 * How far into the year is this day?
 *
 * Takes a month (1 to 12) and a day of it, and the name of the field they came from. Returns the day of a year
 * without 29 February, 1 to 365, which counts for 1 March. Never insufficient; throws ImpossibleInput, naming
 * the field, for a day that is in no calendar.
 * The leap day is left out so that one planting date reads one value of a table in every year.
 * Example: 30 April is day 120.
 */
export function dayOfYear(date: MonthDay, field: string): number {
  const before = DAYS_BEFORE_MONTH[date.month - 1];
  const days = DAYS_IN_MONTH[date.month - 1];
  if (
    before === undefined ||
    days === undefined ||
    !Number.isInteger(date.day) ||
    date.day < 1 ||
    date.day > days
  ) {
    throw new ImpossibleInput(`${field} is not a day of the calendar.`, field);
  }
  return before + date.day;
}
