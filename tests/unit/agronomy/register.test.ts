import { describe, expect, test } from 'vitest';
import { doublesAndGaps } from '@/lib/agronomy/doubles-and-gaps';
import { emergenceCurve } from '@/lib/agronomy/emergence-curve';
import { emergencePercentile } from '@/lib/agronomy/emergence-percentile';
import { emergenceSpread } from '@/lib/agronomy/emergence-spread';
import type { FigureId } from '@/lib/agronomy/figures';
import { standInterval } from '@/lib/agronomy/inference/stand-interval';
import { kachmanSmith } from '@/lib/agronomy/kachman-smith';
import { defaultLateLimits } from '@/lib/agronomy/late-limits';
import { latePattern } from '@/lib/agronomy/late-pattern';
import { lateShareFromCounts, lateShareFromTape } from '@/lib/agronomy/late-share';
import { missingPlantsSdInches } from '@/lib/agronomy/missing-plants-sd';
import { value } from '@/lib/agronomy/outcome';
import { carlsonDoergeClay } from '@/lib/agronomy/penalty/carlson-doerge-clay';
import { fordHicks1992 } from '@/lib/agronomy/penalty/ford-hicks-1992';
import { lauerRankin2004 } from '@/lib/agronomy/penalty/lauer-rankin-2004';
import { lawles2012 } from '@/lib/agronomy/penalty/lawles-2012';
import { liu2004Late } from '@/lib/agronomy/penalty/liu-2004-late';
import { liu2004Spacing } from '@/lib/agronomy/penalty/liu-2004-spacing';
import { nafziger1991 } from '@/lib/agronomy/penalty/nafziger-1991';
import { nielsen2004 } from '@/lib/agronomy/penalty/nielsen-2004';
import { nielsenQuoted } from '@/lib/agronomy/penalty/nielsen-quoted';
import { novakRansom2018Late, novakRansom2018Skips } from '@/lib/agronomy/penalty/novak-ransom-2018';
import { ontarioLate } from '@/lib/agronomy/penalty/ontario-late';
import type { Penalty } from '@/lib/agronomy/penalty/penalty';
import { plantDelays } from '@/lib/agronomy/plant-delays';
import { poolScores } from '@/lib/agronomy/pool-scores';
import { register } from '@/lib/agronomy/register';
import type { WorkedExample } from '@/lib/agronomy/register/register-entry';
import { rowScores } from '@/lib/agronomy/row-scores';
import { spacingPoints, standPoints, timingPoints, wholeScore } from '@/lib/agronomy/score';
import { shareOfSeed } from '@/lib/agronomy/share-of-seed';
import { spacingInchesMean, spacingsInches, spacingVariation } from '@/lib/agronomy/spacing';
import { rowAreaAcres } from '@/lib/agronomy/stand';
import { theoreticalSpacingInches } from '@/lib/agronomy/theoretical-spacing';
import { answerOf } from './answer-of';
import { countsFrom, placesOf, rowSampleOf } from './row-sample-of';

type Inputs = WorkedExample['inputs'];
type Figured = Record<string, number>;

const one = (inputs: Inputs, name: string) => inputs[name] as number;
const many = (inputs: Inputs, name: string) => inputs[name] as readonly number[];

function curveOf(inputs: Inputs) {
  const plants = many(inputs, 'plantsUp');
  return answerOf(
    emergenceCurve(many(inputs, 'days').map((days, index) => ({ days, plantsUp: plants[index] as number }))),
  );
}

const daysTo = (share: number) => (inputs: Inputs) => ({
  days: answerOf(emergencePercentile(curveOf(inputs), share)).days,
});

const spacingsOf = (inputs: Inputs) => spacingsInches(many(inputs, 'positions'));
const variationOf = (inputs: Inputs) => answerOf(spacingVariation(spacingsOf(inputs)));
const placementOf = (inputs: Inputs) =>
  answerOf(
    kachmanSmith([
      {
        spacingsInches: spacingsOf(inputs),
        theoreticalSpacingInches: one(inputs, 'theoreticalSpacingInches'),
      },
    ]),
  );
const lossOf = ({ lossLow, lossHigh }: Penalty): Figured => ({ lossLow, lossHigh });
const lateOf = (inputs: Inputs) => ({
  lateShare: one(inputs, 'lateShare'),
  delayDays: one(inputs, 'delayDays'),
});
const part = (points: number) => value({ points, bound: 'exact' as const });

/** How each worked example is figured again, by the functions the screens use. */
const recomputed: Record<FigureId, (inputs: Inputs) => Figured> = {
  plantsPerAcre: (inputs) => {
    const sample = rowSampleOf({
      lengthInches: one(inputs, 'lengthInches'),
      rowSpacingInches: one(inputs, 'rowSpacingInches'),
      startEnd: 'plant',
      farEnd: 'plant',
      counts: countsFrom(20, [one(inputs, 'plantsUp')]),
    });
    return { plantsPerAcre: answerOf(rowScores(sample).figures.plantsPerAcre).plantsPerAcre };
  },
  plantsPerAcreInterval: (inputs) => {
    const areaAcres = rowAreaAcres(one(inputs, 'lengthInches'), one(inputs, 'rowSpacingInches'));
    const units = many(inputs, 'plants').map((plantsHeld) => ({ plantsHeld, areaAcres }));
    const interval = answerOf(answerOf(standInterval(units, 'row-samples')).interval);
    return {
      plantsPerAcreLower: interval.plantsPerAcreLower,
      plantsPerAcreUpper: interval.plantsPerAcreUpper,
    };
  },
  shareOfSeed: (inputs) => ({ share: shareOfSeed(one(inputs, 'plants'), one(inputs, 'seeds')).share }),
  shareOfSeedInterval: (inputs) => {
    const interval = answerOf(shareOfSeed(one(inputs, 'plants'), one(inputs, 'seeds')).interval);
    return { shareLower: interval.shareLower, shareUpper: interval.shareUpper };
  },
  tapeLessCounted: (inputs) => {
    const tape = placesOf(Array.from({ length: one(inputs, 'onTape') }, (_, index) => index * 6));
    const sample = rowSampleOf({ tape, counts: countsFrom(20, [one(inputs, 'counted')]) });
    return { plants: answerOf(rowScores(sample).figures.tapeLessCounted) };
  },
  emergenceCurve: (inputs) => {
    const curve = curveOf(inputs);
    return {
      thirdVisit: curve.points[2]?.plantsUp as number,
      plantsEmerged: curve.plantsEmerged,
      plantsLost: curve.plantsLost,
    };
  },
  daysTo10: daysTo(0.1),
  daysTo50: daysTo(0.5),
  daysTo90: daysTo(0.9),
  spreadDays: (inputs) => ({ days: answerOf(emergenceSpread(curveOf(inputs))).days }),
  lateShare: (inputs) => {
    const flush = one(inputs, 'firstFlushDays');
    const seen = (afterDays: number, byDays: number) => ({
      firstSeen: { afterDays, byDays },
      markedLate: false,
    });
    const plants = [
      seen(9, 10),
      seen(9, 10),
      seen(9, 10),
      seen(one(inputs, 'afterDays'), one(inputs, 'byDays')),
    ];
    const firstFlush = value({ days: flush, bound: 'exact' as const, afterDays: 9, byDays: 10 });
    const delays = plantDelays(plants, firstFlush, defaultLateLimits);
    const late = answerOf(lateShareFromTape([delays], 'exact', defaultLateLimits));
    return { delayDays: answerOf(late.lateDelayDaysMean), share: late.share };
  },
  lateShareFromCounts: (inputs) => {
    const late = answerOf(lateShareFromCounts(curveOf(inputs), defaultLateLimits));
    return { share: late.share, delayDays: answerOf(late.lateDelayDaysMean) };
  },
  latePattern: (inputs) => ({
    meanRunLength: answerOf(latePattern([many(inputs, 'late').map((late) => late === 1)])).meanRunLength,
  }),
  spacingInchesMean: (inputs) => ({ inches: answerOf(spacingInchesMean(spacingsOf(inputs))) }),
  spacingInchesSd: (inputs) => ({ inches: variationOf(inputs).spacingInchesSd }),
  spacingCv: (inputs) => ({ cv: answerOf(variationOf(inputs).spacingCv) }),
  theoreticalSpacingInches: (inputs) => ({
    inches: theoreticalSpacingInches(one(inputs, 'seedsPerAcre'), one(inputs, 'rowSpacingInches')),
  }),
  placement: (inputs) => {
    const { ofSpacings, ofPlaces } = placementOf(inputs);
    return {
      multiplesOfSpacings: ofSpacings.multiplesShare,
      missesOfSpacings: ofSpacings.missesShare,
      multiplesOfPlaces: ofPlaces.multiplesShare,
      missesOfPlaces: ofPlaces.missesShare,
    };
  },
  spacingInchesSdSingles: (inputs) => ({ precision: answerOf(placementOf(inputs).precision) }),
  spacingInchesSdFromMissing: (inputs) => ({
    inches: answerOf(missingPlantsSdInches(one(inputs, 'theoreticalSpacingInches'), one(inputs, 'share'))),
  }),
  doublesAndGaps: (inputs) => {
    const { doubles, gaps, gapInchesTotal } = answerOf(doublesAndGaps(spacingsOf(inputs)));
    return { doubles, gaps, gapInchesTotal };
  },
  score: (inputs) => ({
    points: answerOf(
      wholeScore({
        stand: part(one(inputs, 'stand')),
        timing: part(one(inputs, 'timing')),
        spacing: part(one(inputs, 'spacing')),
      }),
    ).points,
  }),
  scoreStand: (inputs) => ({
    points: standPoints(one(inputs, 'plantsPerAcre'), one(inputs, 'intendedPlantsPerAcre')).points,
  }),
  scoreTiming: (inputs) => ({
    points: timingPoints({ amount: one(inputs, 'days'), unit: 'days', bound: 'exact' }).points,
  }),
  scoreSpacing: (inputs) => ({ points: spacingPoints(one(inputs, 'inches')).points }),
  'nafziger-1991': (inputs) => lossOf(answerOf(nafziger1991(lateOf(inputs), 'alternating'))),
  'liu-2004-late': (inputs) =>
    lossOf(answerOf(liu2004Late(one(inputs, 'lateShare'), one(inputs, 'leafStagesBehind')))),
  'ontario-late': (inputs) => lossOf(answerOf(ontarioLate(lateOf(inputs)))),
  'ford-hicks-1992': (inputs) =>
    lossOf(answerOf(fordHicks1992(one(inputs, 'lateShare'), one(inputs, 'leavesBehind')))),
  'lawles-2012-irrigated': (inputs) => lossOf(answerOf(lawles2012(lateOf(inputs), 'irrigated'))),
  'lawles-2012-rainfed': (inputs) => lossOf(answerOf(lawles2012(lateOf(inputs), 'rainfed'))),
  'novak-ransom-2018-late': (inputs) => lossOf(answerOf(novakRansom2018Late(lateOf(inputs)))),
  'novak-ransom-2018-skips': (inputs) => lossOf(answerOf(novakRansom2018Skips(one(inputs, 'skipsShare')))),
  'carlson-doerge-clay': (inputs) => lossOf(carlsonDoergeClay(variationOf(inputs).spacingInchesSd)),
  'nielsen-quoted': (inputs) => lossOf(nielsenQuoted(one(inputs, 'inches'))),
  'nielsen-2004': (inputs) => lossOf(nielsen2004(one(inputs, 'inches'))),
  'lauer-rankin-2004': (inputs) => lossOf(lauerRankin2004(one(inputs, 'inches'))),
  'liu-2004-spacing': (inputs) => lossOf(liu2004Spacing(one(inputs, 'inches'))),
};

describe('the register', () => {
  test('has an entry for every figure and penalty of row samples and groups, and no other', () => {
    const row = rowScores(rowSampleOf());
    const pool = poolScores([rowSampleOf()]);
    const ids = [row, pool].map(({ figures, penalties }) => Object.keys({ ...figures, ...penalties }).sort());
    expect(Object.keys(register).sort()).toEqual(ids[0]);
    expect(Object.keys(register).sort()).toEqual(ids[1]);
  });

  test.each(Object.entries(register))(
    'says for %s where it comes from and what it does not tell',
    (id, entry) => {
      expect(entry.id).toBe(id);
      const { version, name, sentence, equation, source, domain, limits, workedExample } = entry;
      for (const words of [version, name, sentence, equation, source, domain, limits, workedExample.source]) {
        expect(words.trim()).not.toBe('');
        expect(words).not.toContain('!');
      }
    },
  );

  test.each(Object.entries(register))('figures the worked example of %s again', (id, { workedExample }) => {
    const figured = recomputed[id as FigureId](workedExample.inputs);
    expect(Object.keys(figured).sort()).toEqual(Object.keys(workedExample.expected).sort());
    for (const [name, expected] of Object.entries(workedExample.expected)) {
      expect(Math.abs((figured[name] as number) - expected)).toBeLessThanOrEqual(workedExample.tolerance);
    }
  });
});
