import { bySegment } from '@/lib/agronomy/by-segment';
import type { TapePlant } from './tape-plant';

export type TapeGap = { fromInches: number; toInches: number };

const gapInMedianSpacings = 1.75;

/**
 * The stretches between neighboring plants that are worth naming, longest first: at least `leastInches`, or one and
 * three quarters of the row's own median spacing where no length is given. That share is a choice of this drawing
 * (common practice, no source), not a count of skips. Over a cut of the tape nothing is known, so no gap is named there.
 */
export function tapeGaps(plants: readonly TapePlant[], leastInches?: number): TapeGap[] {
  const standing = plants
    .filter((plant) => plant.kind === 'plant')
    .sort((a, b) => a.positionInches - b.positionInches);
  const gaps = bySegment(standing, (plant) => plant.segment).flatMap((piece) =>
    piece.slice(1).map((plant, index) => ({
      fromInches: piece[index]?.positionInches ?? plant.positionInches,
      toInches: plant.positionInches,
    })),
  );
  const lengths = gaps.map((gap) => gap.toInches - gap.fromInches).sort((a, b) => a - b);
  const median = lengths[Math.floor(lengths.length / 2)];
  if (median === undefined || (leastInches === undefined && lengths.length < 3)) return [];
  const least = leastInches ?? median * gapInMedianSpacings;
  return gaps
    .filter((gap) => gap.toInches - gap.fromInches >= least)
    .sort((a, b) => b.toInches - b.fromInches - (a.toInches - a.fromInches));
}
