import { segmentsRead, type TapeLaid } from './tape-laid';

/** One place of a sheet as it lies in the row: its number in the order read, its piece counted from the row's start, and where. */
export type LaidPlace = { order: number; segment: number; positionInches: number };

/**
 * Turns places as the tape said them into places along the row, ascending from its start mark. Takes the inches read,
 * ascending within each piece, how the tape lay, and the length of the row sample. A sheet read from the far end is turned
 * around. Where the tape was laid anew after a cut nobody measured how far on that was: the pieces are set one after another
 * and what is left of the length is shared between the cuts and the end, for a drawing alone; no distance over a cut means
 * anything. Example: 10 and 30 read from the far end of a row of 100 inches are 70 and 90.
 */
export function tapePositions(inchesRead: readonly number[], laid: TapeLaid, lengthInches: number): LaidPlace[] {
  const pieces = segmentsRead(inchesRead.length, laid.segmentStarts);
  const cuts = pieces.at(-1) ?? 0;
  const reach = Array.from({ length: cuts + 1 }, (_, piece) => Math.max(0, ...inchesRead.filter((_inches, index) => pieces[index] === piece)));
  const reached = reach.reduce((sum, inches) => sum + inches, 0);
  const gap = cuts === 0 ? 0 : Math.max(0, lengthInches - reached) / (cuts + 1);
  const begin = reach.map((_, piece) => reach.slice(0, piece).reduce((sum, inches) => sum + inches + gap, 0));
  const along = inchesRead.map((inches, order) => ({ order, segment: pieces[order] ?? 0, positionInches: (begin[pieces[order] ?? 0] ?? 0) + inches }));
  if (laid.readFrom === 'start') return along;
  // A place beyond the end of the row sample stays as far from its neighbors as it was read.
  const whole = Math.max(lengthInches, ...along.map((place) => place.positionInches));
  return along.reverse().map((place) => ({ ...place, segment: cuts - place.segment, positionInches: whole - place.positionInches }));
}
