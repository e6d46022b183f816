import { describe, expect, test } from 'vitest';
import { ImpossibleInput } from '@/lib/agronomy/outcome';
import { rowScores } from '@/lib/agronomy/row-scores';
import type { TapePlace } from '@/lib/agronomy/row-sample';
import published from '../../reference/published-examples.json';
import { answerOf, reasonOf } from './answer-of';
import { countsFrom, placesOf, rowSampleOf } from './row-sample-of';

const { tapeReadings } = published;

const printed = rowSampleOf({
  lengthInches: 68,
  startEnd: 'plant',
  farEnd: 'plant',
  tape: placesOf(tapeReadings.positionsInches),
});

describe('rowScores on the printed tape readings', () => {
  const { figures, penalties } = rowScores(printed);

  test('is 30,748 plants per acre from a plant to a plant', () => {
    expect(answerOf(figures.plantsPerAcre).plantsPerAcre).toBeCloseTo(tapeReadings.plantsPerAcre, 0);
  });

  test('is mean 6.8 in, SD 5.1 in and 12.5 bu/ac', () => {
    expect(answerOf(figures.spacingInchesMean)).toBeCloseTo(6.8, 9);
    expect(Math.abs(answerOf(figures.spacingInchesSd) - 5.1)).toBeLessThan(tapeReadings.tolerance);
    const loss = answerOf(penalties['carlson-doerge-clay']).lossLow;
    expect(Math.abs(loss - 12.5)).toBeLessThan(tapeReadings.tolerance);
  });

  test('leaves timing out of the score and says so', () => {
    expect(answerOf(figures.score).leftOut).toEqual(['timing']);
    expect(reasonOf(figures.daysTo50)).toBe('no-counts');
    expect(reasonOf(figures.lateShare)).toBe('late-plants-not-recorded');
  });
});

describe('rowScores on counts and a tape sheet', () => {
  // 8 plants a foot apart; the third and the seventh came up between days 18 and 20, the rest by day 10.
  const tape: TapePlace[] = [6, 12, 18, 24, 30, 36, 42, 48].map((positionInches, index) => ({
    positionInches,
    kind: 'plant',
    firstSeen: index === 2 || index === 6 ? { afterDays: 18, byDays: 20 } : { afterDays: 9, byDays: 10 },
  }));
  const counted = rowSampleOf({
    lengthInches: 54,
    tape,
    counts: [
      { days: 20, plantsUp: 8, plantsDoubtful: 0 },
      { days: 9, plantsUp: 0, plantsDoubtful: 0 },
      { days: 10, plantsUp: 6, plantsDoubtful: 0 },
      { days: 18, plantsUp: 6, plantsDoubtful: 0 },
      { days: 21, plantsUp: 8, plantsDoubtful: 0 },
      { days: 22, plantsUp: 8, plantsDoubtful: 2 },
    ],
  });

  test('sorts counts by day, and the last decides the stand with doubtful plants at one half', () => {
    expect(answerOf(rowScores(counted).figures.plantsPerAcre).plantsHeld).toBe(7);
  });

  test('reads late plants from the tape sheet and the same share from the counts', () => {
    const late = answerOf(rowScores(counted).figures.lateShare);
    // First flush: 0.8 of 6 plants between days 9 and 10, day 9.133; the late two on day 19: 9.867 days behind.
    expect(late).toMatchObject({ share: 0.25, latePlants: 2, source: 'tape-sheet', bound: 'exact' });
    expect(answerOf(late.lateDelayDaysMean)).toBeCloseTo(19 - (9 + 0.8 / 6), 9);
    expect(answerOf(rowScores(counted).figures.lateShareFromCounts).share).toBeCloseTo(0.25, 9);
  });

  test('reads their pattern and the study column, interpolated just below ten days', () => {
    expect(answerOf(rowScores(counted).figures.latePattern).pattern).toBe('alternating');
    const penalty = answerOf(rowScores(counted).penalties['nafziger-1991']);
    expect(penalty).toMatchObject({ basis: 'interpolated', column: 'late plants alternating' });
    expect(penalty.lossLow).toBeCloseTo((6.8 * (19 - (9 + 0.8 / 6))) / 10, 9);
  });

  test('refuses the studies whose share it passes, and those that need leaf stages', () => {
    const { penalties } = rowScores(counted);
    expect(reasonOf(penalties['novak-ransom-2018-late'])).toBe('beyond-study');
    expect(reasonOf(penalties['liu-2004-late'])).toBe('leaf-stage-not-known');
  });

  test('knows a late share only as "at least" while plants still come', () => {
    const stillComing = { ...counted, counts: counted.counts.filter((count) => count.days < 21) };
    expect(answerOf(rowScores(stillComing).figures.lateShare)).toMatchObject({
      source: 'tape-sheet',
      bound: 'at-least',
    });
  });

  test('has every part of the score', () => {
    expect(answerOf(rowScores(counted).figures.score).leftOut).toEqual([]);
  });

  test('leaves frozen input as it was', () => {
    const frozen = Object.freeze({
      ...counted,
      counts: Object.freeze(counted.counts.map((count) => Object.freeze(count))),
      tape: Object.freeze(tape.map((place) => Object.freeze(place))),
    });
    expect(() => rowScores(frozen)).not.toThrow();
  });
});

describe('rowScores elsewhere', () => {
  test('has penalties for corn only', () => {
    const { penalties, figures } = rowScores({ ...printed, crop: 'soybean' });
    for (const penalty of Object.values(penalties)) expect(reasonOf(penalty)).toBe('corn-only');
    expect(answerOf(figures.score).points).toBeGreaterThan(0);
  });

  test('keeps a missing place off the plants', () => {
    const tape: TapePlace[] = [
      ...placesOf([0, 6]),
      { positionInches: 12, kind: 'missing', firstSeen: null },
      ...placesOf([18]),
    ];
    const { figures } = rowScores(rowSampleOf({ tape, counts: countsFrom(9, [4]) }));
    expect(answerOf(figures.spacingInchesMean)).toBe(9);
    expect(answerOf(figures.tapeLessCounted)).toBe(-1);
  });

  test('has no interval when there are more plants than seeds, and a share above 100 %', () => {
    const { figures } = rowScores(rowSampleOf({ counts: countsFrom(20, [36]) }));
    expect(answerOf(figures.shareOfSeed).share).toBeCloseTo(36 / 34, 9);
    expect(reasonOf(figures.plantsPerAcreInterval)).toBe('more-plants-than-seeds');
  });

  test('says which figures need the seeding rate and the intended stand', () => {
    const unknown = { seedsPerAcre: null, intendedPlantsPerAcre: null };
    const { figures } = rowScores({ ...printed, ...unknown });
    expect(reasonOf(figures.shareOfSeed)).toBe('seeds-not-known');
    expect(reasonOf(figures.placement)).toBe('seeds-not-known');
    expect(reasonOf(figures.scoreStand)).toBe('intended-stand-not-known');
  });

  test('answers insufficient throughout when nothing was measured', () => {
    const { figures, penalties } = rowScores(rowSampleOf());
    const answered = Object.entries({ ...figures, ...penalties }).filter(
      ([, outcome]) => outcome.kind === 'value',
    );
    expect(answered.map(([id]) => id)).toEqual(['theoreticalSpacingInches']);
  });

  test('refuses what cannot be', () => {
    expect(() => rowScores(rowSampleOf({ counts: countsFrom(-2, [4]) }))).toThrow(ImpossibleInput);
    expect(() => rowScores(rowSampleOf({ tape: placesOf([5, 3]) }))).toThrow(ImpossibleInput);
    expect(() => rowScores(rowSampleOf({ lengthInches: 0, counts: countsFrom(9, [4]) }))).toThrow(
      ImpossibleInput,
    );
  });
});
