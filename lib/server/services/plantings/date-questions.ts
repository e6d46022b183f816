import { daysSincePlanting, type FieldTime } from '@/lib/agronomy/days-since-planting';
import { badField, type Question } from '@/lib/errors/app-error';
import { dateText } from '@/lib/format/date-text';

type Planted = { plantedOn: string; plantedAt: string | null };

/**
 * A planting date that moves after rows were counted moves every day after planting, so it is asked about. One after the
 * first visit is refused: no plant is up before its seed is in the ground, and no figure could be made.
 */
export function dateQuestions(before: Planted, now: Planted, firstVisit: FieldTime | undefined): Question[] {
  if (!firstVisit) return [];
  const first = dateText(firstVisit.on);
  if (now.plantedOn > firstVisit.on) {
    throw badField('plantedOn', `Rows of this planting were first visited on ${first}; it cannot have been planted after that.`);
  }
  if (daysSincePlanting({ on: now.plantedOn, at: now.plantedAt }, firstVisit) < 0) {
    throw badField('plantedAt', `Rows of this planting were first visited on ${first} at ${firstVisit.at ?? 'noon, since no time was noted'}; give an earlier time.`);
  }
  if (now.plantedOn === before.plantedOn) return [];
  return [
    {
      rule: 'planting-date-moved',
      about: now.plantedOn,
      sentence: `Rows were counted from ${first} on. With planting on ${dateText(now.plantedOn)} instead of ${dateText(before.plantedOn)}, every day after planting changes. Is that right?`,
    },
  ];
}
