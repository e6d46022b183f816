import type { PlaceToCheck } from '@/lib/schemas/check-tape-sheet';
import { laidOnce, type TapeLaid } from '@/lib/schemas/tape-laid';
import type { TapeUnit } from '@/lib/schemas/vocabulary';

/** Leaf collars as whole tenths, -1 where not read. */
export const leafStageTenths = (leafStage: number | null) => (leafStage === null ? -1 : Math.round(leafStage * 10));

/** A sheet's places as the arrays of equal length that the table keeps. */
export function tapeSheetColumns(places: readonly PlaceToCheck[], tapeUnit: TapeUnit, thousandths: readonly number[], laid: TapeLaid = laidOnce) {
  return {
    tapeUnit,
    readFrom: laid.readFrom,
    zeroAt: laid.zeroAt,
    segmentStarts: [...laid.segmentStarts],
    placesTyped: places.map((place) => place.typed),
    placesThousandths: [...thousandths],
    markers: places.map((place) => place.marker ?? ''),
    kinds: places.map((place) => place.kind),
    leafStageTenths: places.map((place) => leafStageTenths(place.leafStage)),
    plants: places.filter((place) => place.kind !== 'missing').length,
  };
}
