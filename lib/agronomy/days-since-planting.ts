import { ImpossibleInput } from './outcome';

/** A calendar day as `YYYY-MM-DD` and, where known, a wall time as `HH:MM` in the field's own zone. */
export type FieldTime = { on: string; at: string | null };

const MILLISECONDS_PER_DAY = 86_400_000;
const MINUTES_PER_DAY = 1_440;

/**
 * How many days after planting did something happen, in days and parts of a day?
 *
 * Takes two field times in the same zone. Returns days, negative when the second lies before the first. Never
 * insufficient; throws ImpossibleInput for a day or a time that does not exist.
 * Method: calendar days plus the difference of the wall times. A time that was not noted is taken as noon
 * (common practice, no source), so that two dates without times are whole days apart. A change to or from
 * daylight saving between the two is not corrected: one hour at most.
 * Example: planted 7 May without a time, visited 15 May at 07:00, is 7.79 days.
 */
export function daysSincePlanting(planted: FieldTime, visited: FieldTime): number {
  const wholeDays = (dayNumber(visited.on) - dayNumber(planted.on)) / MILLISECONDS_PER_DAY;
  return wholeDays + (minuteOfDay(visited.at) - minuteOfDay(planted.at)) / MINUTES_PER_DAY;
}

function dayNumber(day: string): number {
  const parts = /^(\d{4})-(\d{2})-(\d{2})$/.exec(day);
  if (!parts) throw new ImpossibleInput(`${day} is not a calendar day.`, 'on');
  const [year, month, dayOfMonth] = [Number(parts[1]), Number(parts[2]), Number(parts[3])];
  const instant = Date.UTC(year, month - 1, dayOfMonth);
  // Date.UTC rolls 31 June over into July; a day that comes back changed was never on the calendar.
  if (new Date(instant).toISOString().slice(0, 10) !== day) {
    throw new ImpossibleInput(`${day} is not a calendar day.`, 'on');
  }
  return instant;
}

function minuteOfDay(time: string | null): number {
  if (time === null) return MINUTES_PER_DAY / 2;
  const parts = /^(\d{2}):(\d{2})(?::\d{2})?$/.exec(time);
  const hour = Number(parts?.[1]);
  const minute = Number(parts?.[2]);
  if (!parts || hour > 23 || minute > 59) throw new ImpossibleInput(`${time} is not a time of day.`, 'at');
  return hour * 60 + minute;
}
