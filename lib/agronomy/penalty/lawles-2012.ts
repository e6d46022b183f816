import { mapOutcome, type Outcome } from '../outcome';
import { requiredLatePlants, type LatePlants } from './late-plants';
import type { Penalty } from './penalty';
import { shareAndAmount } from './share-and-amount';

export type LawlesWater = 'irrigated' | 'rainfed';

const losses = {
  irrigated: [
    { at: 0, result: 0 },
    { at: 2, result: 3 },
    { at: 5, result: 10 },
    { at: 8, result: 19 },
    { at: 12, result: 25 },
  ],
  rainfed: [
    { at: 0, result: 0 },
    { at: 2, result: 14 },
    { at: 5, result: 25 },
    { at: 8, result: 23 },
    { at: 12, result: 11 },
  ],
} as const;

/**
 * By Lawles et al. (2012): what does every third plant being late cost?
 *
 * Takes the share of late plants (0 to 1), their mean delay in days, and which of the two sites to read.
 * Returns the loss in percent of the yield of the three plants together. Insufficient beyond one plant in
 * three or 12 days. Throws ImpossibleInput for a share above 1 or a negative delay.
 * Method: every third plant late by 2, 5, 8 and 12 days, irrigated −3, −10, −19, −25 %, rainfed −14, −25, −23,
 * −11 %; interpolated from the even stand. It is the outlier among the studies, and its rainfed line turns
 * back; both are shown as measured.
 * Example: every third plant 5 days late, irrigated, costs 10 %.
 */
export function lawles2012(late: LatePlants, water: LawlesWater): Outcome<Penalty> {
  requiredLatePlants(late);
  const loss = shareAndAmount(late.lateShare, late.delayDays, {
    studiedShare: 1 / 3,
    losses: losses[water],
    amountUnit: 'days',
  });
  return mapOutcome(loss, ({ lossPercent, basis }) => ({
    study: water === 'irrigated' ? 'lawles-2012-irrigated' : 'lawles-2012-rainfed',
    source: 'Lawles et al. 2012',
    reading: 'read',
    lossLow: lossPercent,
    lossHigh: lossPercent,
    unit: 'percent-of-three-plants',
    basis,
    column: water,
    domain: 'every third plant late, by 2 to 12 days',
  }));
}
