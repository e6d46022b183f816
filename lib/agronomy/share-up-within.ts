import { SAME_NUMBER } from './constants';
import type { EmergenceCurve } from './emergence-curve';
import { emergencePercentile } from './emergence-percentile';
import { insufficient, mapOutcome, value, type Outcome } from './outcome';
import { plantsUpAt } from './plants-up-at';
import { requiredNumber } from './required-number';

/** From when the hours are counted: the last visit that found nothing, the first flush (10 % up), or half up. */
export type EmergenceZero = 'first-plant' | 'first-flush' | 'half-up';

export type ShareUpWithin = { share: number; zero: EmergenceZero; zeroDays: number; hours: number; bound: 'exact' | 'at-least' };

/**
 * What share of the emerged stand was up so many hours after a stated zero?
 *
 * Takes a never-falling curve, which zero, and the hours (above 0; 24 and 48 are usual). Returns the share, 0 to 1, with
 * the zero's day. Insufficient without plants up, where the first visit already found what the zero needs, and where no
 * visit came that many hours after the zero. Throws ImpossibleInput for hours that are not above 0.
 * Method: a straight line between visits, as the percentiles. With `first-plant` the zero is the last visit that found
 * nothing, so the share is *at least* what was up within the hours of the first plant's coming. The zero changes the
 * number, so the two never stand under one name (extension protocols use either).
 * Half the stand is up at `half-up` by definition: there the share begins at 0.5.
 * Example: 0 2 4 15 25 38 45 50 50 50 on days 1 to 10: 24 h after half up 0.76, 24 h after the last empty visit 0.04.
 */
export function shareUpWithin(curve: EmergenceCurve, zero: EmergenceZero, hours: number): Outcome<ShareUpWithin> {
  requiredNumber(hours, 'hours', { above: 0 });
  const from = zeroDays(curve, zero);
  if (from.kind === 'insufficient') return from;
  const until = from.value + hours / 24;
  const lastDays = curve.points[curve.points.length - 1]?.days ?? 0;
  if (lastDays < until - SAME_NUMBER) {
    return insufficient('no-visit-that-late', `a visit ${hours} hours after the zero`, `the last visit ${Math.round((lastDays - from.value) * 24)} hours after it`);
  }
  const share = plantsUpAt(curve.points, until) / curve.plantsEmerged;
  const exact = zero !== 'first-plant' && curve.countingEnded;
  return value({ share, zero, zeroDays: from.value, hours, bound: exact ? 'exact' : 'at-least' });
}

function zeroDays(curve: EmergenceCurve, zero: EmergenceZero): Outcome<number> {
  const tooLate = insufficient('first-visit-too-late', 'a visit before the zero', 'a first visit at which it was past');
  if (zero === 'first-plant') {
    const empty = curve.points.filter(({ plantsUp }) => plantsUp <= SAME_NUMBER).pop();
    return empty ? value(empty.days) : tooLate;
  }
  const reached = emergencePercentile(curve, zero === 'first-flush' ? 0.1 : 0.5);
  if (reached.kind === 'value' && reached.value.bound === 'at-latest') return tooLate;
  return mapOutcome(reached, ({ days }) => days);
}
