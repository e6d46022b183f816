import type { EmergenceCurve } from './emergence-curve';
import { emergencePercentile } from './emergence-percentile';
import { insufficient, value, type Outcome } from './outcome';
import { spokenNumber } from './spoken-number';

export type EmergenceSpread = {
  days: number;
  bound: 'exact' | 'at-least';
  /** Why it is only a lower bound: more may still come, or a tenth were up before the first visit. */
  boundReasons: ('still-coming' | 'first-visit-too-late')[];
};

/**
 * Over how many days did the middle four fifths of the stand come up?
 *
 * Takes a fitted curve. Returns the days from 10 to 90 % of the emerged stand. Insufficient when nine tenths
 * were up at the first visit, for then the counts show no days at all. Throws nothing of its own.
 *
 * Method: T90 − T10. It is "at least" so many days while counting has not ended (T90 of what has come so far
 * flatters a slow setting whose counting stopped early), and when a tenth were up at the first visit.
 * Dead seeds make a stand look even: read it beside the final stand. It depends on how rows were pooled.
 * Example: a tenth on day 3.09 and nine tenths on day 7 are 3.91 days.
 */
export function emergenceSpread(curve: EmergenceCurve): Outcome<EmergenceSpread> {
  const early = emergencePercentile(curve, 0.1);
  const late = emergencePercentile(curve, 0.9);
  if (early.kind === 'insufficient') return early;
  if (late.kind === 'insufficient') return late;
  if (late.value.bound === 'at-latest') {
    return insufficient(
      'first-visit-after-most-were-up',
      'a visit before nine tenths of the plants were up',
      `a first visit ${spokenNumber(late.value.days)} days after planting with nine tenths up`,
    );
  }
  const boundReasons: EmergenceSpread['boundReasons'] = [];
  if (!curve.countingEnded) boundReasons.push('still-coming');
  if (early.value.bound === 'at-latest') boundReasons.push('first-visit-too-late');
  return value({
    days: late.value.days - early.value.days,
    bound: boundReasons.length > 0 ? 'at-least' : 'exact',
    boundReasons,
  });
}
