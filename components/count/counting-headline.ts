import { countText } from '@/lib/format/count-text';
import { countTexts } from '@/lib/texts/count-texts';
import type { CountRow } from './count-table-types';

/** The finding of the table in one sentence: how far counting has come. */
export function countingHeadline(rows: readonly CountRow[]): string {
  const counted = rows.filter((row) => row.findings.lastPlantsUp !== null);
  const ended = rows.filter((row) => row.findings.countingEnded);
  const all = countText(rows.length, 'row sample');
  if (counted.length === 0) return countTexts.nothingCounted(all);
  if (ended.length === rows.length) return countTexts.allEnded(all);
  if (ended.length === 0) return countTexts.noneEnded(all);
  return countTexts.finding(String(ended.length), all);
}
