import { SAME_NUMBER } from './constants';
import type { EmergenceDays } from './emergence-percentile';
import { requiredLateLimits, type LateLimits } from './late-limits';
import { ImpossibleInput, type Outcome } from './outcome';
import { requiredNumber } from './required-number';

/**
 * When a plant on the tape sheet was first seen: up by one visit and not at the one before. `afterDays` is null
 * when the first visit already found it.
 */
export type FirstSeen = { afterDays: number | null; byDays: number };

export type TapePlant = {
  /** Null when its marker or first visit was not noted. */
  firstSeen: FirstSeen | null;
  /** The scout marked it late by sight. */
  markedLate: boolean;
};

export type LateClass = 'on-time' | 'slow' | 'late' | 'very-late' | 'unknown';

export type PlantDelay = {
  /** Days after the first flush; null where it is not known. */
  delayDays: number | null;
  lateClass: LateClass;
  /** What the class rests on. */
  basis: 'visits' | 'sight' | 'none';
};

/**
 * How late did each plant on the tape sheet come up, and which class is that?
 *
 * Takes the plants in tape order, the first flush of their row sample (the day 10 % of its final stand were
 * up, or insufficient) and the limits. Returns one entry a plant, in the same order. Never insufficient as a
 * whole: a plant whose day is not known and that was not marked late is *unknown*. Throws ImpossibleInput for
 * a first-seen interval whose end is not after its start.
 *
 * Method. The plant's day is the middle of the two visits around it, since the percentiles too assume that
 * plants come up evenly between visits; its delay is that day minus the first flush. A plant found by the
 * first visit belongs to the first flush or is at most that visit's day behind it: its delay is figured from
 * that day. A class begins where the delay is *more than* its limit. Visits decide over sight; without a day,
 * a plant that the scout marked late is late.
 * A plant's day is known to half the time between two visits at best.
 * Example: first flush on day 9.4, seen on day 18 and not on day 17: 8.1 days behind, late.
 */
export function plantDelays(
  plants: readonly TapePlant[],
  firstFlush: Outcome<EmergenceDays>,
  limits: LateLimits,
): PlantDelay[] {
  requiredLateLimits(limits);
  return plants.map((plant) => {
    const seen = plant.firstSeen;
    if (seen) checkInterval(seen);
    if (!seen || firstFlush.kind === 'insufficient') {
      return plant.markedLate
        ? { delayDays: null, lateClass: 'late', basis: 'sight' }
        : { delayDays: null, lateClass: 'unknown', basis: 'none' };
    }
    const cameUpDays = seen.afterDays === null ? seen.byDays : (seen.afterDays + seen.byDays) / 2;
    const delayDays = cameUpDays - firstFlush.value.days;
    return { delayDays, lateClass: lateClassOf(delayDays, limits), basis: 'visits' };
  });
}

/** Which class a delay in days falls into; a limit itself still belongs to the class below it. */
export function lateClassOf(delayDays: number, limits: LateLimits): LateClass {
  if (delayDays > limits.veryLateDays + SAME_NUMBER) return 'very-late';
  if (delayDays > limits.lateDays + SAME_NUMBER) return 'late';
  if (delayDays > limits.slowDays + SAME_NUMBER) return 'slow';
  return 'on-time';
}

function checkInterval(seen: FirstSeen): void {
  requiredNumber(seen.byDays, 'byDays', { atLeast: 0 });
  if (seen.afterDays === null) return;
  requiredNumber(seen.afterDays, 'afterDays', { atLeast: 0 });
  if (seen.byDays <= seen.afterDays) {
    throw new ImpossibleInput('A plant cannot be first seen before the visit that missed it.', 'byDays');
  }
}
