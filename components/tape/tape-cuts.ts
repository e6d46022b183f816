import { bySegment } from '@/lib/agronomy/by-segment';
import type { TapePlant } from './tape-plant';

/** Where the tape was laid anew, drawn halfway between the two pieces: how far they lie apart nobody measured. */
export function tapeCuts(plants: readonly TapePlant[]): number[] {
  const places = [...plants].sort((a, b) => a.positionInches - b.positionInches);
  const pieces = bySegment(places, (plant) => plant.segment);
  return pieces.slice(1).map((piece, index) => {
    const before = pieces[index]?.at(-1)?.positionInches ?? 0;
    return (before + (piece[0]?.positionInches ?? before)) / 2;
  });
}
