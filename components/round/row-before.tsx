import { dayNumber, hasEnded, newAtLast, usedCounts } from '@/lib/client/round/due-row';
import type { RoundCount, RoundPlanting, RoundRow } from '@/lib/schemas/round-day';
import { roundCountTexts } from '@/lib/texts/round-texts';

const shownBefore = 2;

/** The counts before this one beside the number, and whether counting may end. */
export function RowBefore({ row, planting, today }: { row: RoundRow; planting: RoundPlanting; today: string }) {
  const counts = usedCounts(row);
  const fresh = newAtLast(row);
  const stop = hasEnded(row, planting) ? roundCountTexts.ended : fresh === undefined ? null : fresh === 0 ? roundCountTexts.oneWithout : roundCountTexts.coming(fresh);
  return (
    <div className="px-3 pt-1 text-15 leading-snug">
      <p>
        {counts.length === 0
          ? roundCountTexts.never
          : counts
              .slice(-shownBefore)
              .map((count) => countText(count, planting, today))
              .join('. ')}
        . {roundCountTexts.seeds(Math.round(row.seeds))}.
      </p>
      {stop ? <p className="font-bold">{stop}</p> : null}
    </div>
  );
}

function countText(count: RoundCount, planting: RoundPlanting, today: string): string {
  const day = dayNumber(planting.plantedOn, count.visitedOn);
  const ago = dayNumber(count.visitedOn, today);
  if (ago === 0) return roundCountTexts.today(count.visitedAt, count.plantsUp);
  return ago === 1 ? roundCountTexts.yesterday(count.plantsUp, count.doubtful) : roundCountTexts.before(day, count.plantsUp, count.doubtful);
}
