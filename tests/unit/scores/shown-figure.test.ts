import { describe, expect, it } from 'vitest';
import { earlinessScale } from '@/components/scores/earliness-scale';
import { figureInputs } from '@/components/scores/figure-inputs';
import type { FigureSubject } from '@/components/scores/figure-subject';
import { plainFigure } from '@/components/scores/plain-figure';
import { shownFigure } from '@/components/scores/shown-figure';
import type { FigureId } from '@/lib/agronomy/figures';
import { poolScores } from '@/lib/agronomy/pool-scores';
import { register } from '@/lib/agronomy/register';
import type { RowSample } from '@/lib/agronomy/row-sample';
import { figureNames } from '@/lib/texts/score-texts';
import { countsFrom, placesOf, rowSampleOf } from '../agronomy/row-sample-of';

function subjectOf(samples: readonly RowSample[]): FigureSubject {
  const { figures, penalties, ...pooled } = poolScores(samples);
  return {
    planting: {
      plantingId: 'p', farmName: 'Farm', fieldName: 'Field', fieldAcres: 62, crop: 'corn', plantedOn: '2026-05-07', plantedAt: null,
      previousCrop: null, tillage: null, rowSpacingInches: 30, seedsPerAcre: 34_000, intendedPlantsPerAcre: 32_000,
      lateLimits: { slowDays: 2, lateDays: 7, veryLateDays: 14 },
    },
    figures,
    penalties,
    pooled,
    row: null,
  };
}

/** Ten counts of Farooq et al. 2005: a tenth up on day 3.09, half on 5, nine tenths on 7. */
const tenCounts = countsFrom(1, [0, 2, 4, 15, 25, 38, 45, 50, 50, 50]);
const timed = subjectOf([rowSampleOf({ lengthInches: 418.176, counts: tenCounts })]);

describe('a figure as it is read', () => {
  it('carries its number and unit, and single plants only for one row sample', () => {
    expect(shownFigure('daysTo50', timed, 'us').text).toBe('day 5.0');
    expect(shownFigure('spreadDays', timed, 'us')).toMatchObject({ text: '3.9 days', bound: null });
    expect(shownFigure('plantsPerAcre', timed, 'us').text).toBe('25,000 plants per acre');
    const two = subjectOf([31, 28].map((plants, index) => rowSampleOf({ rowSampleId: String(index), lengthInches: 209, counts: countsFrom(9, [plants]) })));
    expect(plainFigure('plantsPerAcre', two, 'us')).toBe('29,500');
    expect(plainFigure('plantsPerAcre', subjectOf([rowSampleOf({ lengthInches: 209, counts: countsFrom(9, [31]) })]), 'us')).toBe('31,013');
  });

  it('says that a spread is at least so many days while counting goes on', () => {
    const counting = subjectOf([rowSampleOf({ counts: countsFrom(8, [0, 10, 20, 30]) })]);
    expect(shownFigure('spreadDays', counting, 'us')).toMatchObject({ bound: 'at least', detail: 'Counting has not ended.' });
    expect(shownFigure('spreadDays', counting, 'us').text).toMatch(/^at least /);
    expect(plainFigure('spreadDays', counting, 'us')).toMatch(/^at least \d/);
    expect(shownFigure('scoreTiming', counting, 'us').bound).toBe('at most');
  });

  it('says in words what is missing, and what it would need', () => {
    expect(shownFigure('spacingInchesSd', timed, 'us')).toMatchObject({ text: 'no tape sheet', sort: null, detail: 'Needs 1 tape sheet; has no tape sheet.' });
    expect(shownFigure('liu-2004-late', subjectOf([rowSampleOf({ crop: 'soybean', counts: tenCounts })]), 'us').text).toBe('corn only');
  });

  it('keeps bushels, and turns them into tonnes for a metric reader', () => {
    const spaced = subjectOf([
      rowSampleOf({ lengthInches: 68, startEnd: 'plant', farEnd: 'plant', tape: placesOf([0, 2, 17, 33, 38, 39, 44, 52, 55, 60, 68]) }),
    ]);
    // 12.5 bu/ac by the SSMG-37 guide; 12.46 / 15.93 = 0.78 t/ha.
    expect(shownFigure('carlson-doerge-clay', spaced, 'us').text).toBe('12.5 bu/ac');
    expect(shownFigure('carlson-doerge-clay', spaced, 'metric').text).toBe('0.78 t/ha');
    expect(shownFigure('spacingInchesMean', spaced, 'metric').text).toBe('17.3 cm');
  });

  it('has a name, words and inputs for every figure of the register', () => {
    for (const id of Object.keys(register) as FigureId[]) {
      expect(figureNames[id]).toBeTruthy();
      const { text } = shownFigure(id, timed, 'us');
      expect(text, id).not.toMatch(/NaN|undefined|null/);
      const facts = figureInputs(id, timed, 'metric');
      expect(facts.every((fact) => fact.text !== '' && !/NaN|undefined/.test(fact.text)), id).toBe(true);
      expect(new Set(facts.map((fact) => fact.name)).size, `${id} names a fact twice`).toBe(facts.length);
    }
  });
});

describe('the heights of plants on the tape', () => {
  const plant = (days: number | null, late = false) => ({ positionInches: 0, segment: 0, days, late, double: false, kind: 'plant' as const });

  it('reach from the first plant to the last that was not late', () => {
    const scale = earlinessScale([plant(9), plant(11), plant(19, true), plant(null)]);
    expect(scale).toMatchObject({ firstDays: 9, lastDays: 11 });
    expect([9, 10, 11, 19].map(scale.earliness)).toEqual([1, 0.5, 0, 0]);
  });

  it('are all the same where nobody saw a day, or all came at once', () => {
    expect(earlinessScale([plant(null)])).toMatchObject({ firstDays: null, lastDays: null });
    expect(earlinessScale([plant(9), plant(9)]).earliness(9)).toBe(1);
  });
});
