import type { FieldProblem, Question } from '@/lib/errors/app-error';
import { dateText } from '@/lib/format/date-text';
import { countText } from '@/lib/format/count-text';
import { plantsMost } from './field-limits';
import { momentOf, resolveCounts, sameVisit, type Countable } from './resolve-counts';

export type CountOfRow = Countable & { id: string; doubtful: number };
/** The row sample and what it can hold. */
export type CountedRow = { label: string; seeds: number };
export type CheckedCount = { id: string; plantsUp: number; fields: FieldProblem[]; questions: Question[] };

/** More than this many plants a seed is no double but another length or another row. */
const plantsPerSeedMost = 3;
const fewSeeds = 10;

type Resolved = CountOfRow & { plantsUp: number; used: boolean };

const plantsAtVisit = (count: { plantsUp: number; visitedOn: string }) =>
  `${countText(count.plantsUp, 'plant')} on ${dateText(count.visitedOn)}`;

/**
 * Holds new counts of one row sample against its seeds and against each other and the counts that stand. The same rules
 * serve what is typed and what comes by file: what cannot be is refused at its field, what is unlikely is asked about.
 * Takes the standing counts without those being corrected, and the whole series in the order recorded.
 */
export function checkCounts(row: CountedRow, series: readonly CountOfRow[], newIds: ReadonlySet<string>): CheckedCount[] {
  const resolved = resolveCounts(series);
  return resolved
    .filter((count) => newIds.has(count.id))
    .map((count) => ({
      id: count.id,
      plantsUp: count.plantsUp,
      fields: problemsOf(count, row, resolved, newIds),
      questions: questionsAbout(count, row, resolved, newIds),
    }));
}

function problemsOf(count: Resolved, row: CountedRow, resolved: readonly Resolved[], newIds: ReadonlySet<string>): FieldProblem[] {
  const most = Math.min(plantsMost, plantsPerSeedMost * Math.max(row.seeds, fewSeeds));
  if (count.plantsUp > most) {
    return [{ path: 'plants', message: `${countText(count.plantsUp, 'plant')} cannot stand where about ${countText(Math.round(row.seeds), 'seed')} were planted. Check the number and the row.` }];
  }
  if (count.doubtful > count.plantsUp) {
    return [{ path: 'doubtful', message: `No more plants can be doubtful than the ${count.plantsUp} that are up.` }];
  }
  const upset = resolved.find((other) => !newIds.has(other.id) && other.countedAs === 'new' && other.doubtful > other.plantsUp);
  return upset ? [{ path: 'plants', message: `With this count, that of ${dateText(upset.visitedOn)} would have more doubtful plants than plants. Correct that one first.` }] : [];
}

/** A question names the numbers it is about, so that another number is asked about anew. */
function questionsAbout(count: Resolved, row: CountedRow, resolved: readonly Resolved[], newIds: ReadonlySet<string>): Question[] {
  const where = `${row.label}, ${dateText(count.visitedOn)}${count.visitedAt ? ` ${count.visitedAt}` : ''}`;
  const used = resolved.filter((other) => other.used && other.id !== count.id && !sameVisit(other, count));
  const before = used.findLast((other) => momentOf(other) < momentOf(count));
  const after = used.find((other) => momentOf(other) > momentOf(count));
  const twin = resolved.find((other) => other.id !== count.id && other.personId === count.personId && sameVisit(other, count));
  const questions: Question[] = [];
  if (count.plantsUp > Math.ceil(row.seeds)) {
    questions.push({
      rule: 'more-plants-than-seeds',
      about: `${where}: ${count.plantsUp}`,
      sentence: `${where}: ${countText(count.plantsUp, 'plant')}, where about ${countText(Math.round(row.seeds), 'seed')} were planted. Were there that many?`,
    });
  }
  if (before && count.plantsUp < before.plantsUp) {
    questions.push(falling(where, before, count, `${where}: ${countText(count.plantsUp, 'plant')}, fewer than the ${plantsAtVisit(before)}. Have plants gone?`));
  }
  // A later new count is asked about itself, as the one that falls.
  if (after && !newIds.has(after.id) && after.plantsUp < count.plantsUp) {
    questions.push(falling(where, count, after, `${where}: ${countText(count.plantsUp, 'plant')}, more than the ${plantsAtVisit(after)}. Have plants gone in between?`));
  }
  // Of two new ones the later is asked about.
  if (twin && (!newIds.has(twin.id) || twin.used)) {
    questions.push({
      rule: 'counted-twice',
      about: `${where}: ${count.personId}`,
      sentence: `${where}: ${twin.personName} has counted this row at this visit already, ${countText(twin.plantsUp, 'plant')}. Keep both? The first is used.`,
    });
  }
  return questions;
}

const falling = (where: string, from: Resolved, to: Resolved, sentence: string): Question => ({
  rule: 'falling-count',
  about: `${where}: ${from.plantsUp} to ${to.plantsUp}`,
  sentence,
});
