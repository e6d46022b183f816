import type { KeptEntry } from './entry';

export type EntryVisit = { id: string; personId: null; visitedOn: string; visitedAt: string | null; marker: string | null };

/** Coming back to a row later than this is another visit. */
const sameWalkMinutes = 120;

const minutesOf = (time: string | null) => (time === null ? null : Number(time.slice(0, 2)) * 60 + Number(time.slice(3, 5)));

/**
 * The visit of this walk that the scout's other entries of the row name already, so that a count, a tape sheet and a dig
 * of one stop are one visit. Undefined where there is none: then it is a visit of its own.
 */
export function visitOfRow(entries: readonly KeptEntry[], now: { date: string; time: string }, marker: string | null): EntryVisit | undefined {
  const minutes = minutesOf(now.time) ?? 0;
  const found = entries.findLast((entry) => {
    const visit = entry.body.visit as EntryVisit | undefined;
    if (visit === undefined || entry.state === 'needs-look' || visit.visitedOn !== now.date || visit.marker !== marker) return false;
    const at = minutesOf(visit.visitedAt);
    return at !== null && minutes - at >= 0 && minutes - at <= sameWalkMinutes;
  });
  return found && (found.body.visit as EntryVisit);
}
