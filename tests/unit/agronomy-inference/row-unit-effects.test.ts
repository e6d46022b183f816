import { describe, expect, it } from 'vitest';
import { rowUnitEffects } from '../../../lib/agronomy/inference/row-unit-effects';
import type { RowUnitFigure } from '../../../lib/agronomy/inference/row-unit-figures';
import { ImpossibleInput } from '../../../lib/agronomy/outcome';
import { randomStream } from '../../../lib/agronomy/random';
import { timingOfRowUnits } from '../../../lib/agronomy/timing-of-row-units';
import { countsFrom, rowSampleOf } from '../agronomy/row-sample-of';
import { answered } from './reference-designs';
import { trialComparison } from './trial-comparison';

const cases = Object.entries(trialComparison.row_units);

function figuresOf({ y, strip, unit }: (typeof trialComparison)['row_units']['complete']['input']) {
  return y.map((figure, index) => ({
    strip: strip[index] as string,
    setting: 'one',
    rowUnit: Number(unit[index]),
    figure,
  }));
}

/** Units 3, 6 and 10 in six strips of two settings; unit 6 is late by `unitDays`, setting b by `settingDays`. */
function sampled(unitDays: number, settingDays: number, seed = 2): RowUnitFigure[] {
  const stream = randomStream(seed);
  return ['1', '2', '3', '4', '5', '6'].flatMap((strip) =>
    [3, 6, 10].map((rowUnit) => ({
      strip,
      setting: Number(strip) % 2 === 0 ? 'b' : 'a',
      rowUnit,
      figure:
        8 +
        0.3 * stream.nextUnit() +
        (rowUnit === 6 ? unitDays : 0) +
        (Number(strip) % 2 === 0 ? settingDays : 0),
    })),
  );
}

describe('rowUnitEffects', () => {
  it.each(cases)('agrees with R, strips taken out and Holm over the units: %s', (_, { input, expected }) => {
    const found = answered(rowUnitEffects(figuresOf(input)));
    expect(found.rowUnits.map(({ rowUnit }) => `${rowUnit}`)).toEqual(expected.units);
    found.rowUnits.forEach((unit, index) => {
      expect(unit.lessOthers / (expected.less_others[index] as number)).toBeCloseTo(1, 8);
      expect(unit.standardError / (expected.se[index] as number)).toBeCloseTo(1, 8);
      expect(unit.p).toBeCloseTo(expected.p_holm[index] as number, 9);
      // The middle of the interval is the estimate, its half the t of R's own degrees of freedom.
      expect((unit.lower + unit.upper) / 2).toBeCloseTo(unit.lessOthers, 9);
    });
    expect(found.errorDegreesOfFreedom).toBe(expected.df);
    expect(found.fRatio / expected.F).toBeCloseTo(1, 8);
    expect(found.p).toBeCloseTo(expected.F_p, 9);
  });

  it('finds the unit that is late in all strips, whatever the settings do', () => {
    for (const settingDays of [0, 2]) {
      const found = answered(rowUnitEffects(sampled(1.5, settingDays)));
      expect(found.rowUnits.filter((unit) => unit.isLateUnit).map((unit) => unit.rowUnit)).toEqual([6]);
      expect(found).toMatchObject({ strips: 6, sameUnitsInEveryStrip: true, leftOut: [] });
      expect(found.rowUnits[1]).toMatchObject({ strips: 6, settings: 2, laterInAllStrips: true });
    }
  });

  it('blames no row unit for a setting that is late', () => {
    const found = answered(rowUnitEffects(sampled(0, 2)));
    expect(found.rowUnits.filter((unit) => unit.isLateUnit)).toEqual([]);
  });

  it('calls no unit late where one is early', () => {
    const found = answered(rowUnitEffects(sampled(-1.5, 0)));
    expect(found.rowUnits.filter((unit) => unit.isLateUnit)).toEqual([]);
    expect(found.rowUnits[1]?.upper).toBeLessThan(0);
  });

  it('takes a unit sampled once as left out, and a strip with one unit as no comparison', () => {
    const figures = [
      ...sampled(1.5, 0),
      { strip: '2', setting: 'b', rowUnit: 12, figure: 30 },
      { strip: '7', setting: 'a', rowUnit: 6, figure: 1 },
    ];
    const found = answered(rowUnitEffects(figures));
    expect(found.leftOut).toEqual([12]);
    expect(found.sameUnitsInEveryStrip).toBe(false);
    expect(found.rowUnits[1]).toMatchObject({ strips: 7, laterInAllStrips: true, isLateUnit: true });
  });

  it('compares the 36 row units of a wide planter', () => {
    const stream = randomStream(3);
    const figures = ['1', '2', '3'].flatMap((strip) =>
      Array.from({ length: 36 }, (_, index) => ({
        strip,
        setting: strip,
        rowUnit: index + 1,
        figure: stream.nextUnit() + (index === 17 ? 4 : 0),
      })),
    );
    const found = answered(rowUnitEffects(figures));
    expect(found.rowUnits.filter((unit) => unit.isLateUnit).map((unit) => unit.rowUnit)).toEqual([18]);
  });

  it('says that setting and row unit are mixed on a split planter', () => {
    const split = ['1', '2', '3', '4'].flatMap((strip) =>
      [1, 2, 3, 4].map((rowUnit) => ({ strip, setting: rowUnit <= 2 ? 'a' : 'b', rowUnit, figure: rowUnit })),
    );
    expect(rowUnitEffects(split)).toMatchObject({
      kind: 'insufficient',
      reason: 'row-unit-mixed-with-setting',
    });
  });

  it('is insufficient for too few strips or units, units that share no strip, and figures that do not vary', () => {
    const one = (strip: string, rowUnit: number, figure: number) => ({
      strip,
      setting: 'a',
      rowUnit,
      figure,
    });
    expect(rowUnitEffects([])).toMatchObject({ reason: 'one-strip', had: '0' });
    expect(rowUnitEffects([one('1', 1, 8), one('1', 2, 9)])).toMatchObject({ reason: 'one-strip', had: '1' });
    expect(rowUnitEffects([one('1', 1, 8), one('2', 1, 9), one('2', 2, 9)])).toMatchObject({
      reason: 'too-few-row-units',
      had: '1',
    });
    const apart = [one('1', 1, 8), one('2', 1, 9), one('3', 2, 8), one('4', 2, 7)];
    expect(rowUnitEffects(apart)).toMatchObject({ reason: 'not-connected' });
    const chain = [one('1', 1, 8), one('1', 2, 9), one('2', 1, 8), one('3', 2, 9)];
    expect(rowUnitEffects(chain)).toMatchObject({ reason: 'no-error-degrees-of-freedom', had: '0' });
    const equal = sampled(0, 0).map((each) => ({ ...each, figure: 8 }));
    expect(rowUnitEffects(equal)).toMatchObject({ reason: 'no-variation' });
  });

  it.each([
    ['a figure that is no number', { figure: Number.NaN }, 'figure'],
    ['planter row 0', { rowUnit: 0 }, 'rowUnit'],
    ['planter row 2.5', { rowUnit: 2.5 }, 'rowUnit'],
    ['a second figure of a unit in a strip', {}, 'rowUnit'],
  ])('refuses %s and names the field', (_, change, field) => {
    const figures = [...sampled(0, 0), { strip: '1', setting: 'a', rowUnit: 3, figure: 8, ...change }];
    expect(() => rowUnitEffects(figures)).toThrow(ImpossibleInput);
    expect(() => rowUnitEffects(figures)).toThrow(expect.objectContaining({ field }));
  });
});

describe('timingOfRowUnits', () => {
  const sample = (strip: string, rowUnit: number, firstDay: number, plants: readonly number[]) => ({
    strip,
    rowUnit,
    sample: rowSampleOf({ counts: countsFrom(firstDay, plants) }),
  });

  it('pools a row unit over its strips: counts added and fitted once', () => {
    const units = timingOfRowUnits([
      sample('1', 10, 7, [0, 0, 20, 20, 20]),
      sample('1', 3, 7, [0, 10, 20, 20, 20]),
      sample('2', 3, 7, [0, 0, 20, 20, 20]),
    ]);
    expect(units.map(({ rowUnit, strips }) => [rowUnit, strips])).toEqual([
      [3, 2],
      [10, 1],
    ]);
    // Together 0 10 40 40 40: half of 40 lies a third of the way from day 8 to day 9.
    const [three] = units;
    if (!three) throw new Error('unit 3 is there');
    expect(answered(three.timing.daysTo50).days).toBeCloseTo(8 + 1 / 3, 12);
    // Strip by strip: day 8 (a tie is that day), and half way from 8 to 9.
    expect(three.byStrip.map(({ strip, daysTo50 }) => [strip, answered(daysTo50).days])).toEqual([
      ['1', 8],
      ['2', 8.5],
    ]);
    expect(answered(three.lateShare).share).toBe(0);
  });

  it('takes the late limits of the planting, and says which row unit has no count', () => {
    const [late, none] = timingOfRowUnits([
      {
        rowUnit: 1,
        strip: '1',
        sample: rowSampleOf({
          counts: countsFrom(7, [0, 10, 10, 10, 20, 20, 20]),
          lateLimits: { slowDays: 1, lateDays: 2, veryLateDays: 9 },
        }),
      },
      { rowUnit: 2, strip: '1', sample: rowSampleOf() },
    ]);
    // First flush on day 7.2; by day 9.2 10 of 20 were up.
    expect(answered(late?.lateShare as never)).toMatchObject({ share: 0.5 });
    expect(none?.timing.daysTo50).toMatchObject({ kind: 'insufficient', reason: 'no-counts' });
    expect(none?.lateShare).toMatchObject({ kind: 'insufficient' });
    expect(timingOfRowUnits([])).toEqual([]);
    expect(() => timingOfRowUnits([sample('1', 0, 7, [0, 1])])).toThrow(ImpossibleInput);
  });
});
