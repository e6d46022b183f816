import 'server-only';
import { Temporal } from 'temporal-polyfill';
import { badField } from '@/lib/errors/app-error';
import { dateText } from '@/lib/format/date-text';
import type { PlantingRow } from '../../data/planting';
import type { WriteContext } from '../../operations/context';
import { visitFacts } from '../counts/visit-facts';

const daysFromPlantingMost = 366;

/**
 * What is read of the field and not of a plant may be read before planting as well as after, within the same season, and
 * not in the future where a form sends it.
 */
export function assertSeasonDay(context: WriteContext, { planting, farm }: { planting: PlantingRow; farm: { timeZone: string } }, path: string, day: string): void {
  const { today } = visitFacts(context, planting, farm.timeZone);
  if (today !== null && day > today) throw badField(path, `This day has not come yet; today is ${dateText(today)}. Check the date.`);
  if (Math.abs(Temporal.PlainDate.from(planting.plantedOn).until(day).days) > daysFromPlantingMost) {
    throw badField(path, `This is more than a year from planting, ${dateText(planting.plantedOn)}. Check the year.`);
  }
}
