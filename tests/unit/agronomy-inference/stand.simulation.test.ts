import { describe, expect, test } from 'vitest';
import { exactShareInterval } from '../../../lib/agronomy/inference/exact-share-interval';
import { residueCover } from '../../../lib/agronomy/inference/residue-cover';
import { standInterval } from '../../../lib/agronomy/inference/stand-interval';
import { standPoisson } from '../../../lib/agronomy/inference/stand-poisson';
import { randomStream } from '../../../lib/agronomy/random';
import { wilsonInterval } from '../../../lib/agronomy/share-of-seed';
import { answerOf } from '../agronomy/answer-of';
import { normalStream } from './normal-stream';

const TRIALS = 4000;
const TRUE_STAND = 30_000;

function shareOfTrials(holds: () => boolean): number {
  let held = 0;
  for (let trial = 0; trial < TRIALS; trial += 1) if (holds()) held += 1;
  return held / TRIALS;
}

describe('intervals over simulated fields', () => {
  test.each([
    { name: 'six equal lengths', lengths: [1, 1, 1, 1, 1, 1] },
    { name: 'three equal lengths', lengths: [1, 1, 1] },
    {
      name: 'ten lengths from half to one and a half',
      lengths: [0.5, 0.7, 0.8, 0.9, 1, 1, 1.1, 1.2, 1.3, 1.5],
    },
  ])('the t interval of the stand holds the truth in 93 to 97 of 100: $name', ({ lengths }) => {
    const normal = normalStream(741);
    const held = shareOfTrials(() => {
      const units = lengths.map((length) => ({
        areaAcres: length / 1000,
        // Patches of the field and the places of single plants, both normal.
        plantsHeld: (length * TRUE_STAND * (1 + 0.08 * normal())) / 1000 + Math.sqrt(length) * normal(),
      }));
      const interval = answerOf(answerOf(standInterval(units, 'row-samples')).interval);
      return interval.plantsPerAcreLower <= TRUE_STAND && TRUE_STAND <= interval.plantsPerAcreUpper;
    });
    expect(held).toBeGreaterThan(0.93);
    expect(held).toBeLessThan(0.97);
  });

  test('the t interval of residue cover over places holds the truth in 93 to 97 of 100', () => {
    const stream = randomStream(742);
    const normal = normalStream(743);
    const held = shareOfTrials(() => {
      const tapes = Array.from({ length: 5 }, () => {
        const cover = 0.45 + 0.1 * normal();
        let marksCovered = 0;
        for (let mark = 0; mark < 100; mark += 1) if (stream.nextUnit() < cover) marksCovered += 1;
        return { marksRead: 100, marksCovered };
      });
      const interval = answerOf(answerOf(residueCover(tapes, 'field')).overPlaces);
      return interval.coverPercentLower <= 45 && 45 <= interval.coverPercentUpper;
    });
    expect(held).toBeGreaterThan(0.93);
    expect(held).toBeLessThan(0.97);
  });
});

describe('counting intervals, by adding up every count there can be', () => {
  /** The binomial probabilities of 0 … n, each from the one before. */
  function binomial(trials: number, share: number): number[] {
    const odds = share / (1 - share);
    const probabilities = [(1 - share) ** trials];
    for (let hits = 1; hits <= trials; hits += 1) {
      probabilities.push(((probabilities[hits - 1] as number) * (trials - hits + 1) * odds) / hits);
    }
    return probabilities;
  }

  function coverage(trials: number, interval: (hits: number) => { shareLower: number; shareUpper: number }) {
    const intervals = Array.from({ length: trials + 1 }, (_, hits) => interval(hits));
    return Array.from({ length: 197 }, (_, step) => (step + 1.5) / 200).map((share) =>
      binomial(trials, share).reduce((sum, probability, hits) => {
        const { shareLower, shareUpper } = intervals[hits] as { shareLower: number; shareUpper: number };
        return shareLower <= share && share <= shareUpper ? sum + probability : sum;
      }, 0),
    );
  }

  test('the exact interval of a share holds every share at least 95 times of 100', () => {
    expect(Math.min(...coverage(34, (hits) => exactShareInterval(hits, 34)))).toBeGreaterThanOrEqual(0.95);
  });

  test('Wilson’s holds it 95 times on average, and less for some shares', () => {
    const held = coverage(34, (hits) => answerOf(wilsonInterval(hits, 34)));
    const mean = held.reduce((sum, each) => sum + each, 0) / held.length;
    expect(mean).toBeGreaterThan(0.945);
    expect(mean).toBeLessThan(0.965);
    expect(Math.min(...held)).toBeLessThan(0.95);
  });

  test('the exact Poisson interval holds every mean at least 95 times of 100', () => {
    const intervals = Array.from({ length: 200 }, (_, plantsHeld) =>
      standPoisson({ plantsHeld, areaAcres: 1 }),
    );
    for (let mean = 0.3; mean < 60; mean += 0.37) {
      let probability = Math.exp(-mean);
      let held = 0;
      intervals.forEach(({ plantsPerAcreLower, plantsPerAcreUpper }, plants) => {
        if (plants > 0) probability *= mean / plants;
        if (plantsPerAcreLower <= mean && mean <= plantsPerAcreUpper) held += probability;
      });
      expect(held).toBeGreaterThanOrEqual(0.95);
    }
  });
});
