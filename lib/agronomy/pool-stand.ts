import type { Figures } from './figures';
import { standInterval, standStrips } from './inference/stand-interval';
import { standPoisson } from './inference/stand-poisson';
import { chainOutcome, insufficient, mapOutcome, value, type Outcome } from './outcome';
import type { RowSample } from './row-sample';
import { rowStand, type RowStand } from './row-stand';
import type { StandInterval } from './stand-interval-shape';
import { standOfOneRow } from './stand-of-one-row';

export type PooledStandBasis = 'one-row-sample' | 'row-samples-as-places' | 'strips-as-places';

export type PooledStand = Pick<
  Figures,
  'plantsPerAcre' | 'plantsPerAcreInterval' | 'shareOfSeed' | 'shareOfSeedInterval'
> & { basis: PooledStandBasis };

type StandingRow = { sample: RowSample; stand: RowStand };

/**
 * How many plants per acre, and what share of the seed, stand where these row samples lie?
 *
 * Takes row samples of one planting; those with neither count nor tape sheet are passed over. Returns plants
 * per acre, the share of seed, both with their interval, and what the interval rests on. Insufficient without
 * a counted row sample; the interval below two places unless a single row sample carries its own. Throws
 * ImpossibleInput as rowStand does.
 * Method: all plants over all area. Interval: strips as places where two or more places are left once the row
 * samples of each strip are added (a spot count outside strips is a place of its own); else the row samples;
 * for one row sample alone, the binomial interval of its seeds or, without a seeding rate, the exact Poisson
 * one, both of the counting only. The share's interval is the stand's over the seeding rate.
 * It holds for places chosen at random.
 * Example: 31 28 33 26 30 29 plants in six lengths of 1/1000 acre: 29,500, from 26,951 to 32,049.
 */
export function poolStand(samples: readonly RowSample[]): PooledStand {
  const rows = samples.flatMap((sample): StandingRow[] => {
    const stand = rowStand(sample);
    return stand.kind === 'value' ? [{ sample, stand: stand.value }] : [];
  });
  const places = placesOf(rows);
  const asStrips = rows.some((row) => row.sample.stripId !== null) && places.length > 1;
  const units = asStrips ? places : rows.map(({ stand }) => stand);
  const estimate = standInterval(units, asStrips ? 'strips' : 'row-samples');
  const only = rows.length === 1 ? rows[0] : undefined;
  const interval = only
    ? intervalOfOneRow(only)
    : chainOutcome(estimate, ({ interval: fromPlaces }) => fromPlaces);
  const plantsHeld = rows.reduce((sum, { stand }) => sum + stand.plantsHeld, 0);
  const areaAcres = rows.reduce((sum, { stand }) => sum + stand.areaAcres, 0);
  const plantsPerAcre = mapOutcome(estimate, (stand) => ({
    plantsPerAcre: stand.plantsPerAcre,
    plantsHeld,
    areaAcres,
  }));
  const seedsPerAcre = samples[0]?.seedsPerAcre ?? null;
  return {
    plantsPerAcre,
    plantsPerAcreInterval: interval,
    ...shares(plantsPerAcre, interval, seedsPerAcre),
    basis: only ? 'one-row-sample' : asStrips ? 'strips-as-places' : 'row-samples-as-places',
  };
}

function placesOf(rows: readonly StandingRow[]) {
  const named = rows.map(({ sample, stand }) => ({
    plantsHeld: stand.plantsHeld,
    areaAcres: stand.areaAcres,
    // Names of strips and of spot counts must not meet by chance.
    stripId: sample.stripId === null ? `row sample ${sample.rowSampleId}` : `strip ${sample.stripId}`,
  }));
  return standStrips(named);
}

function intervalOfOneRow({ sample, stand }: StandingRow): Outcome<StandInterval> {
  if (sample.seedsPerAcre === null) return value(standPoisson(stand));
  return standOfOneRow({ ...sample, seedsPerAcre: sample.seedsPerAcre, plantsHeld: stand.plantsHeld });
}

function shares(
  stand: Figures['plantsPerAcre'],
  interval: Outcome<StandInterval>,
  seedsPerAcre: number | null,
): Pick<Figures, 'shareOfSeed' | 'shareOfSeedInterval'> {
  if (seedsPerAcre === null) {
    const unknown = insufficient('seeds-not-known', 'seeds per acre', 'no seeding rate');
    return { shareOfSeed: unknown, shareOfSeedInterval: unknown };
  }
  return {
    shareOfSeed: mapOutcome(stand, ({ plantsPerAcre, plantsHeld, areaAcres }) => ({
      share: plantsPerAcre / seedsPerAcre,
      plantsHeld,
      seeds: areaAcres * seedsPerAcre,
    })),
    shareOfSeedInterval: mapOutcome(interval, ({ plantsPerAcreLower, plantsPerAcreUpper, method }) => ({
      shareLower: plantsPerAcreLower / seedsPerAcre,
      shareUpper: plantsPerAcreUpper / seedsPerAcre,
      method,
    })),
  };
}
