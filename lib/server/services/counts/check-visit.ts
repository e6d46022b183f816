import { daysSincePlanting } from '@/lib/agronomy/days-since-planting';
import type { FieldProblem } from '@/lib/errors/app-error';
import { dateText } from '@/lib/format/date-text';

export type VisitFacts = {
  plantedOn: string;
  plantedAt: string | null;
  /** Null where a later day is taken and looked at afterwards, as from a phone whose clock is wrong. */
  today: string | null;
};

/** A stand is looked at within the season it was planted in; later, the year or the planting is a slip. */
const daysAfterPlantingMost = 366;

/** What a visit's day may be: not before planting, not years after and, where a form sends it, not in the future. */
export function checkVisit(visit: { visitedOn: string; visitedAt: string | null }, facts: VisitFacts, path: string): FieldProblem[] {
  const days = daysSincePlanting({ on: facts.plantedOn, at: facts.plantedAt }, { on: visit.visitedOn, at: visit.visitedAt });
  if (visit.visitedOn < facts.plantedOn) {
    return [{ path, message: `This is before planting, ${dateText(facts.plantedOn)}. Check the date.` }];
  }
  if (days < 0) {
    return [{ path, message: `This is before planting, ${dateText(facts.plantedOn)} at ${facts.plantedAt ?? 'noon, since no time of planting is known'}. Check the time.` }];
  }
  if (facts.today !== null && visit.visitedOn > facts.today) {
    return [{ path, message: `This day has not come yet; today is ${dateText(facts.today)}. Check the date.` }];
  }
  if (days > daysAfterPlantingMost) {
    return [{ path, message: `This is more than a year after planting, ${dateText(facts.plantedOn)}. Check the year.` }];
  }
  return [];
}
