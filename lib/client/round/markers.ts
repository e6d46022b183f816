import type { RoundRow } from '@/lib/schemas/round-day';

/** Marker colors most crews carry, told by their words; a crew may write its own color or number. */
export const markerColors = ['red', 'blue', 'white', 'yellow', 'pink', 'black', 'orange', 'purple', 'green'] as const;

/** The markers of a planting's visits with the day each was last used, newest first. */
export function markersUsed(rows: readonly RoundRow[]): { marker: string; on: string }[] {
  const last = new Map<string, string>();
  for (const row of rows) {
    for (const { marker, visitedOn } of row.counts) {
      if (marker !== null && (last.get(marker) ?? '') < visitedOn) last.set(marker, visitedOn);
    }
  }
  return [...last].map(([marker, on]) => ({ marker, on })).sort((a, b) => (a.on < b.on ? 1 : -1));
}

/** Today's marker: the one in use today, else the first color that no visit of the planting has yet. */
export function markerOfToday(rows: readonly RoundRow[], today: string): string | null {
  const used = markersUsed(rows);
  const current = used.find((each) => each.on === today);
  if (current) return current.marker;
  return markerColors.find((color) => !used.some((each) => each.marker.toLowerCase() === color)) ?? null;
}
