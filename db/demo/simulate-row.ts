import type { RandomStream } from '@/lib/agronomy/random';
import { normalDraw } from './normal-draw';
import { lateDelayDays, type EmergencePattern } from './simulate-emergence';

/** How the planter drops seeds: common sizes of a good planter, invented for this demo. */
export const planterWork = {
  placementSdInches: 1.3,
  /** Places where no seed is dropped, and places where two are. */
  skipShare: 0.01,
  doubleShare: 0.01,
  /** How far the second seed of a double falls behind the first. */
  doubleApartInchesMost: 0.8,
};

export type RowToSimulate = {
  lengthInches: number;
  theoreticalSpacingInches: number;
  /** Share of the dropped seeds that come up, 1 being all. */
  emergedShare: number;
  /** Lost seeds lie together: how many in a row on average, where one is lost. */
  lossRunSeedsMean: number;
  pattern: EmergencePattern;
  /** What block, strip and row add to every plant's day. */
  shiftDays: number;
  /** Part of the main flush's SD that stands in `shiftDays` of the rows already. */
  rowSdDays: number;
};

/** One seed as it lies, in inches from the tape's zero; a seed that never comes up has no day. */
export type SimulatedSeed = { positionInches: number; emergedDays: number | null; isLate: boolean };

/**
 * What stands in one measured length, seed by seed, in the order of their places?
 *
 * Seeds lie at the theoretical spacing, the first at a chance distance from the mark, each off its place by the placement
 * SD; some places are skipped and some doubled. Losses are a chain of two states with the wanted share and run length.
 * Plants that come up are late or in the main flush. Some seeds are drawn before and beyond the length, since one that
 * belongs outside may fall inside.
 */
export function simulateRow(row: RowToSimulate, stream: RandomStream): SimulatedSeed[] {
  const survives = lossChain(row, stream);
  const mainSdDays = Math.sqrt(row.pattern.mainSdDays ** 2 - row.rowSdDays ** 2);
  const pattern = { ...row.pattern, mainSdDays };
  return droppedPlaces(row, stream)
    .map((positionInches) => (survives() ? { positionInches, ...emergence(pattern, row.shiftDays, stream) } : { positionInches, emergedDays: null, isLate: false }))
    .filter(({ positionInches }) => positionInches >= 0 && positionInches < row.lengthInches)
    .sort((a, b) => a.positionInches - b.positionInches);
}

function droppedPlaces({ lengthInches, theoreticalSpacingInches }: RowToSimulate, stream: RandomStream): number[] {
  const { placementSdInches, skipShare, doubleShare, doubleApartInchesMost } = planterWork;
  const places: number[] = [];
  const margin = 2 * theoreticalSpacingInches;
  const first = -margin + stream.nextUnit() * theoreticalSpacingInches;
  for (let meant = first; meant < lengthInches + margin; meant += theoreticalSpacingInches) {
    const chance = stream.nextUnit();
    if (chance < skipShare) continue;
    const place = normalDraw(stream, { mean: meant, sd: placementSdInches });
    places.push(place);
    if (chance > 1 - doubleShare) places.push(place + stream.nextUnit() * doubleApartInchesMost);
  }
  return places;
}

/** Whether the next seed along the row comes up, asked seed by seed. */
function lossChain({ emergedShare, lossRunSeedsMean }: RowToSimulate, stream: RandomStream): () => boolean {
  const recovers = 1 / lossRunSeedsMean;
  const fails = (recovers * (1 - emergedShare)) / emergedShare;
  let isLost = stream.nextUnit() >= emergedShare;
  return () => {
    isLost = isLost ? stream.nextUnit() >= recovers : stream.nextUnit() < fails;
    return !isLost;
  };
}

function emergence(pattern: EmergencePattern, shiftDays: number, stream: RandomStream) {
  const isLate = stream.nextUnit() < pattern.lateShare;
  const { least, most } = lateDelayDays;
  const days = isLate
    ? pattern.firstFlushDays + least + stream.nextUnit() * (most - least)
    : normalDraw(stream, { mean: pattern.mainMeanDays, sd: pattern.mainSdDays });
  return { emergedDays: days + shiftDays, isLate };
}
