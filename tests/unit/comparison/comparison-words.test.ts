import { describe, expect, it } from 'vitest';
import { comparisonWords } from '@/components/comparison/comparison-words';
import { noteSentences } from '@/components/comparison/note-sentences';
import { poolScores } from '@/lib/agronomy/pool-scores';
import type { ComparedSetting, TrialComparison } from '@/lib/schemas/comparison';

function setting(settingId: string, phrase: string, seriesIndex: number): ComparedSetting {
  const { figures, penalties, ...pooled } = poolScores([]);
  return {
    settingId, name: phrase, phrase, seriesIndex, isReference: seriesIndex === 0, strips: 4, rowSamples: 12, typicalRow: null, coverReadings: 0,
    curve: { kind: 'insufficient', reason: 'no-counts', needed: '1 count', had: 'no count' },
    scored: { figures, penalties, pooled },
  };
}

/** Light down came up 1.5 days tighter than raised, 0.4 to 2.6 days, on 9 degrees of freedom. */
const told: TrialComparison = {
  kind: 'trial',
  planting: {
    plantingId: 'p', farmName: 'Farm', fieldName: 'Field', fieldAcres: null, crop: 'corn', plantedOn: '2026-05-07', plantedAt: null,
    previousCrop: null, tillage: null, rowSpacingInches: 30, seedsPerAcre: 34_000, intendedPlantsPerAcre: 32_000,
    lateLimits: { slowDays: 2, lateDays: 7, veryLateDays: 14 },
  },
  trial: {
    trialId: 't', mainFigure: 'spread-days', rule: 'tukey', referenceSettingId: 'raised', blocks: 4, isLocked: true, lockedAt: '2026-03-12 21:00:00+00',
  },
  settings: [setting('raised', 'the cleaners raised', 0), setting('light', 'the cleaners floating and light down', 1)],
  figures: [
    { figure: 'spread-days', strips: [], means: [], differences: [], analysis: { kind: 'insufficient', reason: '', needed: '', had: '' } },
  ],
  finding: {
    kind: 'difference', figure: 'spread-days', reference: 'raised', rule: 'tukey', blocks: 4, errorDegreesOfFreedom: 9, isLittle: false,
    leftOut: [], cannotTell: [], alsoSeen: [], setting: 'light', comparedWith: 'raised', difference: -1.5, lower: -2.6, upper: -0.4, better: true,
  },
  randomization: { kind: 'value', value: { method: 'exact', arrangements: 331_776, asExtreme: 1176, p: 1176 / 331_776, smallestAttainableP: 0.0001 } },
  notes: {
    stripsTotal: 16, stripsCompared: 16, stillCounting: [], notCounted: [], visitsLeast: 12, visitsMost: 12, lastVisitLeast: '2026-05-26',
    lastVisitMost: '2026-05-26', plantedOtherwise: [], asPlannedOnly: 0, lost: [], rowSamplesNotCounted: [], rowSamplesImpossible: [],
    rowSamplesOutsideStrips: 0, blocksNotAsDealt: [],
  },
};

const headline = (changes: Partial<TrialComparison>) => comparisonWords({ ...told, ...changes }, 'us').headline;
const stillCounting = { ...told.notes, stillCounting: [2, 4] };

describe('what a trial says about its main figure', () => {
  it('claims the difference with its interval, the lock and the randomization test', () => {
    const { headline: said, sub } = comparisonWords(told, 'us');
    expect(said).toBe('With the cleaners floating and light down, the stand came up 1.5 days tighter than with the cleaners raised.');
    expect(sub).toEqual([
      'The 95 % interval is 0.4 to 2.6 days, from 4 blocks.',
      'The main figure is the emergence spread, locked before planting, on 12 March 2026.',
      'The exact randomization test beside it: p = 0.004 (1,176 of 331,776 layouts of chance differ as much).',
    ]);
  });

  it('says "so far" while plants may still come, of figures that move with them only', () => {
    expect(headline({ notes: stillCounting })).toMatch(/^So far, with the cleaners floating and light down, the stand/);
    const stand = { ...told.finding, figure: 'plants-per-acre', difference: 1500, lower: 400, upper: 2600 } as TrialComparison['finding'];
    const figures = [{ ...told.figures[0], figure: 'plants-per-acre' }] as TrialComparison['figures'];
    const changes = { notes: stillCounting, finding: stand, figures, trial: { ...told.trial, mainFigure: 'plants-per-acre' as const } };
    expect(headline(changes)).toMatch(/^With /);
  });

  it('says when the main figure was locked only after planting', () => {
    const late = { ...told.trial, lockedAt: '2026-05-20 12:00:00+00' };
    expect(comparisonWords({ ...told, trial: late }, 'us').sub[1]).toBe(
      'The main figure is the emergence spread, locked only on 20 May 2026, after planting.',
    );
  });

  it('claims nothing of a trial that was not locked, whatever its numbers', () => {
    const { headline: said, sub, more } = comparisonWords({ ...told, trial: { ...told.trial, isLocked: false, lockedAt: null } }, 'us');
    expect([said, ...sub, ...more].join(' ')).not.toMatch(/tighter|interval|p =/);
  });
});

describe('what is said beside the finding', () => {
  it('is silent where nothing is to be said', () => {
    expect(noteSentences(told, 'us')).toEqual([]);
  });

  it('names what was not counted, visited unequally, lost or run otherwise', () => {
    const notes: TrialComparison['notes'] = {
      ...told.notes, stripsCompared: 13, notCounted: [3], visitsLeast: 8, lastVisitLeast: '2026-05-24',
      plantedOtherwise: [{ number: 5, plannedId: 'raised', settingId: 'light', reason: null }],
      lost: [{ number: 7, reason: 'Washed out', rowSamples: 3 }], asPlannedOnly: 1, rowSamplesNotCounted: ['S3-1', 'S3-2'],
      rowSamplesImpossible: ['S9-1'], rowSamplesOutsideStrips: 2, blocksNotAsDealt: [2],
    };
    expect(noteSentences({ ...told, notes }, 'us')).toEqual([
      '1 strip not counted yet (3).',
      'Not in the comparison for want of the emergence spread: 1 counted strip.',
      'The strips were visited unequally: 8 to 12 rounds.',
      'The last visit of a strip was on 24 May at the earliest and 26 May at the latest.',
      'Strip 5 ran the cleaners floating and light down where the cleaners raised was planned; it counts as what it ran.',
      'Strip 7 was lost (Washed out); left out with it: 3 row samples.',
      'Nobody has said what was really run in 1 strip; the plan is taken.',
      '2 row samples of the strips not counted: S3-1, S3-2.',
      '1 row sample left out, the readings contradict each other: S9-1.',
      'Left out of the comparison, in no strip: 2 row samples.',
      'The randomization test leaves out block 2, which was not run as chance dealt it.',
    ]);
  });
});
