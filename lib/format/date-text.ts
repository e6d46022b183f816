const months = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
];
const weekdays = ['Sunday', 'Monday', 'Tuesday', 'Wednesday', 'Thursday', 'Friday', 'Saturday'];

/** "7 May 2026", "7 May", or "Thursday 7 May 2026". */
export type DateStyle = 'full' | 'day-and-month' | 'with-weekday';

/**
 * Writes a local calendar day, given as "2026-05-07". It never becomes an instant, so that no zone can move it.
 * Throws for a day that no calendar has.
 */
export function dateText(isoDate: string, style: DateStyle = 'full'): string {
  const parts = /^(\d{4})-(\d{2})-(\d{2})$/.exec(isoDate);
  const [year, month, day] = (parts?.slice(1) ?? []).map(Number);
  if (year === undefined || month === undefined || day === undefined)
    throw new RangeError(`A date must read like 2026-05-07, not "${isoDate}".`);
  const inCalendar = new Date(Date.UTC(year, month - 1, day));
  if (inCalendar.getUTCMonth() !== month - 1 || inCalendar.getUTCDate() !== day)
    throw new RangeError(`No calendar has the day ${isoDate}.`);
  const dayAndMonth = `${day} ${months[month - 1]}`;
  if (style === 'day-and-month') return dayAndMonth;
  const full = `${dayAndMonth} ${year}`;
  return style === 'with-weekday' ? `${weekdays[inCalendar.getUTCDay()]} ${full}` : full;
}
