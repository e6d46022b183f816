import { mean, sampleStandardDeviation, sampleVariance } from 'simple-statistics';
import { describe, expect, it } from 'vitest';
import { emergenceCurve } from '@/lib/agronomy/emergence-curve';
import { latePlantsWeighed } from '@/lib/agronomy/inference/late-plants-weighed';
import { standInterval } from '@/lib/agronomy/inference/stand-interval';
import { meanEmergenceTime } from '@/lib/agronomy/mean-emergence-time';
import { packRows } from '@/lib/agronomy/pack-rows';
import { packedFigures } from '@/lib/agronomy/packed-figures';
import { randomStream } from '@/lib/agronomy/random';
import { rowToRowDays } from '@/lib/agronomy/row-to-row-days';
import { spacingInchesMean, spacingsInches, spacingVariation } from '@/lib/agronomy/spacing';
import { answerOf } from './answer-of';

// The core describes with loops of its own, because the same loops run over a season at once; each is held to a library here.
const stream = randomStream(1_908);
const rows = Array.from({ length: 60 }, () => {
  let place = 0;
  return Array.from({ length: 3 + stream.nextBelow(30) }, () => (place += stream.nextBelow(30) / 2));
});

describe('means and standard deviations of the core', () => {
  it('are those of simple-statistics: spacings, by records and packed', () => {
    const packed = packedFigures(packRows(rows.map((placesInches) => ({ placesInches, visits: [], plantsHeld: 1, areaAcres: 1, theoreticalSpacingInches: 6 }))));
    rows.forEach((places, index) => {
      const spacings = spacingsInches(places);
      const variation = answerOf(spacingVariation(spacings));
      expect(answerOf(spacingInchesMean(spacings))).toBeCloseTo(mean(spacings), 9);
      expect(variation.spacingInchesSd).toBeCloseTo(sampleStandardDeviation(spacings), 9);
      expect(packed.spacingInchesMean[index]).toBeCloseTo(mean(spacings), 9);
      expect(packed.spacingInchesSd[index]).toBeCloseTo(sampleStandardDeviation(spacings), 9);
    });
  });

  it('are those of simple-statistics: days, each plant for itself', () => {
    const fresh = [3, 9, 11, 4, 2];
    const days = [5, 6, 8, 9, 12];
    const each = fresh.flatMap((plants, index) => Array.from({ length: plants }, () => days[index] ?? 0));
    const curve = answerOf(emergenceCurve(days.map((day, index) => ({ days: day, plantsUp: fresh.slice(0, index + 1).reduce((sum, more) => sum + more, 0) }))));
    const time = answerOf(meanEmergenceTime(curve));
    expect(time.byCountDays).toBeCloseTo(mean(each), 9);
    expect(answerOf(time.varianceDaysSquared)).toBeCloseTo(sampleVariance(each), 9);
  });

  it('are those of simple-statistics: rows of a strip, places of a field, pairs of plants', () => {
    const halves = [10.5, 11.25, 12, 11.5];
    const curves = halves.map((day) => answerOf(emergenceCurve([{ days: day - 1, plantsUp: 0 }, { days: day, plantsUp: 8 }, { days: day + 1, plantsUp: 16 }])));
    expect(answerOf(rowToRowDays(curves)).sdDays).toBeCloseTo(sampleStandardDeviation(halves), 9);

    const plants = [31, 28, 33, 26, 30, 29];
    const stand = answerOf(standInterval(plants.map((plantsHeld) => ({ plantsHeld, areaAcres: 0.001 })), 'row-samples'));
    expect(stand.plantsPerAcre).toBeCloseTo(1_000 * mean(plants), 6);
    expect(answerOf(stand.interval).student?.standardErrorPlantsPerAcre).toBeCloseTo((1_000 * sampleStandardDeviation(plants)) / Math.sqrt(6), 6);

    const pairs = [[0.2, 0.4], [0.3, 0.42], [0.25, 0.38], [0.1, 0.4]] as const;
    const weighed = answerOf(latePlantsWeighed(pairs.map(([latePounds, neighborPounds]) => ({ latePounds, neighborPounds }))));
    const differences = pairs.map(([late, neighbor]) => late - neighbor);
    expect(weighed.differencePounds.mean).toBeCloseTo(mean(differences), 12);
    expect(weighed.differencePounds.standardError).toBeCloseTo(sampleStandardDeviation(differences) / 2, 12);
  });
});
