import 'server-only';
import { Temporal } from 'temporal-polyfill';
import { badField } from '@/lib/errors/app-error';
import { dateText } from '@/lib/format/date-text';
import type { WriteContext } from '../../operations/context';

const daysMost = 366;

/** A spraying and an entry belong to this season; from a form they are not of a day to come. */
export function assertEntryDay({ clock, originKind }: WriteContext, timeZone: string, path: string, day: string): void {
  const today = clock.today(timeZone);
  if (originKind !== 'phone' && day > today) throw badField(path, `This day has not come yet; today is ${dateText(today)}. Check the date.`);
  if (Math.abs(Temporal.PlainDate.from(today).until(day).days) > daysMost) throw badField(path, 'This is more than a year from today. Check the year.');
}
