import type { RoundRow } from '@/lib/schemas/round-day';
import { usedCounts } from './due-row';

/** Markers set in a row sample: as recorded, else one for every plant that came up, which is how they are set. */
export function markersSet(row: RoundRow): { markers: number; recorded: boolean } {
  const recorded = row.markers.findLast((each) => each.event === 'set');
  if (recorded) return { markers: recorded.markers, recorded: true };
  const marked = usedCounts(row).filter((count) => count.marker !== null);
  return { markers: marked.length === 0 ? 0 : Math.max(...marked.map((count) => count.plantsUp)), recorded: false };
}

export const markersTakenUp = (row: RoundRow): number => row.markers.findLast((each) => each.event === 'taken-up')?.markers ?? 0;

/** How many are still out there in all. More taken up than set in one row does not make up for those of another. */
export const markersLeft = (rows: readonly RoundRow[]): number => rows.reduce((sum, row) => sum + Math.max(0, markersSet(row).markers - markersTakenUp(row)), 0);
