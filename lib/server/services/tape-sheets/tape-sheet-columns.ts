import type { TapeUnit } from '@/lib/schemas/vocabulary';
import type { PlaceToCheck } from './check-tape-sheet';

/** A sheet's places as the arrays of equal length that the table keeps. */
export function tapeSheetColumns(places: readonly PlaceToCheck[], tapeUnit: TapeUnit, thousandths: readonly number[]) {
  return {
    tapeUnit,
    placesTyped: places.map((place) => place.typed),
    placesThousandths: [...thousandths],
    markers: places.map((place) => place.marker ?? ''),
    kinds: places.map((place) => place.kind),
    leafStageTenths: places.map((place) => (place.leafStage === null ? -1 : Math.round(place.leafStage * 10))),
    plants: places.filter((place) => place.kind !== 'missing').length,
  };
}
