import { inchesRead } from '@/lib/client/round/tape-draft';
import type { SheetSoFar } from '@/lib/client/round/tape-sheet-of-row';
import { tapePositions } from '@/lib/schemas/tape-positions';
import type { GrownPlant } from '@/components/tape/growing-tape';
import type { SheetMarker } from './tape-notes';

/** The places of a sheet as the growing tape draws them, in the order of the row; what the tape in hand cannot read is left out. */
export function grownPlants(sheet: SheetSoFar, markers: readonly SheetMarker[], lengthInches: number): GrownPlant[] {
  const read = inchesRead(sheet).flatMap((inches, index) => {
    const place = sheet.places[index];
    return inches === undefined || !place ? [] : [{ inches, index, place }];
  });
  const segmentStarts = read.flatMap(({ place }, order) => (order > 0 && place.cutBefore ? [order] : []));
  const laid = tapePositions(read.map(({ inches }) => inches), { readFrom: sheet.readFrom, zeroAt: sheet.zeroAt, segmentStarts }, lengthInches);
  return laid.flatMap(({ order, positionInches, segment }) => {
    const found = read[order];
    if (!found) return [];
    const { place, index } = found;
    return [{
      index, typed: place.typed, positionInches, segment, earliness: earlinessOf(place.marker, markers),
      late: place.kind === 'late', double: place.kind === 'double', kind: place.kind === 'missing' ? ('missing' as const) : ('plant' as const),
    }];
  });
}

/** The earlier a plant's marker, the taller it is drawn; one without a day is the lowest. */
function earlinessOf(marker: string | null, markers: readonly SheetMarker[]): number | null {
  const dated = markers.filter((each) => each.day !== null);
  const at = dated.findIndex((each) => each.marker.toLowerCase() === marker?.toLowerCase());
  if (at === -1) return null;
  return dated.length === 1 ? 1 : 1 - at / (dated.length - 1);
}
