import type { TapePlant } from './tape-plant';

export type TapeGap = { fromInches: number; toInches: number };

const gapInMedianSpacings = 1.75;

/**
 * The stretches between neighboring plants that are worth naming, longest first: at least `leastInches`, or one and
 * three quarters of the row's own median spacing where no length is given. That share is a choice of this drawing
 * (common practice, no source), not a count of skips.
 */
export function tapeGaps(plants: readonly TapePlant[], leastInches?: number): TapeGap[] {
  const places = plants
    .filter((plant) => plant.kind === 'plant')
    .map((plant) => plant.positionInches)
    .sort((a, b) => a - b);
  const gaps = places
    .slice(1)
    .map((toInches, index) => ({ fromInches: places[index] ?? toInches, toInches }));
  const lengths = gaps.map((gap) => gap.toInches - gap.fromInches).sort((a, b) => a - b);
  const median = lengths[Math.floor(lengths.length / 2)];
  if (median === undefined || (leastInches === undefined && lengths.length < 3)) return [];
  const least = leastInches ?? median * gapInMedianSpacings;
  return gaps
    .filter((gap) => gap.toInches - gap.fromInches >= least)
    .sort((a, b) => b.toInches - b.fromInches - (a.toInches - a.fromInches));
}
