import type { TapeReadFrom, TapeZero } from './vocabulary';

/** How the tape lay along the row. `segmentStarts` numbers the places at which it was laid anew after a cut, never the first. */
export type TapeLaid = { readFrom: TapeReadFrom; zeroAt: TapeZero; segmentStarts: readonly number[] };

/** As every sheet was read before anybody could say otherwise: from the start mark, in one piece. */
export const laidOnce: TapeLaid = { readFrom: 'start', zeroAt: 'mark', segmentStarts: [] };

/** In which piece of the tape each place of a sheet lies, counted from 0 in the order read. */
export function segmentsRead(places: number, segmentStarts: readonly number[]): number[] {
  return Array.from({ length: places }, (_, index) => segmentStarts.filter((start) => start <= index).length);
}
