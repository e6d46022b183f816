import { emergenceCurve } from './emergence-curve';
import type { Figures, Penalties } from './figures';
import { lateFigures } from './late-figures';
import { chainOutcome, insufficient, mapOutcome, type Outcome } from './outcome';
import { penaltyFigures } from './penalty-figures';
import type { RowSample } from './row-sample';
import { rowStand, tapeLessCounted, type RowStand } from './row-stand';
import { scoreFigures } from './score-figures';
import { shareOfSeed } from './share-of-seed';
import { sortedCounts } from './sorted-counts';
import { spacingFigures } from './spacing-figures';
import { standOfOneRow } from './stand-of-one-row';
import { timingFigures } from './timing-figures';

export type RowScores = { rowSampleId: string; figures: Figures; penalties: Penalties };

/**
 * What does everything that was measured at one row sample say?
 *
 * Takes one row sample: lengths and places in inches, days since planting, plants as whole numbers. Returns
 * every figure, each a value or insufficient with what was needed and had, and every study's penalty. Throws
 * ImpossibleInput for what cannot be: negative numbers, places out of order, more doubtful plants than plants.
 * Method: as each figure's entry in the register. The interval is of the counting alone and needs the seeding
 * rate; one row sample says nothing about the rest of the field.
 * Example: places 0 2 17 33 38 39 44 52 55 60 68 in of a 30-inch row, both ends plants: 30,748 plants per acre,
 * mean spacing 6.8 in, SD 5.116 in, 12.5 bu/ac by the SSMG-37 rule.
 */
export function rowScores(sample: RowSample): RowScores {
  const stand = rowStand(sample);
  const seeds = seedFigures(sample, stand);
  const curve = emergenceCurve(sortedCounts(sample));
  const spacing = spacingFigures(
    [sample],
    mapOutcome(seeds.shareOfSeed, ({ share }) => share),
  );
  const late = lateFigures([sample], curve);
  const plantsPerAcre = mapOutcome(stand, (row) => ({
    plantsPerAcre: row.plantsPerAcre,
    plantsHeld: row.plantsHeld,
    areaAcres: row.areaAcres,
  }));
  const timing = timingFigures(curve);
  const graded = { plantsPerAcre, spreadDays: timing.spreadDays, spacingInchesSd: spacing.spacingInchesSd };
  const figures = {
    plantsPerAcre,
    ...seeds,
    ...timing,
    ...late,
    ...spacing,
    tapeLessCounted: tapeLessCounted(sample),
    ...scoreFigures({ ...graded, intendedPlantsPerAcre: sample.intendedPlantsPerAcre }),
  };
  return { rowSampleId: sample.rowSampleId, figures, penalties: penaltyFigures(sample.crop, figures) };
}

type SeedFigures = Pick<Figures, 'plantsPerAcreInterval' | 'shareOfSeed' | 'shareOfSeedInterval'>;

function seedFigures(sample: RowSample, stand: Outcome<RowStand>): SeedFigures {
  const seedsPerAcre = sample.seedsPerAcre;
  if (seedsPerAcre === null) {
    const unknown = insufficient('seeds-not-known', 'seeds per acre', 'no seeding rate');
    return { plantsPerAcreInterval: unknown, shareOfSeed: unknown, shareOfSeedInterval: unknown };
  }
  const share = mapOutcome(stand, (row) => shareOfSeed(row.plantsHeld, seedsPerAcre * row.areaAcres));
  return {
    plantsPerAcreInterval: chainOutcome(stand, ({ plantsHeld }) =>
      standOfOneRow({
        plantsHeld,
        seedsPerAcre,
        lengthInches: sample.lengthInches,
        rowSpacingInches: sample.rowSpacingInches,
      }),
    ),
    shareOfSeed: mapOutcome(share, ({ share: standing, plants, seeds }) => ({
      share: standing,
      plantsHeld: plants,
      seeds,
    })),
    shareOfSeedInterval: chainOutcome(share, ({ interval }) => interval),
  };
}
