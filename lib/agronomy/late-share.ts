import type { EmergenceCurve } from './emergence-curve';
import { emergencePercentile } from './emergence-percentile';
import type { LateClass, PlantDelay } from './plant-delays';
import { requiredLateLimits, type LateLimits } from './late-limits';
import { insufficient, value, type Outcome } from './outcome';
import { plantsUpAt } from './plants-up-at';

export type LateShare = {
  /** Share of the plants that are late or very late, 1 being all. */
  share: number;
  latePlants: number;
  plants: number;
  /** Slow only: behind, but not late. Never charged. */
  slowShare: number;
  veryLateShare: number;
  /** Plants on the sheet whose class is not known; they are in none of the shares. */
  plantsUnknown: number;
  /** How far behind the late plants are on average; insufficient when there are none or their days are not known. */
  lateDelayDaysMean: Outcome<number>;
  source: 'tape-sheet' | 'counts';
  /** `at-least`: the first flush is known only as "by that day at the latest", or plants are still coming. */
  bound: 'exact' | 'at-least';
  limits: LateLimits;
};

/**
 * What share of the plants on the tape sheets came up late?
 *
 * Takes the delays of the plants of one or more sheets, each figured against its own row sample's first flush,
 * whether those flushes and countings were complete, and the limits the classes were made with. Returns
 * shares of the plants whose class is known. Insufficient when no plant's class is known. Throws
 * ImpossibleInput for limits out of order.
 *
 * Method: late and very late plants over plants with a known class. On a sheet without days, where at least
 * one plant is marked late, the unmarked plants are taken as on time.
 * Plants that died before the sheet was read are not on it.
 * Example: 4 late of 31 plants is 12.9 %.
 */
export function lateShareFromTape(
  sheets: readonly (readonly PlantDelay[])[],
  bound: LateShare['bound'],
  limits: LateLimits,
): Outcome<LateShare> {
  requiredLateLimits(limits);
  const classes = sheets.flatMap(settledClasses);
  const known = classes.filter((lateClass) => lateClass !== 'unknown');
  if (known.length === 0) {
    return insufficient(
      'late-plants-not-recorded',
      'the visit at which each plant was first seen, or late plants marked',
      `${classes.length} plants with neither`,
    );
  }
  const count = (wanted: LateClass) => known.filter((lateClass) => lateClass === wanted).length;
  const latePlants = count('late') + count('very-late');
  return value({
    share: latePlants / known.length,
    latePlants,
    plants: known.length,
    slowShare: count('slow') / known.length,
    veryLateShare: count('very-late') / known.length,
    plantsUnknown: classes.length - known.length,
    lateDelayDaysMean: meanDelay(sheets.flat(), latePlants),
    source: 'tape-sheet',
    bound,
    limits,
  });
}

/**
 * The classes of one sheet, a sheet marked by sight taken as marked throughout: who marks late plants looks at
 * all of them, so an unmarked plant there was seen and found in time.
 */
export function settledClasses(sheet: readonly PlantDelay[]): LateClass[] {
  const bySightOnly =
    sheet.some((plant) => plant.basis === 'sight') && !sheet.some((plant) => plant.basis === 'visits');
  return sheet.map((plant) => (bySightOnly && plant.lateClass === 'unknown' ? 'on-time' : plant.lateClass));
}

function meanDelay(plants: readonly PlantDelay[], latePlants: number): Outcome<number> {
  if (latePlants === 0) return insufficient('no-late-plants', '1 late plant', '0 late plants');
  const delays = plants.flatMap((plant) =>
    plant.delayDays !== null && (plant.lateClass === 'late' || plant.lateClass === 'very-late')
      ? [plant.delayDays]
      : [],
  );
  if (delays.length < latePlants) {
    return insufficient(
      'delay-not-known',
      `the visits between which ${latePlants} late plants came up`,
      `${delays.length} plants with them`,
    );
  }
  return value(delays.reduce((sum, delay) => sum + delay, 0) / delays.length);
}

/**
 * Without a tape sheet: what share of the emerged stand came up late, by the counts alone?
 *
 * Takes a fitted curve and the limits. Returns shares of the plants emerged, which need not be whole plants.
 * Insufficient when the counts show only one moment. Throws ImpossibleInput for limits out of order.
 * Method: one minus the curve's reading at first flush + limit, straight between visits; the mean delay is
 * that of the part of the curve beyond, each piece at its middle. It is "at least" while plants still come
 * and where the first flush is only known as "by that day at the latest".
 * It does not tell which plants are late, so their pattern in the row stays unknown.
 * Example: 27 of 30 up seven days after the first flush is 10 % late.
 */
export function lateShareFromCounts(curve: EmergenceCurve, limits: LateLimits): Outcome<LateShare> {
  requiredLateLimits(limits);
  const flush = emergencePercentile(curve, 0.1);
  if (flush.kind === 'insufficient') return flush;
  if (curve.points.length < 2) return insufficient('too-few-visits', '2 visits', '1 visit');
  const zero = flush.value.days;
  const plants = curve.plantsEmerged;
  const after = (days: number) => plants - Math.min(plants, plantsUpAt(curve.points, zero + days));
  const latePlants = after(limits.lateDays);
  const complete = curve.countingEnded && flush.value.bound === 'exact';
  return value({
    share: latePlants / plants,
    latePlants,
    plants,
    slowShare: (after(limits.slowDays) - latePlants) / plants,
    veryLateShare: after(limits.veryLateDays) / plants,
    plantsUnknown: 0,
    lateDelayDaysMean:
      latePlants > 0
        ? value(delaySum(curve, zero, limits) / latePlants)
        : insufficient('no-late-plants', '1 late plant', '0 late plants'),
    source: 'counts',
    bound: complete ? 'exact' : 'at-least',
    limits,
  });
}

function delaySum(curve: EmergenceCurve, zero: number, limits: LateLimits): number {
  const start = zero + limits.lateDays;
  let sum = 0;
  for (let index = 1; index < curve.points.length; index += 1) {
    const left = curve.points[index - 1];
    const right = curve.points[index];
    if (!left || !right) continue;
    const from = Math.max(left.days, start);
    if (from >= right.days) continue;
    const plants = right.plantsUp - plantsUpAt([left, right], from);
    sum += plants * ((from + right.days) / 2 - zero);
  }
  return sum;
}
