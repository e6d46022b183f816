import { describe, expect, it } from 'vitest';
import { ImpossibleInput } from '@/lib/agronomy/outcome';
import { illinois2014 } from '@/lib/agronomy/penalty/illinois-2014';
import { nafziger1996SkipMadeUp } from '@/lib/agronomy/penalty/nafziger-1996';
import { ohioReplantGain } from '@/lib/agronomy/penalty/ohio-replant-gain';
import { answerOf } from './answer-of';

const impossible = [
  { lateShare: -0.01, delayDays: 1 },
  { lateShare: 1.01, delayDays: 1 },
  { lateShare: NaN, delayDays: 1 },
  { lateShare: 0.5, delayDays: -1 },
  { lateShare: 0.5, delayDays: Infinity },
];

describe('late plants as Illinois restates them', () => {
  // Illinois Extension 2014: 1.5 weeks 6 to 9 %; 3 weeks, 25 % late about 10 %, 50 to 75 % late 20 to 22 %.
  it.each([
    [0.25, 10.5, 6, 9],
    [0.5, 10.5, 6, 9],
    [0.75, 10.5, 6, 9],
    [0.25, 21, 10, 10],
    [0.5, 21, 20, 22],
    [0.6, 21, 20, 22],
    [0.75, 21, 20, 22],
  ])('cost what is printed: %d of the plants by %d days', (lateShare, delayDays, low, high) => {
    const penalty = answerOf(illinois2014({ lateShare, delayDays }));
    expect(penalty.lossLow).toBeCloseTo(low, 9);
    expect(penalty.lossHigh).toBeCloseTo(high, 9);
    expect(penalty).toMatchObject({ basis: 'measured', restates: 'nafziger-1991' });
  });

  it('cost nothing where none is late, also beyond the delays printed', () => {
    expect(answerOf(illinois2014({ lateShare: 0, delayDays: 40 }))).toMatchObject({
      lossLow: 0,
      lossHigh: 0,
      basis: 'measured',
    });
    expect(answerOf(illinois2014({ lateShare: 1, delayDays: 0 }))).toMatchObject({
      lossLow: 0,
      lossHigh: 0,
      basis: 'measured',
    });
  });

  it.each([
    [0.125, 10.5, 3, 4.5],
    [0.25, 5.25, 3, 4.5],
    [0.5, 15.75, 13, 15.5],
    [0.375, 21, 15, 16],
    [0.3, 10.5, 6, 9],
  ])(
    'are interpolated from the even stand and labelled so: %d by %d days',
    (lateShare, delayDays, low, high) => {
      const penalty = answerOf(illinois2014({ lateShare, delayDays }));
      expect(penalty.lossLow).toBeCloseTo(low, 9);
      expect(penalty.lossHigh).toBeCloseTo(high, 9);
      expect(penalty.basis).toBe('interpolated');
    },
  );

  it('are refused beyond what is printed', () => {
    expect(illinois2014({ lateShare: 0.8, delayDays: 10 })).toEqual({
      kind: 'insufficient',
      reason: 'beyond-study',
      needed: 'at most 75 % of plants late',
      had: '80 %',
    });
    expect(illinois2014({ lateShare: 0.5, delayDays: 21.5 })).toEqual({
      kind: 'insufficient',
      reason: 'beyond-study',
      needed: 'a delay up to 21 days',
      had: '21.5 days',
    });
    for (const late of impossible) expect(() => illinois2014(late)).toThrow(ImpossibleInput);
  });
});

describe('what replanting an uneven stand can gain', () => {
  // Ohio State AGF-122: under two weeks, under 5 % whatever the pattern; half or more three weeks or more late, up to 10 %.
  it.each([
    [0.1, 0.5, 5],
    [1, 13.9, 5],
    [0.5, 21, 10],
    [1, 40, 10],
  ])('is bounded as printed: %d of the plants by %d days, %d %', (lateShare, delayDays, gainPercentMost) => {
    expect(answerOf(ohioReplantGain({ lateShare, delayDays }))).toEqual({
      gainPercentMost,
      basis: 'printed',
    });
  });

  it('is nothing where none is late', () => {
    expect(answerOf(ohioReplantGain({ lateShare: 0, delayDays: 30 }))).toEqual({
      gainPercentMost: 0,
      basis: 'even',
    });
  });

  it('is not said where the guide prints nothing', () => {
    expect(ohioReplantGain({ lateShare: 0.5, delayDays: 14 })).toEqual({
      kind: 'insufficient',
      reason: 'beyond-study',
      needed: 'a delay under 14 days, or of 21 and more',
      had: '14 days',
    });
    expect(ohioReplantGain({ lateShare: 0.5, delayDays: 20.9 }).kind).toBe('insufficient');
    expect(ohioReplantGain({ lateShare: 0.49, delayDays: 21 })).toEqual({
      kind: 'insufficient',
      reason: 'beyond-study',
      needed: 'half of the plants late or more',
      had: '49 %',
    });
    for (const late of impossible) expect(() => ohioReplantGain(late)).toThrow(ImpossibleInput);
  });
});

describe('what neighbors of a skip make up', () => {
  // Nafziger 1996, J. Prod. Agric. 9:238: 47 % at 18,000 plants per acre, 19 % at 30,000.
  it('is what is printed at both stands, and less the thicker the stand between', () => {
    expect(answerOf(nafziger1996SkipMadeUp(18_000))).toEqual({ madeUpShare: 0.47, basis: 'measured' });
    expect(answerOf(nafziger1996SkipMadeUp(30_000))).toEqual({ madeUpShare: 0.19, basis: 'measured' });
    expect(answerOf(nafziger1996SkipMadeUp(24_000))).toEqual({
      madeUpShare: expect.closeTo(0.33, 12),
      basis: 'interpolated',
    });
  });

  it('is not said outside them, and refused for no stand', () => {
    expect(nafziger1996SkipMadeUp(17_999)).toEqual({
      kind: 'insufficient',
      reason: 'beyond-study',
      needed: '18,000 to 30,000 plants per acre',
      had: '17999',
    });
    expect(nafziger1996SkipMadeUp(30_001).kind).toBe('insufficient');
    for (const bad of [0, -1, NaN, Infinity])
      expect(() => nafziger1996SkipMadeUp(bad)).toThrow(ImpossibleInput);
  });
});
