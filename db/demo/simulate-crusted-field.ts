import { randomStream } from '@/lib/agronomy/random';
import { theoreticalSpacingInches } from '@/lib/agronomy/theoretical-spacing';
import { crustedFieldSeed } from './chosen-seeds';
import { emergencePattern } from './simulate-emergence';
import { simulateRow, type SimulatedSeed } from './simulate-row';

/**
 * What is true of the crusted field: in its low ground a crust held most seedlings, on the high ground about a third. Losses
 * lie in longer stretches than in a sound stand. Weighted by acres it holds about 20,500 plants an acre.
 */
export const crustedTruth = {
  plantedOn: '2026-04-28',
  lookedAtOn: '2026-05-18',
  daysAfterPlanting: 20,
  seedsPerAcre: 34_000,
  rowSpacingInches: 30,
  rowLengthInches: 209,
  plantsPerAcre: 20_500,
  zones: [
    { key: 'low', name: 'Low ground', acres: 18, places: 4, plantsPerAcre: 13_000 },
    { key: 'high', name: 'High ground', acres: 44, places: 8, plantsPerAcre: 23_568 },
  ],
  lossRunSeedsMean: 2.5,
} as const;

export type LookedAtPlace = { zoneKey: 'low' | 'high'; number: number; seeds: SimulatedSeed[]; plantsUp: number; doubtful: number };

/** The crusted field in its twelve places on the day somebody looked at it; one plant on the high ground stands doubtful. */
export function simulateCrustedField(seed: number = crustedFieldSeed): LookedAtPlace[] {
  const stream = randomStream(seed);
  const { seedsPerAcre, rowSpacingInches, rowLengthInches, lossRunSeedsMean, daysAfterPlanting } = crustedTruth;
  const places = crustedTruth.zones.flatMap((zone) =>
    Array.from({ length: zone.places }, () => {
      const row = {
        lengthInches: rowLengthInches,
        theoreticalSpacingInches: theoreticalSpacingInches(seedsPerAcre, rowSpacingInches),
        emergedShare: zone.plantsPerAcre / seedsPerAcre,
        lossRunSeedsMean,
        pattern: emergencePattern({ halfUpDays: 12.5, spreadDays: 5, lateShare: 0.05 }),
        shiftDays: 0,
        rowSdDays: 0,
      };
      return { zoneKey: zone.key, seeds: simulateRow(row, stream) };
    }),
  );
  return places.map(({ zoneKey, seeds }, index) => ({
    zoneKey,
    number: index + 1,
    seeds,
    plantsUp: seeds.filter(({ emergedDays }) => emergedDays !== null && emergedDays <= daysAfterPlanting).length,
    doubtful: index === places.length - 1 ? 1 : 0,
  }));
}
