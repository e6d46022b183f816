import { describe, expect, it } from 'vitest';
import { comparisonDescription } from '@/lib/agronomy/comparison-description';
import { degreeDaysCelsius, degreeDaysFahrenheit } from '@/lib/agronomy/degree-days';
import { doublesAndGaps } from '@/lib/agronomy/doubles-and-gaps';
import { emergenceCurve } from '@/lib/agronomy/emergence-curve';
import { emergencePercentile } from '@/lib/agronomy/emergence-percentile';
import { interpolate } from '@/lib/agronomy/interpolate';
import { isotonicFit } from '@/lib/agronomy/isotonic-fit';
import { kachmanSmith } from '@/lib/agronomy/kachman-smith';
import { requiredLateLimits } from '@/lib/agronomy/late-limits';
import { mergedVisits } from '@/lib/agronomy/merged-visits';
import { missingPlantsSdInches } from '@/lib/agronomy/missing-plants-sd';
import { ImpossibleInput } from '@/lib/agronomy/outcome';
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
import { plantDelays } from '@/lib/agronomy/plant-delays';
import { plantsHeld } from '@/lib/agronomy/plants-held';
import { requiredNumber } from '@/lib/agronomy/required-number';
import { rowLengthFeet, rowLengthMeters } from '@/lib/agronomy/row-length';
import { spacingPoints, standPoints, timingPoints } from '@/lib/agronomy/score';
import { shareOfSeed, wilsonInterval } from '@/lib/agronomy/share-of-seed';
import { spacingInchesMean, spacingsInches, spacingVariation } from '@/lib/agronomy/spacing';
import { plantsPerAcre, plantsPerHectare, rowAreaAcres } from '@/lib/agronomy/stand';
import { theoreticalSpacingInches } from '@/lib/agronomy/theoretical-spacing';
import { usualFinalStandPerAcre } from '@/lib/agronomy/usual-final-stand';
import { answerOf } from './answer-of';

const curve = answerOf(emergenceCurve([{ days: 1, plantsUp: 0 }, { days: 2, plantsUp: 4 }, { days: 3, plantsUp: 8 }]));
const held = { plantsUp: 10, plantsDoubtful: 2, startEnd: 'mark', farEnd: 'mark' } as const;
const limits = { slowDays: 2, lateDays: 7, veryLateDays: 14 };
const late = { lateShare: 0.1, delayDays: 5 };
const nothing = { kind: 'insufficient', reason: 'none', needed: '', had: '' } as const;

/** One number of each function: how it is called with it, and the limits it may not pass. */
type Case = [name: string, call: (number: number) => unknown, limits: { atLeast?: number; above?: number; atMost?: number }];

const cases: Case[] = [
  ['row length of a spacing in inches', (x) => rowLengthFeet(x), { above: 0 }],
  ['row length of a spacing in meters', (x) => rowLengthMeters(x), { above: 0 }],
  ['area of a length', (x) => rowAreaAcres(x, 30), { above: 0 }],
  ['area of a row spacing', (x) => rowAreaAcres(200, x), { above: 0 }],
  ['area of rows', (x) => rowAreaAcres(200, 30, x), { above: 0 }],
  ['plants per acre of plants', (x) => plantsPerAcre({ plantsHeld: x, lengthInches: 200, rowSpacingInches: 30 }), { atLeast: 0 }],
  ['plants per hectare', (x) => plantsPerHectare(x), { atLeast: 0 }],
  ['plants held of plants', (x) => plantsHeld({ ...held, plantsUp: x, plantsDoubtful: 0 }), { atLeast: 0 }],
  ['plants held of doubtful plants', (x) => plantsHeld({ ...held, plantsDoubtful: x }), { atLeast: 0, atMost: 10 }],
  ['plants held of rows', (x) => plantsHeld({ ...held, rowsCounted: x }), { above: 0 }],
  ['share of seed of plants', (x) => shareOfSeed(x, 34), { atLeast: 0 }],
  ['share of seed of seeds', (x) => shareOfSeed(0, x), { above: 0 }],
  ['interval of a share of hits', (x) => wilsonInterval(x, 50), { atLeast: 0 }],
  ['interval of a share of trials', (x) => wilsonInterval(0, x), { above: 0 }],
  ['theoretical spacing of seeds', (x) => theoreticalSpacingInches(x, 30), { above: 0 }],
  ['theoretical spacing of a row spacing', (x) => theoreticalSpacingInches(34_000, x), { above: 0 }],
  ['SD that missing plants make of a spacing', (x) => missingPlantsSdInches(x, 0.9), { above: 0 }],
  ['SD that missing plants make of a share', (x) => missingPlantsSdInches(6, x), { atLeast: 0 }],
  ['usual final stand of seeds', (x) => usualFinalStandPerAcre(x, 0.95), { above: 0 }],
  ['usual final stand of a germination', (x) => usualFinalStandPerAcre(34_000, x), { above: 0, atMost: 1 }],
  ['spacings of a first place', (x) => spacingsInches([x]), { atLeast: 0 }],
  ['spacings of a next place', (x) => spacingsInches([4, x]), { atLeast: 4 }],
  ['spacing variation of a spacing', (x) => spacingVariation([x, 5]), { atLeast: 0 }],
  ['mean spacing of a spacing', (x) => spacingInchesMean([x, 5]), { atLeast: 0 }],
  ['doubles and gaps of a spacing', (x) => doublesAndGaps([x, 5]), { atLeast: 0 }],
  ['placement of a spacing', (x) => kachmanSmith([{ spacingsInches: [x], theoreticalSpacingInches: 6 }]), { atLeast: 0 }],
  ['placement of a theoretical spacing', (x) => kachmanSmith([{ spacingsInches: [5], theoreticalSpacingInches: x }]), { above: 0 }],
  ['visits of a day', (x) => mergedVisits([{ days: x, plantsUp: 1 }]), { atLeast: 0 }],
  ['visits of a next day', (x) => mergedVisits([{ days: 3, plantsUp: 1 }, { days: x, plantsUp: 1 }]), { atLeast: 3 }],
  ['visits of plants', (x) => mergedVisits([{ days: 3, plantsUp: x }]), { atLeast: 0 }],
  ['percentile of a share', (x) => emergencePercentile(curve, x), { above: 0, atMost: 1 }],
  ['isotonic fit of a reading', (x) => isotonicFit([x]), {}],
  ['isotonic fit of a weight', (x) => isotonicFit([1], [x]), { above: 0 }],
  ['line read at a place', (x) => interpolate([{ at: 0, result: 0 }, { at: 1, result: 1 }], x), {}],
  ['limit of slow', (x) => requiredLateLimits({ ...limits, slowDays: x }), { atLeast: 0, atMost: 7 }],
  ['limit of late', (x) => requiredLateLimits({ ...limits, lateDays: x }), { atLeast: 2, atMost: 14 }],
  ['limit of very late', (x) => requiredLateLimits({ ...limits, veryLateDays: x }), { atLeast: 7 }],
  ['delay of the visit that missed a plant', (x) => plantDelays([{ firstSeen: { afterDays: x, byDays: 9 }, markedLate: false }], nothing, limits), { atLeast: 0, atMost: 8.99 }],
  ['delay of the visit that found a plant', (x) => plantDelays([{ firstSeen: { afterDays: null, byDays: x }, markedLate: false }], nothing, limits), { atLeast: 0 }],
  ['points of a stand', (x) => standPoints(x, 30_000), { atLeast: 0 }],
  ['points of an intended stand', (x) => standPoints(30_000, x), { above: 0 }],
  ['points of a spread', (x) => timingPoints({ amount: x, unit: 'days', bound: 'exact' }), { atLeast: 0 }],
  ['points of a spacing SD', (x) => spacingPoints(x), { atLeast: 0 }],
  ['degree days of a high in °F', (x) => degreeDaysFahrenheit(x, 40), { atLeast: 40 }],
  ['degree days of a low in °F', (x) => degreeDaysFahrenheit(40, x), { atMost: 40 }],
  ['degree days of a high in °C', (x) => degreeDaysCelsius(x, 4), { atLeast: 4 }],
  ['SSMG-37 of an SD', (x) => carlsonDoergeClay(x), { atLeast: 0 }],
  ['Nielsen as quoted of an SD', (x) => nielsenQuoted(x), { atLeast: 0 }],
  ['Nielsen 2004 of an SD', (x) => nielsen2004(x), { atLeast: 0 }],
  ['Lauer and Rankin of an SD', (x) => lauerRankin2004(x), { atLeast: 0 }],
  ['Liu spacing of an SD', (x) => liu2004Spacing(x), { atLeast: 0 }],
  ['Liu late of a share', (x) => liu2004Late(x, 2), { atLeast: 0, atMost: 1 }],
  ['Liu late of leaf stages', (x) => liu2004Late(0.1, x), { atLeast: 0 }],
  ['Ford and Hicks of a share', (x) => fordHicks1992(x, 1), { atLeast: 0, atMost: 1 }],
  ['Ford and Hicks of leaves', (x) => fordHicks1992(0.5, x), { atLeast: 0 }],
  ['Nafziger of a share', (x) => nafziger1991({ ...late, lateShare: x }, 'alternating'), { atLeast: 0, atMost: 1 }],
  ['Nafziger of a delay', (x) => nafziger1991({ ...late, delayDays: x }, 'alternating'), { atLeast: 0 }],
  ['Lawles of a share', (x) => lawles2012({ ...late, lateShare: x }, 'irrigated'), { atLeast: 0, atMost: 1 }],
  ['Ontario of a share', (x) => ontarioLate({ ...late, lateShare: x }), { atLeast: 0, atMost: 1 }],
  ['Ontario of a delay', (x) => ontarioLate({ ...late, delayDays: x }), { atLeast: 0 }],
  ['Novak and Ransom of a share', (x) => novakRansom2018Late({ ...late, lateShare: x }), { atLeast: 0, atMost: 1 }],
  ['Novak and Ransom of a delay', (x) => novakRansom2018Late({ ...late, delayDays: x }), { atLeast: 0 }],
  ['Novak and Ransom of skips', (x) => novakRansom2018Skips(x), { atLeast: 0, atMost: 1 }],
  ['description of a strip', (x) => comparisonDescription([{ setting: 'a', figure: x }]), {}],
];

describe('what cannot be', () => {
  it.each(cases)('is refused, up to its very limit: %s', (_, call, { atLeast, above, atMost }) => {
    for (const never of [NaN, Infinity, -Infinity, '5' as unknown as number]) expect(() => call(never)).toThrow(ImpossibleInput);
    if (atLeast !== undefined) {
      expect(() => call(atLeast - 1e-6)).toThrow(ImpossibleInput);
      expect(() => call(atLeast)).not.toThrow();
    }
    if (above !== undefined) {
      expect(() => call(above)).toThrow(ImpossibleInput);
      expect(() => call(above + 1e-3)).not.toThrow();
    }
    if (atMost !== undefined) {
      expect(() => call(atMost + 0.02)).toThrow(ImpossibleInput);
      expect(() => call(atMost)).not.toThrow();
    }
  });

  it('is named: the field, and what it may be', () => {
    const refused = (call: () => unknown) => {
      try {
        call();
      } catch (error) {
        return error instanceof ImpossibleInput ? [error.field, error.message] : ['another error', String(error)];
      }
      return ['nothing'];
    };
    expect(refused(() => requiredNumber(-1, 'plants', { atLeast: 0 }))).toEqual(['plants', 'plants is -1; it cannot be below 0.']);
    expect(refused(() => requiredNumber(0, 'plants', { above: 0 }))).toEqual(['plants', 'plants is 0; it must be above 0.']);
    expect(refused(() => requiredNumber(2, 'share', { atMost: 1 }))).toEqual(['share', 'share is 2; it cannot be above 1.']);
    expect(refused(() => requiredNumber(NaN, 'share'))).toEqual(['share', 'share is not a finite number.']);
  });
});
