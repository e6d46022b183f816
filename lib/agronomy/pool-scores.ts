import { poolEmergence } from './emergence-pool';
import type { Figures, Penalties } from './figures';
import { lateFigures } from './late-figures';
import { ImpossibleInput, insufficient, mapOutcome, value, type Outcome } from './outcome';
import { penaltyFigures } from './penalty-figures';
import { poolStand, type PooledStandBasis } from './pool-stand';
import type { RowSample } from './row-sample';
import { tapeLessCounted } from './row-stand';
import { scoreFigures } from './score-figures';
import { sortedCounts } from './sorted-counts';
import { spacingFigures } from './spacing-figures';
import { timingFigures } from './timing-figures';
import { timingOfStrips } from './timing-of-strips';

/** How a group's figures were taken together; each has its sentence in `poolDefinitions`. */
export type PoolDefinition = {
  stand: PooledStandBasis;
  timing: 'one-row-sample' | 'one-curve' | 'mean-of-strips';
};

export type PoolScores = {
  figures: Figures;
  penalties: Penalties;
  definition: PoolDefinition;
  rowSamples: number;
  rowSamplesCounted: number;
  rowSamplesWithTape: number;
  strips: number;
  /** Strips whose counts make a timing curve. */
  stripsTimed: number;
  /** Spot counts outside strips, which a mean of strips leaves out of the timing. */
  rowSamplesOutsideTiming: number;
};

/**
 * What do the row samples of a strip, a setting or a planting say together?
 *
 * Takes row samples of one planting (the same crop, seeding rate, intended stand and late limits), each naming
 * its strip or none. Returns every figure and penalty with the way they were taken together and how much went
 * in. Each figure is insufficient where its own needs are not met. Throws ImpossibleInput when the row samples
 * are of unlike plantings, and as rowScores does.
 *
 * Method. Stand: all plants over all area; its interval from strips where there are two or more (a spot count
 * outside them is a place of its own), else from row samples, else of the one count. Timing: within one strip,
 * or without strips, one curve fitted to the pooled counts; over several strips the mean of the strips'
 * figures, while `emergenceCurve` stays the pooled curve, to be drawn. Spacings: all spacings joined, rows not
 * bridged. Late plants: added over tape sheets, each against its own row sample. Score and penalties: from
 * these figures, not the mean of scores.
 * Row samples chosen where a field looks best or worst make every figure as good or bad.
 * Example: 31 28 33 26 30 29 plants in six lengths of 1/1000 acre: 29,500 plants per acre, 26,951 to 32,049.
 */
export function poolScores(samples: readonly RowSample[]): PoolScores {
  requireOnePlanting(samples);
  const strips = groupedByStrip(samples);
  const { basis, ...stand } = poolStand(samples);
  const curve = poolEmergence(samples.map(sortedCounts));
  const ofStrips = strips.length > 1 ? timingOfStrips(strips) : null;
  const timing = { ...timingFigures(curve), ...ofStrips?.figures };
  const spacing = spacingFigures(
    samples,
    mapOutcome(stand.shareOfSeed, ({ share }) => share),
  );
  const measured = {
    ...stand,
    ...timing,
    ...lateFigures(samples, curve),
    ...spacing,
    tapeLessCounted: summedDifference(samples),
  };
  const intendedPlantsPerAcre = samples[0]?.intendedPlantsPerAcre ?? null;
  const oneTiming = samples.length === 1 ? 'one-row-sample' : 'one-curve';
  return {
    figures: { ...measured, ...scoreFigures({ ...measured, intendedPlantsPerAcre }) },
    penalties: penaltyFigures(samples[0]?.crop ?? 'not known', measured),
    definition: { stand: basis, timing: ofStrips ? 'mean-of-strips' : oneTiming },
    rowSamples: samples.length,
    rowSamplesCounted: samples.filter((sample) => sample.counts.length > 0).length,
    rowSamplesWithTape: samples.filter((sample) => sample.tape !== null).length,
    strips: strips.length,
    stripsTimed: ofStrips ? ofStrips.stripsTimed : curve.kind === 'value' ? strips.length : 0,
    rowSamplesOutsideTiming: ofStrips ? samples.filter((sample) => sample.stripId === null).length : 0,
  };
}

/** What each way of taking row samples together means, in a sentence. */
export const poolDefinitions: Record<PoolDefinition['stand'] | PoolDefinition['timing'], string> = {
  'one-row-sample': 'One row sample: it says nothing about the rest of the field.',
  'row-samples-as-places': 'All plants over all area; the interval comes from how the row samples differ.',
  'strips-as-places': 'All plants over all area; the interval comes from how the strips differ.',
  'one-curve': 'One curve, fitted once to the pooled counts of all row samples.',
  'mean-of-strips':
    'The mean of the strips, each with one curve fitted to the pooled counts of its row samples.',
};

function requireOnePlanting(samples: readonly RowSample[]): void {
  const first = samples[0];
  if (!first) return;
  for (const field of ['crop', 'seedsPerAcre', 'intendedPlantsPerAcre'] as const) {
    if (samples.some((sample) => sample[field] !== first[field])) {
      throw new ImpossibleInput(`The row samples are of plantings with unlike ${field}.`, field);
    }
  }
}

function groupedByStrip(samples: readonly RowSample[]): RowSample[][] {
  const strips = new Map<string, RowSample[]>();
  for (const sample of samples) {
    if (sample.stripId !== null) strips.set(sample.stripId, [...(strips.get(sample.stripId) ?? []), sample]);
  }
  return [...strips.values()];
}

function summedDifference(samples: readonly RowSample[]): Outcome<number> {
  const differences = samples
    .map(tapeLessCounted)
    .flatMap((difference) => (difference.kind === 'value' ? [difference.value] : []));
  if (differences.length === 0) {
    return insufficient('one-source', 'a row sample with a count and a tape sheet', 'none');
  }
  return value(differences.reduce((sum, difference) => sum + difference, 0));
}
