import { Temporal } from 'temporal-polyfill';

/** A trial is planned before it is planted, but not more than a season ahead; beyond that the year is a slip. */
export function latestPlantingDay(today: string): string {
  return Temporal.PlainDate.from(today).add({ years: 1 }).toString();
}
