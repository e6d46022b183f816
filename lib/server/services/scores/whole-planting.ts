import type { StandEstimate } from '@/lib/agronomy/inference/stand-interval';
import { mapOutcome, type Outcome } from '@/lib/agronomy/outcome';
import type { RowSample } from '@/lib/agronomy/row-sample';
import { scoreFigures } from '@/lib/agronomy/score-figures';
import type { ScoredGroup } from '@/lib/schemas/scored-group';
import { scoredGroup } from './scored-group';

/**
 * The scores of the planting. Where zones weigh its stand by their acres, that stand, its share of the seed and its points
 * take the place of the plain ones; timing and spacing stay those of all row samples.
 */
export function wholePlanting(samples: readonly RowSample[], byAcres: Outcome<StandEstimate> | null): ScoredGroup {
  const group = scoredGroup(samples);
  const seedsPerAcre = samples[0]?.seedsPerAcre ?? null;
  if (byAcres?.kind !== 'value') return group;
  const { plantsPerAcre, interval } = byAcres.value;
  const stand = {
    plantsPerAcre: mapOutcome(group.figures.plantsPerAcre, (plain) => ({ ...plain, plantsPerAcre })),
    plantsPerAcreInterval: interval,
  };
  const ofSeed =
    seedsPerAcre === null
      ? {}
      : {
          shareOfSeed: mapOutcome(group.figures.shareOfSeed, (plain) => ({ ...plain, share: plantsPerAcre / seedsPerAcre })),
          shareOfSeedInterval: mapOutcome(interval, ({ plantsPerAcreLower, plantsPerAcreUpper, method }) => ({
            shareLower: plantsPerAcreLower / seedsPerAcre,
            shareUpper: plantsPerAcreUpper / seedsPerAcre,
            method,
          })),
        };
  const figures = { ...group.figures, ...stand, ...ofSeed };
  const graded = scoreFigures({ ...figures, intendedPlantsPerAcre: samples[0]?.intendedPlantsPerAcre ?? null });
  return { ...group, figures: { ...figures, ...graded } };
}
