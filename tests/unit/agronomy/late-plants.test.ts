import { describe, expect, test } from 'vitest';
import { emergenceCurve } from '@/lib/agronomy/emergence-curve';
import type { EmergenceDays } from '@/lib/agronomy/emergence-percentile';
import { defaultLateLimits, requiredLateLimits } from '@/lib/agronomy/late-limits';
import { latePattern } from '@/lib/agronomy/late-pattern';
import { lateShareFromCounts, lateShareFromTape } from '@/lib/agronomy/late-share';
import { ImpossibleInput, insufficient, value, type Outcome } from '@/lib/agronomy/outcome';
import { lateClassOf, plantDelays, type TapePlant } from '@/lib/agronomy/plant-delays';
import { answerOf, reasonOf } from './answer-of';

// The classes are our own definition; expected values are that definition worked by hand.
const flush: Outcome<EmergenceDays> = value({ days: 9.4, bound: 'exact', afterDays: 9, byDays: 10 });
const unknownFlush = insufficient('no-counts', '1 count', 'no count');

function seen(afterDays: number | null, byDays: number): TapePlant {
  return { firstSeen: { afterDays, byDays }, markedLate: false };
}

const unmarked: TapePlant = { firstSeen: null, markedLate: false };
const marked: TapePlant = { firstSeen: null, markedLate: true };

describe('plantDelays', () => {
  test('takes the middle of the two visits around a plant, less the first flush', () => {
    const [plant] = plantDelays([seen(17, 18)], flush, defaultLateLimits);
    expect(plant?.delayDays).toBeCloseTo(8.1, 9);
    expect(plant).toMatchObject({ lateClass: 'late', basis: 'visits' });
  });

  test('takes a plant found by the first visit as no later than that visit', () => {
    const [plant] = plantDelays([seen(null, 9)], flush, defaultLateLimits);
    expect(plant).toMatchObject({ lateClass: 'on-time' });
  });

  test('lets visits decide over a mark by sight, and sight where there is no visit', () => {
    const early = { firstSeen: { afterDays: 9, byDays: 10 }, markedLate: true };
    const classes = plantDelays([early, marked, unmarked], flush, defaultLateLimits);
    expect(classes.map((plant) => plant.lateClass)).toEqual(['on-time', 'late', 'unknown']);
  });

  test('knows no class without a first flush, save for marks by sight', () => {
    const classes = plantDelays([seen(17, 18), marked], unknownFlush, defaultLateLimits);
    expect(classes.map((plant) => plant.basis)).toEqual(['none', 'sight']);
  });

  test('refuses a plant first seen before the visit that missed it', () => {
    expect(() => plantDelays([seen(18, 17)], flush, defaultLateLimits)).toThrow(ImpossibleInput);
  });

  test.each([
    [2, 'on-time'],
    [2.01, 'slow'],
    [7, 'slow'],
    [7.01, 'late'],
    [14, 'late'],
    [14.01, 'very-late'],
  ] as const)('puts a delay of %s days into %s', (delayDays, lateClass) => {
    expect(lateClassOf(delayDays, defaultLateLimits)).toBe(lateClass);
  });

  test('follows the limits it is given', () => {
    const limits = { slowDays: 1, lateDays: 5, veryLateDays: 10 };
    expect(plantDelays([seen(15, 16)], flush, limits)[0]?.lateClass).toBe('late');
    expect(() => requiredLateLimits({ slowDays: 5, lateDays: 3, veryLateDays: 10 })).toThrow(ImpossibleInput);
  });
});

describe('lateShareFromTape', () => {
  test('adds the plants of all sheets and leaves unknown ones out', () => {
    const first = plantDelays([seen(9, 10), seen(9, 10), seen(17, 18), unmarked], flush, defaultLateLimits);
    const second = plantDelays([seen(9, 10), seen(24, 26)], flush, defaultLateLimits);
    const late = answerOf(lateShareFromTape([first, second], 'exact', defaultLateLimits));
    expect(late).toMatchObject({
      latePlants: 2,
      plants: 5,
      share: 0.4,
      veryLateShare: 0.2,
      plantsUnknown: 1,
    });
    expect(answerOf(late.lateDelayDaysMean)).toBeCloseTo((8.1 + 15.6) / 2, 9);
  });

  test('takes unmarked plants as on time on a sheet marked by sight, without a delay', () => {
    const sheet = plantDelays([marked, unmarked, unmarked, unmarked], unknownFlush, defaultLateLimits);
    const late = answerOf(lateShareFromTape([sheet], 'exact', defaultLateLimits));
    expect(late.share).toBe(0.25);
    expect(reasonOf(late.lateDelayDaysMean)).toBe('delay-not-known');
  });

  test('is insufficient when a sheet says nothing of time', () => {
    const sheet = plantDelays([unmarked, unmarked], flush, defaultLateLimits);
    expect(reasonOf(lateShareFromTape([sheet], 'exact', defaultLateLimits))).toBe('late-plants-not-recorded');
  });
});

describe('lateShareFromCounts', () => {
  const curveOf = (days: number[], plants: number[]) =>
    answerOf(emergenceCurve(days.map((day, index) => ({ days: day, plantsUp: plants[index] as number }))));

  test('reads the part of the curve beyond the first flush and the limit, with its mean delay', () => {
    const late = answerOf(
      lateShareFromCounts(curveOf([8, 10, 17, 19, 20, 21], [0, 20, 20, 25, 25, 25]), defaultLateLimits),
    );
    // First flush: 2.5 of 25 on day 8.25. 5 plants came up between days 17 and 19, 9.75 days behind on average.
    expect(late.share).toBeCloseTo(0.2, 9);
    expect(answerOf(late.lateDelayDaysMean)).toBeCloseTo(9.75, 9);
    expect(late.bound).toBe('exact');
  });

  test('splits an interval that the limit falls into', () => {
    const late = answerOf(
      lateShareFromCounts(curveOf([8, 9, 15, 17, 18, 19], [0, 10, 10, 12, 12, 12]), defaultLateLimits),
    );
    // First flush on day 8.12; the limit is day 15.12, 0.12 of the plants of the interval 15 to 17 lie before.
    expect(late.latePlants).toBeCloseTo(2 * (1 - 0.06), 9);
    expect(answerOf(late.lateDelayDaysMean)).toBeCloseTo((15.12 + 17) / 2 - 8.12, 9);
  });

  test('is "at least" while plants still come', () => {
    expect(answerOf(lateShareFromCounts(curveOf([8, 9, 10], [0, 20, 25]), defaultLateLimits)).bound).toBe(
      'at-least',
    );
  });

  test('is insufficient from one visit', () => {
    expect(reasonOf(lateShareFromCounts(curveOf([9], [20]), defaultLateLimits))).toBe('too-few-visits');
  });
});

describe('latePattern', () => {
  const rowOf = (letters: string) => [...letters].map((letter) => letter === 'L');

  test.each([
    ['L.L.L.L.', 'alternating', 1],
    ['LLL...LLL...', 'in-groups', 3],
    ['L..LL.', 'alternating', 1.5],
    ['LL..LL', 'in-groups', 2],
  ] as const)('reads %s as %s', (letters, pattern, meanRunLength) => {
    expect(answerOf(latePattern([rowOf(letters)]))).toMatchObject({ pattern, meanRunLength });
  });

  test('never lets a run bridge two rows', () => {
    expect(answerOf(latePattern([rowOf('..L'), rowOf('L..')])).runs).toBe(2);
  });

  test('is insufficient without a late plant', () => {
    expect(reasonOf(latePattern([rowOf('....')]))).toBe('no-late-plants');
  });
});
