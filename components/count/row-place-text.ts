import { countTexts } from '@/lib/texts/count-texts';

export type RowPlaceFacts = { blockNumber: number | null; stripNumber: number | null; zoneName: string | null; planterRow: number | null };

/** Where a row sample lies: "Block 2, strip 7, planter row 5", "Low ground", "Spot count". */
export function rowPlaceText(place: RowPlaceFacts): string {
  const strip =
    place.stripNumber === null
      ? []
      : [...(place.blockNumber === null ? [] : [countTexts.block(String(place.blockNumber))]), countTexts.strip(String(place.stripNumber))];
  const zone = place.zoneName === null ? [] : [place.zoneName];
  const row = place.planterRow === null ? [] : [countTexts.planterRow(String(place.planterRow))];
  const parts = [...(strip.length + zone.length === 0 ? [countTexts.spot] : []), ...strip, ...zone, ...row];
  const text = parts.join(', ');
  return `${text.charAt(0).toUpperCase()}${text.slice(1)}`;
}
