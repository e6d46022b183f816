import type { TapePlant } from '@/components/tape/tape-plant';
import type { TapeEntryKind } from '@/lib/schemas/vocabulary';
import type { FieldMoment, SheetCount } from '../count/row-sheet-types';

type DrawnPlace = { positionInches: number; segment: number; kind: TapeEntryKind; seenBy: FieldMoment | null };

const millisecondsPerMinute = 60_000;
/** Minutes since an arbitrary day, for order and shares alone; a visit without a time counts as noon. */
const minutesOf = (moment: FieldMoment) => Date.parse(`${moment.on}T${moment.at ?? '12:00'}:00Z`) / millisecondsPerMinute;

/** The visit that set a marker, the last of several. */
export function seenByMarker(marker: string | null, counts: readonly SheetCount[]): FieldMoment | null {
  const wanted = marker?.trim().toLowerCase() ?? '';
  if (wanted === '') return null;
  const visit = counts.findLast((count) => count.used && count.marker?.toLowerCase() === wanted);
  return visit ? { on: visit.visitedOn, at: visit.visitedAt } : null;
}

/** A sheet's places as the tape draws them: the tallest came up by the first visit that found any plant, the lowest by the last. */
export function drawnPlants(places: readonly DrawnPlace[], counts: readonly SheetCount[]): TapePlant[] {
  const visits = counts.filter((count) => count.used && count.plantsUp > 0).map((count) => minutesOf({ on: count.visitedOn, at: count.visitedAt }));
  const [first, last] = [Math.min(...visits), Math.max(...visits)];
  const earlinessOf = (seenBy: FieldMoment | null) => {
    if (seenBy === null || visits.length === 0) return null;
    return last === first ? 1 : (last - minutesOf(seenBy)) / (last - first);
  };
  return places.map((place) => ({
    positionInches: place.positionInches,
    segment: place.segment,
    earliness: earlinessOf(place.seenBy),
    late: place.kind === 'late',
    double: place.kind === 'double',
    kind: place.kind === 'missing' ? 'missing' : 'plant',
  }));
}
