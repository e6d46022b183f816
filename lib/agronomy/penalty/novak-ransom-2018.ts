import { SAME_NUMBER } from '../constants';
import { insufficient, value, type Outcome } from '../outcome';
import { requiredNumber } from '../required-number';
import { isEvenStand, requiredLatePlants, type LatePlants } from './late-plants';
import type { Penalty } from './penalty';
import { spokenNumber } from '../spoken-number';

const STUDIED_SHARE = 0.1;
const delayBandDays = { from: 5, to: 17 };
const source = 'Novak and Ransom 2018, doi 10.4236/as.2018.910092, and the North Dakota note of 2016';

/**
 * By Novak and Ransom (2018): what do late plants cost?
 *
 * Takes the share of late plants (0 to 1) and their mean delay in days. Returns the loss in bushels per acre at
 * 200 bu/ac, low and high. Insufficient beyond 10 % of the plants or 17 days. Throws ImpossibleInput for a
 * share above 1 or a negative delay.
 * Method: 10 % of plants 5 to 17 days late cost 5 to 6 bu/ac at 200 bu/ac; interpolated from the even stand
 * below 10 % and below 5 days. The study's own zero is the day half the plants were up, ours the first flush.
 * Example: 10 % of plants 10 days late cost 5 to 6 bu/ac.
 */
export function novakRansom2018Late(late: LatePlants): Outcome<Penalty> {
  requiredLatePlants(late);
  const even = isEvenStand(late);
  if (!even && late.lateShare > STUDIED_SHARE + SAME_NUMBER) {
    return insufficient(
      'beyond-study',
      'at most 10 % of plants late',
      `${spokenNumber(late.lateShare * 100)} %`,
    );
  }
  if (!even && late.delayDays > delayBandDays.to) {
    return insufficient(
      'beyond-study',
      `a delay up to ${delayBandDays.to} days`,
      `${spokenNumber(late.delayDays)} days`,
    );
  }
  const shareOfStudied = Math.min(1, late.lateShare / STUDIED_SHARE);
  const part = even ? 0 : shareOfStudied * Math.min(1, late.delayDays / delayBandDays.from);
  return value({
    study: 'novak-ransom-2018-late',
    source,
    reading: 'read',
    lossLow: 5 * part,
    lossHigh: 6 * part,
    unit: 'bushels-per-acre',
    basis: even || part > 1 - SAME_NUMBER ? 'measured' : 'interpolated',
    column: 'late plants, at 200 bu/ac',
    domain: '10 % of plants late by 5 to 17 days, at 200 bu/ac',
  });
}

/**
 * By the same: what do skips cost?
 *
 * Takes the share of skips (0 to 1). Returns bushels per acre at 200 bu/ac. Insufficient beyond 10 %. Throws
 * ImpossibleInput for a share out of range. Method: 10 % skips cost 16 bu/ac; interpolated below.
 * It charges the missing plants, which the stand may already be charged for: never add the two.
 * Example: 5 % skips are interpolated to 8 bu/ac.
 */
export function novakRansom2018Skips(skipsShare: number): Outcome<Penalty> {
  requiredNumber(skipsShare, 'skipsShare', { atLeast: 0, atMost: 1 });
  if (skipsShare > STUDIED_SHARE + SAME_NUMBER) {
    return insufficient('beyond-study', 'at most 10 % skips', `${spokenNumber(skipsShare * 100)} %`);
  }
  const loss = 16 * Math.min(1, skipsShare / STUDIED_SHARE);
  const measured = skipsShare === 0 || Math.abs(skipsShare - STUDIED_SHARE) <= SAME_NUMBER;
  return value({
    study: 'novak-ransom-2018-skips',
    source,
    reading: 'read',
    lossLow: loss,
    lossHigh: loss,
    unit: 'bushels-per-acre',
    basis: measured ? 'measured' : 'interpolated',
    column: 'skips, at 200 bu/ac',
    domain: '10 % skips, at 200 bu/ac',
  });
}
