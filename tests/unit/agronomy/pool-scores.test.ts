import { describe, expect, test } from 'vitest';
import { poolDefinitions, poolScores } from '@/lib/agronomy/pool-scores';
import { rowScores } from '@/lib/agronomy/row-scores';
import standMeasures from '../../reference/stand-measures.json';
import { answerOf, reasonOf } from './answer-of';
import { referenceCase } from './reference-case';
import { countsFrom, placesOf, rowSampleOf } from './row-sample-of';

const up = [0, 3, 12, 22, 28, 31, 31, 31];

function rowOf(rowSampleId: string, stripId: string | null, plants: readonly number[] = up) {
  return rowSampleOf({ rowSampleId, stripId, counts: countsFrom(8, plants) });
}

describe('poolScores', () => {
  test('takes row samples without strips as places (AREA-04)', () => {
    const { input, expected } = referenceCase<
      { count: number[] },
      { mean: number; lower: number; upper: number }
    >(standMeasures, 'AREA-04');
    const samples = input.count.map((plants, index) =>
      rowSampleOf({ rowSampleId: String(index), counts: countsFrom(20, [plants]) }),
    );
    const { figures, definition } = poolScores(samples);
    const interval = answerOf(figures.plantsPerAcreInterval);
    expect(answerOf(figures.plantsPerAcre).plantsPerAcre).toBeCloseTo(expected.mean, 4);
    expect(interval.plantsPerAcreLower).toBeCloseTo(expected.lower, 4);
    expect(interval.plantsPerAcreUpper).toBeCloseTo(expected.upper, 4);
    expect(definition.stand).toBe('row-samples-as-places');
  });

  test('takes strips as places where there are two or more (AREA-09)', () => {
    const { input, expected } = referenceCase<{ y: number[]; plot: number[] }, { mean: number; se: number }>(
      standMeasures,
      'AREA-09',
    );
    const samples = input.y.map((plants, index) =>
      rowSampleOf({
        rowSampleId: String(index),
        stripId: String(input.plot[index]),
        counts: countsFrom(20, [plants]),
      }),
    );
    const { figures, definition, strips } = poolScores(samples);
    const interval = answerOf(figures.plantsPerAcreInterval);
    expect(answerOf(figures.plantsPerAcre).plantsPerAcre / 1000).toBeCloseTo(expected.mean, 9);
    expect((interval.student?.standardErrorPlantsPerAcre as number) / 1000).toBeCloseTo(expected.se, 9);
    expect(interval).toMatchObject({ basis: 'strips', units: 4 });
    expect(definition.stand).toBe('strips-as-places');
    expect(strips).toBe(4);
  });

  test('takes a spot count outside the strips as a place of its own, and leaves it out of the timing', () => {
    const samples = [rowOf('1', 'a'), rowOf('2', 'b'), rowOf('3', null)];
    const pooled = poolScores(samples);
    expect(answerOf(pooled.figures.plantsPerAcreInterval).units).toBe(3);
    expect(pooled).toMatchObject({ rowSamplesOutsideTiming: 1, stripsTimed: 2 });
  });

  test('gives one row sample what it has by itself', () => {
    const sample = rowOf('1', 'a');
    const pooled = poolScores([sample]);
    const own = rowScores(sample);
    expect(pooled.figures.plantsPerAcreInterval).toEqual(own.figures.plantsPerAcreInterval);
    expect(pooled.figures.spreadDays).toEqual(own.figures.spreadDays);
    expect(pooled.figures.score).toEqual(own.figures.score);
    expect(pooled.definition).toEqual({ stand: 'one-row-sample', timing: 'one-row-sample' });
  });

  test('gives one row sample without a seeding rate the exact Poisson interval', () => {
    const sample = { ...rowOf('1', null, [31]), seedsPerAcre: null };
    const interval = answerOf(poolScores([sample]).figures.plantsPerAcreInterval);
    expect(interval).toMatchObject({ method: 'poisson-exact', basis: 'counting-only' });
    expect(interval.plantsPerAcreLower / 1000).toBeCloseTo(21.06, 2);
  });

  test('takes the timing of several strips as the mean of one curve a strip', () => {
    const early = [rowOf('1', 'a'), rowOf('2', 'a')];
    const late = [rowOf('3', 'b'), rowOf('4', 'b')].map((sample) => ({
      ...sample,
      counts: sample.counts.map((count) => ({ ...count, days: count.days + 1 })),
    }));
    const days = (samples: typeof early) => answerOf(poolScores(samples).figures.daysTo50).days;
    const both = poolScores([...early, ...late]);
    expect(both.definition.timing).toBe('mean-of-strips');
    expect(days([...early, ...late])).toBeCloseTo((days(early) + days(late)) / 2, 9);
    const spread = answerOf(poolScores(early).figures.spreadDays).days;
    expect(answerOf(both.figures.spreadDays).days).toBeCloseTo(spread, 9);
  });

  test('fits one curve within a strip', () => {
    const pooled = poolScores([rowOf('1', 'a'), rowOf('2', 'a')]);
    expect(pooled.definition.timing).toBe('one-curve');
    expect(answerOf(pooled.figures.emergenceCurve).plantsEmerged).toBe(62);
  });

  test('says "at least" for the group when a strip is still coming', () => {
    const { figures } = poolScores([rowOf('1', 'a'), rowOf('2', 'b', [0, 3, 12, 22, 28, 30, 31, 32])]);
    expect(answerOf(figures.spreadDays)).toMatchObject({ bound: 'at-least', boundReasons: ['still-coming'] });
    expect(answerOf(figures.score).bound).toBe('at-most');
  });

  test('joins the spacings of rows without bridging them', () => {
    const tapes = [
      [0, 6, 12],
      [100, 108],
    ].map((positions, index) => rowSampleOf({ rowSampleId: String(index), tape: placesOf(positions) }));
    const { figures, rowSamplesWithTape } = poolScores(tapes);
    expect(answerOf(figures.spacingInchesMean)).toBeCloseTo(20 / 3, 9);
    expect(rowSamplesWithTape).toBe(2);
  });

  test('adds late plants over sheets, each against its own row sample’s first flush', () => {
    const sheet = (firstDay: number) =>
      rowSampleOf({
        rowSampleId: String(firstDay),
        counts: countsFrom(firstDay, [0, 3, 3, 3, 3, 3, 3, 3, 3, 3, 4, 4, 4]),
        tape: [0, 6, 12, 18].map((positionInches, index) => ({
          positionInches,
          kind: 'plant' as const,
          firstSeen: {
            afterDays: firstDay + (index === 3 ? 9 : 0),
            byDays: firstDay + (index === 3 ? 10 : 1),
          },
        })),
      });
    // Against one pooled flush the later row's plants would lie five days further back.
    const late = answerOf(poolScores([sheet(8), sheet(13)]).figures.lateShare);
    expect(late).toMatchObject({ latePlants: 2, plants: 8, share: 0.25 });
    expect(answerOf(late.lateDelayDaysMean)).toBeCloseTo(9.5 - 0.4 / 3, 9);
  });

  test('refuses row samples of unlike plantings', () => {
    const soybean = { ...rowOf('2', null), crop: 'soybean' };
    expect(() => poolScores([rowOf('1', null), soybean])).toThrow(expect.objectContaining({ field: 'crop' }));
  });

  test('answers insufficient throughout without a row sample', () => {
    const { figures, penalties } = poolScores([]);
    for (const outcome of Object.values({ ...figures, ...penalties }))
      expect(outcome.kind).toBe('insufficient');
    expect(reasonOf(figures.plantsPerAcre)).toBe('no-row-samples');
  });

  test('has a sentence for every way of taking row samples together', () => {
    const { definition } = poolScores([rowOf('1', 'a'), rowOf('2', 'b')]);
    expect(poolDefinitions[definition.stand]).toMatch(/strips differ/);
    expect(poolDefinitions[definition.timing]).toMatch(/mean of the strips/);
  });
});
