import { countingEnded } from '@/lib/agronomy/counting-ended';
import { daysSincePlanting, type FieldTime } from '@/lib/agronomy/days-since-planting';
import type { Question } from '@/lib/errors/app-error';
import { dateText } from '@/lib/format/date-text';
import type { DigPlace } from './vocabulary';

type CountOfRow = { visitedOn: string; visitedAt: string | null; plantsUp: number; used: boolean };

/**
 * What is asked before a dig is kept: digging destroys the sample, so one inside the measured length comes after its last
 * count. Plain, so that a phone asks the same as the server. Takes the counts of the row sample in the order of visits.
 */
export function digQuestions(row: { label: string; planted: FieldTime }, dig: { where: DigPlace; visitedOn: string }, counts: readonly CountOfRow[]): Question[] {
  if (dig.where !== 'in-sample') return [];
  const visits = counts.filter((count) => count.used).map((count) => ({
    days: daysSincePlanting(row.planted, { on: count.visitedOn, at: count.visitedAt }),
    plantsUp: count.plantsUp,
  }));
  if (countingEnded(visits)) return [];
  const about = `${row.label}, ${dateText(dig.visitedOn)}`;
  return [{ rule: 'dig-before-counting-ended', about, sentence: `${about}: counting here has not ended, and digging inside the measured length destroys the sample. Was it dug there?` }];
}
