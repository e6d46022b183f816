import { Temporal } from 'temporal-polyfill';

/** The calendar day so many days after another. */
export const dayAfter = (day: string, days: number) => Temporal.PlainDate.from(day).add({ days }).toString();
