import { insufficient, value, type Outcome } from '../outcome';
import { spokenNumber } from '../spoken-number';
import { isEvenStand, requiredLatePlants, type LatePlants } from './late-plants';

/** `even` where nothing is late, so that evenness gains nothing. The gain lies under or at the bound, never stated itself. */
export type ReplantGainBound = { gainPercentMost: number; basis: 'printed' | 'even' };

const TWO_WEEKS_DAYS = 14;
const THREE_WEEKS_DAYS = 21;

/**
 * By Ohio State (AGF-122): how much can replanting an uneven stand gain by its evenness?
 *
 * Takes the share of late plants (0 to 1) and their mean delay in days (0 or more). Returns an upper bound in percent of
 * yield. Insufficient where the guide prints nothing: from two to three weeks, and for less than half the plants three weeks
 * or more late. Throws ImpossibleInput for a share above 1 or a negative delay.
 * Method: AGF-122, a delay under two weeks, under 5 % whatever the pattern; half or more three weeks or more late, up to 10 %.
 * A bound is not read between, so nothing is interpolated. It compares at equal dates: the later date of the second stand
 * costs on its own. Example: any share late by 10 days: under 5 %.
 */
export function ohioReplantGain(late: LatePlants): Outcome<ReplantGainBound> {
  requiredLatePlants(late);
  if (isEvenStand(late)) return value({ gainPercentMost: 0, basis: 'even' });
  if (late.delayDays < TWO_WEEKS_DAYS) return value({ gainPercentMost: 5, basis: 'printed' });
  if (late.delayDays < THREE_WEEKS_DAYS) {
    return insufficient(
      'beyond-study',
      'a delay under 14 days, or of 21 and more',
      `${spokenNumber(late.delayDays)} days`,
    );
  }
  return late.lateShare >= 0.5
    ? value({ gainPercentMost: 10, basis: 'printed' })
    : insufficient(
        'beyond-study',
        'half of the plants late or more',
        `${spokenNumber(late.lateShare * 100)} %`,
      );
}
