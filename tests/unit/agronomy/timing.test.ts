import { describe, expect, it } from 'vitest';
import { emergenceCurve, type EmergenceCurve } from '@/lib/agronomy/emergence-curve';
import { emergencePercentile } from '@/lib/agronomy/emergence-percentile';
import { emergenceSpread } from '@/lib/agronomy/emergence-spread';
import { expectedEmergenceHeat } from '@/lib/agronomy/expected-emergence-heat';
import { heatCurve } from '@/lib/agronomy/heat-curve';
import { heatSincePlanting, type WeatherDay } from '@/lib/agronomy/heat-since-planting';
import { lateClassBy } from '@/lib/agronomy/late-class-by';
import { meanEmergenceTime } from '@/lib/agronomy/mean-emergence-time';
import { ImpossibleInput, value } from '@/lib/agronomy/outcome';
import { rowToRowDays } from '@/lib/agronomy/row-to-row-days';
import { shareUpWithin } from '@/lib/agronomy/share-up-within';
import { synchrony } from '@/lib/agronomy/synchrony';
import { turnbull } from '@/lib/agronomy/turnbull';
import germination from '../../reference/emergence-measures.json';
import degreeDays from '../../reference/degree-days.json';
import madeInR from '../../reference/timing.json';
import { answerOf } from './answer-of';

const visitsOf = (days: readonly number[], plants: readonly number[]) => days.map((each, index) => ({ days: each, plantsUp: plants[index] ?? 0 }));
const curveOf = (days: readonly number[], plants: readonly number[]): EmergenceCurve => answerOf(emergenceCurve(visitsOf(days, plants)));
const tenDays = [1, 2, 3, 4, 5, 6, 7, 8, 9, 10];
const tenCounts = [0, 2, 4, 15, 25, 38, 45, 50, 50, 50];
const ten = curveOf(tenDays, tenCounts);

describe('mean emergence time', () => {
  it('is 5.42 days with variance 2.330204 for the ten counts, as a germination index package prints', () => {
    const mean = answerOf(meanEmergenceTime(ten));
    expect(mean.byCountDays).toBeCloseTo(5.42, 9);
    expect(answerOf(mean.varianceDaysSquared)).toBeCloseTo(2.330204, 6);
    // The same counts by the middle of each interval, by definition.
    expect(answerOf(mean.byMidIntervalDays)).toBeCloseTo(4.92, 9);
  });

  it('agrees with R where days were missed, and does not guess when the first plants came', () => {
    const mean = answerOf(meanEmergenceTime(curveOf([5, 6, 8, 9, 12], [3, 12, 23, 27, 29])));
    expect(mean.byCountDays).toBeCloseTo(7.48275862068965, 9);
    expect(answerOf(mean.varianceDaysSquared)).toBeCloseTo(3.25862068965517, 9);
    expect(mean.byMidIntervalDays).toMatchObject({ kind: 'insufficient', reason: 'no-visit-before-the-first-plants' });
  });

  it('of a single plant has no variance, and of none is insufficient', () => {
    const one = answerOf(meanEmergenceTime(curveOf([5, 6], [0, 1])));
    expect(one.byCountDays).toBe(6);
    expect(one.varianceDaysSquared).toMatchObject({ kind: 'insufficient', reason: 'too-few-plants' });
    expect(meanEmergenceTime({ ...ten, plantsEmerged: 0 })).toMatchObject({ reason: 'nothing-up' });
  });

  it('does not see a gap in the visits, which the interval sees', () => {
    // SURV-08 of the reference values: true mean 7.376 days; by count days 8.678.
    const gap = answerOf(meanEmergenceTime(curveOf([0, 4, 5, 6, 7, 10, 14], [0, 79, 999, 4077, 8960, 18577, 19980])));
    expect(gap.byCountDays).toBeCloseTo(8.67752752752753, 9);
  });
});

describe('synchrony', () => {
  it('is 0.1722449 for the ten counts, as a germination index package prints', () => {
    expect(answerOf(synchrony(visitsOf(tenDays, tenCounts)))).toBeCloseTo(0.1722449, 7);
  });

  it('agrees with R where days were missed', () => {
    expect(answerOf(synchrony(visitsOf([5, 6, 8, 9, 12], [3, 12, 23, 27, 29])))).toBeCloseTo(0.248768472906404, 9);
  });

  it('is 1 when all came at one visit, and a plant that died was not un-emerged', () => {
    expect(answerOf(synchrony(visitsOf([6, 7, 8], [0, 30, 29])))).toBe(1);
    expect(answerOf(synchrony(visitsOf([6, 7, 8, 9], [0, 2, 1, 4])))).toBeCloseTo(2 / 6, 12);
  });

  it('is undefined below two plants', () => {
    const case07 = germination.find(({ id }) => id === 'EMRG-07');
    expect(case07).toBeDefined();
    expect(synchrony(visitsOf([5, 6], [0, 1]))).toMatchObject({ kind: 'insufficient', had: '1 plant up' });
    expect(synchrony([])).toMatchObject({ kind: 'insufficient', had: '0 plants up' });
  });

  it('takes half a new plant, from two counts of one moment, as no pair', () => {
    expect(answerOf(synchrony([{ days: 5, plantsUp: 2 }, { days: 6, plantsUp: 2 }, { days: 6, plantsUp: 3 }]))).toBeCloseTo(1 / 1.875, 9);
  });
});

describe('share up within hours of a stated zero', () => {
  it('reads between visits, and names its zero', () => {
    expect(answerOf(shareUpWithin(ten, 'half-up', 24))).toEqual({ share: 0.76, zero: 'half-up', zeroDays: 5, hours: 24, bound: 'exact' });
    expect(answerOf(shareUpWithin(ten, 'first-plant', 24))).toMatchObject({ share: 0.04, zeroDays: 1, bound: 'at-least' });
    // First flush on day 3.0909; two days later 25 + 0.0909 × 13 plants.
    expect(answerOf(shareUpWithin(ten, 'first-flush', 48)).share).toBeCloseTo((25 + (1 / 11) * 13) / 50, 9);
  });

  it('is at least so much while plants still come', () => {
    expect(answerOf(shareUpWithin(curveOf([1, 2, 3, 4], [0, 10, 20, 25]), 'half-up', 24)).bound).toBe('at-least');
  });

  it.each([['first-plant'], ['first-flush'], ['half-up']] as const)('is insufficient where the first visit was past the zero: %s', (zero) => {
    expect(shareUpWithin(curveOf([8, 9, 10], [20, 21, 22]), zero, 24)).toMatchObject({ reason: 'first-visit-too-late' });
  });

  it('is insufficient where nobody came that many hours later', () => {
    expect(shareUpWithin(curveOf([8, 9, 10], [0, 2, 22]), 'half-up', 48)).toMatchObject({ reason: 'no-visit-that-late', had: 'the last visit 13 hours after it' });
  });

  it('refuses hours that are none, and passes on that nothing is up', () => {
    expect(() => shareUpWithin(ten, 'half-up', 0)).toThrow(ImpossibleInput);
    expect(shareUpWithin({ ...ten, plantsEmerged: 0, points: [] }, 'half-up', 24)).toMatchObject({ reason: 'nothing-up' });
  });
});

describe('row-to-row difference', () => {
  const half = (day: number) => curveOf([day - 1, day, day + 1], [0, 10, 20]);

  it('is how far the rows lie apart in coming half up', () => {
    const rows = answerOf(rowToRowDays([half(11.4), half(11), half(11.8)]));
    expect(rows).toMatchObject({ rows: 3, earliestDays: 11, latestDays: 11.8 });
    expect(rows.apartDays).toBeCloseTo(0.8, 9);
    expect(rows.sdDays).toBeCloseTo(0.4, 9);
  });

  it('needs two rows that came half up between visits', () => {
    expect(rowToRowDays([half(11), curveOf([12, 13], [30, 30])])).toMatchObject({ reason: 'too-few-rows', had: '1' });
  });
});

describe('lateness by collars and by heat', () => {
  it.each([
    [{ by: 'collars', collars: 1 }, 'late'],
    [{ by: 'collars', collars: 0.5 }, 'on-time'],
    [{ by: 'collars', collars: 2 }, 'very-late'],
    [{ by: 'collars', collars: -1 }, 'on-time'],
    [{ by: 'degree-days', degreeDaysF: 82 }, 'late'],
    [{ by: 'degree-days', degreeDaysF: 81 }, 'on-time'],
    [{ by: 'degree-days', degreeDaysF: 163 }, 'late'],
    [{ by: 'degree-days', degreeDaysF: 164 }, 'very-late'],
  ] as const)('calls %o %s', (behind, expected) => {
    expect(lateClassBy(behind)).toBe(expected);
  });

  it('refuses what is no number', () => {
    expect(() => lateClassBy({ by: 'collars', collars: NaN })).toThrow(ImpossibleInput);
    expect(() => lateClassBy({ by: 'degree-days', degreeDaysF: Infinity })).toThrow(ImpossibleInput);
  });
});

describe('heat since planting', () => {
  const reference = degreeDays[0];
  const weather: WeatherDay[] = (reference?.input.tmax_f ?? []).map((highF, day) => ({ day, highF, lowF: reference?.input.tmin_f[day] ?? 0 }));
  const asked = { weather, plantedAtPart: null, visitDay: 7, visitPart: 0.5, convention: 'through-yesterday' as const };

  it('cumulates the published week', () => {
    expect(weather).toHaveLength(7);
    reference?.expected.cumulative.forEach((cumulated, index) => {
      expect(answerOf(heatSincePlanting({ ...asked, visitDay: index + 1 })).degreeDaysF).toBeCloseTo(cumulated, 9);
    });
  });

  it('counts the planting day from planting, and by the hour the day of the visit up to then', () => {
    // 6 degree days on the planting day, half of it left; 11.5 the next day, a quarter of it over.
    expect(answerOf(heatSincePlanting({ ...asked, plantedAtPart: 0.5, visitDay: 1 }))).toEqual({ degreeDaysF: 3, degreeDaysC: expect.closeTo(5 / 3, 9), convention: 'through-yesterday', plantingDayShare: 0.5 });
    expect(answerOf(heatSincePlanting({ ...asked, plantedAtPart: 0.5, visitDay: 1, visitPart: 0.25, convention: 'by-the-hour' })).degreeDaysF).toBeCloseTo(3 + 11.5 / 4, 9);
    expect(answerOf(heatSincePlanting({ ...asked, plantedAtPart: 0.75, visitDay: 0, visitPart: 0.5, convention: 'by-the-hour' })).degreeDaysF).toBe(0);
    expect(answerOf(heatSincePlanting({ ...asked, visitDay: 0 })).degreeDaysF).toBe(0);
  });

  it('takes °C as well, each day in its own unit', () => {
    // 30 and 10 °C are 86 and 50 °F: 18 °F degree days, 10 in °C.
    const celsius = answerOf(heatSincePlanting({ ...asked, weather: [{ day: 0, highC: 30, lowC: 10 }, { day: 1, highF: 86, lowF: 50 }], visitDay: 2 }));
    expect(celsius.degreeDaysF).toBeCloseTo(36, 9);
    expect(celsius.degreeDaysC).toBeCloseTo(20, 9);
  });

  it('names the days whose weather is missing', () => {
    expect(heatSincePlanting({ ...asked, weather: weather.filter(({ day }) => day !== 2 && day !== 4) })).toMatchObject({ reason: 'weather-missing', had: 'none of day 2, 4' });
    expect(heatSincePlanting({ ...asked, convention: 'by-the-hour' })).toMatchObject({ had: 'none of day 7' });
  });

  it.each([
    ['a visit before planting', { visitDay: -1 }],
    ['half a day number', { visitDay: 1.5 }],
    ['a part of day over 1', { visitPart: 1.2 }],
    ['a planting time over 1', { plantedAtPart: 2 }],
    ['a day given twice', { weather: [...weather, { day: 0, highF: 60, lowF: 50 }] }],
    ['weather of half a day', { weather: [{ day: 0.5, highF: 60, lowF: 50 }] }],
    ['a high below the low', { weather: [{ day: 0, highF: 40, lowF: 50 }] }],
  ])('refuses %s', (_, changes) => {
    expect(() => heatSincePlanting({ ...asked, ...changes })).toThrow(ImpossibleInput);
  });
});

describe('the curve on the scale of heat', () => {
  const heat = (degreeDaysF: number) => value({ degreeDaysF, degreeDaysC: degreeDaysF / 1.8, convention: 'through-yesterday' as const, plantingDayShare: 1 });
  const curve = curveOf([9, 10, 11, 12], [0, 10, 20, 30]);

  it('interpolates the same counts against heat', () => {
    const onHeat = answerOf(heatCurve(curve, [heat(90), heat(100), heat(120), heat(130)]));
    expect(onHeat.scale).toBe('degree-days-f');
    expect(answerOf(emergencePercentile(onHeat, 0.5)).days).toBeCloseTo(110, 9);
    expect(answerOf(emergenceSpread(onHeat)).days).toBeCloseTo(127 - 93, 9);
  });

  it('joins visits without heat between them', () => {
    expect(answerOf(heatCurve(curve, [heat(90), heat(100), heat(100), heat(130)])).points).toEqual([{ days: 90, plantsUp: 0 }, { days: 100, plantsUp: 20 }, { days: 130, plantsUp: 30 }]);
    expect(curve.points[1]).toEqual({ days: 10, plantsUp: 10 });
  });

  it('is insufficient with the weather, and refuses heat that falls or does not fit', () => {
    const missing = { kind: 'insufficient' as const, reason: 'weather-missing', needed: 'all', had: 'none' };
    expect(heatCurve(curve, [heat(90), missing, heat(120), heat(130)])).toEqual(missing);
    expect(() => heatCurve(curve, [heat(90)])).toThrow(ImpossibleInput);
    expect(() => heatCurve(curve, [heat(90), heat(80), heat(120), heat(130)])).toThrow(ImpossibleInput);
  });
});

describe('heat after which corn is expected', () => {
  const plain = { seedingDepthInches: 2, seedZoneDry: false, residueCoverShare: 0.2, soil: 'medium' as const };

  it('is 90 to 125, usually 115, and W121 adds to it', () => {
    expect(expectedEmergenceHeat(plain)).toEqual({ earliestDegreeDaysF: 90, usualDegreeDaysF: 115, latestDegreeDaysF: 125, added: [] });
    expect(expectedEmergenceHeat({ ...plain, seedingDepthInches: 3, seedZoneDry: true })).toMatchObject({ earliestDegreeDaysF: 135, usualDegreeDaysF: 160, latestDegreeDaysF: 170 });
    expect(expectedEmergenceHeat({ ...plain, residueCoverShare: 0.8, soil: 'fine' })).toMatchObject({ earliestDegreeDaysF: 150, usualDegreeDaysF: 205, latestDegreeDaysF: 245 });
    expect(expectedEmergenceHeat({ ...plain, seedingDepthInches: 1.5, residueCoverShare: 0.75, soil: 'coarse' })).toMatchObject({ earliestDegreeDaysF: 30, usualDegreeDaysF: 70, latestDegreeDaysF: 95 });
  });

  it('names what was added for what', () => {
    expect(expectedEmergenceHeat({ ...plain, seedingDepthInches: 2.5, seedZoneDry: true, residueCoverShare: 0.9, soil: 'coarse' }).added.map(({ reason }) => reason)).toEqual(['depth', 'dry', 'residue', 'soil']);
  });

  it('refuses a depth or cover that cannot be', () => {
    expect(() => expectedEmergenceHeat({ ...plain, seedingDepthInches: 0 })).toThrow(ImpossibleInput);
    expect(() => expectedEmergenceHeat({ ...plain, residueCoverShare: 75 })).toThrow(ImpossibleInput);
  });
});

describe('the model-free estimate', () => {
  it.each(madeInR.map((each, index) => [index + 1, each] as const))('agrees with the survival package of R, case %i', (_, { lower, upper, count, at, up }) => {
    const shares = answerOf(turnbull(lower.map((afterDays, index) => ({ afterDays, byDays: upper[index] ?? null, plants: count[index] ?? 0 }))));
    at.forEach((day, index) => {
      const by = shares.filter(({ byDays }) => byDays !== null && byDays <= day).reduce((sum, { share }) => sum + share, 0);
      // R stops its own steps at about 1e-5.
      expect(by).toBeCloseTo(up[index] ?? NaN, 4);
    });
  });

  it('equals the share of new plants where calendars agree, and adds up to 1', () => {
    const shares = answerOf(turnbull([{ afterDays: 0, byDays: 5, plants: 3 }, { afterDays: 5, byDays: 6, plants: 9 }, { afterDays: 6, byDays: null, plants: 12 }]));
    expect(shares.map(({ share }) => share)).toEqual([0.125, 0.375, 0.5]);
    expect(shares[2]).toMatchObject({ afterDays: 6, byDays: null });
  });

  it('is insufficient without plants, and refuses what cannot be', () => {
    expect(turnbull([{ afterDays: 0, byDays: 5, plants: 0 }])).toMatchObject({ reason: 'nothing-up' });
    expect(turnbull([])).toMatchObject({ reason: 'nothing-up' });
    for (const wrong of [{ afterDays: 5, byDays: 5, plants: 1 }, { afterDays: -1, byDays: 5, plants: 1 }, { afterDays: 0, byDays: 5, plants: -1 }, { afterDays: 0, byDays: NaN, plants: 1 }]) {
      expect(() => turnbull([wrong])).toThrow(ImpossibleInput);
    }
  });
});
