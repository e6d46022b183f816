import { describe, expect, test } from 'vitest';
import { clearedBandPercent } from '../../../lib/agronomy/cleared-band';
import { cutRow } from '../../../lib/agronomy/cut-row';
import { hoopFactor } from '../../../lib/agronomy/hoop-factor';
import { hoopStand } from '../../../lib/agronomy/hoop-stand';
import { exactShareInterval } from '../../../lib/agronomy/inference/exact-share-interval';
import { moreRowSamples } from '../../../lib/agronomy/inference/more-row-samples';
import { residueCleared } from '../../../lib/agronomy/inference/residue-cleared';
import { residueCover } from '../../../lib/agronomy/inference/residue-cover';
import { rowSamplesNeeded } from '../../../lib/agronomy/inference/row-samples-needed';
import { standDispersion } from '../../../lib/agronomy/inference/stand-dispersion';
import { standInterval, standStrips } from '../../../lib/agronomy/inference/stand-interval';
import { standPoisson } from '../../../lib/agronomy/inference/stand-poisson';
import { register } from '../../../lib/agronomy/register';
import { inferenceRegister } from '../../../lib/agronomy/register-inference';
import type { WorkedExample } from '../../../lib/agronomy/register/register-entry';
import { standEstimatorEntries } from '../../../lib/agronomy/register/stand-estimator-entries';
import { rowLengthFeet, rowLengthMeters } from '../../../lib/agronomy/row-length';
import { rowSamplesAlike } from '../../../lib/agronomy/row-samples-alike';
import { plantsPerAcre, rowAreaAcres } from '../../../lib/agronomy/stand';
import { standByDoubtful } from '../../../lib/agronomy/stand-by-doubtful';
import { tillageClass } from '../../../lib/agronomy/tillage-class';
import { transectLengthFeet } from '../../../lib/agronomy/transect-length';
import { wheelStand } from '../../../lib/agronomy/wheel-stand';
import { answerOf } from '../agronomy/answer-of';

type Inputs = WorkedExample['inputs'];
const one = (inputs: Inputs, name: string) => inputs[name] as number;
const many = (inputs: Inputs, name: string) => inputs[name] as readonly number[];

const marks = { startEnd: 'mark', farEnd: 'mark' } as const;
const placesOf = (inputs: Inputs) =>
  many(inputs, 'plants').map((plantsHeld) => ({ plantsHeld, areaAcres: 0.001 }));
const inStrips = (inputs: Inputs) =>
  many(inputs, 'figures').map((figure, index) => ({
    figure,
    plantsHeld: figure,
    areaAcres: 1,
    stripId: String(Math.floor(index / one(inputs, 'rowSamplesPerStrip'))),
  }));
const studentOf = (estimate: ReturnType<typeof standInterval>) =>
  answerOf(answerOf(estimate).interval).student?.standardErrorPlantsPerAcre as number;
const coverOf = (inputs: Inputs) =>
  answerOf(
    residueCover(
      many(inputs, 'marksRead').map((marksRead, index) => ({
        marksRead,
        marksCovered: many(inputs, 'marksCovered')[index] as number,
      })),
      'field',
    ),
  );

/** How each worked example is figured again by the code it explains. */
const again: Record<string, (inputs: Inputs) => Record<string, number>> = {
  'row-length': (inputs) => ({
    feet: rowLengthFeet(one(inputs, 'rowSpacingInches')),
    meters: rowLengthMeters(one(inputs, 'rowSpacingMeters')),
  }),
  'cut-row': (inputs) => {
    const pieces = many(inputs, 'plants').map((plantsUp, index) => ({
      plantsUp,
      plantsDoubtful: 0,
      lengthInches: many(inputs, 'lengthsInches')[index] as number,
      ...marks,
    }));
    const row = answerOf(cutRow(pieces));
    const rowSpacingInches = one(inputs, 'rowSpacingInches');
    return { plantsHeld: row.plantsHeld, plantsPerAcre: plantsPerAcre({ ...row, rowSpacingInches }) };
  },
  'hoop-factor': (inputs) => ({ plantsPerAcre: hoopFactor(one(inputs, 'diameterInches')) }),
  'hoop-stand': (inputs) => {
    const stand = answerOf(hoopStand(many(inputs, 'plants'), one(inputs, 'diameterInches')));
    return { plantsPerSquareFoot: stand.plantsPerSquareFoot };
  },
  'wheel-stand': (inputs) => {
    const stand = answerOf(
      wheelStand({
        plantsPassed: one(inputs, 'plantsPassed'),
        distanceInches: one(inputs, 'distanceInches'),
        rowSpacingInches: one(inputs, 'rowSpacingInches'),
        startEnd: 'plant',
        farEnd: 'plant',
      }),
    );
    return { plantsHeld: stand.plantsHeld, plantsPerAcre: stand.plantsPerAcre };
  },
  'stand-by-doubtful': (inputs) => {
    const stand = standByDoubtful({
      plantsUp: one(inputs, 'plantsUp'),
      plantsDoubtful: one(inputs, 'plantsDoubtful'),
      lengthInches: one(inputs, 'lengthInches'),
      rowSpacingInches: one(inputs, 'rowSpacingInches'),
      ...marks,
    });
    return {
      none: stand.plantsPerAcreNoneLive,
      half: stand.plantsPerAcreHalfLive,
      all: stand.plantsPerAcreAllLive,
    };
  },
  'stand-ratio-interval': (inputs) => {
    const units = many(inputs, 'plants').map((plantsHeld, index) => ({
      plantsHeld,
      areaAcres: rowAreaAcres(
        (many(inputs, 'lengthsFeet')[index] as number) * 12,
        one(inputs, 'rowSpacingInches'),
      ),
    }));
    const estimate = standInterval(units, 'row-samples');
    const interval = answerOf(answerOf(estimate).interval);
    return {
      plantsPerAcre: answerOf(estimate).plantsPerAcre,
      lower: interval.plantsPerAcreLower,
      upper: interval.plantsPerAcreUpper,
      standardError: studentOf(estimate),
    };
  },
  'stand-strips-interval': (inputs) => {
    const estimate = standInterval(standStrips(inStrips(inputs)), 'strips');
    return {
      mean: answerOf(estimate).plantsPerAcre,
      standardError: studentOf(estimate),
      standardErrorPassingOver: studentOf(standInterval(inStrips(inputs), 'row-samples')),
    };
  },
  'row-samples-alike': (inputs) => {
    const alike = answerOf(rowSamplesAlike(inStrips(inputs)));
    const { varianceStrips, varianceWithin } = alike;
    return { likeness: answerOf(alike.likeness), varianceStrips, varianceWithin };
  },
  'stand-counting-poisson': (inputs) => {
    const interval = standPoisson({
      plantsHeld: one(inputs, 'plants'),
      areaAcres: one(inputs, 'areaAcres'),
    });
    return { lower: interval.plantsPerAcreLower, upper: interval.plantsPerAcreUpper };
  },
  'share-exact-interval': (inputs) => {
    const { shareLower, shareUpper } = exactShareInterval(one(inputs, 'hits'), one(inputs, 'trials'));
    return { shareLower, shareUpper };
  },
  'stand-dispersion': (inputs) => {
    const { index, test: tested } = answerOf(standDispersion(placesOf(inputs)));
    const { chiSquare, pEven, pPatchy } = answerOf(tested);
    return { index, chiSquare, pEven, pPatchy };
  },
  'row-samples-needed': (inputs) => ({
    rowSamples: rowSamplesNeeded(one(inputs, 'cv'), one(inputs, 'withinShare')),
  }),
  'more-row-samples': (inputs) => {
    const { needed, more } = answerOf(moreRowSamples(placesOf(inputs), one(inputs, 'withinShare')));
    return { needed, more };
  },
  'residue-cover': (inputs) => ({ coverPercent: coverOf(inputs).coverPercent }),
  'residue-cover-places': (inputs) => {
    const { coverPercent, counting, overPlaces } = coverOf(inputs);
    return {
      coverPercent,
      lower: answerOf(overPlaces).coverPercentLower,
      upper: answerOf(overPlaces).coverPercentUpper,
      countingLower: counting.coverPercentLower,
      countingUpper: counting.coverPercentUpper,
    };
  },
  'residue-cleared': (inputs) => {
    const marksRead = one(inputs, 'marksRead');
    const pairs = many(inputs, 'field').map((marksCovered, index) => ({
      field: { marksRead, marksCovered },
      inRow: { marksRead, marksCovered: many(inputs, 'inRow')[index] as number },
    }));
    const { points, interval } = answerOf(residueCleared(pairs));
    return { points, lower: answerOf(interval).pointsLower, upper: answerOf(interval).pointsUpper };
  },
  'tillage-class': (inputs) => {
    const cover = {
      coverPercent: one(inputs, 'coverPercent'),
      coverPercentLower: one(inputs, 'coverPercentLower'),
      coverPercentUpper: one(inputs, 'coverPercentUpper'),
    };
    const classes = answerOf(tillageClass(cover, 'field'));
    return {
      isReduced: classes.tillageClass === 'reduced' ? 1 : 0,
      classesWithin: classes.within.length,
    };
  },
  'transect-length': (inputs) => ({
    feet: transectLengthFeet(one(inputs, 'stripWidthFeet'), one(inputs, 'angleDegrees')),
  }),
  'cleared-band': (inputs) => ({
    percent: clearedBandPercent(one(inputs, 'bandInches'), one(inputs, 'rowSpacingInches')),
  }),
};

describe('the register of stand counts and residue', () => {
  test('figures every entry again and has no other, under ids no other register uses', () => {
    const ids = standEstimatorEntries.map((entry) => entry.id);
    expect([...ids].sort()).toEqual(Object.keys(again).sort());
    expect(new Set(ids).size).toBe(ids.length);
    const others = inferenceRegister.filter((entry) => !standEstimatorEntries.includes(entry));
    expect(others.filter((entry) => ids.includes(entry.id))).toEqual([]);
    expect(
      ids.filter(
        (id) => id in register && !standEstimatorEntries.includes(register[id as keyof typeof register]),
      ),
    ).toEqual([]);
  });

  test.each(standEstimatorEntries.map((entry) => [entry.id, entry] as const))(
    'says for %s where it comes from and what it does not tell',
    (_, { version, name, sentence, equation, source, domain, limits, workedExample }) => {
      for (const words of [version, name, sentence, equation, source, domain, limits, workedExample.source]) {
        expect(words.trim()).not.toBe('');
        expect(words).not.toContain('!');
      }
    },
  );

  test.each(standEstimatorEntries.map((entry) => [entry.id, entry.workedExample] as const))(
    'figures the worked example of %s again',
    (id, { inputs, expected, tolerance }) => {
      const figured = again[id]?.(inputs) ?? {};
      expect(Object.keys(figured).sort()).toEqual(Object.keys(expected).sort());
      for (const [name, number] of Object.entries(expected)) {
        expect(Math.abs((figured[name] as number) - number), name).toBeLessThanOrEqual(tolerance);
      }
    },
  );
});
