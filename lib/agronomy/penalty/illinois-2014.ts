import { interpolate, isAnchor, type Anchor } from '../interpolate';
import { SAME_NUMBER } from '../constants';
import { insufficient, value, type Outcome } from '../outcome';
import { spokenNumber } from '../spoken-number';
import { isEvenStand, requiredLatePlants, type LatePlants } from './late-plants';
import type { Penalty } from './penalty';

/** Like a study's answer, but no study of its own: it restates one, so it is never a second witness beside it. */
export type RestatedPenalty = Omit<Penalty, 'study'> & { study: 'illinois-2014'; restates: 'nafziger-1991' };

const DELAYS_DAYS = { tenAndAHalf: 10.5, threeWeeks: 21 };
const SHARE_MOST = 0.75;

/** Losses in percent by share late; 50 to 75 % is one figure, and so is all that is late by a week and a half. */
const losses = {
  low: {
    tenAndAHalf: [anchor(0, 0), anchor(0.25, 6), anchor(0.5, 6), anchor(0.75, 6)],
    threeWeeks: [anchor(0, 0), anchor(0.25, 10), anchor(0.5, 20), anchor(0.75, 20)],
  },
  high: {
    tenAndAHalf: [anchor(0, 0), anchor(0.25, 9), anchor(0.5, 9), anchor(0.75, 9)],
    threeWeeks: [anchor(0, 0), anchor(0.25, 10), anchor(0.5, 22), anchor(0.75, 22)],
  },
};

/**
 * By Illinois Extension (2014), restating Nafziger, Carter and Graham: what do late plants cost?
 *
 * Takes the share of late plants (0 to 1) and their mean delay in days (0 or more). Returns the loss in percent of the even
 * stand, low and high. Insufficient beyond three quarters of the plants or three weeks. Throws ImpossibleInput for a share
 * above 1 or a negative delay.
 * Method: a week and a half late 6 to 9 %, whichever share; three weeks late, a quarter about 10 %, half to three quarters 20
 * to 22 %; straight lines between, from none at no late plants and no delay, labelled interpolated.
 * It is the 1991 study in round numbers and no evidence beside it. Example: half the plants three weeks late: 20 to 22 %.
 */
export function illinois2014(late: LatePlants): Outcome<RestatedPenalty> {
  requiredLatePlants(late);
  const even = isEvenStand(late);
  if (!even && late.lateShare > SHARE_MOST + SAME_NUMBER) {
    return insufficient(
      'beyond-study',
      'at most 75 % of plants late',
      `${spokenNumber(late.lateShare * 100)} %`,
    );
  }
  if (!even && late.delayDays > DELAYS_DAYS.threeWeeks) {
    return insufficient('beyond-study', 'a delay up to 21 days', `${spokenNumber(late.delayDays)} days`);
  }
  const printedShare = isAnchor(losses.low.tenAndAHalf, late.lateShare) || late.lateShare > 0.5;
  const printedDelay = Object.values(DELAYS_DAYS).includes(late.delayDays);
  return value({
    study: 'illinois-2014',
    restates: 'nafziger-1991',
    source: 'Illinois Extension 2014',
    reading: 'read',
    lossLow: lossPercent(late, losses.low),
    lossHigh: lossPercent(late, losses.high),
    unit: 'percent-of-even-stand',
    basis: even || (printedShare && printedDelay) ? 'measured' : 'interpolated',
    column: '',
    domain: '25 to 75 % of plants late, by a week and a half or three weeks',
  });
}

function lossPercent(late: LatePlants, line: (typeof losses)['low']): number {
  const delays = [
    anchor(0, 0),
    anchor(DELAYS_DAYS.tenAndAHalf, interpolate(line.tenAndAHalf, late.lateShare)),
    anchor(DELAYS_DAYS.threeWeeks, interpolate(line.threeWeeks, late.lateShare)),
  ];
  return interpolate(delays, late.delayDays);
}

function anchor(at: number, result: number): Anchor {
  return { at, result };
}
