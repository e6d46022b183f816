import { countingEnded } from '@/lib/agronomy/counting-ended';
import { daysSincePlanting } from '@/lib/agronomy/days-since-planting';
import type { RoundCount, RoundPlanting, RoundRow } from '@/lib/schemas/round-day';

/** What is to be done at a row sample today, and why. */
export type Due =
  | { do: 'count'; why: 'first' | 'still-coming' | 'one-without-new' }
  | { do: 'tape' }
  | { do: 'depth' }
  | { do: 'nothing'; why: 'counted-today' | 'done' | 'too-early' | 'strip-lost' };

/** Before this day no corn stands, so nobody need walk there. Common practice, no source. */
export const firstCountDay = 4;

export const dayNumber = (plantedOn: string, on: string) => Math.round((Date.parse(on) - Date.parse(plantedOn)) / 86_400_000);

/** The counts that stand for their visits, in the order of the visits. */
export const usedCounts = (row: RoundRow): RoundCount[] => row.counts.filter((count) => count.used);

export function hasEnded(row: RoundRow, planting: Pick<RoundPlanting, 'plantedOn' | 'plantedAt'>): boolean {
  const planted = { on: planting.plantedOn, at: planting.plantedAt };
  return countingEnded(usedCounts(row).map((count) => ({ days: daysSincePlanting(planted, { on: count.visitedOn, at: count.visitedAt }), plantsUp: count.plantsUp })));
}

/** How many were new at the last visit; undefined before there are two. */
export function newAtLast(row: RoundRow): number | undefined {
  const counts = usedCounts(row);
  const last = counts.at(-1);
  const before = counts.at(-2);
  return last && before ? Math.max(0, last.plantsUp - before.plantsUp) : undefined;
}

/**
 * What is due at a row: a count while plants may still come, then one tape sheet, then the seeding depth of ten plants,
 * which one row of each strip answers for. A row counted today waits for tomorrow; it may be opened and counted again
 * all the same.
 */
export function dueOf(row: RoundRow, planting: RoundPlanting, today: string): Due {
  if (planting.strips.find((strip) => strip.id === row.stripId)?.lost) return { do: 'nothing', why: 'strip-lost' };
  const counts = usedCounts(row);
  const last = counts.at(-1);
  if (!last) return dayNumber(planting.plantedOn, today) < firstCountDay ? { do: 'nothing', why: 'too-early' } : { do: 'count', why: 'first' };
  if (hasEnded(row, planting)) {
    if (row.tapeSheets.length === 0) return { do: 'tape' };
    return depthIsDue(row, planting) ? { do: 'depth' } : { do: 'nothing', why: 'done' };
  }
  if (last.visitedOn === today) return { do: 'nothing', why: 'counted-today' };
  return { do: 'count', why: counts.length > 1 && newAtLast(row) === 0 ? 'one-without-new' : 'still-coming' };
}

/** Ten plants of a strip tell its seeding depth: the first of its row samples stands for it, a free place for itself. */
function depthIsDue(row: RoundRow, planting: RoundPlanting): boolean {
  const strip = row.stripId === null ? [row] : planting.rows.filter((each) => each.stripId === row.stripId);
  const first = [...strip].sort((a, b) => byLabel.compare(a.label, b.label))[0];
  return first?.id === row.id && row.depths.length === 0 && strip.every((each) => each.id === row.id || each.depths.length === 0);
}

const byLabel = new Intl.Collator('en-US', { numeric: true });
